import type { Rig } from '../../../src-main/contract/rig'
import { makeWaveMethod } from '../../../src-main/engine/characteristics/makeWaveMethod'
import { makeElementLine } from '../../../src-main/engine/elements/makeElementLine'
import { makeElementMethod } from '../../../src-main/engine/elements/makeElementMethod'
import { makeLine } from '../../../src-main/engine/line/makeLine'
import { makeMarch } from '../../../src-main/engine/march/march'
import type { MethodRun } from '../../../src-main/engine/march/methodRun'
import { makeRecords } from '../../../src-main/engine/records/makeRecords'

/** Marches a rig to its end by characteristics and hands over the line and its records. */
export function marchRig(rig: Rig, full = false) {
  return marchRun(makeWaveMethod(makeLine(rig)), full)
}

/** Marches a rig to its end with elements. */
export function marchElements(rig: Rig, full = false) {
  return marchRun(makeElementMethod(makeElementLine(makeLine(rig))), full)
}

function marchRun(run: MethodRun, full: boolean) {
  const records = makeRecords(run, full)
  const march = makeMarch(run, records, run.line.steps)
  march.advance(march.end)
  return { line: run.line, record: records.finish(), broken: march.broken }
}
