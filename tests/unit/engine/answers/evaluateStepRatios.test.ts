import { describe, expect, it } from 'vitest'
import { evaluateStepRatios } from '../../../../src-main/engine/answers/evaluateStepRatios'
import { STEP_RATIOS, STEEL_INTO } from '../../../../src-main/engine/exact/published/stepRatios'

const ROUNDING = 1e-15

describe(`ratios at a step: ${STEP_RATIOS.source}`, () => {
  for (const [ratio, R, T, vT, ER, ET, stress] of STEP_RATIOS.rows) {
    it(`Z2/Z1 = ${ratio}`, () => {
      const found = evaluateStepRatios(3, 3 * ratio, 2, 2 * ratio)
      expect(found.reflectedForce).toBeCloseTo(R, 10)
      expect(found.transmittedForce).toBeCloseTo(T, 9)
      expect(found.reflectedEnergy).toBeCloseTo(ER, 10)
      expect(found.transmittedEnergy).toBeCloseTo(ET, 10)
      expect(found.reflectedStress).toBe(found.reflectedForce)
      expect(found.transmittedStress).toBeCloseTo(stress, 9)
      // v_T/v_I = (F_T/Z2)/(F_I/Z1); at the limits it is 1 - R
      expect(1 - found.reflectedForce).toBeCloseTo(vT, 9)
    })
  }

  it('shares the energy whole, the same from both sides', () => {
    for (const ratio of [1e-6, 0.3, 1, 7, 1e9]) {
      const there = evaluateStepRatios(1, ratio, 1, ratio)
      const back = evaluateStepRatios(ratio, 1, ratio, 1)
      expect(Math.abs(there.reflectedEnergy + there.transmittedEnergy - 1)).toBeLessThan(4 * ROUNDING)
      expect(back.transmittedEnergy).toBeCloseTo(there.transmittedEnergy, 14)
      expect(back.reflectedForce).toBeCloseTo(-there.reflectedForce, 14)
    }
  })

  it("keeps finite at a free and at a fixed end whose area is the bar's own", () => {
    expect(evaluateStepRatios(5, 0, 1, 1)).toMatchObject({
      reflectedForce: -1,
      transmittedForce: 0,
      transmittedStress: 0,
    })
    expect(evaluateStepRatios(5, Infinity, 1, 1)).toMatchObject({
      reflectedForce: 1,
      transmittedForce: 2,
      transmittedStress: 2,
    })
  })
})

describe(`steel into another material of the same area: ${STEEL_INTO.source}`, () => {
  const Z = (density: number, modulus: number) => Math.sqrt(density * modulus)
  for (const [density, modulus, ratio, R, T, ET] of STEEL_INTO.rows) {
    it(`density ${density}`, () => {
      const found = evaluateStepRatios(Z(7850, 207e9), Z(density, modulus), 1, 1)
      expect(Z(density, modulus) / Z(7850, 207e9) / ratio).toBeCloseTo(1, 8)
      expect(found.reflectedForce).toBeCloseTo(R, 9)
      expect(found.transmittedForce).toBeCloseTo(T, 8)
      expect(found.transmittedEnergy).toBeCloseTo(ET, 9)
    })
  }

  it('passes whole where the areas match the impedances: steel to aluminium at 2.95548329', () => {
    const found = evaluateStepRatios(Z(7850, 207e9), 2.95548329 * Z(2700, 68.9e9), 1, 2.95548329)
    expect(Math.abs(found.reflectedForce)).toBeLessThan(1e-9)
  })

  it('silver to gold at equal areas, a textbook problem', () => {
    const [silver, gold] = [Z(10500, 83e9), Z(19300, 78e9)]
    expect(silver / gold).toBeCloseTo(0.760865233, 9)
    const found = evaluateStepRatios(silver, gold, 1, 1)
    expect(found.transmittedStress).toBeCloseTo(1.13580526, 8)
    expect(1 - found.reflectedForce).toBeCloseTo(0.864194736, 9)
    expect(-found.reflectedForce).toBeCloseTo(-0.135805264, 9)
  })
})
