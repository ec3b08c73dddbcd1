import { solveInSlices, type SliceOutcome } from '../../workers/solveInSlices'
import { makeProgress } from './makeProgress'
import type { OpenRig } from './openRig'
import type { Terminal } from './terminal'

export interface RunOptions {
  /** Keeps the field at every cell and step. */
  full: boolean
  /** Shows no progress. */
  quiet: boolean
}

/**
 * Solves a rig in slices, so that the user can stop it and sees how far it is.
 *
 * @param opened - the rig and its file
 * @param options - what is kept and what is shown
 * @param terminal - where progress is shown and the wish to stop comes from
 * @returns the result; or the step after which the numbers were no longer finite. Rejects with the
 *   signal's reason when it is stopped.
 */
export async function runSolve(
  { rig, file }: OpenRig,
  options: RunOptions,
  terminal: Terminal,
): Promise<SliceOutcome> {
  const progress = makeProgress(terminal, options.quiet)
  try {
    return await solveInSlices(rig, file.sha256, {
      full: options.full,
      signal: terminal.signal,
      atOnce: terminal.atOnce,
      onProgress: (step, steps) => progress.show(step / steps),
    })
  } finally {
    progress.erase()
  }
}
