import { describe, expect, it } from 'vitest'
import { evaluateShoulderFactor } from '../../../../src-main/engine/answers/evaluateShoulderFactor'
import { SHOULDER_FACTORS } from '../../../../src-main/engine/exact/published/shoulderFactors'

describe(`shoulder fillet: ${SHOULDER_FACTORS.source}`, () => {
  for (const [D, r, round, flat] of SHOULDER_FACTORS.rows) {
    it(`D/d = ${D}, r/d = ${r}`, () => {
      const at = (form: 'round' | 'flat') =>
        evaluateShoulderFactor({ larger: D, smaller: 1, radius: r, form })
      expect(at('round').kt).toBeCloseTo(round, 6)
      expect(at('flat').kt).toBeCloseTo(flat, 6)
      expect(at('round')).toMatchObject({ inRange: true, reason: '' })
    })
  }

  it('gives q = 2 to the low set, q just above to the high one', () => {
    // Both sets at q = 2, D/d = 1.5: 1.750208 low, 1.755358 high (recomputed from the coefficients).
    expect(evaluateShoulderFactor({ larger: 1.5, smaller: 1, radius: 0.125, form: 'round' }).kt).toBeCloseTo(
      1.750208,
      6,
    )
    expect(
      evaluateShoulderFactor({ larger: 1.5, smaller: 1, radius: 0.12499, form: 'round' }).kt,
    ).toBeCloseTo(1.7554, 3)
    // 1.2 and 0.05 as decimals give h/r = 1.9999999999999996 or 2.0000000000000004 by the way they are scaled.
    for (const unit of [1, 0.02, 0.0254, 3e-3])
      expect(
        evaluateShoulderFactor({ larger: 1.2 * unit, smaller: unit, radius: 0.05 * unit, form: 'round' }).kt,
      ).toBeCloseTo(2.018023, 6)
  })

  it('reaches from h/r = 0.1 to 20 and says so outside', () => {
    const at = (radius: number) => evaluateShoulderFactor({ larger: 3, smaller: 1, radius, form: 'round' })
    expect(at(10).inRange).toBe(true)
    expect(at(0.05).inRange).toBe(true)
    expect(at(10.1)).toEqual({ kt: null, inRange: false, reason: expect.stringContaining('h/r = 0.0990') })
    expect(at(0.049)).toEqual({ kt: null, inRange: false, reason: expect.stringContaining('h/r = 20.4') })
    expect(at(0).reason).toContain('sharp')
    expect(evaluateShoulderFactor({ larger: 1, smaller: 1, radius: 0.1, form: 'flat' }).reason).toContain(
      'no shoulder',
    )
  })
})
