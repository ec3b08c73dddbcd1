import { findEntry, writeColour, type ColourTable } from '../../../plot/colour/colourMap'
import type { LinearScale } from '../../../plot/linearScale'
import { findFrom } from '../../../plot/thinTrace'

/** A quantity along the line at one moment. */
export interface StripModel {
  /** Ascending [m]. */
  x: ArrayLike<number>
  values: ArrayLike<number>
  /** Value of the last colour. */
  limit: number
  table: ColourTable
  ink: string
  rule: string
  /** [px] */
  width: number
}

/**
 * Draws a quantity along the line: filled to zero in its colours, outlined in ink.
 *
 * @param context - drawn into
 * @param model - what is drawn
 * @param x - places to pixels
 * @param y - values to pixels
 */
export function drawStrip(
  context: CanvasRenderingContext2D,
  { x: places, values, limit, table, ink, rule, width }: StripModel,
  x: LinearScale,
  y: LinearScale,
): void {
  const first = Math.max(0, findFrom(places, x.from) - 1)
  const last = Math.min(places.length - 1, findFrom(places, x.to))
  const zero = y.at(0)
  const edge = (i: number): number =>
    i <= 0
      ? x.at(places[0])
      : i >= places.length
        ? x.at(places[places.length - 1])
        : x.at((places[i - 1] + places[i]) / 2)

  for (let i = first; i <= last; i++) {
    if (!Number.isFinite(values[i])) continue
    context.fillStyle = writeColour(table, findEntry(values[i], limit))
    const top = y.at(values[i])
    // A shade wider than its column, so that no seam shows.
    context.fillRect(edge(i), Math.min(top, zero), edge(i + 1) - edge(i) + 0.5, Math.abs(top - zero))
  }
  context.fillStyle = rule
  context.fillRect(0, Math.round(zero) - 0.5, width, 1)

  context.strokeStyle = ink
  context.lineWidth = 1.25
  context.lineJoin = 'round'
  context.beginPath()
  let isOn = false
  for (let i = first; i <= last; i++) {
    const isBar = Number.isFinite(values[i])
    if (isBar && isOn) context.lineTo(x.at(places[i]), y.at(values[i]))
    else if (isBar) context.moveTo(x.at(places[i]), y.at(values[i]))
    isOn = isBar
  }
  context.stroke()
}
