import type { DelayLine } from './delayLine'
import { WIDENING } from './widening'

/** Side of a tile of (position, step). */
export const TILE = 16

/** Largest and smallest force so far at each position, with the steps, shape (positions) each. */
export interface Extremes {
  high: Float64Array
  low: Float64Array
  highStep: Int32Array
  lowStep: Int32Array
}

/**
 * The kernel that looks at every value of one tile. Made once, with scratch arrays of its own, so
 * that V8 builds their addresses into the loop: see `gradedKernel`.
 */
function makeTileKernel() {
  // Waves of the tile: right-going by k - p + 15, left-going by k + p, both from the tile's corner.
  const a = new Float64Array(2 * TILE)
  const b = new Float64Array(2 * TILE)
  let leastHigh = 0
  let largestLow = 0

  return {
    /** Over the positions of the tile scanned last. */
    get leastHigh() {
      return leastHigh
    },
    get largestLow() {
      return largestLow
    },

    /** Takes positions p0..p1-1 at steps k0..k1-1 of a delay line into the extremes. */
    scan(line: DelayLine, p0: number, p1: number, k0: number, k1: number, extremes: Extremes): void {
      const { right, left, cells } = line
      const { high, low, highStep, lowStep } = extremes
      const width = p1 - p0
      const depth = k1 - k0
      const aAt = k0 - p0 + cells - TILE + 1
      const bAt = k0 + p0
      for (let i = TILE - width; i < TILE - 1 + depth; i++) a[i] = right[aAt + i]
      for (let i = 0; i < width + depth - 1; i++) b[i] = left[bAt + i]
      leastHigh = Infinity
      largestLow = -Infinity
      for (let i = 0; i < width; i++) {
        const p = p0 + i
        const back = TILE - 1 - i
        const before = high[p]
        const below = low[p]
        let top = before
        let bottom = below
        let topAt = 0
        let bottomAt = 0
        for (let j = 0; j < depth; j++) {
          const F = a[j + back] + b[j + i]
          if (F > top) {
            top = F
            topAt = j
          } else if (F < bottom) {
            bottom = F
            bottomAt = j
          }
        }
        if (top > before) {
          top *= WIDENING
          high[p] = top
          highStep[p] = k0 + topAt
        }
        if (bottom < below) {
          bottom *= WIDENING
          low[p] = bottom
          lowStep[p] = k0 + bottomAt
        }
        if (top < leastHigh) leastHigh = top
        if (bottom > largestLow) largestLow = bottom
      }
    },
  }
}

/** The one tile kernel of this thread. */
export const tileKernel = makeTileKernel()
