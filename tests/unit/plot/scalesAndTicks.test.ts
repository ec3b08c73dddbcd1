import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { makeLinearScale } from '../../../src-renderer/plot/linearScale'
import { listTicks, roundUpLimit } from '../../../src-renderer/plot/listTicks'

describe('linear scale', () => {
  it('puts time upright', () => {
    const scale = makeLinearScale(0, 1e-3, 380, 0)
    expect(scale.at(0)).toBe(380)
    expect(scale.at(2.5e-4)).toBe(285)
    expect(scale.valueAt(95)).toBeCloseTo(7.5e-4, 15)
  })
})

describe('ticks', () => {
  it('number a bar of 1660 mm in steps of 200', () => {
    const { major, minor, step, places } = listTicks(0, 1660, 9)
    expect(step).toBe(200)
    expect(places).toBe(0)
    expect(major).toEqual([0, 200, 400, 600, 800, 1000, 1200, 1400, 1600])
    expect(minor.slice(0, 4)).toEqual([50, 100, 150, 250])
  })

  it('number a millisecond in tenths, each exactly', () => {
    expect(listTicks(0, 1, 10).major).toEqual([0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1])
    expect(listTicks(0, 1, 10).places).toBe(1)
  })

  it('take either order, and ranges across zero without a negative zero', () => {
    expect(listTicks(350, -350, 4).major).toEqual([-200, 0, 200])
    expect(Object.is(listTicks(-1, 1, 4).major[2], 0)).toBe(true)
  })

  it('are few, inside, ascending and whole multiples at any range', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e6, max: 1e6, noNaN: true }),
        fc.double({ min: 1e-6, max: 1e6, noNaN: true }),
        fc.integer({ min: 2, max: 12 }),
        (from, width, wanted) => {
          // A ruler far from its origin loses digits of its own; the sheet's stay within nine.
          fc.pre(Math.abs(from) / width < 1e6)
          const to = from + width
          const { major, minor, step } = listTicks(from, to, wanted)
          expect(major.length).toBeLessThanOrEqual(wanted + 1)
          for (const value of [...major, ...minor]) {
            expect(value).toBeGreaterThanOrEqual(from - 1e-6 * step)
            expect(value).toBeLessThanOrEqual(to + 1e-6 * step)
          }
          major.forEach((value) =>
            expect(Math.abs(value / step - Math.round(value / step))).toBeLessThan(1e-6),
          )
          for (let i = 1; i < major.length; i++) expect(major[i] - major[i - 1]).toBeCloseTo(step, 6)
        },
      ),
    )
  })
})

describe('limit of a colour bar', () => {
  it.each([
    [326e6, 350e6],
    [350e6, 350e6],
    [0.0301, 0.035],
    [9.3, 10],
    [0, 1],
  ])('rounds %d up to %d', (largest, limit) => {
    expect(roundUpLimit(largest)).toBeCloseTo(limit, 12)
  })

  it('never cuts a value and never more than halves the map', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-12, max: 1e12, noNaN: true }), (largest) => {
        const limit = roundUpLimit(largest)
        expect(limit).toBeGreaterThanOrEqual(largest * (1 - 1e-9))
        expect(limit).toBeLessThanOrEqual(1.5 * largest * (1 + 1e-9))
      }),
    )
  })
})
