import { describe, expect, it } from 'vitest'
import { listFatigue } from '../../../../../src-main/engine/answers/fatigue/listFatigue'
import { makePlainLine } from '../makePlainLine'
import { makeShaft, ROUND_FATIGUE, TIRING } from './makeFatigueLine'

const line = makeShaft()
const plain = { bar: 0, section: 0, span: 0, position: 2, kt: null }
const answer = (history: number[], kt: number | null = null) =>
  listFatigue(line, [{ ...plain, kt }], () => Float64Array.from(history))[0]

describe('impacts to failure', () => {
  it('counts one push and release per impact as one whole cycle', () => {
    // Range 1 GPa, amplitude 0.5 GPa: 512 cycles by hand.
    const found = answer([0, 0, -1e9, -1e9, 0, 0])
    expect(found).toMatchObject({
      bar: 'shaft',
      section: 0,
      at: 0.01,
      kt: null,
      ...ROUND_FATIGUE,
      amplitude: 0.5e9,
      cycles: 1,
    })
    expect(found.damage * 512).toBeCloseTo(1, 12)
    expect(found.impacts! / 512).toBeCloseTo(1, 12)
    expect(found.largest).toHaveLength(1)
    expect(found.largest[0]).toMatchObject({ range: 1e9, mean: -0.5e9, count: 1 })
  })

  it('counts the largest range as whole, since the next impact brings it back', () => {
    // 0, -0.5, +0.5, 0 GPa: a count from rest alone would call the range of 1 GPa a half cycle.
    const found = answer([0, -0.5e9, 0.5e9, 0])
    expect(found.cycles).toBe(1)
    expect(found.impacts! / 512).toBeCloseTo(1, 12)
  })

  it('adds up inner cycles by Miner', () => {
    // 0 -1 -0.5 -1 0 GPa: 1 GPa once (512) and 0.5 GPa once (524288).
    const found = answer([0, -1e9, -0.5e9, -1e9, 0])
    expect(found.cycles).toBe(2)
    expect(found.impacts! * (1 / 512 + 1 / 524288)).toBeCloseTo(1, 12)
    expect(found.largest.map(({ range, count }) => [range, count])).toEqual([
      [1e9, 1],
      [0.5e9, 1],
    ])
    expect(found.largest[1].damage * 524288).toBeCloseTo(1, 12)
  })

  it('multiplies by the fillet factor', () => {
    const found = answer([0, -0.5e9, 0], 2)
    expect(found.amplitude).toBe(0.5e9)
    expect(found.impacts! / 512).toBeCloseTo(1, 12)
  })

  it('merges equal ranges, and sums all of them beyond the ten rows', () => {
    const equal = answer([0, ...Array.from({ length: 50 }, () => [-1e9, 0]).flat()])
    expect(equal.largest).toHaveLength(1)
    expect(equal.largest[0].count).toBe(50)
    expect((equal.impacts! * 50) / 512).toBeCloseTo(1, 12)
    // Ranges 1, 2 .. 12 MPa from zero.
    const many = answer([0, ...Array.from({ length: 12 }, (_, i) => [-(i + 1) * 1e6, 0]).flat()])
    expect(many.cycles).toBe(12)
    expect(many.largest.map(({ range }) => range / 1e6)).toEqual([12, 11, 10, 9, 8, 7, 6, 5, 4, 3])
    const damage = Array.from({ length: 12 }, (_, i) => 2 * (((i + 1) * 1e6) / 2e9) ** 10).reduce(
      (a, b) => a + b,
    )
    expect(many.damage / damage).toBeCloseTo(1, 12)
  })

  it('takes rounding for no load', () => {
    const dusty = answer([0, -1e9, -1e9 + 1e-7, -1e9, 1e-7, 0, 1e-7])
    expect(dusty.cycles).toBe(1)
  })

  it('tells how much of the damage the first half of the run does', () => {
    const found = answer([0, -1e9, 0, 0, -1e9, 0, 0])
    expect(found.damageFirstHalf / found.damage).toBeCloseTo(0.5, 12)
  })

  it('has no number of impacts where no cycle does damage', () => {
    expect(answer([0, 0, 0])).toMatchObject({
      cycles: 0,
      damage: 0,
      impacts: null,
      amplitude: 0,
      largest: [],
    })
    expect(answer([5e6, 5e6])).toMatchObject({ damage: 0, impacts: null })
    // (1e-40)^10 lies below the smallest number.
    expect(answer([0, -1e-30, 0])).toMatchObject({ cycles: 1, damage: 0, impacts: null })
  })

  it('answers a fraction of an impact, finite, over the strength', () => {
    expect(answer([0, -3e9, 0])).toMatchObject({ damage: 2, impacts: 0.5 })
  })

  it('takes the most damaged place of each bar, not the one with the largest range', () => {
    const pair = makePlainLine({
      bars: ['one', 'two'].map((name) => ({
        name,
        sections: [1, 2].map(() => ({ length: 0.02, diameter: 0.02, material: TIRING })),
      })),
    })
    const places = [0, 1, 2].map((span) => ({
      bar: span < 2 ? 0 : 1,
      section: span % 2,
      span,
      position: 0,
      kt: null,
    }))
    // One cycle of 1 GPa lasts 512 impacts; three of 0.95 GPa last 512 / 0.95^10 / 3 = 285.0.
    const histories = [
      [0, -1e9, 0],
      [0, -0.95e9, 0, -0.95e9, 0, -0.95e9, 0],
      [0, -0.1e9, 0],
    ]
    const found = listFatigue(pair, places, ({ span }) => Float64Array.from(histories[span]))
    expect(found.map(({ bar, section }) => [bar, section])).toEqual([
      ['one', 1],
      ['two', 0],
    ])
    expect(found[0].impacts! / (512 / 0.95 ** 10 / 3)).toBeCloseTo(1, 12)
    expect(listFatigue(pair, [], () => new Float64Array(1))).toEqual([])
  })
})
