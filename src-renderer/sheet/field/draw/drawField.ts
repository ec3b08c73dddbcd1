import { drawHaloText } from '../../../plot/haloText'
import { placeLabels, type Box } from '../../../plot/placeLabels'
import { drawFronts } from './drawFronts'
import { drawKey } from './drawKey'
import { writeFont } from '../../charts/inks'
import { CHAIN, DOTS, drawLevels, drawUprights } from './drawLines'
import type { FieldModel } from './fieldModel'
import type { FieldScales } from './fieldScales'
import { listFrontLabels, listFrontLines } from './listFrontLabels'

/** Size of type that the measures of marks below are for [px]; they grow with it. */
const TYPE = 11

/** Half the length of a sign, half the width of the bar of a contact that carries force, radius of the ring [px]. */
const SIGN = 2.5
const CONTACT = 2.5
const RING = 8

/**
 * Draws what stands over the field's picture: grid, sections, signs, fronts with their numbers, contacts,
 * breaks, gauges, the governing ring with its chain lines, and the key.
 *
 * @param context - drawn into; one unit is one pixel of the page
 * @param model - what is shown
 * @param scales - where
 */
export function drawField(context: CanvasRenderingContext2D, model: FieldModel, scales: FieldScales): void {
  const { palette, stale, line } = model
  const { width, height, x, t } = scales
  const ink = stale ? palette.stale : palette.ink
  const upright = (places: number[], style: Parameters<typeof drawUprights>[4]): void =>
    drawUprights(
      context,
      places.map(x.at).filter((place) => place > -1 && place < width + 1),
      0,
      height,
      style,
    )

  const grid = { colour: palette.ink, alpha: palette.theme === 'dark' ? 0.12 : 0.08 }
  upright(
    model.xTicks.major.map((value) => value * model.xUnit),
    grid,
  )
  drawLevels(
    context,
    model.tTicks.major.map((value) => t.at(value * model.tUnit)),
    0,
    width,
    grid,
  )

  drawSigns(context, model, scales)
  if (line) {
    const faces = line.bars.flatMap(({ sections }) => sections.slice(1).map(({ from }) => from))
    upright(faces, { colour: ink, width: 0.75, alpha: 0.35 })
    upright(
      line.joints.map((joint) => joint.x),
      { colour: ink },
    )
    upright(
      line.gauges.map((gauge) => gauge.x),
      { colour: ink, dash: DOTS },
    )
  }
  const fronts = listFrontLines(model.fronts, scales)
  drawFronts(context, fronts, ink)
  drawContacts(context, model, scales, ink)
  drawSpalls(context, model, scales, ink)

  const taken = [...drawGoverning(context, model, scales, ink), ...drawGauges(context, model, scales, ink)]
  const keyBox = drawKey(context, model, scales, taken)
  context.font = writeFont(model.axisSize)
  const labels = listFrontLabels(fronts, (text) => context.measureText(text).width, model.axisSize, height)
  const room = { left: 2, top: 2, right: width - 2, bottom: height - 2 }
  for (const label of placeLabels(labels, room, [...taken, keyBox])) {
    drawHaloText(context, label.text, label.x, label.y, {
      font: writeFont(model.axisSize),
      ink,
      halo: palette.paper,
    })
  }
}

function drawSigns(
  context: CanvasRenderingContext2D,
  { signs, palette, axisSize }: FieldModel,
  scales: FieldScales,
): void {
  const half = (SIGN * axisSize) / TYPE
  context.save()
  context.strokeStyle = palette.ink
  context.globalAlpha = 0.5
  context.lineWidth = 1
  context.beginPath()
  for (const { across, up, positive } of signs) {
    const x = Math.round(across * scales.width) + 0.5
    const y = Math.round((1 - up) * scales.height) + 0.5
    context.moveTo(x - half, y)
    context.lineTo(x + half, y)
    if (!positive) continue
    context.moveTo(x, y - half)
    context.lineTo(x, y + half)
  }
  context.stroke()
  context.restore()
}

