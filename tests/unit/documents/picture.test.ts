import { describe, expect, test } from 'vitest'
import { coarsenField } from '../../../src-main/documents/picture/coarsenField'
import { makeColourMap, SHADES } from '../../../src-main/documents/picture/colourMap'
import { drawPath } from '../../../src-main/documents/picture/drawPath'
import { findOverlaps } from '../../../src-main/documents/picture/findOverlaps'
import { findRange } from '../../../src-main/documents/picture/findRange'
import { listTicks } from '../../../src-main/documents/picture/listTicks'
import { mergeStretches } from '../../../src-main/documents/picture/mergeStretches'
import { makeScale } from '../../../src-main/documents/picture/scale'
import { thinByExtremes } from '../../../src-main/documents/picture/thinByExtremes'

test('a scale maps both ends and an axis without length is opened', () => {
  const scale = makeScale([0, 2], [100, 0])
  expect([scale.place(0), scale.place(1), scale.place(2)]).toEqual([100, 50, 0])
  const opened = makeScale([3, 3], [0, 10])
  expect(opened.place(3)).toBe(5)
})

test('ticks are round and lie within the axis', () => {
  expect(listTicks(0, 1200, 10)).toEqual([0, 200, 400, 600, 800, 1000, 1200])
  expect(listTicks(-7, 7, 5)).toEqual([-5, 0, 5])
  expect(listTicks(0.31, 0.34, 3).map((tick) => Number(tick.toFixed(4)))).toEqual([0.31, 0.32, 0.33, 0.34])
})

test('a range holds all values and zero', () => {
  const [from, to] = findRange([[1, 2], [5]])
  expect(from).toBeLessThanOrEqual(0)
  expect(to).toBeGreaterThanOrEqual(5)
  expect(findRange([[0, 0]])).toEqual([-1, 1])
})

test('a path has a move and lines, to a hundredth', () => {
  const scale = makeScale([0, 1], [0, 100])
  expect(
    drawPath(
      [
        [0, 0],
        [1 / 3, 1],
      ],
      scale,
      scale,
    ),
  ).toBe('M0 0L33.33 100')
})

describe('thinning', () => {
  test('keeps the one sample that is a peak, and the order', () => {
    const x = Array.from({ length: 40_000 }, (_none, i) => i)
    const y = x.map((i) => (i === 12_345 ? 7 : i === 31_000 ? -3 : 0))
    const kept = thinByExtremes(x, y, 400)
    expect(kept).toContain(12_345)
    expect(kept).toContain(31_000)
    expect(kept.length).toBeLessThanOrEqual(4 * 401)
    expect(kept).toEqual([...kept].sort((a, b) => a - b))
    expect(kept[0]).toBe(0)
    expect(kept[kept.length - 1]).toBe(39_999)
  })
  test('leaves a short trace alone', () =>
    expect(thinByExtremes([0, 1, 2], [1, 2, 3], 10)).toEqual([0, 1, 2]))
})

describe('coarse field', () => {
  const field = {
    x: Array.from({ length: 1001 }, (_none, i) => i / 1000),
    t: Array.from({ length: 501 }, (_none, j) => j / 1000),
    stress: Array.from({ length: 501 }, (_row, j) =>
      Array.from({ length: 1001 }, (_none, i) => (j === 250 && i === 777 ? -9 : 1)),
    ),
  }
  test('a single narrow peak stays where it is, with its sign', () => {
    const coarse = coarsenField(field, 50, 25)!
    expect(coarse.largest).toBe(9)
    expect(coarse.stress[12][38]).toBe(-9)
    expect(coarse.stress.flat().filter((value) => value === -9).length).toBe(1)
    expect(coarse.x).toHaveLength(51)
  })
  test('a coarse field is never finer than the field, and no field makes none', () => {
    expect(
      coarsenField(
        {
          x: [0, 1, 2],
          t: [0, 1],
          stress: [
            [1, 2, 3],
            [4, 5, 6],
          ],
        },
        50,
        50,
      )!.x,
    ).toEqual([0, 1, 2])
    expect(coarsenField({ x: [], t: [], stress: [] }, 50, 50)).toBeNull()
  })
})

test.each(['light', 'dark'] as const)('the %s colour map runs through its stops', (scheme) => {
  const map = makeColourMap(scheme)
  const stops = {
    light: ['#1e5099', '#78a2cf', '#fbfaf6', '#dca377', '#b45600'],
    dark: ['#61b2f4', '#2f6789', '#15191e', '#86632a', '#f5ad53'],
  }[scheme]
  expect(map).toHaveLength(SHADES)
  expect([0, 5, 10, 15, 20].map((i) => map[i])).toEqual(stops)
  expect(new Set(map).size).toBe(SHADES)
})

test('opposite waves overlap where both pass, and touching ends are none', () => {
  const pulse = (direction: 'right' | 'left', from: number, to: number) => ({
    direction,
    from,
    to,
    peakForce: 1,
    clear: false,
  })
  const pulses = [
    pulse('right', 0, 4),
    pulse('left', 1, 2),
    pulse('left', 3, 6),
    pulse('right', 5, 8),
    pulse('left', 8, 9),
  ]
  expect(findOverlaps(pulses)).toEqual([
    { from: 1, to: 2 },
    { from: 3, to: 4 },
    { from: 5, to: 6 },
  ])
  expect(findOverlaps(pulses.filter(({ direction }) => direction === 'left'))).toEqual([])
})

test('stretches that cannot be told apart become one', () => {
  const stretches = [
    { from: 0, to: 1 },
    { from: 1.5, to: 2 },
    { from: 4, to: 5 },
  ]
  expect(mergeStretches(stretches, 1)).toEqual([
    { from: 0, to: 2 },
    { from: 4, to: 5 },
  ])
  expect(mergeStretches(stretches, 0.1)).toEqual(stretches)
})
