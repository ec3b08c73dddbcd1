import { describe, expect, it } from 'vitest'
import type { End } from '../../src-main/contract/rig'
import { evaluateMassOnLongBar } from '../../src-main/engine/exact/evaluateMassOnLongBar'
import {
  FIXED_END_PEAK_LIMITS,
  MASS_ON_FIXED_BAR,
  MASS_ON_FIXED_BAR_HISTORY,
  MASS_ON_FIXED_BAR_LIMITS,
  MASS_ON_FREE_BAR,
} from '../../src-main/engine/exact/published/massOnBar'
import { solveMassOnFixedBar } from '../../src-main/engine/exact/solveMassOnFixedBar'
import { marchRig } from '../unit/engine/march'
import { makeBar, makeRig, makeSection } from '../unit/engine/testRig'
import { expectNear } from './expectNear'
import { findWorst } from './findWorst'
import { solveText } from './solveText'

/**
 * The mass is integrated by the midpoint rule: a force at step k is that of the middle of the step, exact
 * to second order in the cell. On 1000 cells this leaves some 1e-6 of the number, more for heavy bars.
 */
const SECOND_ORDER = 2e-5
const CELLS = 1000
const DT = 1e-7
const AREA = 1e-3
const Z = 4e7 * AREA
const SPEED = 5

/** Strikes a bar of 1000 cells with a mass m/alpha, until ct/L = tau. */
function strike(alpha: number, rightEnd: End, tau: number) {
  const mass = (Z * CELLS * DT) / alpha
  const rig = makeRig(
    [makeBar('bar', [makeSection(CELLS * 5000 * DT, AREA)])],
    { duration: tau * CELLS * DT, timeStep: DT },
    { leftEnd: { kind: 'mass', mass, velocity: SPEED, joint: 'contact', gap: 0 }, rightEnd },
  )
  const { line, record } = marchRig(rig)
  const struck = record.node(0)!
  const last = struck.forceLeft.findIndex((F) => F === 0) - 1
  const stress = struck.forceLeft.map((F) => -F / (Z * SPEED))
  return {
    mass,
    record,
    stress,
    speed: struck.velocityLeft.map((v) => v / SPEED),
    farStress: record.node(line.spans.length)!.forceLeft.map((F) => -F / (Z * SPEED)),
    /** ct/L at which the force would pass zero, from the last two pressing steps. */
    contactEnds: (last + 0.5 + stress[last] / (stress[last - 1] - stress[last])) / CELLS,
    lastPressing: last,
    /** Of the mass once it has left for the first time. */
    massSpeed: 1 - struck.forceLeft.slice(0, last + 1).reduce((sum, F) => sum - F * DT, 0) / (mass * SPEED),
  }
}

/** The value just after a front at step k, from the middles of the two steps that follow. */
const afterFront = (values: Float64Array, k: number) => 1.5 * values[k] - 0.5 * values[k + 1]
/** The value at the start of step k where no front arrives then. */
const between = (values: Float64Array, k: number) => (values[k - 1] + values[k]) / 2
/** The largest front, of those that arrive every 2L/c from ct/L = tau on; no value between two may pass it. */
function findLargestFront(values: Float64Array, tau: number): { stress: number; tau: number } {
  let best = { stress: 0, tau }
  for (let at = tau; at * CELLS + 1 < values.length; at += 2) {
    const stress = afterFront(values, at * CELLS)
    if (stress > best.stress) best = { stress, tau: at }
  }
  expect(Math.max(...values)).toBeLessThan(best.stress)
  return best
}

