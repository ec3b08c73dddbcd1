import type { PulseWindow } from './pulseWindow'

/**
 * Says of the first pulse whether it is seen alone.
 *
 * @param window - of the pulse; null where nothing passes
 * @param end - of the run [s]
 * @returns one short line, and whether it is a warning
 */
export function describeWindow(window: PulseWindow | null, end: number): { text: string; alarm: boolean } {
  if (!window) return { text: 'nothing passes', alarm: false }
  const { to, spare } = window
  if (spare === null) {
    return {
      text: to < end * (1 - 1e-9) ? 'pulse fits, none returns' : 'pulse outlasts the run',
      alarm: false,
    }
  }
  return spare < 0
    ? { text: `pulse overlaps by ${writeDuration(-spare)}`, alarm: true }
    : { text: `pulse fits, ${writeDuration(spare)} spare`, alarm: false }
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
