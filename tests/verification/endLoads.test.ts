import { describe, expect, it } from 'vitest'
import type { Rig } from '../../src-main/contract/rig'
import { evaluateFixedEndForce } from '../../src-main/engine/exact/evaluateFixedEndForce'
import { evaluateOneModeFactor } from '../../src-main/engine/exact/evaluateOneModeFactor'
import { evaluateSuddenDisplacement } from '../../src-main/engine/exact/evaluateSuddenDisplacement'
import { RAMP_FACTORS } from '../../src-main/engine/exact/published/rodLoads'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection } from '../unit/engine/testRig'
import { expectNear } from './expectNear'
import { findWorst } from './findWorst'

/** Travel time and ramp are whole numbers of steps: the march is exact but for rounding. */
const ROUNDING = 1e-12
const CELLS = 100
const DT = 1e-6
const LENGTH = CELLS * 5000 * DT
const AREA = 1e-3
const P = -12e3

/** A rod fixed at its left end, loaded at its right end, until ct/L = tau. */
function marchLoaded(load: (t: number) => number, tau: number) {
  const rig: Rig = makeRig(
    [makeBar('rod', [makeSection(LENGTH, AREA)])],
    { duration: tau * CELLS * DT, timeStep: DT },
    {
      leftEnd: { kind: 'fixed' },
      rightEnd: { kind: 'force', pulse: makePulse(load) },
      gauges: [{ name: 'middle', bar: 0, at: LENGTH / 2, bridge: null }],
    },
  )
  const { record } = marchRig(rig)
  expect(record.energy.closure).toBeLessThan(ROUNDING)
  return {
    root: record.node(0)!.forceRight,
    tip: record.node(1)!.velocityLeft,
    middle: record.gauges[0].force,
  }
}

describe('constant end load put on suddenly: Timoshenko, Vibration Problems; Graff ch. 2 (from memory)', () => {
  const { root, tip, middle } = marchLoaded(() => P, 12)

  it('free-end displacement is a triangle wave between 0 and 2PL/EA of period 4L/c', () => {
    const scale = (P * LENGTH) / (200e9 * AREA)
    let u = 0
    // The displacement at the end of step k: the velocity is constant over a step.
    const miss = tip.map((v, k) => (u += v * DT) / scale - evaluateSuddenDisplacement((k + 1) / CELLS))
    expectNear(findWorst(miss), 0, ROUNDING)
  })

  it('fixed-end force is 0 until L/c, 2P until 3L/c, 0 until 5L/c and so on', () => {
    const step = (tau: number) => (tau < 0 ? 0 : 1)
    const miss = root.map((F, k) => F / P - evaluateFixedEndForce(step, (k + 0.5) / CELLS))
    expectNear(findWorst(miss), 0, ROUNDING)
    expect([0.5, 2, 4, 6].map((tau) => Math.round(Math.abs(root[tau * CELLS] / P)))).toEqual([0, 2, 0, 2])
  })

  it('mid-length force: 0 to 0.5, P to 1.5, 2P to 2.5, P to 3.5, 0 to 4.5', () => {
    const bounds = [0.5, 1.5, 2.5, 3.5, 4.5]
    const miss = middle.slice(0, 4.5 * CELLS).map((F, k) => {
      const interval = bounds.findIndex((bound) => (k + 0.5) / CELLS < bound)
      return F / P - [0, 1, 2, 1, 0][interval]
    })
    expectNear(findWorst(miss), 0, ROUNDING)
  })

  it('the dynamic load factor is exactly 2 at the root, in the middle and for the end displacement', () => {
    expectNear(Math.max(...root.map((F) => F / P)), 2, ROUNDING)
    expectNear(Math.max(...middle.map((F) => F / P)), 2, ROUNDING)
  })
})

describe(`marched, ${RAMP_FACTORS.label}: ${RAMP_FACTORS.source}`, () => {
  const factor = (rise: number) => {
    const duration = rise * CELLS * DT
    const { root } = marchLoaded((t) => P * Math.min(1, t / duration), rise + 8)
    return Math.max(...root.map((F) => F / P))
  }

  it.each(RAMP_FACTORS.rows)('tr c/L = %d', (rise, rod) => {
    expectNear(factor(rise), rod, ROUNDING)
  })

  it('2 for every ramp up to 2L/c', () => {
    for (const rise of [0.25, 1, 1.5, 2]) expectNear(factor(rise), 2, ROUNDING)
  })

  it('the exact factor is 4L/(c tr) from 2L/c to 4L/c', () => {
    for (const rise of [2.2, 2.75, 3.9]) expectNear(factor(rise), 4 / rise, ROUNDING)
  })

  it('no overshoot at tr = T = 4L/c, nor in the one-mode formula, which is low elsewhere', () => {
    expectNear(evaluateOneModeFactor(4), 1, ROUNDING)
    for (const [rise, , oneMode] of RAMP_FACTORS.rows)
      if (rise % 4 !== 0) expect(factor(rise)).toBeGreaterThan(oneMode)
  })
})
