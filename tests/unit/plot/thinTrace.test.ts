import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findFrom, thinTrace } from '../../../src-renderer/plot/thinTrace'

describe('thinTrace', () => {
  it('keeps a spike of one sample among ten thousand', () => {
    const t = Float64Array.from({ length: 10_000 }, (_, i) => i)
    const values = new Float64Array(10_000)
    values[4567] = 1
    const kept = thinTrace(t, values, 0, 9999, 100)
    expect(kept).toContain(4567)
    expect(kept.length).toBeLessThanOrEqual(4 * 101)
  })

  it('keeps what joins the range to its outside', () => {
    const t = [0, 1, 2, 3, 4]
    expect(thinTrace(t, [0, 0, 0, 0, 0], 1.5, 2.5, 10)).toEqual([1, 2, 3])
  })

  it('keeps each column its extremes, in order, at any range', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 3, maxLength: 400 }),
        fc.integer({ min: 1, max: 40 }),
        (values, columns) => {
          const t = values.map((_, i) => i)
          const last = values.length - 1
          const kept = thinTrace(t, values, 0, last, columns)
          expect(kept[0]).toBe(0)
          expect(kept.at(-1)).toBe(last)
          for (let i = 1; i < kept.length; i++) expect(kept[i]).toBeGreaterThan(kept[i - 1])
          for (let column = 0; column < columns; column++) {
            const inside = (i: number) => Math.floor((i / last) * columns) === column
            const all = values.filter((_, i) => inside(i))
            const left = kept.filter(inside).map((i) => values[i])
            if (all.length === 0) continue
            expect(Math.max(...left)).toBe(Math.max(...all))
            expect(Math.min(...left)).toBe(Math.min(...all))
          }
        },
      ),
    )
  })
})

describe('findFrom', () => {
  it('finds the first sample at or after a time', () => {
    const t = [0, 1, 1, 2]
    expect([-1, 0, 0.5, 1, 1.5, 2, 3].map((time) => findFrom(t, time))).toEqual([0, 0, 1, 1, 3, 3, 4])
  })
})
