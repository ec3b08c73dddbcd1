import type { Rig } from '../contract/rig'
import { listFatigue } from './answers/fatigue/listFatigue'
import { type FatiguePlace, listFatiguePlaces } from './answers/fatigue/listFatiguePlaces'
import { compareMethods } from './answers/compareMethods'
import { makeWaveMethod } from './characteristics/makeWaveMethod'
import { makeElementLine } from './elements/makeElementLine'
import { makeElementMethod } from './elements/makeElementMethod'
import { assembleSolution, type Solution } from './assembleSolution'
import { makeLine } from './line/makeLine'
import type { Line } from './line/line'
import { joinRecorders } from './march/joinRecorders'
import { makeMarch, type March } from './march/march'
import type { MethodRun } from './march/methodRun'
import type { FieldWindow } from './records/field/pixels'
import { makeRunField, type RunField } from './records/field/makeRunField'
import { makeRecords, type Records } from './records/makeRecords'
import type { RunRecord } from './records/record'

export type { FieldWindow, RunField, Solution }

/** A rig on its way to a solution, marched slice by slice by its host. */
export interface Solve {
  readonly line: Line
  /** The field of its main run, to be looked into once the solve is complete; null where it was not asked for. */
  readonly field: RunField | null
  /** Steps done so far, out of `steps`, over all its runs. */
  readonly step: number
  readonly steps: number
  /** True once the numbers have stopped being finite; the solve goes no further. */
  readonly broken: boolean
  advance(toStep: number): void
  /** The solution; call once step = steps. */
  finish(): Solution
}

/** One run of a solve. */
interface Phase {
  run: MethodRun
  records: Records
  march: March
  field: RunField | null
}

/**
 * Sets up the solution of a rig by the method its run asks for; `both` runs one after the other and
 * compares them. Where a material has a fatigue line the main method runs once more to watch the
 * places that the first run found worst.
 *
 * @param rig a checked rig; its size was checked by the reader
 * @param options full: keep the field at every cell and step in the solution; field: keep what it takes
 *   to look into the field afterwards
 */
export function makeSolve(rig: Rig, options: { full?: boolean; field?: boolean } = {}): Solve {
  const waveLine = makeLine(rig)
  const { method } = rig.run
  const line = method === 'elements' ? makeElementLine(waveLine) : waveLine
  const makeMain = () => (method === 'elements' ? makeElementMethod(line) : makeWaveMethod(line))
  const watches = rig.bars.some((bar) => bar.sections.some((section) => section.material.fatigue !== null))

  const main = makePhase(makeMain(), options.full ?? false, options.field)
  const planned = [line.steps + 1]
  const other = method === 'both' ? makeElementLine(waveLine) : null
  if (other !== null) planned.push(other.steps + 1)
  if (watches) planned.push(line.steps + 1)
  const steps = planned.reduce((sum, count) => sum + count, 0)

  const done: Phase[] = []
  let phase = main
  let mainRecord: RunRecord | null = null
  let places: FatiguePlace[] = []

  /** The run after the one that has ended; null after the last. */
  function makeNext(): Phase | null {
    mainRecord ??= main.records.finish()
    if (other !== null && done.length === 1) return makePhase(makeElementMethod(other), false)
    if (!watches || done.length === planned.length) return null
    places = listFatiguePlaces(line, mainRecord)
    const run = makeMain()
    for (const { span, position } of places) run.addProbe(span, position)
    return makePhase(run, false)
  }

  function countDone(): number {
    return done.reduce((sum, one) => sum + one.march.end, 0)
  }

  return {
    line,
    field: main.field,
    steps,
    get step() {
      return done.includes(phase) ? countDone() : countDone() + phase.march.step
    },
    get broken() {
      return phase.march.broken
    },
    advance(toStep) {
      phase.march.advance(toStep - (done.includes(phase) ? 0 : countDone()))
      if (phase.march.step < phase.march.end || done.includes(phase)) return
      done.push(phase)
      phase = makeNext() ?? phase
    },
    finish() {
      const record = mainRecord!
      const fatigue = watches ? listFatigue(line, places, readStress(done[planned.length - 1], line)) : []
      const compared = other === null ? null : { line: other, record: done[1].records.finish() }
      return assembleSolution(line, record, {
        method: method === 'elements' ? 'elements' : 'characteristics',
        breaks: main.run.breaks,
        fragments: main.run.listFragments(),
        comparison: compared && compareMethods({ line, record }, compared),
        fatigue,
      })
    },
  }
}

function makePhase(run: MethodRun, full: boolean, withField = false): Phase {
  const records = makeRecords(run, full)
  const field = withField ? makeRunField(run) : null
  const recorder = field === null ? records : joinRecorders(records, field)
  return { run, records, field, march: makeMarch(run, recorder, run.line.steps) }
}

/** Nominal stress at a watched place over the run [Pa]. */
function readStress({ run }: Phase, line: Line): (place: FatiguePlace) => Float64Array {
  return ({ span, position }) => {
    const area = line.spans[span].area[position]
    return run.readTrace(span, position).force.map((force) => force / area)
  }
}
