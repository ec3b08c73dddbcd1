import type { Terminal } from '../../../../src-main/hosts/command-line/terminal'

export interface TestTerminal extends Terminal {
  /** What was printed to standard output and standard error. */
  printed: { out: string; err: string }
  stop(): void
}

/**
 * Makes a terminal that records what is printed and whose clock is in the test's hands.
 *
 * @param options - parts that differ from a quiet terminal with a true clock
 */
export function makeTestTerminal(options: Partial<Terminal> = {}): TestTerminal {
  const printed = { out: '', err: '' }
  const stop = new AbortController()
  return {
    printed,
    stop: () => stop.abort(),
    out(text) {
      printed.out += text
    },
    err(text) {
      printed.err += text
    },
    showsProgress: false,
    signal: stop.signal,
    atOnce: (work) => work(),
    clock: () => performance.now(),
    debug: false,
    pageFolder: '',
    ...options,
  }
}
