import { findEntry, writeColour, type ColourTable } from '../../../plot/colour/colourMap'
import { writeFont } from '../../charts/inks'
import type { Ruler } from '../useRulers'
import { drawField } from './drawField'
import { drawPicture, type PaintedPicture } from './drawPicture'
import type { FieldModel } from './fieldModel'
import type { FieldScales } from './fieldScales'

/** Words of the colour bar, from its top down, at even distances. */
export interface BarWords {
  table: ColourTable
  /** False for a quantity without sign. */
  isSigned: boolean
  words: readonly string[]
}

/** The field with its rulers and colours, as it is saved. */
export interface FieldFigure {
  title: string
  model: FieldModel
  scales: FieldScales
  x: Ruler
  t: Ruler
  painted: PaintedPicture | null
  bar: BarWords
}

/** Room about the field [px]. */
const LEFT = 96
const TOP = 36
const RIGHT = 56
const BOTTOM = 32

/** Height of the colour bar and count of its steps. */
const BAR = 96
const STEPS = 48

/**
 * Reckons the size of the saved field.
 *
 * @param scales - of the field
 * @returns width and height [px]
 */
export function evaluateFigureSize({ width, height }: FieldScales): { width: number; height: number } {
  return { width: LEFT + width + RIGHT, height: TOP + height + BOTTOM }
}

/**
 * Draws the field with title, rulers and colour bar.
 *
 * @param context - drawn into
 * @param figure - what is drawn
 */
export function drawFieldFigure(context: CanvasRenderingContext2D, figure: FieldFigure): void {
  const { model, scales, painted, title } = figure
  const { palette, stale, axisSize, bodySize } = model
  const ink = stale ? palette.stale : palette.ink
  context.save()
  context.translate(LEFT, TOP)
  context.save()
  context.beginPath()
  context.rect(0, 0, scales.width, scales.height)
  context.clip()
  if (painted) drawPicture(context, painted, scales)
  drawField(context, model, scales)
  context.restore()

  context.strokeStyle = ink
  context.fillStyle = ink
  context.lineWidth = 1
  context.strokeRect(0, 0, scales.width, scales.height)
  context.textBaseline = 'alphabetic'
  context.textAlign = 'left'
  context.font = writeFont(bodySize, 600)
  context.fillText(title, 0, -14)
  context.font = writeFont(axisSize)
  drawRulers(context, figure)
  drawBar(context, figure)
  context.restore()
}

function drawRulers(context: CanvasRenderingContext2D, { scales, x, t, model }: FieldFigure): void {
  const { width, height } = scales
  context.beginPath()
  for (const [values, length] of [
    [x.ticks.major, 5],
    [x.ticks.minor, 3],
  ] as const) {
    for (const value of values) {
      context.moveTo(scales.x.at(value * x.size), height)
      context.lineTo(scales.x.at(value * x.size), height + length)
    }
  }
  for (const [values, length] of [
    [t.ticks.major, 6],
    [t.ticks.minor, 3],
  ] as const) {
    for (const value of values) {
      context.moveTo(width, scales.t.at(value * t.size))
      context.lineTo(width + length, scales.t.at(value * t.size))
    }
  }
  context.stroke()
  const drop = height + 8 + model.axisSize
  context.textAlign = 'center'
  for (const value of x.ticks.major) context.fillText(x.writeTick(value), scales.x.at(value * x.size), drop)
  context.textAlign = 'right'
  context.fillText(`x, ${x.unit}`, -16, drop)
  context.textAlign = 'left'
  for (const value of t.ticks.major) {
    context.fillText(t.writeTick(value), width + 10, scales.t.at(value * t.size) + 0.35 * model.axisSize)
  }
  context.fillText(`t, ${t.unit}`, width + 10, -14)
}

function drawBar(context: CanvasRenderingContext2D, { scales, bar, model }: FieldFigure): void {
  const left = 12 - LEFT
  const top = scales.height - BAR
  const least = bar.isSigned ? -1 : 0
  for (let i = 0; i < STEPS; i++) {
    context.fillStyle = writeColour(bar.table, findEntry(1 - ((i + 0.5) * (1 - least)) / STEPS, 1))
    context.fillRect(left, top + (i * BAR) / STEPS, 10, BAR / STEPS + 0.5)
  }
  context.strokeRect(left, top, 10, BAR)
  context.fillStyle = model.stale ? model.palette.stale : model.palette.ink
  bar.words.forEach((word, i) => {
    const share = bar.words.length > 1 ? i / (bar.words.length - 1) : 0
    context.fillText(
      word,
      left + 15,
      top + model.axisSize * (0.8 - 0.6 * share) + share * (BAR - 0.2 * model.axisSize),
    )
  })
}
