import { describe, expect, it } from 'vitest'
import { listSignMarks } from '../../../../src-renderer/sheet/field/draw/listSignMarks'
import { listSpells } from '../../../../src-renderer/sheet/field/listSpells'
import { readLimits, spreadLimits } from '../../../../src-renderer/sheet/field/readLimits'
import { reduceGrid } from '../../../../src-renderer/sheet/field/reduceGrid'

describe('spells of a contact', () => {
  it('are the rows with force', () => {
    const values = [0, 0, -5, 0, -5, -5, 0, 1e-9, 0, 7]
    expect(listSpells(values, 1e-6, 0, 10)).toEqual([
      { from: 2, to: 6 },
      { from: 8, to: 10 },
    ])
    expect(listSpells([Number.NaN, Number.NaN], 0, 0, 1)).toEqual([])
  })
})

describe('limits', () => {
  const peak = (allowable: number | null) => ({ allowable }) as never
  const sections = [
    { from: 0, to: 0.5, tension: peak(600), compression: peak(900) },
    { from: 0.5, to: 1, tension: peak(null), compression: peak(300) },
  ] as never

  it('take the factor of safety off', () => {
    expect(readLimits({ sections, factorOfSafety: 1.5 })).toEqual([
      { from: 0, to: 0.5, high: 400, low: -600 },
      { from: 0.5, to: 1, high: Infinity, low: -200 },
    ])
  })

  it('are spread by the middle of each column, also in a closer look', () => {
    const limits = readLimits({ sections, factorOfSafety: 1.5 })
    expect(Array.from(spreadLimits(limits, 0, 1, 4).low)).toEqual([-600, -600, -200, -200])
    expect(Array.from(spreadLimits(limits, 0.4, 0.6, 3).low)).toEqual([-600, -200, -200])
    expect(Array.from(spreadLimits(limits, -1, 0, 2).high)).toEqual([Infinity, Infinity])
  })
})

describe('the table of a field', () => {
  it('keeps the value of largest magnitude with its sign', () => {
    const values = Float32Array.of(-3, 1, 0, 2, -1, 1, 4, 4, NaN, NaN, NaN, NaN, 0, 0, NaN, NaN)
    const grid = { columns: 4, rows: 2, values }
    expect(reduceGrid(grid, 2, 1)).toEqual([[-3, 4]])
    expect(reduceGrid(grid, 2, 2)).toEqual([
      [-3, 4],
      [NaN, 0],
    ])
  })
})

describe('signs in the field', () => {
  it('stand where the field is of one sign, and not where it is weak or there is no bar', () => {
    const values = new Float32Array(2 * 40 * 40)
    for (let row = 0; row < 40; row++) {
      for (let column = 0; column < 40; column++) {
        const value = column < 10 ? -1 : column < 20 ? 0.05 : column < 30 ? 0.9 : Number.NaN
        values.fill(value, 2 * (row * 40 + column), 2 * (row * 40 + column) + 2)
      }
    }
    const marks = listSignMarks({ columns: 40, rows: 40, values }, 1, 4, 4)
    expect(marks).toEqual([
      { across: 0.125, up: 0.125, positive: false },
      { across: 0.625, up: 0.125, positive: true },
      { across: 0.125, up: 0.625, positive: false },
      { across: 0.625, up: 0.625, positive: true },
    ])
  })
})
