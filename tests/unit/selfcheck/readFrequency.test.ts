import { describe, expect, it } from 'vitest'
import { readFrequency } from '../../../src-main/selfcheck/readFrequency'

const sample = (f: (k: number) => number) => Float64Array.from({ length: 400 }, (_, k) => f(k))

describe('readFrequency', () => {
  it('finds the frequency of one harmonic to rounding, whatever the phase', () => {
    for (const w of [0.05, 0.06, 0.075])
      for (const phase of [0, 1, 2])
        expect(
          readFrequency(
            sample((k) => Math.cos(w * k + phase)),
            25,
          ),
        ).toBeCloseTo(w, 12)
  })

  it('is little moved by a faint harmonic beside it', () => {
    const w = 0.06
    const found = readFrequency(
      sample((k) => Math.cos(w * k) + 1e-3 * Math.cos(2.7 * w * k + 1)),
      25,
    )
    expect(Math.abs(found / w - 1)).toBeLessThan(1e-5)
  })
})
