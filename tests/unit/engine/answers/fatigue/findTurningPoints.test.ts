import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findTurningPoints } from '../../../../../src-main/engine/answers/fatigue/findTurningPoints'

const histories = fc.array(fc.integer({ min: -20, max: 20 }), { minLength: 1, maxLength: 60 })

describe('turning points', () => {
  it('names peaks and valleys with the first and the last point', () => {
    expect(findTurningPoints([0, 1, 2, 1, -1, 0])).toEqual([0, 2, 4, 5])
  })

  it('takes a plateau as one point, named where it is reached', () => {
    expect(findTurningPoints([0, 0, 3, 3, 3, 1, 1, 2, 2])).toEqual([0, 2, 5, 7])
  })

  it('has one point for a history that stands still, none for an empty one', () => {
    expect(findTurningPoints([4, 4, 4])).toEqual([0])
    expect(findTurningPoints([4])).toEqual([0])
    expect(findTurningPoints([])).toEqual([])
  })

  it('drops swings up to the smallest, and keeps the true extremes', () => {
    // The swings 5-4-6 and 6-5.5-6.5 go back by 1 and 0.5; the peak stays 6.5, and the valley at the end 0.5.
    const history = [0, 5, 4, 6, 5.5, 6.5, 1, 1.8, 0.5, 1.2]
    expect(findTurningPoints(history, 1)).toEqual([0, 5, 8])
    expect(findTurningPoints(history, 0.9)).toEqual([0, 1, 2, 5, 8])
  })

  it('drops a first swing before the history sets out', () => {
    expect(findTurningPoints([0, 0.5, -10], 1)).toEqual([1, 2])
    expect(findTurningPoints([0, 0.5, -0.4, 0.2], 1)).toEqual([0])
  })

  it('alternates by more than the smallest swing, and holds the largest and the smallest value', () => {
    fc.assert(
      fc.property(histories, fc.integer({ min: 0, max: 10 }), (history, smallest) => {
        const points = findTurningPoints(history, smallest)
        const values = points.map((i) => history[i])
        for (let i = 1; i < points.length; i++) {
          expect(points[i]).toBeGreaterThan(points[i - 1])
          expect(Math.abs(values[i] - values[i - 1])).toBeGreaterThan(smallest)
          if (i > 1) expect((values[i] - values[i - 1]) * (values[i - 1] - values[i - 2])).toBeLessThan(0)
        }
        const [low, high] = [Math.min(...history), Math.max(...history)]
        if (high - low <= smallest) expect(points).toEqual([0])
        else expect([Math.min(...values), Math.max(...values)]).toEqual([low, high])
      }),
    )
  })
})
