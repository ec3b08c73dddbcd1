import type { Pulse } from '../../src-main/contract/rig'

/** A history of straight stretches with its exact integral. */
export interface StraightPulse extends Pulse {
  /** Integral from 0 to t. */
  integral(t: number): number
}

/**
 * Makes a history of straight stretches, zero before the first and after the last.
 *
 * @param stretches from, to [s] and the values there, one after the other in time
 */
export function makeStraightPulse(stretches: [number, number, number, number][]): StraightPulse {
  const value = (t: number) => {
    for (const [from, to, a, b] of stretches)
      if (t >= from && t < to) return a + ((b - a) * (t - from)) / (to - from)
    return 0
  }
  return {
    shape: 'formula',
    rise: null,
    breaks: [...new Set(stretches.flatMap(([from, to]) => [from, to]))].sort((a, b) => a - b),
    value,
    integral(t) {
      let sum = 0
      for (const [from, to, a, b] of stretches) {
        if (t <= from) continue
        const end = Math.min(t, to)
        const last = a + ((b - a) * (end - from)) / (to - from)
        sum += ((a + last) / 2) * (end - from)
      }
      return sum
    },
  }
}
