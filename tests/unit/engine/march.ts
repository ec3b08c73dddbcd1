import type { Rig } from '../../../src-main/contract/rig'
import { advanceWaves } from '../../../src-main/engine/characteristics/advanceWaves'
import { makeWaveRun } from '../../../src-main/engine/characteristics/makeWaveRun'
import { makeLine } from '../../../src-main/engine/line/makeLine'
import { makeMarch } from '../../../src-main/engine/march/march'
import { makeRecords } from '../../../src-main/engine/records/makeRecords'

/** Marches a rig to its end and hands over the line and its records. */
export function marchRig(rig: Rig, full = false) {
  const line = makeLine(rig)
  const run = makeWaveRun(line)
  const records = makeRecords(run, full)
  const march = makeMarch({ advance: (from, to) => advanceWaves(run, from, to) }, records, line.steps)
  march.advance(march.end)
  return { line, record: records.finish(), broken: march.broken }
}
