import type { PageResult } from '../../../src-main/contract/bridge'
import { drawHatch } from '../../plot/hatching'
import type { Plot } from '../charts/frameSpec'
import type { Inks } from '../charts/inks'
import type { Bound } from './listBounds'

/** Height of the hatching on the forbidden side [px]. */
export const SIDE = 7

/**
 * Hatches the forbidden side of each allowable.
 *
 * @param plot - drawn into
 * @param bounds - seen in it
 * @param inks - of the drawing
 */
export function drawSides({ context, x, y, area }: Plot, bounds: readonly Bound[], inks: Inks): void {
  for (const { from, to, stress } of bounds) {
    const at = y.at(stress)
    const left = Math.max(area.left, x.at(from))
    const right = Math.min(area.right, x.at(to))
    const [top, bottom] =
      stress > 0 ? [Math.max(area.top, at - SIDE), at] : [at, Math.min(area.bottom, at + SIDE)]
    drawHatch(context, { left, right, top, bottom }, { gap: 4, width: 1, colour: inks.ink, lean: 'falling' })
  }
}

/**
 * Hatches what of the peaks is over its allowable, densely.
 *
 * @param plot - drawn into
 * @param result - of the run
 * @param bounds - of both senses
 * @param inks - of the drawing
 */
export function drawOver(
  { context, x, y, area }: Plot,
  { envelope }: PageResult,
  bounds: Record<'tension' | 'compression', readonly Bound[]>,
  inks: Inks,
): void {
  for (const sense of ['tension', 'compression'] as const) {
    for (const bound of bounds[sense]) {
      const over = listOver(envelope.x, envelope[sense], bound)
      if (over.length === 0) continue
      context.save()
      context.beginPath()
      for (const [place, value] of over) context.lineTo(x.at(place), y.at(value))
      for (const [place] of over.toReversed()) context.lineTo(x.at(place), y.at(bound.stress))
      context.closePath()
      context.clip()
      drawHatch(context, area, { gap: 3.5, width: 1.5, colour: inks.ink, lean: 'rising' })
      context.restore()
    }
  }
}

/** The envelope of a section where it is over a bound, cut to the bound elsewhere; empty where it never is. */
function listOver(
  x: ArrayLike<number>,
  values: ArrayLike<number>,
  { from, to, stress }: Bound,
): [number, number][] {
  const sign = Math.sign(stress)
  const points: [number, number][] = []
  let isOver = false
  for (let i = 0; i < x.length; i++) {
    if (x[i] < from - 1e-9 || x[i] > to + 1e-9) continue
    const beyond = sign * values[i] > sign * stress
    isOver ||= beyond
    points.push([x[i], beyond ? values[i] : stress])
  }
  return isOver ? points : []
}

/**
 * Draws how far the stress at a fillet stands above the nominal peak: a stem with an open end.
 *
 * @param plot - drawn into
 * @param sections - of the result
 * @param inks - of the drawing
 */
export function drawStems({ context, x, y, area }: Plot, sections: PageResult['sections'], inks: Inks): void {
  context.save()
  context.beginPath()
  context.rect(area.left, area.top, area.right - area.left, area.bottom - area.top)
  context.clip()
  context.strokeStyle = inks.ink
  context.fillStyle = inks.paper
  context.lineWidth = 1
  for (const { peak, local, localAt, kt } of sections.flatMap(({ tension, compression }) => [
    tension,
    compression,
  ])) {
    if (kt === null || Math.abs(local) <= Math.abs(peak) * (1 + 1e-9)) continue
    const [at, tip] = [x.at(localAt), y.at(local)]
    context.beginPath()
    context.moveTo(at, y.at(local / kt))
    context.lineTo(at, tip)
    context.stroke()
    context.beginPath()
    context.arc(at, tip, 2.5, 0, 2 * Math.PI)
    context.fill()
    context.stroke()
  }
  context.restore()
}
