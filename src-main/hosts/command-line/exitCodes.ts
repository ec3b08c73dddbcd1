/** What the program's exit status says. */
export const EXIT = {
  done: 0,
  /** A fault of the program or of the machine; the input was not to blame. */
  fault: 1,
  /** The input is refused; every reason stands on standard error. */
  refused: 2,
  /** A published check fails on this machine. */
  failedCheck: 3,
  /** Stopped by Ctrl-C or by a request to end, before anything was written. */
  stopped: 130,
} as const
