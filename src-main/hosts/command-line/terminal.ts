/** What a command needs of the outside: where it prints, when it must stop, what time it is. */
export interface Terminal {
  /** Prints to standard output. */
  out(text: string): void
  /** Prints to standard error. */
  err(text: string): void
  /** True where standard error is a terminal, so that progress can be shown and erased. */
  showsProgress: boolean
  /** Aborted when the user wants the program to stop. */
  signal: AbortSignal
  /** Runs work that cannot be stopped on its way: a wish to stop meanwhile ends the process at once. */
  atOnce<T>(work: () => T): T
  /** A clock that only runs forward [ms]. */
  clock(): number
  /** True where the place of a fault of the program is wanted. */
  debug: boolean
  /** Absolute path of the built page, for `serve`. */
  pageFolder: string
}
