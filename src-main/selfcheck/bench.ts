import type { Rig } from '../contract/rig'
import { makeWaveMethod } from '../engine/characteristics/makeWaveMethod'
import { makeElementLine } from '../engine/elements/makeElementLine'
import { makeElementMethod } from '../engine/elements/makeElementMethod'
import type { Line } from '../engine/line/line'
import { makeLine } from '../engine/line/makeLine'
import { makeMarch } from '../engine/march/march'
import { makeRecords } from '../engine/records/makeRecords'
import type { RunRecord } from '../engine/records/record'
import { RIG_FORMAT, type RigForm } from '../engine/rig/form/rigForm'
import { readRig } from '../engine/rig/readRig'
import { makeSolve, type Solution } from '../engine/solveRig'

/** A rig as its file says it, but for the word of the format. */
export type RigSetup = Omit<RigForm, 'format'>

/** A rig after its run. */
export interface Marched {
  line: Line
  record: RunRecord
}

/** Runs the rigs of the checks on the way that a user's rig takes: text, reader, line, method, records, answers. */
export interface Bench {
  /** Runs a rig by the method that it names and hands over what was recorded. */
  march(setup: RigSetup): Marched
  /** Solves a rig and hands over what its user gets. */
  solve(setup: RigSetup): Solution
}

/** Makes the bench of the engine as it is. */
export function makeBench(): Bench {
  return {
    march(setup) {
      const rig = read(setup)
      const line = makeLine(rig)
      const run =
        rig.run.method === 'elements' ? makeElementMethod(makeElementLine(line)) : makeWaveMethod(line)
      const records = makeRecords(run, false)
      const march = makeMarch(run, records, run.line.steps)
      march.advance(march.end)
      if (march.broken) throw new Error(`a check's run broke: ${rig.title}`)
      return { line: run.line, record: records.finish() }
    },
    solve(setup) {
      const rig = read(setup)
      const solve = makeSolve(rig)
      while (solve.step < solve.steps && !solve.broken) solve.advance(solve.steps)
      if (solve.broken) throw new Error(`a check's run broke: ${rig.title}`)
      return solve.finish()
    },
  }
}

function read(setup: RigSetup): Rig {
  const { rig, faults } = readRig(JSON.stringify({ format: RIG_FORMAT, ...setup }))
  if (rig !== null) return rig
  throw new Error(
    `a check's rig is refused: ${faults.map(({ path, message }) => `${path}: ${message}`).join('; ')}`,
  )
}