describe(`marched, ${MASS_ON_FIXED_BAR.label}: ${MASS_ON_FIXED_BAR.source}`, () => {
  it.each(MASS_ON_FIXED_BAR.rows)(
    'm/M = %d',
    (alpha, contactEnds, leaves, struckPeak, struckAt, fixedPeak, fixedAt) => {
      const found = strike(alpha, { kind: 'fixed' }, Math.max(contactEnds, fixedAt) + 0.05)
      expectNear(found.contactEnds / contactEnds, 1, SECOND_ORDER)
      expectNear(found.massSpeed, leaves, SECOND_ORDER)
      const struck = findLargestFront(found.stress, 0)
      expect(struck.tau).toBe(struckAt)
      expectNear(struck.stress / struckPeak, 1, SECOND_ORDER)
      const far = findLargestFront(found.farStress, 1)
      expect(far.tau).toBe(fixedAt)
      expectNear(far.stress / fixedPeak, 1, SECOND_ORDER)
      expect(found.record.energy.closure).toBeLessThan(1e-12)
    },
  )

  it('the whole history follows the exact polynomials', () => {
    for (const alpha of [1 / 10, 1 / 2, 4]) {
      const exact = solveMassOnFixedBar(alpha)
      const { stress, lastPressing } = strike(alpha, { kind: 'fixed' }, exact.contactEnds)
      const miss = stress
        .slice(0, lastPressing + 1)
        .map((value, k) => value - exact.stress((k + 0.5) / CELLS))
      expectNear(findWorst(miss), 0, SECOND_ORDER * exact.struckPeak.stress)
    }
  })
})

describe(`marched, ${MASS_ON_FIXED_BAR_HISTORY.label}: ${MASS_ON_FIXED_BAR_HISTORY.source}`, () => {
  it.each(MASS_ON_FIXED_BAR_HISTORY.rows)('m/M = %d at ct/L = %d', (alpha, tau, stress, speed) => {
    const found = strike(alpha, { kind: 'fixed' }, tau + 0.01)
    const read = tau % 2 === 0 ? afterFront : between
    expectNear(read(found.stress, tau * CELLS), stress, SECOND_ORDER)
    expectNear(read(found.speed, tau * CELLS), speed, SECOND_ORDER)
  })

  it('the first interval and the first front: exp(-alpha tau), then 2 more', () => {
    for (const [alpha, one, before, after] of [
      [1, 0.367879441, 0.135335283, 2.13533528],
      [1 / 2, 0.60653066, 0.36787944, 2.36787944],
    ]) {
      const { stress } = strike(alpha, { kind: 'fixed' }, 2.01)
      expectNear(between(stress, CELLS), one, SECOND_ORDER)
      expectNear(1.5 * stress[2 * CELLS - 1] - 0.5 * stress[2 * CELLS - 2], before, SECOND_ORDER)
      expectNear(afterFront(stress, 2 * CELLS), after, SECOND_ORDER)
    }
  })
})

describe(`marched, ${MASS_ON_FIXED_BAR_LIMITS.label}: ${MASS_ON_FIXED_BAR_LIMITS.source}`, () => {
  // 0.3 % off the limit the contact ends several steps before the front, or outlasts it.
  it.each(MASS_ON_FIXED_BAR_LIMITS.rows)('contact ends before %d while M/m < %d', (tau, limit) => {
    const ends = (massRatio: number) => strike(1 / massRatio, { kind: 'fixed' }, tau + 2).contactEnds
    expect(ends(limit * (1 - 3e-3))).toBeLessThan(tau)
    expect(ends(limit * (1 + 3e-3))).toBeGreaterThan(tau)
  })
})

describe(`marched, ${FIXED_END_PEAK_LIMITS.label}: ${FIXED_END_PEAK_LIMITS.source}`, () => {
  it.each(FIXED_END_PEAK_LIMITS.rows)('fixed-end peak at %d while M/m < %d', (tau, limit) => {
    /** The front two units later over this one. */
    const nextOverThis = (massRatio: number) => {
      const { farStress } = strike(1 / massRatio, { kind: 'fixed' }, tau + 2.01)
      return afterFront(farStress, (tau + 2) * CELLS) / afterFront(farStress, tau * CELLS)
    }
    expect(nextOverThis(limit * (1 - 1e-4))).toBeLessThan(1)
    expect(nextOverThis(limit * (1 + 1e-4))).toBeGreaterThan(1)
  })
})

