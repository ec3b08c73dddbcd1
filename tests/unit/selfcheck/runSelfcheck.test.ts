import { describe, expect, it } from 'vitest'
import type { Bench } from '../../../src-main/selfcheck/bench'
import type { Check } from '../../../src-main/selfcheck/check'
import { runSelfcheck } from '../../../src-main/selfcheck/runSelfcheck'

const noBench: Bench = {
  march: () => {
    throw new Error('not asked for')
  },
  solve: () => {
    throw new Error('not asked for')
  },
}

const make = (computed: number[], options: Partial<Check> = {}): Check => ({
  id: 'one',
  title: 'One',
  section: 1,
  source: 'a book',
  values: [
    { what: 'a', published: 2 },
    { what: 'b', published: 0, scale: 4 },
  ],
  tolerance: 0.01,
  reason: 'because',
  compute: () => computed,
  ...options,
})

const run = (...checks: Check[]) => [...runSelfcheck(checks, noBench)]

describe('runSelfcheck', () => {
  it('measures each value by its own size, or by its scale, and shows the worst', () => {
    expect(run(make([2.01, 0.03]))).toEqual([
      {
        id: 'one',
        title: 'One',
        section: 1,
        source: 'a book',
        tolerance: 0.01,
        reason: 'because',
        passed: true,
        what: 'b',
        published: 0,
        computed: 0.03,
        error: 0.0075,
        values: [
          { what: 'a', published: 2, computed: 2.01, error: expect.closeTo(0.005, 12) },
          { what: 'b', published: 0, computed: 0.03, error: 0.0075 },
        ],
      },
    ])
  })

  it('fails what is over the tolerance by the least', () => {
    expect(run(make([2, 0.04]))[0].passed).toBe(true)
    expect(run(make([2, 0.0400001]))[0].passed).toBe(false)
  })

  it.each([NaN, Infinity, -Infinity])('fails %d', (none) => {
    expect(run(make([none, 0]))[0]).toMatchObject({ passed: false, what: 'a' })
    expect(run(make([2, none]))[0]).toMatchObject({ passed: false, what: 'b' })
  })

  it('throws where a check does not compute all its values', () => {
    expect(() => run(make([2]))).toThrow('check one computes 1 numbers for 2 values')
  })

  it('computes one check at a time, so that a host can stop between two', () => {
    const done: string[] = []
    const checks = ['x', 'y', 'z'].map((id) =>
      make([2, 0], {
        id,
        compute: () => {
          done.push(id)
          return [2, 0]
        },
      }),
    )
    const outcomes = runSelfcheck(checks, noBench)
    expect(done).toEqual([])
    outcomes.next()
    expect(done).toEqual(['x'])
    outcomes.next()
    expect(done).toEqual(['x', 'y'])
  })
})
