import { createHash } from 'node:crypto'
import { setImmediate } from 'node:timers/promises'
import type { Fault } from '../contract/fault'
import type { Result } from '../contract/result'
import { SOFTWARE } from '../contract/software'
import { readRig, type ReadRigOptions } from '../engine/rig/readRig'
import { makeSolve } from '../engine/solveRig'

/** Time for which a solve holds its process before it lets others in [s]. */
const SLICE = 0.03
const FIRST_STEPS = 64

export interface SolveTextOptions extends ReadRigOptions {
  /** Keeps the field at every cell and step. */
  full?: boolean
  /** Told after each slice how many of the steps are done. */
  onProgress?: (step: number, steps: number) => void
  /** Asked after each slice; true ends the solve. */
  isStopped?: () => boolean
}

/** Solved; refused by its reader; no longer finite from a step on, which is a fault of ours; or stopped. */
export type SolveOutcome =
  | { status: 'solved'; result: Result }
  | { status: 'refused'; faults: Fault[] }
  | { status: 'broken'; step: number; steps: number }
  | { status: 'stopped' }

/**
 * Reads the text of a rig file and solves it in slices, so that its process stays answerable.
 *
 * @param text - the whole file; the digest in the result is that of its UTF-8 bytes
 * @param options - access to records, method, field, progress and stop
 * @returns the result with its digest, version and the time spent solving, or why there is none
 */
export async function solveText(text: string, options: SolveTextOptions = {}): Promise<SolveOutcome> {
  const { full = false, onProgress, isStopped, ...reading } = options
  const { rig, faults } = readRig(text, reading)
  if (rig === null) return { status: 'refused', faults }

  const [solve, making] = time(() => makeSolve(rig, { full }))
  let spent = making
  let count = FIRST_STEPS
  while (solve.step < solve.steps && !solve.broken) {
    const [, slice] = time(() => solve.advance(Math.min(solve.step + count, solve.steps)))
    spent += slice
    // Twice the steps or half of them, never more at once: a slice may meet slower steps than the last.
    count = Math.max(1, Math.round(count * Math.min(2, Math.max(0.5, SLICE / Math.max(slice, 1e-6)))))
    onProgress?.(solve.step, solve.steps)
    await setImmediate()
    if (isStopped?.()) return { status: 'stopped' }
  }
  if (solve.broken) return { status: 'broken', step: solve.step, steps: solve.steps }

  const [solution, finishing] = time(() => solve.finish())
  const sha256 = createHash('sha256').update(text).digest('hex')
  return {
    status: 'solved',
    result: {
      ...solution,
      rig: { ...solution.rig, sha256 },
      software: { ...SOFTWARE },
      run: { ...solution.run, solveTime: spent + finishing },
    },
  }
}

/** Does something and says how long it took [s]. */
function time<T>(action: () => T): [T, number] {
  const start = performance.now()
  const value = action()
  return [value, (performance.now() - start) / 1000]
}
