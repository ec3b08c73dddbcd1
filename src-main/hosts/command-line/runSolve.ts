import { setImmediate as turn } from 'node:timers/promises'
import type { Result } from '../../contract/result'
import { SOFTWARE } from '../../contract/software'
import { makeSolve } from '../../engine/solveRig'
import { makeProgress } from './makeProgress'
import type { OpenRig } from './openRig'
import type { Terminal } from './terminal'

/** Time that a slice of the run should take before signals are heard again [ms]. */
const SLICE = 30
const FIRST_STEPS = 32

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
): Promise<{ result: Result } | { brokenAfter: number; steps: number }> {
  const progress = makeProgress(terminal, options.quiet)
  const started = terminal.clock()
  const solve = terminal.atOnce(() => makeSolve(rig, { full: options.full }))
  let slice = FIRST_STEPS
  try {
    while (solve.step < solve.steps && !solve.broken) {
      const before = terminal.clock()
      solve.advance(Math.min(solve.steps, solve.step + slice))
      slice = chooseSlice(slice, terminal.clock() - before)
      progress.show(solve.step / solve.steps)
      await turn()
      terminal.signal.throwIfAborted()
    }
  } finally {
    progress.erase()
  }
  if (solve.broken) return { brokenAfter: solve.step, steps: solve.steps }
  const { rig: about, run, ...answers } = terminal.atOnce(() => solve.finish())
  const solveTime = (terminal.clock() - started) / 1000
  await turn()
  terminal.signal.throwIfAborted()
  return {
    result: {
      ...answers,
      rig: { ...about, sha256: file.sha256 },
      software: SOFTWARE,
      run: { ...run, solveTime },
    },
  }
}

/** The number of steps that would have taken the time of a slice, at most four times as many as before. */
function chooseSlice(steps: number, took: number): number {
  return Math.max(1, Math.min(4 * steps, Math.round((steps * SLICE) / Math.max(took, 0.1))))
}
