import type { PulseWindow } from './pulseWindow'

/** What is said of a trace, whatever the moment. */
export interface TraceNote {
  text: string
  /** The same for a narrow trace. */
  short: string
  /** True where it is a warning. */
  alarm: boolean
}

/**
 * Says of the first pulse whether it is seen alone.
 *
 * @param window - of the pulse; null where nothing passes
 * @param end - of the run [s]
 */
export function describeWindow(window: PulseWindow | null, end: number): TraceNote {
  if (!window) return { text: 'nothing passes', short: 'nothing passes', alarm: false }
  const { to, spare } = window
  if (spare === null) {
    return to < end * (1 - 1e-9)
      ? { text: 'pulse fits, none returns', short: 'fits', alarm: false }
      : { text: 'pulse outlasts the run', short: 'outlasts run', alarm: false }
  }
  if (spare < 0) {
    const by = writeDuration(-spare)
    return { text: `pulse overlaps by ${by}`, short: `overlaps ${by}`, alarm: true }
  }
  return {
    text: `pulse fits, ${writeDuration(spare)} spare`,
    short: `fits, ${writeDuration(spare)}`,
    alarm: false,
  }
}

/**
 * Writes how long something lasts, in the unit that keeps the number short.
 *
 * @param duration - [s]
 * @returns such as `157 µs`, `1.24 ms` or `12.5 s`
 */
export function writeDuration(duration: number): string {
  const [size, unit] = duration < 1e-3 ? [1e-6, 'µs'] : duration < 1 ? [1e-3, 'ms'] : [1, 's']
  const value = duration / size
  return `${value < 9.95 ? value.toFixed(1) : value.toFixed(0)} ${unit}`
}
