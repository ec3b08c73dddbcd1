import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { evaluateBasquin } from '../../../../../src-main/engine/answers/fatigue/evaluateBasquin'
import { evaluateDamage } from '../../../../../src-main/engine/answers/fatigue/evaluateDamage'
import { ROUND_FATIGUE } from './makeFatigueLine'

describe('fatigue line', () => {
  it('lasts half a cycle, one reversal, at the strength coefficient', () => {
    expect(evaluateBasquin(1e9, -0.1, 1e9)).toBe(0.5)
  })

  it('lasts 512 cycles at half the strength with exponent -0.1', () => {
    // By hand: 0.5 * (1/2)^-10 = 0.5 * 1024.
    expect(evaluateBasquin(1e9, -0.1, 0.5e9)).toBeCloseTo(512, 9)
  })

  it('lasts 2 million cycles at a quarter with exponent -1/11', () => {
    // By hand: 0.5 * 4^11 = 2^21 = 2097152.
    expect(evaluateBasquin(800e6, -1 / 11, 200e6) / 2097152).toBeCloseTo(1, 12)
  })

  it('lasts for ever without stress', () => {
    expect(evaluateBasquin(1e9, -0.1, 0)).toBe(Infinity)
  })

  it('gives back the amplitude: strength (2 N)^exponent', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 1, noNaN: true }),
        fc.double({ min: -0.3, max: -0.03, noNaN: true }),
        (share, exponent) => {
          const N = evaluateBasquin(1e9, exponent, share * 1e9)
          // A power of up to 33 multiplies rounding by as much.
          expect((2 * N) ** exponent / share).toBeCloseTo(1, 12)
        },
      ),
    )
  })
})

describe('damage', () => {
  it('sums count / N', () => {
    // Range 1 GPa: 512 cycles. Range 0.5 GPa: amplitude a quarter, 0.5 * 4^10 = 524288 cycles.
    const cycles = [
      { range: 1e9, count: 1 },
      { range: 1e9, count: 0.5 },
      { range: 0.5e9, count: 4 },
    ]
    expect(evaluateDamage(cycles, ROUND_FATIGUE) / (1.5 / 512 + 4 / 524288)).toBeCloseTo(1, 12)
  })

  it('is zero without cycles, or where they have no range', () => {
    expect(evaluateDamage([], ROUND_FATIGUE)).toBe(0)
    expect(evaluateDamage([{ range: 0, count: 1 }], ROUND_FATIGUE)).toBe(0)
  })

  it('stays finite over the strength: at most two per cycle', () => {
    expect(evaluateDamage([{ range: 2e15, count: 1 }], { strength: 1, exponent: -0.01 })).toBe(2)
  })
})
