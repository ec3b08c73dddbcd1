import { NOTICE } from '../contract/notice'
import type { Comparison, FatigueAnswer, Result } from '../contract/result'
import { answerStriker } from './answers/answerStriker'
import { answerTapers } from './answers/answerTapers'
import { listFatigueCautions } from './answers/fatigue/listFatigueCautions'
import { findGoverning } from './answers/findGoverning'
import { listCautions } from './answers/listCautions'
import { listInterfaces } from './answers/listInterfaces'
import { listSectionPeaks } from './answers/listSectionPeaks'
import { tabulateEnvelope } from './answers/tabulateEnvelope'
import { tabulateGauges } from './answers/tabulateGauges'
import { tabulateEnds, tabulateJoints } from './answers/tabulateJoints'
import { traceWavefronts } from './answers/traceWavefronts'
import type { Line } from './line/line'
import type { Break, Fragment } from './march/methodRun'
import type { RunRecord } from './records/record'

/** What the engine finds; the host adds the file's digest, its own version and the time taken. */
export type Solution = Omit<Result, 'rig' | 'software' | 'run'> & {
  rig: Pick<Result['rig'], 'title'>
  run: Omit<Result['run'], 'solveTime'>
}

/** What a solve knows beside the records of its main run. */
export interface Beside {
  method: Result['method']
  breaks: readonly Break[]
  fragments: readonly Fragment[]
  comparison: Comparison | null
  fatigue: FatigueAnswer[]
}

/** Makes the answers from the records of a finished run. */
export function assembleSolution(line: Line, record: RunRecord, beside: Beside): Solution {
  const { rig, dt } = line
  const sections = listSectionPeaks(line, record)
  const governing = findGoverning(sections)
  const { energy, field } = record
  const times = Array.from(energy.step, (k) => k * dt)
  const fall = rig.gravity * dt * line.steps
  return {
    format: 'barwright-result/1',
    rig: { title: rig.title },
    method: beside.method,
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
    factorOfSafety: rig.factorOfSafety,
    fatigue: beside.fatigue,
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
    comparison: beside.comparison,
    spalls: beside.breaks.map(({ bar, x, area, force, k }) => ({
      bar: rig.bars[bar].name,
      x,
      time: k * dt,
      stress: force / area,
    })),
    fragments: beside.fragments.map(({ bar, from, to, mass, momentum }) => ({
      bar: rig.bars[bar].name,
      from,
      to,
      mass,
      velocity: momentum / mass + fall,
    })),
    cautions: [...listCautions(line, record, sections), ...listFatigueCautions(line, beside.fatigue)],
    notice: NOTICE,
  }
}
