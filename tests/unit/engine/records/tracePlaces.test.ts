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

  it('on a step lies in the right-hand section, at the ends of a bar on its faces', () => {
    const sections = () => [makeSection(20 * CELL, 1e-3), makeSection(20 * CELL, 3e-3)]
    const gauges = traceGauges(sections(), [0, 20 * CELL, 40 * CELL], 90)
    expect(gauges.map(({ area }) => area)).toEqual([1e-3, 3e-3, 3e-3])
    gauges.forEach(({ impedance, area, modulus }) => {
      expect(impedance / (4e7 * area)).toBeCloseTo(1, 14)
      expect(modulus).toBe(200e9)
    })
    expect(gauges.map(({ x }) => x)).toEqual([0, 20 * CELL, 40 * CELL])
    // The right-hand section at the step knows only what passes it: nothing before step 20.
    expect(gauges[1].force.slice(0, 20).every((F) => F === 0)).toBe(true)
    expect(Math.max(...gauges[2].velocity.map(Math.abs))).toBeLessThan(1e-12)
  })

  it('between two positions blends them: a smooth wave to second order, a front over one step', () => {
    const place = (cells: number) => cells * CELL
    const [at7, at8, between] = traceGauges(long(), [place(7), place(8), place(7.25)], 60)
    between.force.forEach((F, k) =>
      expect(Math.abs(F - (0.75 * at7.force[k] + 0.25 * at8.force[k]))).toBeLessThan(1e-9),
    )
    // Against the pulse itself, 7.25 steps late: its curvature times a dt^2/2 of the share, 1000/13^2 x 0.1.
    const miss = between.rightgoing.slice(8, 60).map((f, i) => f + pulse.value((i + 8 - 7.25) * DT))
    expect(Math.max(...miss.map(Math.abs))).toBeLessThan(1.2)
    expect(Math.max(...miss.map(Math.abs))).toBeGreaterThan(0)
  })

  it('split force and velocity into the waves that pass: f + g = F, g - f = Z v', () => {
    for (const gauge of traceGauges([makeSection(30 * CELL, (s) => 1e-3 * (1 + s))], [7.3 * CELL], 400)) {
      gauge.force.forEach((F, k) => {
        expect(Math.abs(gauge.rightgoing[k] + gauge.leftgoing[k] - F)).toBeLessThan(1e-9)
        const Zv = gauge.impedance * gauge.velocity[k]
        expect(Math.abs(gauge.leftgoing[k] - gauge.rightgoing[k] - Zv)).toBeLessThan(1e-9)
      })
      expect(gauge.area / (1e-3 * (1 + 7.3 / 30))).toBeCloseTo(1, 12)
    }
  })
})
