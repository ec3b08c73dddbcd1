import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { countRainflow } from '../../../../../src-main/engine/answers/fatigue/countRainflow'
import { findTurningPoints } from '../../../../../src-main/engine/answers/fatigue/findTurningPoints'
import { makeRepeatable } from '../../../../../src-main/engine/answers/fatigue/makeRepeatable'

/** Whole numbers, so that ranges are exact and sums can be compared for equality. */
const histories = fc.array(fc.integer({ min: -20, max: 20 }), { minLength: 1, maxLength: 60 })

/** Counts by range, ascending. */
function sumByRange(history: number[], smallest = 0): [range: number, count: number][] {
  const sums = new Map<number, number>()
  for (const { range, count } of countRainflow(history, smallest))
    sums.set(range, (sums.get(range) ?? 0) + count)
  return [...sums].sort(([one], [other]) => one - other)
}

describe('rainflow counting', () => {
  it("counts the standard's worked example", () => {
    // ASTM E1049-85, worked example of section 5.4.4 (values and outcome from memory; recounted by hand by the
    // rule: A-B 3 half, B-C 4 half, E-F 4 whole, C-D 8 half, then D-G 9, G-H 8 and H-I 6 left over as halves).
    const history = [-2, 1, -3, 5, -1, 3, -4, 4, -2]
    expect(countRainflow(history)).toEqual([
      { range: 3, mean: -0.5, count: 0.5, from: 0, to: 1 },
      { range: 4, mean: -1, count: 0.5, from: 1, to: 2 },
      { range: 4, mean: 1, count: 1, from: 4, to: 5 },
      { range: 8, mean: 1, count: 0.5, from: 2, to: 3 },
      { range: 9, mean: 0.5, count: 0.5, from: 3, to: 6 },
      { range: 8, mean: 0, count: 0.5, from: 6, to: 7 },
      { range: 6, mean: 1, count: 0.5, from: 7, to: 8 },
    ])
    expect(sumByRange(history)).toEqual([
      [3, 0.5],
      [4, 1.5],
      [6, 0.5],
      [8, 1],
      [9, 0.5],
    ])
  })

  it("counts the standard's example of a repeating history as whole cycles", () => {
    // ASTM E1049-85, worked example of section 5.4.5 (from memory), the same points from the peak D on; recounted
    // by hand: E-F 4, A-B 3, H-C 7 and D-G 9, each once. A stands twice where one repetition meets the next.
    const repeated = makeRepeatable([-2, 1, -3, 5, -1, 3, -4, 4, -2])
    expect(repeated).toEqual([5, -1, 3, -4, 4, -2, -2, 1, -3, 5])
    expect(sumByRange(repeated)).toEqual([
      [3, 1],
      [4, 1],
      [7, 1],
      [9, 1],
    ])
  })

  it('counts nothing where nothing moves', () => {
    expect(countRainflow([])).toEqual([])
    expect(countRainflow([7])).toEqual([])
    expect(countRainflow(new Float64Array(5))).toEqual([])
    expect(makeRepeatable([])).toEqual([])
    expect(countRainflow(makeRepeatable([3, 3, 3]))).toEqual([])
  })

  it('counts a single way as half a cycle, and there and back as two halves', () => {
    expect(sumByRange([0, 10])).toEqual([[10, 0.5]])
    expect(sumByRange([0, 10, 0])).toEqual([[10, 1]])
  })

  it('counts a small cycle inside a large one apart, and drops it on request', () => {
    expect(sumByRange([0, 10, 9, 10, 0])).toEqual([
      [1, 1],
      [10, 1],
    ])
    expect(sumByRange([0, 10, 9, 10, 0], 1)).toEqual([[10, 1]])
  })

  it('adds up: half a count for each range between turns, and the whole way gone', () => {
    fc.assert(
      fc.property(histories, (history) => {
        const points = findTurningPoints(history)
        const cycles = countRainflow(history)
        expect(cycles.reduce((sum, { count }) => sum + count, 0)).toBe((points.length - 1) / 2)
        let way = 0
        for (let i = 1; i < history.length; i++) way += Math.abs(history[i] - history[i - 1])
        expect(cycles.reduce((sum, { count, range }) => sum + 2 * count * range, 0)).toBe(way)
      }),
    )
  })

  it('finds the largest range of the history as its largest cycle', () => {
    fc.assert(
      fc.property(histories, (history) => {
        const largest = Math.max(0, ...countRainflow(history).map(({ range }) => range))
        expect(largest).toBe(Math.max(...history) - Math.min(...history))
      }),
    )
  })

  it('keeps the ranges and turns the means where the history is turned over; means and indices belong together', () => {
    fc.assert(
      fc.property(histories, (history) => {
        const cycles = countRainflow(history)
        const turned = countRainflow(history.map((value) => -value))
        expect(turned.map(({ range, count, from, to }) => [range, count, from, to])).toEqual(
          cycles.map(({ range, count, from, to }) => [range, count, from, to]),
        )
        turned.forEach(({ mean }, i) => expect(mean + cycles[i].mean).toBe(0))
        for (const { from, to, range, mean } of cycles) {
          expect(from).toBeLessThan(to)
          expect(Math.abs(history[to] - history[from])).toBe(range)
          expect((history[to] + history[from]) / 2).toBe(mean)
        }
      }),
    )
  })

  it('sees neither plateaus nor points on the way', () => {
    fc.assert(
      fc.property(histories, (history) => {
        const slow = history.flatMap((value, i) => [value, value, (value + (history[i + 1] ?? value)) / 2])
        expect(sumByRange(slow)).toEqual(sumByRange(history))
      }),
    )
  })

  it('counts a repeated history in whole cycles, the same from wherever it starts', () => {
    fc.assert(
      fc.property(histories, fc.nat(59), (history, by) => {
        const start = by % history.length
        const rotated = [...history.slice(start), ...history.slice(0, start)]
        const sums = sumByRange(makeRepeatable(history))
        expect(sumByRange(makeRepeatable(rotated))).toEqual(sums)
        for (const [, count] of sums) expect(Number.isInteger(count)).toBe(true)
      }),
    )
  })

  it('agrees with removing inner ranges one by one, in any order, where the history repeats', () => {
    fc.assert(
      fc.property(histories, (history) => {
        expect(sumByRange(makeRepeatable(history))).toEqual(removeInner(makeRepeatable(history)))
      }),
    )
  })
})

/**
 * A second way to the count of a history that starts and ends at its largest value: as long as there
 * is one, take out the smallest range between two turns as a whole cycle.
 */
function removeInner(history: number[]): [range: number, count: number][] {
  const values = findTurningPoints(history).map((i) => history[i])
  const sums = new Map<number, number>()
  while (values.length > 1) {
    let at = 0
    for (let i = 1; i + 1 < values.length; i++)
      if (Math.abs(values[i + 1] - values[i]) < Math.abs(values[at + 1] - values[at])) at = i
    const range = Math.abs(values[at + 1] - values[at])
    sums.set(range, (sums.get(range) ?? 0) + 1)
    // At the ends one of the two is the largest value, which stays.
    if (at === 0) values.splice(1, 2)
    else values.splice(at + 2 === values.length ? at - 1 : at, 2)
  }
  return [...sums].sort(([one], [other]) => one - other)
}
