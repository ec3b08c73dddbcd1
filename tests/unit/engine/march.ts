import type { Rig } from '../../../src-main/contract/rig'
import { makeWaveMethod } from '../../../src-main/engine/characteristics/makeWaveMethod'
import { makeLine } from '../../../src-main/engine/line/makeLine'
import { makeMarch } from '../../../src-main/engine/march/march'
import { makeRecords } from '../../../src-main/engine/records/makeRecords'

/** Marches a rig to its end and hands over the line and its records. */
export function marchRig(rig: Rig, full = false) {
  const line = makeLine(rig)
  const run = makeWaveMethod(line)
  const records = makeRecords(run, full)
  const march = makeMarch(run, records, line.steps)
  march.advance(march.end)
  return { line, record: records.finish(), broken: march.broken }
}
