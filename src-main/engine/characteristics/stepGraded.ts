import { f, g, high, highStep, low, lowStep, T, WIDENING } from './gradedWorkspace'

/**
 * Scatters at every inner node of one graded block and shifts by one cell, in place, with the
 * force envelope in the same loop: `F = 2 g + T (f - g)`, `f' = F - g`, `g' = F - f`.
 * The first cell's f and the last cell's g are left to the nodes at its faces.
 *
 * @param first slot of its first cell
 * @param last slot of its last cell
 * @param k the step
 * @returns the wave that arrives at its right face [N]; that at its left face is g[first] before the call
 */
export function stepGraded(first: number, last: number, k: number): number {
  let arriving = f[first]
  for (let i = first + 1; i <= last; i++) {
    const fIn = arriving
    const gIn = g[i]
    const F = 2 * gIn + T[i] * (fIn - gIn)
    arriving = f[i]
    f[i] = F - gIn
    g[i - 1] = F - fIn
    if (F > high[i]) {
      high[i] = F * WIDENING
      highStep[i] = k
    } else if (F < low[i]) {
      low[i] = F * WIDENING
      lowStep[i] = k
    }
  }
  return arriving
}

/** Sets waves under 1e-200 N to zero in cells first..last: subnormal numbers are slow. */
export function flushGraded(first: number, last: number): void {
  for (let i = first; i <= last; i++) {
    if (f[i] < 1e-200 && f[i] > -1e-200) f[i] = 0
    if (g[i] < 1e-200 && g[i] > -1e-200) g[i] = 0
  }
}
