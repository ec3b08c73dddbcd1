import type { DelayLine } from './delayLine'

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
  // Extremes of the row looked at last, and the steps from the tile's first where they are.
  let top = 0
  let bottom = 0
  let topAt = 0
  let bottomAt = 0

  /** 1 where both waves rise all over the tile, -1 where both fall, 0 otherwise. */
  function findTrend(width: number, depth: number): number {
    let rises = true
    let falls = true
    for (let i = TILE - width + 1; i < TILE - 1 + depth && (rises || falls); i++) {
      if (a[i] < a[i - 1]) rises = false
      if (a[i] > a[i - 1]) falls = false
    }
    for (let i = 1; i < width + depth - 1 && (rises || falls); i++) {
      if (b[i] < b[i - 1]) rises = false
      if (b[i] > b[i - 1]) falls = false
    }
    return rises ? 1 : falls ? -1 : 0
  }

  /** Extremes of row i when its force only rises or only falls: they are at its first and last step. */
  function boundRow(i: number, depth: number, trend: number): void {
    const back = TILE - 1 - i
    const first = a[back] + b[i]
    let j = depth - 1
    const last = a[j + back] + b[j + i]
    while (j > 0 && a[j - 1 + back] + b[j - 1 + i] === last) j--
    top = trend > 0 ? last : first
    bottom = trend > 0 ? first : last
    topAt = trend > 0 ? j : 0
    bottomAt = trend > 0 ? 0 : j
  }

  /** Extremes of row i, every step looked at. */
  function scanRow(i: number, depth: number): void {
    const back = TILE - 1 - i
    let upper = -Infinity
    let lower = Infinity
    let upperAt = 0
    let lowerAt = 0
    for (let j = 0; j < depth; j++) {
      const F = a[j + back] + b[j + i]
      if (F > upper) {
        upper = F
        upperAt = j
      }
      if (F < lower) {
        lower = F
        lowerAt = j
      }
    }
    top = upper
    bottom = lower
    topAt = upperAt
    bottomAt = lowerAt
  }

  return {
    /** Over the positions of the tile scanned last. */
    get leastHigh() {
      return leastHigh
    },
    get largestLow() {
      return largestLow
    },

    /**
     * Takes positions p0..p1-1 at steps k0..k1-1 of a delay line into the extremes.
     *
     * @param share what is kept of a new peak: WIDENING to settle it, 1/WIDENING to leave its time open
     */
    scan(
      line: DelayLine,
      p0: number,
      p1: number,
      k0: number,
      k1: number,
      extremes: Extremes,
      share: number,
    ): void {
      const { right, left, cells } = line
      const { high, low, highStep, lowStep } = extremes
      const width = p1 - p0
      const depth = k1 - k0
      const aAt = k0 - p0 + cells - TILE + 1
      const bAt = k0 + p0
      for (let i = TILE - width; i < TILE - 1 + depth; i++) a[i] = right[aAt + i]
      for (let i = 0; i < width + depth - 1; i++) b[i] = left[bAt + i]
      const trend = findTrend(width, depth)
      leastHigh = Infinity
      largestLow = -Infinity
      for (let i = 0; i < width; i++) {
        const p = p0 + i
        if (trend === 0) scanRow(i, depth)
        else boundRow(i, depth, trend)
        if (top > high[p]) {
          high[p] = top * share
          highStep[p] = k0 + topAt
        }
        if (bottom < low[p]) {
          low[p] = bottom * share
          lowStep[p] = k0 + bottomAt
        }
        if (high[p] < leastHigh) leastHigh = high[p]
        if (low[p] > largestLow) largestLow = low[p]
      }
    },
  }
}

/** The one tile kernel of this thread. */
export const tileKernel = makeTileKernel()