function drawContacts(
  context: CanvasRenderingContext2D,
  { contacts, axisSize }: FieldModel,
  { x, t }: FieldScales,
  ink: string,
): void {
  const half = (CONTACT * axisSize) / TYPE
  context.fillStyle = ink
  for (const spell of contacts) {
    context.fillRect(x.at(spell.x) - half, t.at(spell.to), 2 * half, t.at(spell.from) - t.at(spell.to))
  }
}

/** From the moment a bar comes apart on, two lines with paper between them. */
function drawSpalls(
  context: CanvasRenderingContext2D,
  { spalls, palette }: FieldModel,
  { x, t }: FieldScales,
  ink: string,
): void {
  for (const spall of spalls) {
    const [left, bottom] = [Math.round(x.at(spall.x)) - 2, t.at(spall.time)]
    if (bottom <= 0) continue
    context.fillStyle = ink
    context.fillRect(left, 0, 4, bottom)
    context.fillStyle = palette.paper
    context.fillRect(left + 1, 0, 2, bottom)
  }
}

/** The ring and its chain lines; returns the areas that its words take. */
function drawGoverning(
  context: CanvasRenderingContext2D,
  { governing, palette, axisSize, bodySize }: FieldModel,
  { x, t, width, height }: FieldScales,
  ink: string,
): Box[] {
  if (!governing) return []
  const ring = (RING * axisSize) / TYPE
  const atX = x.at(governing.x)
  const atT = t.at(governing.t)
  const style = { colour: ink, width: governing.over ? 2 : 1, dash: CHAIN }
  if (atX > -1 && atX < width + 1) drawUprights(context, [atX], 0, height, style)
  if (atT < -1 || atT > height + 1) return []
  drawLevels(context, [atT], Math.max(0, atX + ring + 1), width, style)
  if (atX < -1 || atX > width + 1) return []

  context.save()
  for (const [lineWidth, colour] of [
    [5, palette.paper],
    [2, ink],
  ] as const) {
    context.strokeStyle = colour
    context.lineWidth = lineWidth
    context.beginPath()
    context.arc(atX, atT, ring, 0, 2 * Math.PI)
    context.stroke()
  }
  context.fillStyle = ink
  context.beginPath()
  context.arc(atX, atT, 1.5, 0, 2 * Math.PI)
  context.fill()
  const font = writeFont(bodySize, 600)
  context.font = font
  const wide = context.measureText(governing.text).width
  context.restore()
  const aside = ring + 6
  const right = atX + aside + wide < width - 4
  const left = right ? atX + aside : atX - aside - wide
  const y = atT - ring - 4 < bodySize ? atT + ring + 6 : atT - ring - 4
  drawHaloText(context, governing.text, left, y, { font, ink, halo: palette.paper, align: 'left' })
  return [
    { left: atX - ring - 4, top: atT - ring - 4, right: atX + ring + 4, bottom: atT + ring + 4 },
    { left: left - 4, top: y - bodySize / 2 - 2, right: left + wide + 4, bottom: y + bodySize / 2 + 2 },
  ]
}

function drawGauges(
  context: CanvasRenderingContext2D,
  { line, palette, axisSize }: FieldModel,
  { x, width, height }: FieldScales,
  ink: string,
): Box[] {
  const font = writeFont(axisSize, 600)
  const y = height - axisSize / 2 - 4
  return (line?.gauges ?? []).flatMap((gauge) => {
    const at = x.at(gauge.x)
    if (at < 0 || at > width) return []
    context.font = font
    const wide = context.measureText(gauge.name).width
    const left = at + 4 + wide < width - 2 ? at + 4 : at - 4 - wide
    drawHaloText(context, gauge.name, left, y, { font, ink, halo: palette.paper, align: 'left' })
    return [{ left: left - 2, top: y - axisSize / 2 - 2, right: left + wide + 2, bottom: height }]
  })
}
