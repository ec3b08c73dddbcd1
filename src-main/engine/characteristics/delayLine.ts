/**
 * A uniform stretch of n cells as two delay lines: `f(p, k) = right[k - p + n]` and
 * `g(p, k) = left[k + p]` at position p (0..n) and step k, so a step costs nothing inside it and
 * any trace is two look-ups. Index n is the wave that enters at step 0; those below it are the
 * initial state.
 */
export interface DelayLine {
  cells: number
  /** Wave entering at the left face, shape (n + steps + 1) [N]. */
  right: Float64Array
  /** Wave entering at the right face, shape (n + steps + 1) [N]. */
  left: Float64Array
}

export function makeDelayLine(cells: number, steps: number): DelayLine {
  return {
    cells,
    right: new Float64Array(cells + steps + 1),
    left: new Float64Array(cells + steps + 1),
  }
}
