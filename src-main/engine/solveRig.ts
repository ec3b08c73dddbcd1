import { NOTICE } from '../contract/notice'
import type { Result } from '../contract/result'
import type { Rig } from '../contract/rig'
import { answerStriker } from './answers/answerStriker'
import { answerTapers } from './answers/answerTapers'
import { findGoverning } from './answers/findGoverning'
import { listCautions } from './answers/listCautions'
import { listInterfaces } from './answers/listInterfaces'
import { listSectionPeaks } from './answers/listSectionPeaks'
import { tabulateEnvelope } from './answers/tabulateEnvelope'
import { tabulateGauges } from './answers/tabulateGauges'
import { tabulateEnds, tabulateJoints } from './answers/tabulateJoints'
import { traceWavefronts } from './answers/traceWavefronts'
import { makeWaveMethod } from './characteristics/makeWaveMethod'
import { makeLine } from './line/makeLine'
import type { Line } from './line/line'
import { makeMarch } from './march/march'
import { makeRecords } from './records/makeRecords'
import type { RunRecord } from './records/record'

/** What the engine finds; the host adds the file's digest, its own version and the time taken. */
export type Solution = Omit<Result, 'rig' | 'software' | 'run'> & {
  rig: Pick<Result['rig'], 'title'>
  run: Omit<Result['run'], 'solveTime'>
}

/** A rig on its way to a solution, marched slice by slice by its host. */
export interface Solve {
  readonly line: Line
  /** Steps done so far, out of `steps`. */
  readonly step: number
  readonly steps: number
  /** True once the numbers have stopped being finite; the run goes no further. */
  readonly broken: boolean
  advance(toStep: number): void
  /** The solution; call once step = steps. */
  finish(): Solution
}

/**
 * Sets up the solution of a rig by characteristics.
 *
 * @param rig a checked rig; its size was checked by the reader
 * @param options full: keep the field at every cell and step
 */
export function makeSolve(rig: Rig, options: { full?: boolean } = {}): Solve {
  const line = makeLine(rig)
  const run = makeWaveMethod(line)
  const records = makeRecords(run, options.full ?? false)
  const march = makeMarch(run, records, line.steps)
  return {
    line,
    get step() {
      return march.step
    },
    steps: march.end,
    get broken() {
      return march.broken
    },
    advance: (toStep) => march.advance(toStep),
    finish: () => assemble(line, records.finish()),
  }
}

/** Makes the answers from the records of a finished run. */
function assemble(line: Line, record: RunRecord): Solution {
  const { rig, dt } = line
  const sections = listSectionPeaks(line, record)
  const governing = findGoverning(sections)
  const { energy, field } = record
  const times = Array.from(energy.step, (k) => k * dt)
  return {
    format: 'barwright-result/1',
    rig: { title: rig.title },
    method: 'characteristics',
    run: {
      timeStep: dt,
      steps: line.steps,
      cells: line.spans.reduce((sum, span) => sum + span.cells, 0),
      duration: rig.run.duration,
      travelTimeRounding: line.rounding.map(({ bar, section, error }) => ({
        bar: rig.bars[bar].name,
        section,
        error,
      })),
    },
    line: {
      length: line.length,
      bars: line.bars.map(({ name, from, to, mass, travelTime }) => ({ name, from, to, mass, travelTime })),
    },
    interfaces: listInterfaces(line),
    tapers: answerTapers(line),
    envelope: tabulateEnvelope(line, record.envelope),
    sections,
    governing,
    striker: answerStriker(line, governing),
    gauges: tabulateGauges(line, record.gauges),
    joints: tabulateJoints(line, record),
    ends: tabulateEnds(line, record),
    bars: record.bars.map(({ momentum, mass, kinetic, strain }, i) => ({
      name: rig.bars[i].name,
      momentum,
      velocity: momentum / mass,
      kinetic,
      strain,
    })),
    energy: {
      t: times,
      kinetic: Array.from(energy.kinetic),
      strain: Array.from(energy.strain),
      dissipated: Array.from(energy.dissipated),
      work: Array.from(energy.work),
      closure: energy.closure,
    },
    momentum: { closure: energy.momentumClosure },
    wavefronts: traceWavefronts(line, record),
    field: { x: Array.from(field.x), t: times, stress: field.stress.map((row) => Array.from(row)) },
    comparison: null,
    cautions: listCautions(line, record, sections),
    notice: NOTICE,
  }
}
