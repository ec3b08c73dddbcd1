import { createHash } from 'node:crypto'
import type { SolveAnswer } from '../contract/bridge'
import type { Result } from '../contract/result'
import { makeRecordReader } from '../documents/makeRecordReader'
import { writeReport } from '../documents/report/writeReport'
import { makeInspection } from '../engine/rig/makeInspection'
import { readRig } from '../engine/rig/readRig'
import type { RunField } from '../engine/solveRig'
import { coarsenRig } from './coarsenRig'
import { drawLine } from './drawLine'
import { packResult } from './packResult'
import type { Question, SolveJob } from './solveJob'
import { solveInSlices } from './solveInSlices'

/** The run that a worker solved last, kept to be looked into. */
export interface KeptRun {
  text: string
  result: Result
  field: RunField
}

/** A value for the page, with the buffers that are handed over to it. */
export interface Answer {
  value: unknown
  buffers: ArrayBuffer[]
}

/**
 * Answers what a run is asked for.
 *
 * @param kept - the run
 * @param question - anything but a solve
 */
export function answerFromRun(kept: KeptRun, question: Exclude<Question, { kind: 'solve' }>): Answer {
  switch (question.kind) {
    case 'field':
      return handOver(kept.field.readTile(question.window))
    case 'profile': {
      const profile = kept.field.readProfile(question.t, question.columns, question.part)
      return { value: profile, buffers: Object.values(profile).map(({ buffer }) => buffer as ArrayBuffer) }
    }
    case 'report':
      return { value: writeReport(kept.result, kept.text), buffers: [] }
  }
}

function handOver(values: Float32Array): Answer {
  return { value: values, buffers: [values.buffer as ArrayBuffer] }
}

/**
 * Reads and solves a rig.
 *
 * @param job - the rig and how it is solved
 * @param watch - told how far it is, and heard: once aborted the answer is `stopped`
 * @returns the answer for the page, and the run where there is one
 */
export async function solveJob(
  job: SolveJob,
  watch: { signal: AbortSignal; onProgress: (done: number, of: number) => void },
): Promise<Answer & { kept: KeptRun | null }> {
  const none = (value: SolveAnswer) => ({ value, buffers: [], kept: null })
  const { notes, inspection } = makeInspection()
  const { rig, faults } = readRig(job.text, {
    notes,
    method: job.method,
    readRecord: job.rigPath === null ? undefined : makeRecordReader(job.rigPath),
  })
  if (rig === null) return none({ status: 'refused', faults, inspection })
  const sha256 = createHash('sha256').update(job.text).digest('hex')
  try {
    const outcome = await solveInSlices(job.coarse ? coarsenRig(rig) : rig, sha256, { ...watch, field: true })
    if (!('result' in outcome)) {
      const { brokenAfter, steps } = outcome
      return none({
        status: 'broken',
        message: `The numbers stopped being finite after step ${brokenAfter} of ${steps}.`,
      })
    }
    const { result, buffers } = packResult(outcome.result)
    const value: SolveAnswer = { status: 'solved', result, line: drawLine(rig), inspection }
    return { value, buffers, kept: { text: job.text, result: outcome.result, field: outcome.field! } }
  } catch (error) {
    if (watch.signal.aborted) return none({ status: 'stopped' })
    throw error
  }
}
