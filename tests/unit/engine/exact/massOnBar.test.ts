import { describe, expect, it } from 'vitest'
import { evaluateMassOnFreeBar } from '../../../../src-main/engine/exact/evaluateMassOnFreeBar'
import { evaluateMassOnLongBar } from '../../../../src-main/engine/exact/evaluateMassOnLongBar'
import {
  FIXED_END_PEAK_LIMITS,
  MASS_ON_FIXED_BAR,
  MASS_ON_FIXED_BAR_HISTORY,
  MASS_ON_FIXED_BAR_LIMITS,
  MASS_ON_FREE_BAR,
} from '../../../../src-main/engine/exact/published/massOnBar'
import { solveMassOnFixedBar } from '../../../../src-main/engine/exact/solveMassOnFixedBar'

/** Half a unit of the eighth decimal, to which the tables are printed. */
const PRINTED = 0.51e-8

describe(`${MASS_ON_FIXED_BAR.label}: ${MASS_ON_FIXED_BAR.source}`, () => {
  it.each(MASS_ON_FIXED_BAR.rows)('m/M = %d', (alpha, ends, speed, struck, struckAt, fixed, fixedAt) => {
    const found = solveMassOnFixedBar(alpha)
    expect(Math.abs(found.contactEnds - ends)).toBeLessThan(PRINTED)
    expect(Math.abs(found.velocity(found.contactEnds) - speed)).toBeLessThan(PRINTED)
    expect(Math.abs(found.struckPeak.stress - struck)).toBeLessThan(PRINTED)
    expect(found.struckPeak.tau).toBeCloseTo(struckAt, 7)
    expect(Math.abs(found.fixedPeak.stress - fixed)).toBeLessThan(PRINTED)
    expect(found.fixedPeak.tau).toBeCloseTo(fixedAt, 7)
  })

  it.each(MASS_ON_FIXED_BAR_HISTORY.rows)('m/M = %d at ct/L = %d', (alpha, tau, stress, speed) => {
    const found = solveMassOnFixedBar(alpha)
    expect(Math.abs(found.stress(tau) - stress)).toBeLessThan(PRINTED)
    expect(Math.abs(found.velocity(tau) - speed)).toBeLessThan(PRINTED)
  })

  it.each(MASS_ON_FIXED_BAR_LIMITS.rows)(
    'contact ends before %d just under M/m = %d and not just over',
    (before, limit) => {
      expect(solveMassOnFixedBar(1 / (limit - 1e-6)).contactEnds).toBeLessThan(before)
      expect(solveMassOnFixedBar(1 / (limit + 1e-6)).contactEnds).toBeGreaterThanOrEqual(before)
    },
  )

  it.each(FIXED_END_PEAK_LIMITS.rows)('the fixed-end peak comes at %d up to M/m = %d', (at, limit) => {
    expect(solveMassOnFixedBar(1 / (limit - 1e-5)).fixedPeak.tau).toBeCloseTo(at, 6)
    expect(solveMassOnFixedBar(1 / (limit + 1e-5)).fixedPeak.tau).toBeCloseTo(at + 2, 6)
  })

  it('gives the worked example: c = 5000, s0 = 200 MPa, L = 1 m, alpha = 1', () => {
    const found = solveMassOnFixedBar(1)
    expect(200e6 * found.fixedPeak.stress).toBeCloseTo(454.134113e6, -1)
    // Printed as 613.533529; 200 (2 + (2 + exp(-2))/2) is 613.5335283, one unit less in the last digit.
    expect(Math.abs((found.contactEnds / 5000) * 1e6 - 613.533529)).toBeLessThan(1e-6)
    expect(5 * found.velocity(found.contactEnds)).toBeCloseTo(-3.4380947, 7)
  })
})

describe(`${MASS_ON_FREE_BAR.label}: ${MASS_ON_FREE_BAR.source}`, () => {
  it.each(MASS_ON_FREE_BAR.rows)('m/M = %d', (alpha, ends, velocity, barVelocity, restitution, barEnergy) => {
    const found = evaluateMassOnFreeBar(alpha)
    expect(found.contactEnds).toBe(ends)
    expect(Math.abs(found.velocity - velocity)).toBeLessThan(PRINTED)
    expect(Math.abs(found.barVelocity - barVelocity)).toBeLessThan(PRINTED)
    expect(Math.abs(found.restitution - restitution)).toBeLessThan(PRINTED)
    expect(Math.abs(found.barEnergy - barEnergy)).toBeLessThan(PRINTED)
  })
})

describe('rigid mass on a bar without end: exp(-Z t/M), Love, Treatise, art. 281 (from memory)', () => {
  it('falls to 1/e in M/Z and is zero before the impact', () => {
    expect(evaluateMassOnLongBar(4000, 2, 0)).toBe(1)
    expect(evaluateMassOnLongBar(4000, 2, 2 / 4000)).toBeCloseTo(1 / Math.E, 15)
    expect(evaluateMassOnLongBar(4000, 2, -1e-9)).toBe(0)
  })

  it('is the first interval of the bar of finite length', () => {
    // alpha tau = (Z T/M)(t/T): the same exponential.
    expect(solveMassOnFixedBar(0.5).stress(1.7)).toBeCloseTo(evaluateMassOnLongBar(0.5, 1, 1.7), 15)
  })
})
