import type { RunRecord } from '../../../../src-main/engine/records/record'
import type { Line } from '../../../../src-main/engine/line/line'
import { makeWaveMethod } from '../../../../src-main/engine/characteristics/makeWaveMethod'
import { makeLine } from '../../../../src-main/engine/line/makeLine'
import { makeMarch } from '../../../../src-main/engine/march/march'
import { makeRecords } from '../../../../src-main/engine/records/makeRecords'
import { makePlainRig, type PlainRig } from './makePlainLine'

/** Runs a plain rig by characteristics, with a gauge at each place given on a bar. */
export function runPlain(
  plain: PlainRig,
  gauges: { bar: number; at: number }[] = [],
): { line: Line; record: RunRecord } {
  const rig = makePlainRig(plain)
  rig.gauges = gauges.map(({ bar, at }, i) => ({ name: `G${i + 1}`, bar, at, bridge: null }))
  const line = makeLine(rig)
  const run = makeWaveMethod(line)
  const records = makeRecords(run, false)
  const march = makeMarch(run, records, line.steps)
  march.advance(march.end)
  return { line, record: records.finish() }
}
