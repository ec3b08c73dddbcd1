import { describe, expect, it } from 'vitest'
import { evaluateBridge } from '../../../../src-main/engine/answers/evaluateBridge'

const bridge = { factor: 2, arms: 1, excitation: 5, gain: 100, poisson: null }

describe('bridge volts (the linear formula, common practice)', () => {
  it('counts arms along the bar once each: 1 millistrain on a quarter bridge of factor 2 is 0.5 mV per volt', () => {
    expect(evaluateBridge({ ...bridge, gain: 1, excitation: 1 }, 1e-3)).toBeCloseTo(0.5e-3, 15)
    expect(evaluateBridge(bridge, -1e-3)).toBeCloseTo(-0.25, 15)
    expect(evaluateBridge({ ...bridge, arms: 2 }, 1e-3)).toBeCloseTo(0.5, 15)
    expect(evaluateBridge({ ...bridge, arms: 4 }, 1e-3)).toBeCloseTo(1, 15)
  })

  it('counts the arms across with the Poisson ratio', () => {
    expect(evaluateBridge({ ...bridge, arms: 2, poisson: 0.3 }, 1e-3)).toBeCloseTo(0.25 * 1.3, 15)
    expect(evaluateBridge({ ...bridge, arms: 4, poisson: 0.3 }, 1e-3)).toBeCloseTo(0.25 * 2.6, 15)
    expect(evaluateBridge({ ...bridge, arms: 1, poisson: 0.3 }, 1e-3)).toBeCloseTo(0.25, 15)
  })
})
