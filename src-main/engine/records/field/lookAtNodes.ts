import { seen } from './seen'
import type { WaveSpan } from './waveSpan'

/**
 * Finds the extremes of `sign f + g` over positions p0..p1 and steps k0..k1, both ends included.
 *
 * @param sign +1 for the force [N], -1 for Z times the velocity [N]
 */
export function lookAtNodeSums(
  { cells, right, left }: WaveSpan,
  p0: number,
  p1: number,
  k0: number,
  k1: number,
  sign: number,
): void {
  const f = right.wave
  const g = left.wave
  let high = -Infinity
  let low = Infinity
  for (let k = k0; k <= k1; k++) {
    let a = k - p0 + cells
    let b = k + p0
    for (let p = p0; p <= p1; p++) {
      const value = sign * f[a--] + g[b++]
      if (value > high) high = value
      if (value < low) low = value
    }
  }
  seen[1] = high
  seen[0] = low
}

/**
 * Finds the extremes of `(f - h)^2 + (g + h)^2` over the same, which with `h = Z G/2` is `E A^2` times the
 * energy per volume in a frame that moves at G.
 */
export function lookAtNodeSquares(
  { cells, right, left }: WaveSpan,
  p0: number,
  p1: number,
  k0: number,
  k1: number,
  h: number,
): void {
  const f = right.wave
  const g = left.wave
  let high = -Infinity
  let low = Infinity
  for (let k = k0; k <= k1; k++) {
    for (let p = p0; p <= p1; p++) {
      const a = f[k - p + cells] - h
      const b = g[k + p] + h
      const value = a * a + b * b
      if (value > high) high = value
      if (value < low) low = value
    }
  }
  seen[1] = high
  seen[0] = low
}
