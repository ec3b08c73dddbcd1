import { describe, expect, it } from 'vitest'
import type { End, Joint, Rig, Section } from '../../../../src-main/contract/rig'
import { makeWaveMethod } from '../../../../src-main/engine/characteristics/makeWaveMethod'
import { makeLine } from '../../../../src-main/engine/line/makeLine'
import { makeMarch } from '../../../../src-main/engine/march/march'
import { makeRecords } from '../../../../src-main/engine/records/makeRecords'
import { marchRig } from '../march'
import { makeBar, makePulse, makeRig, makeSection } from '../testRig'

const DT = 1e-6
const CELL = 5000 * DT
const STEPS = 1501
const pulse = makePulse((t) => -1000 * Math.sin(t / 9e-6) * Math.exp(-t / 4e-4))
const CONTACT: Joint = { kind: 'contact', gap: 0 }

function makeStruck(sections: Section[][], joints: Joint[] = sections.slice(1).map(() => CONTACT)): Rig {
  const length = sections[0].reduce((sum, section) => sum + section.length, 0)
  return makeRig(
    sections.map((one, i) => makeBar(`bar ${i}`, one, { uniformVelocity: i === 0 ? 4 : 0 })),
    { duration: STEPS * DT, timeStep: DT },
    {
      joints,
      leftEnd: { kind: 'force', pulse },
      rightEnd: { kind: 'support', stiffness: 2e8, damping: 2e3, mass: 0.3, joint: 'bonded', gap: 0 },
      gauges: [{ name: 'G', bar: 0, at: 0.37 * length, bridge: null }],
    },
  )
}

const cone = (cells: number) => makeSection(cells * CELL, (s) => 1e-3 * (1 + s) ** 2)
const straight = (cells: number, area = 1e-3) => makeSection(cells * CELL, area)

const RIGS: [string, () => Rig][] = [
  ['tapers alone', () => makeStruck([[cone(9)], [cone(17), cone(5)]])],
  ['cells by themselves', () => makeStruck([[cone(1)], [straight(1)], [straight(1), straight(1, 2e-3)]])],
  ['blocks of two cells', () => makeStruck([[cone(2)], [straight(2)]])],
  [
    'tapers, short and long sections',
    () =>
      makeStruck([
        [straight(20), cone(9), straight(4)],
        [straight(3), cone(30)],
      ]),
  ],
  ['long sections alone', () => makeStruck([[straight(20), straight(11, 2e-3)], [straight(31)]])],
]

/** Marches in strides of given lengths, over and over. */
function marchInStrides(rig: Rig, strides: number[]) {
  const line = makeLine(rig)
  const run = makeWaveMethod(line)
  const records = makeRecords(run, false)
  const march = makeMarch(run, records, line.steps)
  for (let i = 0; march.step < march.end; i++) march.advance(march.step + strides[i % strides.length])
  return records.finish()
}

function expectSame(one: ReturnType<typeof marchInStrides>, other: ReturnType<typeof marchInStrides>) {
  expect(one.envelope).toEqual(other.envelope)
  expect(one.node(0)).toEqual(other.node(0))
  expect(one.energy.kinetic).toEqual(other.energy.kinetic)
  expect(one.field.stress.length).toBe(other.field.stress.length)
  // Places inside a taper are read from the waves that arrive or from those that leave: the same but for rounding.
  const miss = (a: Float64Array, b: Float64Array) => Math.max(...a.map((value, k) => Math.abs(value - b[k])))
  const scale = Math.max(...one.gauges[0].force.map(Math.abs))
  expect(miss(one.gauges[0].force, other.gauges[0].force)).toBeLessThan(1e-13 * scale)
}

describe('the march by characteristics', () => {
  it.each(RIGS)('comes to the same bits in pairs of steps and in single ones: %s', (_name, make) => {
    const pairs = marchInStrides(make(), [STEPS + 1])
    expectSame(pairs, marchInStrides(make(), [1]))
    expectSame(pairs, marchInStrides(make(), [3, 1, 64, 7]))
  })

  it.each(RIGS)('keeps two runs apart that take turns: %s', (_name, make) => {
    const alone = marchRig(make()).record
    const runs = [
      makeWaveMethod(makeLine(make())),
      makeWaveMethod(makeLine(makeStruck([[cone(23)], [cone(12)]]))),
    ]
    const records = runs.map((run) => makeRecords(run, false))
    const marches = runs.map((run, i) => makeMarch(run, records[i], run.line.steps))
    while (marches.some((march) => march.step < march.end))
      for (const march of marches) march.advance(march.step + 97)
    expectSame(alone, records[0].finish())
  })

  it('marches a straight bar the same as one delay line and cell by cell', () => {
    const ends: Partial<Rig> & { leftEnd: End } = {
      leftEnd: { kind: 'force', pulse },
      rightEnd: { kind: 'fixed' },
    }
    const [line, cells] = [[straight(42)], Array.from({ length: 6 }, () => straight(7))].map((sections) =>
      marchRig(makeRig([makeBar('bar', sections)], { duration: STEPS * DT, timeStep: DT }, ends)),
    )
    expect([line.line.spans.length, cells.line.spans.length]).toEqual([1, 6])
    const { envelope } = line.record
    const scale = Math.max(...envelope.tension)
    cells.line.spans.forEach((_, i) => {
      for (let p = 0; p <= 7; p++) {
        const at = cells.record.envelope.start[i] + p
        for (const sense of ['tension', 'compression'] as const)
          expect(Math.abs(cells.record.envelope[sense][at] - envelope[sense][7 * i + p])).toBeLessThan(
            1e-12 * scale,
          )
      }
    })
    expect(cells.record.envelope.tensionStep[20]).toBe(envelope.tensionStep[18])
  })
})
