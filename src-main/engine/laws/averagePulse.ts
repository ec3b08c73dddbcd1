import type { Pulse } from '../../contract/rig'

/** Gauss-Legendre points and weights on -1..1, three points (Abramowitz and Stegun, table 25.4, from memory). */
const POINTS = [-Math.sqrt(0.6), 0, Math.sqrt(0.6)]
const WEIGHTS = [5 / 18, 8 / 18, 5 / 18]

/**
 * Averages a pulse over a stretch of time, stopping at its breaks: exact where it is made of
 * straight stretches. Elements take a prescribed history as its mean over the steps it works in;
 * a single value at a jump would leave a trace that alternates from node to node for ever.
 *
 * @param from [s]
 * @param to [s], later
 */
export function averagePulse(pulse: Pulse, from: number, to: number): number {
  let sum = 0
  let start = from
  for (const stop of [...pulse.breaks.filter((t) => t > from && t < to), to]) {
    const half = (stop - start) / 2
    POINTS.forEach((point, i) => {
      sum += 2 * half * WEIGHTS[i] * pulse.value(start + half * (1 + point))
    })
    start = stop
  }
  return sum / (to - from)
}
