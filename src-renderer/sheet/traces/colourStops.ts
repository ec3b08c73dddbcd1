import { findEntry, writeColour, type ColourTable } from '../../plot/colour/colourMap'
import type { ColourStops } from '../charts/frameSpec'

/**
 * Colours of a trace by its value at each time, along an upright axis.
 *
 * @param points - `[value, t]` with t ascending
 * @param from - time at the bottom
 * @param to - time at the top
 * @param map - colours of the field
 * @param limit - value of the last colour
 * @returns stops from the top down; neighbours of one colour between equals are left out
 */
export function listColourStops(
  points: readonly (readonly [value: number, t: number])[],
  from: number,
  to: number,
  map: ColourTable,
  limit: number,
): ColourStops {
  const stops: { share: number; entry: number }[] = []
  for (let i = points.length - 1; i >= 0; i--) {
    const [value, t] = points[i]
    const share = Math.min(1, Math.max(0, (to - t) / (to - from)))
    const entry = findEntry(value, limit)
    const [last, before] = [stops.at(-1), stops.at(-2)]
    if (last?.entry === entry && before?.entry === entry) last.share = share
    else stops.push({ share, entry })
  }
  return { along: 'y', stops: stops.map(({ share, entry }) => ({ share, colour: writeColour(map, entry) })) }
}
