import { setImmediate as turn } from 'node:timers/promises'
import type { Result } from '../contract/result'
import type { Rig } from '../contract/rig'
import { SOFTWARE } from '../contract/software'
import { makeSolve, type RunField } from '../engine/solveRig'

/** Time for which a solve holds its process before it lets others in [ms]. */
const SLICE = 30
const FIRST_STEPS = 64

export interface SliceOptions {
  /** Keeps the field at every cell and step. */
  full?: boolean
  /** Keeps what it takes to look into the field afterwards. */
  field?: boolean
  /** Told after each slice how many of the steps are done. */
  onProgress?: (step: number, steps: number) => void
  /** Heard after each slice; once aborted, the solve rejects with its reason. */
  signal?: AbortSignal
  /** Carries out the setting up and the finishing, which cannot be sliced. */
  atOnce?: <T>(action: () => T) => T
}

/**
 * The result, with the field where it was asked for; or the step after which the numbers were no longer
 * finite, which is a fault of ours.
 */
export type SliceOutcome = { result: Result; field: RunField | null } | { brokenAfter: number; steps: number }

/**
 * Solves a rig in slices, so that its process stays answerable, and completes the result with what the
 * engine cannot know: the file's digest, the version, the time spent solving.
 *
 * @param rig - a checked rig
 * @param sha256 - digest of the rig's file, in hexadecimal
 * @param options - what is kept, who is told, who may stop it
 * @returns the result, or how far it came; rejects with the signal's reason when it is stopped
 */
export async function solveInSlices(
  rig: Rig,
  sha256: string,
  { full = false, field = false, onProgress, signal, atOnce = (action) => action() }: SliceOptions = {},
): Promise<SliceOutcome> {
  let spent = 0
  const spend = <T>(action: () => T): T => {
    const start = performance.now()
    const value = action()
    spent += performance.now() - start
    return value
  }

  const solve = spend(() => atOnce(() => makeSolve(rig, { full, field })))
  let count = FIRST_STEPS
  while (solve.step < solve.steps && !solve.broken) {
    const before = spent
    spend(() => solve.advance(Math.min(solve.step + count, solve.steps)))
    count = chooseCount(count, spent - before)
    onProgress?.(solve.step, solve.steps)
    await turn()
    signal?.throwIfAborted()
  }
  if (solve.broken) return { brokenAfter: solve.step, steps: solve.steps }

  const { rig: about, run, ...answers } = spend(() => atOnce(() => solve.finish()))
  await turn()
  signal?.throwIfAborted()
  return {
    field: solve.field,
    result: {
      ...answers,
      rig: { ...about, sha256 },
      software: SOFTWARE,
      run: { ...run, solveTime: spent / 1000 },
    },
  }
}

/** The steps that would have filled the slice, at most twice as many as before: later ones may cost more. */
function chooseCount(count: number, took: number): number {
  return Math.max(1, Math.min(2 * count, Math.round((count * SLICE) / Math.max(took, 0.1))))
}
