import { findTurningPoints } from './findTurningPoints'

/** A range that a history goes through, there and back (count 1) or one way (count 0.5). */
export interface RainflowCycle {
  /** Distance between its two turning points, positive, in the unit of the history. */
  range: number
  /** Middle of its two turning points. */
  mean: number
  count: 0.5 | 1
  /** Indices of its turning points in the history, `from` before `to`. */
  from: number
  to: number
}

/**
 * Counts the cycles of a history by the rainflow rule.
 *
 * Of the last three turning points not yet discarded, let Y be the range of the first two and X that
 * of the last two. Once X >= Y: if Y holds the start of what is left, it is half a cycle and its first
 * point is discarded; otherwise it is a cycle and both its points are discarded. What is left at the
 * end counts as half cycles. Source: ASTM E1049-85, section 5.4.4 (from memory). The counts add up to half the
 * number of ranges between turning points, and the sum of 2 count range to the whole way gone.
 *
 * @param history values in their order, shape (n), all finite
 * @param smallest swing that is dropped, in the unit of the history; 0 keeps every turn
 * @returns the cycles in the order in which they are counted; none where the history does not move
 */
export function countRainflow(history: ArrayLike<number>, smallest = 0): RainflowCycle[] {
  const cycles: RainflowCycle[] = []
  const left: number[] = []
  const count = (from: number, to: number, share: 0.5 | 1): void => {
    const [a, b] = [history[from], history[to]]
    cycles.push({ range: Math.abs(b - a), mean: a + (b - a) / 2, count: share, from, to })
  }
  for (const point of findTurningPoints(history, smallest)) {
    left.push(point)
    while (left.length >= 3) {
      const [first, second, third] = left.slice(-3)
      const X = Math.abs(history[third] - history[second])
      const Y = Math.abs(history[second] - history[first])
      if (X < Y) break
      const holdsStart = left.length === 3
      count(first, second, holdsStart ? 0.5 : 1)
      left.splice(-3, holdsStart ? 1 : 2)
    }
  }
  for (let i = 1; i < left.length; i++) count(left[i - 1], left[i], 0.5)
  return cycles
}
