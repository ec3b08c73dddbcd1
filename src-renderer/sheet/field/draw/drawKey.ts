import { isOver, type Box } from '../../../plot/placeLabels'
import type { FieldModel } from './fieldModel'
import type { FieldScales } from './fieldScales'
import { writeFont } from '../../charts/inks'

/** Space about the key's words and below it, where the names of gauges stand [px]. */
const PAD = 5
const EDGE = 4

/**
 * Draws what the field's signs mean, on a plate of paper in the first corner that is free: lower right, upper
 * right, upper left.
 *
 * @param context - drawn into
 * @param model - whose `key` is drawn
 * @param scales - of the field
 * @param taken - areas that must stay free
 * @returns the area of the plate
 */
export function drawKey(
  context: CanvasRenderingContext2D,
  { key, palette, axisSize }: FieldModel,
  { width, height }: FieldScales,
  taken: readonly Box[],
): Box {
  if (key.length === 0) return { left: 0, top: 0, right: 0, bottom: 0 }
  const line = axisSize + 3
  context.save()
  context.font = writeFont(axisSize)
  const wide = Math.max(...key.map((text) => context.measureText(text).width)) + 2 * PAD
  const high = key.length * line + 2 * PAD - 2
  const foot = axisSize + 8
  const corners = [
    { left: width - EDGE - wide, top: height - foot - high },
    { left: width - EDGE - wide, top: EDGE },
    { left: EDGE, top: EDGE },
  ].map(({ left, top }) => ({ left, top, right: left + wide, bottom: top + high }))
  const plate = corners.find((box) => !taken.some((other) => isOver(box, other))) ?? corners[0]

  context.fillStyle = palette.paper
  context.globalAlpha = 0.85
  context.fillRect(plate.left, plate.top, wide, high)
  context.globalAlpha = 1
  context.fillStyle = palette.unit
  context.textAlign = 'right'
  context.textBaseline = 'middle'
  key.forEach((text, i) => context.fillText(text, plate.right - PAD, plate.top + PAD - 1 + (i + 0.5) * line))
  context.restore()
  return plate
}
