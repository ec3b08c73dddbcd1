import type { Terminal } from './terminal'

const FIRST_AFTER = 1000
const EVERY = 100

/** A line of progress that comes after a second and leaves nothing behind. */
export interface Progress {
  /** Shows how much is done, 0..1, where it is time to. */
  show(share: number): void
  /** Erases the line. */
  erase(): void
}

/**
 * Makes the progress of one run; it stays silent where standard error is no terminal.
 *
 * @param terminal - where it is shown
 * @param quiet - shows nothing at all
 * @returns the progress, its time running from now
 */
export function makeProgress(terminal: Terminal, quiet: boolean): Progress {
  const started = terminal.clock()
  let shown = -Infinity
  return {
    show(share) {
      const now = terminal.clock()
      if (quiet || !terminal.showsProgress || now - started < FIRST_AFTER || now - shown < EVERY) return
      shown = now
      const left = share > 0 ? `, about ${describeWait(((now - started) * (1 - share)) / share)} left` : ''
      terminal.err(`\r\u001b[2K${Math.floor(share * 100)} %${left}`)
    },
    erase() {
      if (shown > -Infinity) terminal.err('\r\u001b[2K')
      shown = -Infinity
    },
  }
}

function describeWait(milliseconds: number): string {
  const seconds = Math.ceil(milliseconds / 1000)
  if (seconds < 60) return `${seconds} s`
  return seconds < 3600 ? `${Math.ceil(seconds / 60)} min` : `${(seconds / 3600).toFixed(1)} h`
}
