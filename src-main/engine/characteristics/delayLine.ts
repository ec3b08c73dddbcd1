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

/** Sets waves that entered in steps from..to-1 and are under 1e-200 N to zero: subnormal numbers are slow. */
export function flushDelayLine(line: DelayLine, from: number, to: number): void {
  const { right, left, cells } = line
  for (let i = from + cells; i < to + cells; i++) {
    if (right[i] < 1e-200 && right[i] > -1e-200) right[i] = 0
    if (left[i] < 1e-200 && left[i] > -1e-200) left[i] = 0
  }
}
