import type { FieldRequest } from '../../../contract/bridge'

/** A window of the field in pixels, whose run the caller knows. */
export type FieldWindow = Omit<FieldRequest, 'slot'>

/** Signed extremes per pixel, shape (rows, columns, 2); NaN where nothing was seen yet. */
export interface Tile {
  window: FieldWindow
  values: Float32Array
}

export function makeTile(window: FieldWindow): Tile {
  return { window, values: new Float32Array(2 * window.rows * window.columns).fill(NaN) }
}

/** Takes what was seen in a pixel into a tile. */
export function widenPixel(values: Float32Array, pixel: number, low: number, high: number): void {
  const i = 2 * pixel
  if (!(values[i] <= low)) values[i] = low
  if (!(values[i + 1] >= high)) values[i + 1] = high
}

/** One row or column of pixels, as a stretch of positions or of steps. */
export interface Strip {
  index: number
  from: number
  to: number
}

/**
 * Lists the pixels along one axis that see a part of it, each cut to what it sees.
 *
 * @param axis ends of the window and the number of its pixels
 * @param seen ends of the part, in the window's unit
 * @param scale what one unit is in positions or steps, counted from the part's start
 */
export function listStrips(
  axis: { from: number; to: number; count: number },
  seen: { from: number; to: number },
  scale: number,
): Strip[] {
  const size = (axis.to - axis.from) / axis.count
  const first = Math.max(0, Math.floor((seen.from - axis.from) / size))
  const last = Math.min(axis.count - 1, Math.ceil((seen.to - axis.from) / size) - 1)
  const strips: Strip[] = []
  for (let index = first; index <= last; index++) {
    const from = Math.max(seen.from, axis.from + index * size)
    const to = Math.min(seen.to, axis.from + (index + 1) * size)
    if (to >= from) strips.push({ index, from: (from - seen.from) * scale, to: (to - seen.from) * scale })
  }
  return strips
}

/** First and last index, both included. */
export interface Reach {
  from: number
  to: number
}

/**
 * Finds the nodes or samples that lie in a strip, or the nearest to its middle where there is none.
 *
 * @param find index of a place, whole numbers being the nodes
 * @param count how many nodes there are
 */
export function reachNodes(
  { from, to }: Pick<Strip, 'from' | 'to'>,
  find: (at: number) => number,
  count: number,
): Reach {
  // As small integers: a zero with a sign would make every look at an array slow.
  const hold = (i: number) => Math.min(count - 1, Math.max(0, i)) | 0
  const reach = { from: Math.ceil(find(from)), to: Math.floor(find(to)) }
  if (reach.to >= reach.from) return { from: hold(reach.from), to: hold(reach.to) }
  const nearest = hold(Math.round(find((from + to) / 2)))
  return { from: nearest, to: nearest }
}
