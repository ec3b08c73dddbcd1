import { describe, expect, it } from 'vitest'
import { evaluateCosine } from '../../../../../src-main/engine/answers/harmonic/evaluateCosine'
import { evaluateSineShare } from '../../../../../src-main/engine/answers/harmonic/evaluateSineShare'

describe('cosine and sine of a phase whose square may be negative', () => {
  it('agree with the library on both sides of zero and of the end of the series', () => {
    for (const size of [1e-6, 0.01, 0.2499, 0.2501, 3, 20]) {
      const K = Math.sqrt(size)
      expect(evaluateCosine(size)).toBeCloseTo(Math.cos(K), 14)
      expect(evaluateSineShare(size)).toBeCloseTo(Math.sin(K) / K, 14)
      expect(evaluateCosine(-size) / Math.cosh(K)).toBeCloseTo(1, 14)
      expect(evaluateSineShare(-size) / (Math.sinh(K) / K)).toBeCloseTo(1, 14)
    }
    expect(evaluateCosine(0)).toBe(1)
    expect(evaluateSineShare(0)).toBe(1)
  })
})
