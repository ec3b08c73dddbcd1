import { reachNodes, type Strip } from './pixels'

/**
 * How each row or column of pixels looks at a span, or at the run. Lists of numbers, since what V8 makes
 * of objects with whole and broken numbers in one field is ten times slower to read.
 */
export interface Looks {
  /** Of the pixels in the tile. */
  index: Int32Array
  /** Middle of what each sees, in positions or steps. */
  middle: Float64Array
  /** Nodes that each sees. */
  first: Int32Array
  last: Int32Array
  /** 1 where it is made from diamonds. */
  rough: Uint8Array
  /** Where it looks for them: from there on, by steps, so many times. */
  from: Float64Array
  step: Float64Array
  count: Int32Array
}

/**
 * Chooses how pixels look. At nodes with those of the diamonds whose middles lie in the pixel, for a pixel
 * beside it may leave them out; for diamonds a little closer than every half of one, which meets each
 * whose middle lies in it.
 *
 * @param end last position of the span, or last step of the run
 * @param level diamonds are 2^level across; 0 for none
 */
export function makeLooks(strips: readonly Strip[], end: number, level: number): Looks {
  const size = level > 0 ? 2 ** level : 0
  const nodes = strips.map(({ from, to }) =>
    reachNodes({ from: from - size / 2, to: to + size / 2 }, (at) => at, end + 1),
  )
  const count = Int32Array.from(strips, ({ from, to }) =>
    level > 0 ? Math.max(1, Math.ceil((to - from) / (0.45 * size))) : 1,
  )
  const step = Float64Array.from(strips, ({ from, to }, i) => (to - from) / count[i])
  return {
    index: Int32Array.from(strips, (strip) => strip.index),
    middle: Float64Array.from(strips, ({ from, to }) => (from + to) / 2),
    first: Int32Array.from(nodes, (reach) => reach.from),
    last: Int32Array.from(nodes, (reach) => reach.to),
    rough: Uint8Array.from(strips, ({ from, to }) => (level > 0 && from >= size && to <= end - size ? 1 : 0)),
    from: Float64Array.from(strips, ({ from }, i) => from + step[i] / 2),
    step,
    count,
  }
}
