import { evaluateLeastSquare } from './evaluateLeastSquare'
import type { Looks } from './looks'
import { seen } from './seen'
import type { WaveSpan } from './waveSpan'

/**
 * Finds the extremes of `sign f + g` over the diamonds that a window meets. Runs of f and of g of one
 * parity cross in a diamond of (position, step), 2^level across, at whose nodes each value of the one
 * meets each of the other; so its extremes are those of their extremes.
 *
 * @param p looks of the columns of pixels, of which column i counts
 * @param k looks of the rows of pixels, of which row j counts
 * @param level 1 or more; the window lies 2^level inside the span and the run
 * @param sign +1 for the force [N], -1 for Z times the velocity [N]
 */
export function lookAtDiamondSums(
  { cells, right, left }: WaveSpan,
  p: Looks,
  i: number,
  k: Looks,
  j: number,
  level: number,
  sign: number,
): void {
  const pFrom = p.from[i]
  const pStep = p.step[i]
  const pCount = p.count[i]
  const kFrom = k.from[j]
  const kStep = k.step[j]
  const kCount = k.count[j]
  let high = -Infinity
  let low = Infinity
  for (let parity = 0; parity <= 1; parity++) {
    const other = (parity + cells) & 1
    const f = right.readLevel(level, parity)
    const g = left.readLevel(level, other)
    const fTop = sign > 0 ? f.high : f.low
    const fBottom = sign > 0 ? f.low : f.high
    const gTop = g.high
    const gBottom = g.low
    for (let m = 0; m < kCount; m++) {
      const step = kFrom + m * kStep
      for (let n = 0; n < pCount; n++) {
        const position = pFrom + n * pStep
        const a = (step - position + cells - parity) >> level
        const b = (step + position - other) >> level
        const top = sign * fTop[a] + gTop[b]
        const bottom = sign * fBottom[a] + gBottom[b]
        if (top > high) high = top
        if (bottom < low) low = bottom
      }
    }
  }
  seen[1] = high
  seen[0] = low
}

/** The same for `(f - h)^2 + (g + h)^2`; its least value may come out too small, never too large. */
export function lookAtDiamondSquares(
  { cells, right, left }: WaveSpan,
  p: Looks,
  i: number,
  k: Looks,
  j: number,
  level: number,
  h: number,
): void {
  const pFrom = p.from[i]
  const pStep = p.step[i]
  const pCount = p.count[i]
  const kFrom = k.from[j]
  const kStep = k.step[j]
  const kCount = k.count[j]
  let high = -Infinity
  let low = Infinity
  for (let parity = 0; parity <= 1; parity++) {
    const other = (parity + cells) & 1
    const f = right.readLevel(level, parity)
    const g = left.readLevel(level, other)
    for (let m = 0; m < kCount; m++) {
      const step = kFrom + m * kStep
      for (let n = 0; n < pCount; n++) {
        const position = pFrom + n * pStep
        const a = (step - position + cells - parity) >> level
        const b = (step + position - other) >> level
        const f0 = f.low[a] - h
        const f1 = f.high[a] - h
        const g0 = g.low[b] + h
        const g1 = g.high[b] + h
        const top = Math.max(f0 * f0, f1 * f1) + Math.max(g0 * g0, g1 * g1)
        const bottom = evaluateLeastSquare(f0, f1) + evaluateLeastSquare(g0, g1)
        if (top > high) high = top
        if (bottom < low) low = bottom
      }
    }
  }
  seen[1] = high
  seen[0] = low
}
