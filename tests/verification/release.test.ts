import { describe, expect, it } from 'vitest'
import type { Bar, End } from '../../src-main/contract/rig'
import { RELEASE } from '../../src-main/engine/exact/published/examples'
import { evaluateReleasedFixedEnd } from '../../src-main/engine/exact/evaluateReleasedFixedEnd'
import { evaluateReleasedForce } from '../../src-main/engine/exact/evaluateReleasedForce'
import { evaluateReleasedFreeEnd } from '../../src-main/engine/exact/evaluateReleasedFreeEnd'
import { marchRig } from '../unit/engine/march'
import { makeBar, makeRig, makeSection } from '../unit/engine/testRig'
import { expectNear } from './expectNear'
import { findWorst } from './findWorst'

const ROUNDING = 1e-12
const CELLS = 60
const DT = 1e-6
const LENGTH = CELLS * 5000 * DT
const AREA = 1e-3
const F0 = 80e3
const SIGMA = F0 / AREA

function marchReleased(bars: Bar[], leftEnd: End, rightEnd: End, tau: number) {
  const { line, record } = marchRig(
    makeRig(
      bars,
      { duration: tau * CELLS * DT, timeStep: DT },
      {
        leftEnd,
        rightEnd,
        joints: bars.slice(1).map(() => ({ kind: 'bonded' })),
        gauges: [{ name: 'middle', bar: bars.length - 1, at: LENGTH / 2, bridge: null }],
      },
    ),
  )
  expect(record.energy.closure).toBeLessThan(ROUNDING)
  expect(record.energy.momentumClosure).toBeLessThan(ROUNDING)
  return { line, record, middle: record.gauges[0] }
}

const preloaded = (area = AREA) => makeBar('rod', [makeSection(LENGTH, area)], { preload: F0 })
/** The middle of each step: at a jump neither the value before nor the one after. */
const tau = (k: number) => (k + 0.5) / CELLS

describe(`marched, ${RELEASE.label}: ${RELEASE.source}`, () => {
  const { record } = marchReleased([preloaded()], { kind: 'fixed' }, { kind: 'free' }, 12)
  const root = record.node(0)!.forceRight
  const tip = record.node(1)!.velocityLeft

  it.each(RELEASE.rows)('from ct/L = %d to %d: %d', (from, to, stress) => {
    const miss = root.slice(from * CELLS, to * CELLS).map((F) => F / F0 - stress)
    expect(miss).toHaveLength((to - from) * CELLS)
    expectNear(findWorst(miss), 0, ROUNDING)
  })

  it('and so on, period 4L/c', () => {
    expectNear(findWorst(root.map((F, k) => F / F0 - evaluateReleasedFixedEnd(tau(k)))), 0, ROUNDING)
  })

  it('the free end moves at sigma/(rho c) = c eps', () => {
    const speed = SIGMA / 4e7
    expectNear(findWorst(tip.map((v) => Math.abs(v) - speed)), 0, speed * ROUNDING)
    expectNear(speed, 5000 * (SIGMA / 200e9), ROUNDING)
    expect(tip[0]).toBeLessThan(0)
  })

  it('its displacement is a triangle wave between +eps L and -eps L', () => {
    const reach = (SIGMA / 200e9) * LENGTH
    let u = reach
    const miss = tip.map((v, k) => (u += v * DT) / reach - evaluateReleasedFreeEnd((k + 1) / CELLS))
    expectNear(findWorst(miss), 0, ROUNDING)
  })
})

describe("both ends let go: exact by d'Alembert", () => {
  it('the middle is at +sigma to L/2c, -sigma to 3L/2c, period 2L/c', () => {
    const { middle } = marchReleased([preloaded()], { kind: 'free' }, { kind: 'free' }, 10)
    const expected = (k: number) => (Math.floor(tau(k) + 0.5) % 2 === 0 ? F0 : -F0)
    expectNear(findWorst(middle.force.map((F, k) => F / expected(k) - 1)), 0, ROUNDING)
  })

  it('the middle never moves', () => {
    const { middle } = marchReleased([preloaded()], { kind: 'free' }, { kind: 'free' }, 10)
    expectNear(findWorst(middle.velocity), 0, (SIGMA / 4e7) * ROUNDING)
  })
})

describe('a preloaded length let go into a bar: Staab and Gilat, Exp. Mech. 31 (1991) 232 (from memory)', () => {
  it('equal bars: incident wave sigma/2, velocity sigma/(2 rho c), duration 2Lp/c', () => {
    const { middle } = marchReleased(
      [preloaded(), makeBar('bar', [makeSection(LENGTH, AREA)])],
      { kind: 'fixed' },
      { kind: 'matched' },
      4,
    )
    const share = (k: number) => (tau(k) > 0.5 && tau(k) < 2.5 ? 0.5 : 0)
    expectNear(findWorst(middle.force.map((F, k) => F / F0 - share(k))), 0, ROUNDING)
    const speed = SIGMA / 4e7
    expectNear(findWorst(middle.velocity.map((v, k) => v / -speed - share(k))), 0, ROUNDING)
    expectNear(findWorst(middle.leftgoing), 0, F0 * ROUNDING)
  })

  it('unequal bars: F0 Z2/(Z1 + Z2)', () => {
    for (const ratio of [0.25, 0.5, 3]) {
      const { middle } = marchReleased(
        [preloaded(), makeBar('bar', [makeSection(LENGTH, ratio * AREA)])],
        { kind: 'fixed' },
        { kind: 'matched' },
        2.4,
      )
      const F = evaluateReleasedForce(F0, 1, ratio)
      expectNear(F, (F0 * ratio) / (1 + ratio), 1e-9)
      const share = (k: number) => (tau(k) > 0.5 ? F : 0)
      expectNear(findWorst(middle.force.map((value, k) => value - share(k))), 0, F0 * ROUNDING)
    }
  })
})
