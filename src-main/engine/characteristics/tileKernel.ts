import { WIDENING } from '../march/widening'
import type { DelayLine } from './delayLine'

/** Side of a tile of (position, step). */
export const TILE = 16

/** The largest force of one sign so far at each position, with its step, shape (positions) each. */
export interface Peaks {
  /** +1 for tension; -1 for compression, whose force is then counted positive. */
  sign: 1 | -1
  peak: Float64Array
  step: Int32Array
}

/**
 * The kernel that looks at every value of one tile. Made once, with scratch arrays of its own, so
 * that V8 builds their addresses into the loop: see `gradedKernel`.
 */
function makeTileKernel() {
  // Waves of the tile, times the sign: right-going by k - p + 15, left-going by k + p, both from its corner.
  const a = new Float64Array(2 * TILE)
  const b = new Float64Array(2 * TILE)

  /** Largest force of row i, every step looked at. */
  function findPeak(i: number, depth: number): number {
    const back = TILE - 1 - i
    let top = -Infinity
    for (let j = 0; j < depth; j++) {
      const F = a[j + back] + b[j + i]
      if (F > top) top = F
    }
    return top
  }

  /** First step of row i whose force comes within rounding of its peak. */
  function findStep(i: number, top: number): number {
    const back = TILE - 1 - i
    const level = top / WIDENING
    let j = 0
    while (a[j + back] + b[j + i] < level) j++
    return j
  }

  return {
    /**
     * Takes positions p0..p1-1 at steps k0..k1-1 of a delay line into its peaks.
     *
     * @param share what is kept of a new peak: WIDENING to settle it, 1/WIDENING to leave its time open
     * @returns the least peak over these positions [N]
     */
    scan(
      line: DelayLine,
      p0: number,
      p1: number,
      k0: number,
      k1: number,
      { sign, peak, step }: Peaks,
      share: number,
    ): number {
      const { right, left, cells } = line
      const width = p1 - p0
      const depth = k1 - k0
      const aAt = k0 - p0 + cells - TILE + 1
      const bAt = k0 + p0
      for (let i = TILE - width; i < TILE - 1 + depth; i++) a[i] = sign * right[aAt + i]
      for (let i = 0; i < width + depth - 1; i++) b[i] = sign * left[bAt + i]
      let least = Infinity
      for (let i = 0; i < width; i++) {
        const p = p0 + i
        const top = findPeak(i, depth)
        if (top > peak[p]) {
          peak[p] = top * share
          step[p] = k0 + findStep(i, top)
        }
        if (peak[p] < least) least = peak[p]
      }
      return least
    },
  }
}

/** The one tile kernel of this thread. */
export const tileKernel = makeTileKernel()
