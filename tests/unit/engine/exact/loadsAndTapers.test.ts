import { describe, expect, it } from 'vitest'
import { evaluateConeStep } from '../../../../src-main/engine/exact/evaluateConeStep'
import { evaluateEqualSteps } from '../../../../src-main/engine/exact/evaluateEqualSteps'
import { evaluateFixedEndForce } from '../../../../src-main/engine/exact/evaluateFixedEndForce'
import { evaluateIncidentWave } from '../../../../src-main/engine/exact/evaluateIncidentWave'
import { evaluateOneModeFactor } from '../../../../src-main/engine/exact/evaluateOneModeFactor'
import { evaluateRampFactor } from '../../../../src-main/engine/exact/evaluateRampFactor'
import { evaluateReleasedFixedEnd } from '../../../../src-main/engine/exact/evaluateReleasedFixedEnd'
import { evaluateReleasedForce } from '../../../../src-main/engine/exact/evaluateReleasedForce'
import { evaluateReleasedFreeEnd } from '../../../../src-main/engine/exact/evaluateReleasedFreeEnd'
import { evaluateSuddenDisplacement } from '../../../../src-main/engine/exact/evaluateSuddenDisplacement'
import { INCIDENT_WAVE, RELEASE } from '../../../../src-main/engine/exact/published/examples'
import { RAMP_FACTORS } from '../../../../src-main/engine/exact/published/rodLoads'
import { CONE_STEP, EQUAL_STEPS } from '../../../../src-main/engine/exact/published/taperTables'

const PRINTED = 0.51e-8

describe(`${RAMP_FACTORS.label}: ${RAMP_FACTORS.source}`, () => {
  it.each(RAMP_FACTORS.rows)('tr c/L = %d', (rise, rod, oneMode) => {
    expect(evaluateRampFactor(rise)).toBeCloseTo(rod, 12)
    expect(Math.abs(evaluateOneModeFactor(rise) - oneMode)).toBeLessThan(0.51e-6)
  })

  it('is exactly 2 up to a rise of 2L/c and 4L/(c tr) from there to 4L/c', () => {
    for (const rise of [0, 0.3, 1, 1.9, 2]) expect(evaluateRampFactor(rise)).toBeCloseTo(2, 12)
    for (const rise of [2.2, 2.9, 3.7]) expect(evaluateRampFactor(rise)).toBeCloseTo(4 / rise, 12)
  })

  it('a sudden load: root force 0, 2, 0 and a triangle of displacement from 0 to 2 (period 4L/c)', () => {
    const step = (tau: number) => (tau < 0 ? 0 : 1)
    expect([0.5, 1.5, 2.5, 3.5, 4.5, 5.5].map((tau) => evaluateFixedEndForce(step, tau))).toEqual([
      0, 2, 2, 0, 0, 2,
    ])
    expect([0, 1, 2, 3, 4, 5].map(evaluateSuddenDisplacement)).toEqual([0, 1, 2, 1, 0, 1])
  })
})

describe(`${CONE_STEP.label}: ${CONE_STEP.source}`, () => {
  it.each(CONE_STEP.rows)('tau = %d', (tau, ...printed) => {
    ;[Math.SQRT2, 2, 3].forEach((R, i) => {
      expect(Math.abs(evaluateConeStep(R, tau, 'growing') - printed[i])).toBeLessThan(PRINTED)
      expect(evaluateConeStep(R, tau, 'contracting')).toBeCloseTo(
        evaluateConeStep(R, tau, 'growing') / R ** 2,
        14,
      )
    })
  })
})

describe(`${EQUAL_STEPS.label}: ${EQUAL_STEPS.source}`, () => {
  it.each(EQUAL_STEPS.rows)('A2/A1 = %d in %d steps', (ratio, steps, front) => {
    expect(Math.abs(evaluateEqualSteps(ratio, steps) - front)).toBeLessThan(PRINTED)
  })

  it('tends to sqrt(A2/A1)', () => expect(evaluateEqualSteps(4, 1e6)).toBeCloseTo(2, 5))
})

describe(`${INCIDENT_WAVE.label}: ${INCIDENT_WAVE.source}`, () => {
  it.each(INCIDENT_WAVE.rows)('strain %d', (strain, stress, force, duration, length, energy) => {
    const wave = evaluateIncidentWave(8000, 200e9, (Math.PI / 4) * 0.02 ** 2, 0.3, 20)
    expect(wave.strain).toBeCloseTo(strain, 15)
    expect(wave.stress).toBeCloseTo(stress, 6)
    expect(wave.force).toBeCloseTo(force, 3)
    expect(wave.duration).toBeCloseTo(duration, 15)
    expect(wave.length).toBeCloseTo(length, 14)
    expect(wave.energy).toBeCloseTo(energy, 6)
  })
})

describe(`${RELEASE.label}: ${RELEASE.source}`, () => {
  it.each(RELEASE.rows)('from %d to %d: %d', (from, to, stress) => {
    expect(evaluateReleasedFixedEnd(from)).toBe(stress)
    expect(evaluateReleasedFixedEnd((from + to) / 2)).toBe(stress)
    expect(evaluateReleasedFixedEnd(to)).toBe(-stress)
  })

  it('moves the free end as a triangle between + and - eps L', () => {
    expect([0, 1, 2, 3, 4, 4.5].map(evaluateReleasedFreeEnd)).toEqual([1, 0, -1, 0, 1, 0.5])
  })

  it('sends F0 Z2/(Z1 + Z2) into another bar, half into its like (Staab and Gilat 1991, from memory)', () => {
    expect(evaluateReleasedForce(8e3, 5, 5)).toBe(4e3)
    expect(evaluateReleasedForce(9e3, 10, 5)).toBe(3e3)
  })
})