describe(`marched, ${MASS_ON_FREE_BAR.label}: ${MASS_ON_FREE_BAR.source}`, () => {
  it.each(MASS_ON_FREE_BAR.rows)('m/M = %d', (alpha, contactEnds, leaves, barSpeed, restitution, share) => {
    const found = strike(alpha, { kind: 'free' }, 2.2)
    expect(found.lastPressing + 1).toBe(contactEnds * CELLS)
    expectNear(found.massSpeed, leaves, SECOND_ORDER)
    const [bar] = found.record.bars
    expectNear(bar.momentum / bar.mass / SPEED, barSpeed, SECOND_ORDER)
    expectNear(bar.momentum / bar.mass / SPEED - found.massSpeed, restitution, SECOND_ORDER)
    expectNear((bar.kinetic + bar.strain) / ((found.mass * SPEED ** 2) / 2), share, SECOND_ORDER)
    expect(found.record.energy.closure).toBeLessThan(1e-12)
    expect(found.record.energy.momentumClosure).toBeLessThan(1e-12)
  })
})

describe('marched, rigid mass on a bar without end: Love, Treatise, art. 281 (from memory)', () => {
  it('stress and speed fall as exp(-Z t/M), without rebound; the impulse is M v0', () => {
    const found = strike(1, { kind: 'matched' }, 30)
    const exact = found.stress.map((_, k) => evaluateMassOnLongBar(Z, found.mass, (k + 0.5) * DT))
    expectNear(findWorst(found.stress.map((stress, k) => stress - exact[k])), 0, 1e-6)
    expectNear(findWorst(found.speed.map((speed, k) => speed - exact[k])), 0, 1e-6)
    expect(found.stress.every((stress) => stress > 0)).toBe(true)
    expectNear(found.record.ends.left.impulse / (found.mass * SPEED), 1, 1e-12)
  })

  it('holds on any bar until 2L/c', () => {
    for (const kind of ['free', 'fixed'] as const) {
      const { stress } = strike(2, { kind }, 1.999)
      const miss = stress.map((value, k) => value - Math.exp((-2 * (k + 0.5)) / CELLS))
      expectNear(findWorst(miss), 0, 1e-6)
    }
  })
})

describe('mass on a steel bar of 1 m, m = M, c = 5000 m/s, rho c = 4e7, 5 m/s: values recomputed', () => {
  const solve = (cell: string) =>
    solveText({
      format: 'barwright-rig/1',
      title: 'Drop mass on a held bar',
      materials: { steel: { density: '8000 kg/m^3', modulus: '200 GPa', poisson: 0.3 } },
      leftEnd: { kind: 'mass', mass: '8000 kg/m^3 * 4 cm^2 * 1 m', velocity: '5 m/s', joint: 'contact' },
      bars: [{ name: 'bar', material: 'steel', sections: [{ length: '1 m', area: '4 cm^2' }] }],
      rightEnd: { kind: 'fixed' },
      gauges: [{ name: 'struck end', bar: 'bar', at: '0 m' }],
      run: { duration: '640 us', cell },
    }).solution

  it('fixed-end peak 454.134113 MPa at 600 us, parted at 613.533529 us at -3.43809470 m/s', () => {
    const [coarse, fine] = [solve('2 mm'), solve('1 mm')]
    // A peak behind a front stands for the middle of its step, first order low: extrapolated from two cells.
    const peak = (2 * fine.ends.right.peakForce - coarse.ends.right.peakForce) / 4e-4
    expectNear(peak / -454.134113e6, 1, 1e-5)
    expectNear(fine.sections[0].compression.time, 600e-6, 1e-18)
    expectNear(fine.sections[0].compression.at, 1, 1e-15)
    const { stress, t } = fine.gauges[0]
    const last = stress.findLastIndex((value) => value < 0)
    const ends = t[last] + 1e-7 + (2e-7 * stress[last]) / (stress[last - 1] - stress[last])
    expectNear(ends / 613.533529e-6, 1, 1e-6)
    expectNear(5 - fine.ends.left.impulse / 3.2, -3.4380947, 1e-5)
  })
})
