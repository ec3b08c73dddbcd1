import { describe, expect, it } from 'vitest'
import type { Gauge, Section } from '../../../../src-main/contract/rig'
import { marchRig } from '../march'
import { makeBar, makePulse, makeRig, makeSection } from '../testRig'

const DT = 1e-6
const CELL = 5000 * DT
const pulse = makePulse((t) => -1000 * Math.sin(t / 13e-6) ** 2)

function traceGauges(sections: Section[], at: number[], steps: number) {
  const gauges: Gauge[] = at.map((place, i) => ({ name: `G${i}`, bar: 0, at: place, bridge: null }))
  const rig = makeRig(
    [makeBar('bar', sections)],
    { duration: steps * DT, timeStep: DT },
    { leftEnd: { kind: 'force', pulse }, rightEnd: { kind: 'fixed' }, gauges },
  )
  return marchRig(rig).record.gauges
}

const long = () => [makeSection(42 * CELL, 1e-3)]
/** The same bar in pieces too short for delay lines: one block marched cell by cell, in pairs of steps. */
const pieces = () => Array.from({ length: 6 }, () => makeSection(7 * CELL, 1e-3))
/** A taper so slight that it is a straight bar to rounding. */
const slight = () => [makeSection(42 * CELL, (s) => 1e-3 * (1 + 1e-15 * s))]

describe('gauges', () => {
  it('read the same in a bar marched cell by cell as in one delay line, at every step of a long run', () => {
    const at = [0, 3, 7, 11, 20.4, 35, 41.5, 42].map((cells) => cells * CELL)
    const right = traceGauges(long(), at, 1500)
    for (const sections of [pieces(), slight()])
      traceGauges(sections, at, 1500).forEach((gauge, i) => {
        const miss = (one: Float64Array, other: Float64Array) =>
          Math.max(...one.map((value, k) => Math.abs(value - other[k])))
        expect(miss(gauge.force, right[i].force)).toBeLessThan(1e-9)
        expect(miss(gauge.velocity, right[i].velocity)).toBeLessThan(1e-9 / 4e4)
        expect(miss(gauge.rightgoing, right[i].rightgoing)).toBeLessThan(1e-9)
        expect(miss(gauge.leftgoing, right[i].leftgoing)).toBeLessThan(1e-9)
      })
  })
})
