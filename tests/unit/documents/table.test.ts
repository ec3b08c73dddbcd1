import { expect, test } from 'vitest'
import { makePulsesTable } from '../../../src-main/documents/tables/gaugeTables'
import { makePeaksTable } from '../../../src-main/documents/tables/peaksTable'
import { makeEndsTable } from '../../../src-main/documents/tables/jointTables'
import { makeRoundingTable } from '../../../src-main/documents/tables/lineTables'
import { makeTable } from '../../../src-main/documents/tables/table'
import { writeTextTable } from '../../../src-main/documents/tables/writeTextTable'
import { makeTestResult } from './makeTestResult'

test('a column has one unit, which its heading names', () => {
  const table = makeTable<number | null>(
    [{ heading: 'time', measures: 'time', value: (time) => time }],
    [4e-6, 2.5e-3, null],
  )
  expect(table.headings).toEqual(['time [ms]'])
  expect(table.rows).toEqual([['0.004000'], ['2.500'], ['none']])
})

test('columns of one quantity share their unit', () => {
  const table = makeTable<[number, number]>(
    [
      { heading: 'from', measures: 'time', value: ([from]) => from },
      { heading: 'to', measures: 'time', value: ([, to]) => to },
    ],
    [[4e-6, 2.5e-3]],
  )
  expect(table.headings).toEqual(['from [ms]', 'to [ms]'])
  expect(table.rows).toEqual([['0.004000', '2.500']])
})

test('what rounding leaves beside larger numbers reads 0; a column of small numbers stands', () => {
  const columns = [{ heading: 'stress', measures: 'stress' as const, value: (stress: number) => stress }]
  expect(makeTable(columns, [61e6, -9e-9, 1e-3]).rows).toEqual([['61.00'], ['0'], ['1.000 × 10⁻⁹']])
  expect(makeTable(columns, [-9e-9, 3e-9]).rows).toEqual([['−9.000 × 10⁻¹⁵'], ['3.000 × 10⁻¹⁵']])
})

test('a negative margin is marked, whichever section governs', () => {
  const result = makeTestResult()
  result.sections[2].tension.margin = -1e-9
  const table = makePeaksTable(result)
  expect(table.alarm).toEqual([false, false, false, false, true, false])
  expect(table.rows[4].slice(-2)).toEqual(['−1.000 × 10⁻⁹', 'NEGATIVE: over the limit'])
  expect(table.rows[3].slice(-1)).toEqual(['within the limit, governing'])
})

test('the peaks stand with the place and time of their local stress', () => {
  const { headings, rows } = makePeaksTable(makeTestResult())
  expect(headings.slice(2, 7)).toEqual(['peak [MPa]', 'Kt', 'local [MPa]', 'at [mm]', 'time [µs]'])
  expect(rows[3].slice(2, 7)).toEqual(['−250.5', 'none', '−250.5', '450.0', '99.00'])
})

test('an end says how long it pressed and how fast its mass is', () => {
  const { headings, rows } = makeEndsTable(makeTestResult().ends)
  expect(headings.slice(-2)).toEqual(['time with force [µs]', 'mass there moves at [m/s]'])
  expect(rows.map((row) => row.slice(-2))).toEqual([
    ['0', 'none'],
    ['120.0', '0.7500'],
  ])
})

test('the rounding of a travel time that is rounding of the machine reads 0', () => {
  const rows = [3.8e-14, -0.0021].map((error, section) => ({ bar: 'a', section, error }))
  expect(makeRoundingTable(rows).rows.map(([, share]) => share)).toEqual(['0 %', '−0.2100 %'])
})

test('only the first pulses of each gauge are listed where that is asked for', () => {
  const [gauge] = makeTestResult().gauges
  const gauges = [gauge, { ...gauge, name: 'G2' }]
  expect(makePulsesTable(gauges).rows).toHaveLength(4)
  expect(makePulsesTable(gauges, 1).rows.map(([name]) => name)).toEqual(['G1', 'G2'])
})

test('columns of a text table are aligned and no cell breaks a line', () => {
  const table = makeTable<[string, number]>(
    [
      { heading: 'name', measures: 'text', value: ([name]) => name },
      { heading: 'v', measures: 'velocity', value: ([, velocity]) => velocity },
    ],
    [
      ['µ', 1],
      ['two\nlines', -12.5],
    ],
  )
  expect(writeTextTable(table)).toBe(
    ['  name           v [m/s]', '  µ                1.000', '  two\\u{a}lines   −12.50', ''].join('\n'),
  )
})
