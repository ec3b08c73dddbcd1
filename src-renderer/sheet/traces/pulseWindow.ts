import type { GaugePulse } from '../../../src-main/contract/result'

/** The first pulse at a gauge, and how long it is seen alone. */
export interface PulseWindow {
  /** When it comes and when it has passed [s]. */
  from: number
  to: number
  direction: GaugePulse['direction']
  /** When the first wave of the other direction comes [s]; null where none comes in the run. */
  until: number | null
  /** Time left between the end of the pulse and the next wave [s]; negative where they overlap. */
  spare: number | null
}

/**
 * Finds how long the first pulse at a gauge is free of waves that travel the other way.
 *
 * @param pulses - of one gauge
 * @returns its window; null where nothing has passed
 */
export function findPulseWindow(pulses: readonly GaugePulse[]): PulseWindow | null {
  if (pulses.length === 0) return null
  const first = pulses.reduce((a, b) => (b.from < a.from ? b : a))
  const opposite = pulses.filter((pulse) => pulse.direction !== first.direction && pulse.to > first.from)
  const until =
    opposite.length === 0 ? null : Math.max(first.from, Math.min(...opposite.map((it) => it.from)))
  const { from, to, direction } = first
  return { from, to, direction, until, spare: until === null ? null : until - to }
}

/** A stretch of time [s]. */
export interface Stretch {
  from: number
  to: number
}

/**
 * Lists when waves of one direction pass, without the gaps that a drawing could not show.
 *
 * @param pulses - of one gauge
 * @param direction - of the waves
 * @param gap - stretches closer than this become one [s]
 * @returns the stretches, ascending [s]
 */
export function listPassing(
  pulses: readonly GaugePulse[],
  direction: GaugePulse['direction'],
  gap: number,
): Stretch[] {
  const merged: Stretch[] = []
  const own = pulses.filter((pulse) => pulse.direction === direction).sort((a, b) => a.from - b.from)
  for (const { from, to } of own) {
    const last = merged.at(-1)
    if (last && from - last.to < gap) last.to = Math.max(last.to, to)
    else merged.push({ from, to })
  }
  return merged
}
