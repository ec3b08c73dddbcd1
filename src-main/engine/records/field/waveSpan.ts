import type { SpanWaves } from '../../march/methodRun'
import { evaluateLeastSquare } from './evaluateLeastSquare'
import type { Reach } from './pixels'
import { makeWavePyramid, type WavePyramid } from './wavePyramid'

/** A uniform span whose waves are known at every step: `f = right[k - p + cells]`, `g = left[k + p]`. */
export interface WaveSpan {
  cells: number
  steps: number
  right: WavePyramid
  left: WavePyramid
}

export function makeWaveSpan(waves: SpanWaves, cells: number, steps: number): WaveSpan {
  return { cells, steps, right: makeWavePyramid(waves.right), left: makeWavePyramid(waves.left) }
}

/** Extremes of what was looked at last; one object, so that a pixel allocates nothing. */
export const seen = { low: 0, high: 0 }

/** What is made of the two waves at a place. */
export interface Mix {
  /** +1 for `f + g`, the force; -1 for `g - f`, Z times the velocity; 0 for `(f - h)^2 + (g + h)^2`. */
  sign: 1 | -1 | 0
  /** Z G/2 in a frame that moves at G [N]. */
  h: number
}

/** Finds the extremes of a mix over every position p and step k of a window. */
export function lookAtNodes({ cells, right, left }: WaveSpan, p: Reach, k: Reach, { sign, h }: Mix): void {
  const f = right.wave
  const g = left.wave
  let high = -Infinity
  let low = Infinity
  for (let step = k.from; step <= k.to; step++) {
    for (let position = p.from; position <= p.to; position++) {
      const a = f[step - position + cells]
      const b = g[step + position]
      const value = sign === 0 ? (a - h) * (a - h) + (b + h) * (b + h) : sign * a + b
      if (value > high) high = value
      if (value < low) low = value
    }
  }
  seen.high = high
  seen.low = low
}

/** Places at which a stretch of positions or steps is looked at. */
export interface Looks {
  from: number
  step: number
  count: number
}

/**
 * Looks a little closer than every half of 2^level, which meets every diamond of that size whose middle
 * lies in the stretch.
 */
export function chooseLooks(from: number, to: number, level: number): Looks {
  const count = Math.max(1, Math.ceil((to - from) / (0.45 * 2 ** level)))
  const step = (to - from) / count
  return { from: from + step / 2, step, count }
}

/**
 * Finds the extremes of a mix over the diamonds that a window meets. Runs of f and of g of one parity
 * cross in a diamond of (position, step), 2^level across, at whose nodes each value of the one meets each
 * of the other; so its extremes are those of their extremes. With sign 0 the least may come out too small.
 *
 * @param level 1 or more; the window lies that far inside the span and the run
 */
export function lookAtDiamonds(
  { cells, right, left }: WaveSpan,
  p: Looks,
  k: Looks,
  level: number,
  { sign, h }: Mix,
): void {
  let high = -Infinity
  let low = Infinity
  for (let parity = 0; parity <= 1; parity++) {
    const other = (parity + cells) & 1
    const f = right.readLevel(level, parity)
    const g = left.readLevel(level, other)
    const { high: fHigh, low: fLow } = f
    const { high: gHigh, low: gLow } = g
    for (let i = 0; i < k.count; i++) {
      const step = k.from + i * k.step
      for (let j = 0; j < p.count; j++) {
        const position = p.from + j * p.step
        const a = (step - position + cells - parity) >> level
        const b = (step + position - other) >> level
        let top = 0
        let bottom = 0
        if (sign === 0) {
          const [f0, f1, g0, g1] = [fLow[a] - h, fHigh[a] - h, gLow[b] + h, gHigh[b] + h]
          top = Math.max(f0 * f0, f1 * f1) + Math.max(g0 * g0, g1 * g1)
          bottom = evaluateLeastSquare(f0, f1) + evaluateLeastSquare(g0, g1)
        } else {
          top = gHigh[b] + (sign > 0 ? fHigh[a] : -fLow[a])
          bottom = gLow[b] + (sign > 0 ? fLow[a] : -fHigh[a])
        }
        if (top > high) high = top
        if (bottom < low) low = bottom
      }
    }
  }
  seen.high = high
  seen.low = low
}
