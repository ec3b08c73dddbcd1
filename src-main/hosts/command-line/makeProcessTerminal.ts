import { EXIT } from './exitCodes'
import type { Terminal } from './terminal'

const SIGNALS = ['SIGINT', 'SIGTERM'] as const

/**
 * Makes the terminal of this process. The first Ctrl-C or request to end asks the command to stop, the
 * second one ends the process at once; a reader that has closed the pipe is no fault.
 *
 * @param pageFolder - absolute path of the built page
 * @returns the terminal
 */
export function makeProcessTerminal(pageFolder: string): Terminal {
  const stop = new AbortController()
  const onSignal = (): void => {
    if (stop.signal.aborted) process.exit(EXIT.stopped)
    stop.abort()
  }
  const listen = (): void => {
    for (const name of SIGNALS) process.on(name, onSignal)
  }
  listen()
  for (const stream of [process.stdout, process.stderr]) {
    stream.on('error', (error: NodeJS.ErrnoException) => {
      if (error.code !== 'EPIPE') throw error
    })
  }
  return {
    out: (text) => process.stdout.write(text),
    err: (text) => process.stderr.write(text),
    showsProgress: process.stderr.isTTY === true,
    signal: stop.signal,
    atOnce(work) {
      // Without a listener the system ends the process by itself, which no busy loop can delay.
      for (const name of SIGNALS) process.off(name, onSignal)
      try {
        return work()
      } finally {
        listen()
      }
    },
    clock: () => performance.now(),
    debug: process.env.BARWRIGHT_DEBUG !== undefined,
    pageFolder,
  }
}
