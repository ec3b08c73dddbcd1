import { parse } from 'csv-parse/sync'
import { expect, test } from 'vitest'
import { writeCsv } from '../../../src-main/documents/writeCsv'
import { writeEnvelopeCsv } from '../../../src-main/documents/writeEnvelopeCsv'
import { writeGaugesCsv } from '../../../src-main/documents/writeGaugesCsv'
import { writeSectionsCsv } from '../../../src-main/documents/writeSectionsCsv'
import { makeTestResult } from './makeTestResult'

const join = (parts: Iterable<string>): string => [...parts].join('')
const read = (parts: Iterable<string>): string[][] => parse(join(parts)) as string[][]

test.each(["=cmd|' /C calc'!A0", '+1+1', '-1+1', '@SUM(A1)', '\t=1', '＝1'])(
  'the text %j is no formula to a spreadsheet',
  (text) => expect(read(writeCsv([text], 1, () => [text]))).toEqual([[`'${text}`], [`'${text}`]]),
)

test('quotes, commas and line breaks in a name stay within its cell', () => {
  const name = 'a "b", c\nd'
  expect(read(writeCsv(['name'], 1, () => [name]))).toEqual([['name'], [name]])
})

test('numbers stand in full and negative ones are not touched', () => {
  const values = [-250.5e6, 0.1 + 0.2, -1e-300, 5e-324, 1.7976931348623157e308, -0]
  const [, row] = read(writeCsv(values.map(String), 1, () => values))
  expect(row.map(Number)).toEqual(values.map((value) => value + 0))
  expect(row[0]).toBe('-250500000')
})

test('a table longer than one part has every row once', () => {
  const rows = read(writeCsv(['i'], 1234, (i) => [i]))
  expect(rows.slice(1).map(([cell]) => Number(cell))).toEqual(Array.from({ length: 1234 }, (_none, i) => i))
})

test('the envelope keeps both faces of a step', () => {
  const { envelope } = makeTestResult()
  const rows = read(writeEnvelopeCsv(envelope))
  expect(rows[0]).toEqual([
    'x [m]',
    'tension [Pa]',
    'tension time [s]',
    'compression [Pa]',
    'compression time [s]',
  ])
  expect(rows.slice(1).map(([x]) => Number(x))).toEqual(envelope.x)
  expect(rows.slice(1).map((row) => Number(row[3]))).toEqual(envelope.compression)
  expect(rows.slice(1).map((row) => Number(row[4]))).toEqual(envelope.compressionTime)
})

test('gauges share one column of time; only those with a bridge have its column', () => {
  const [gauge] = makeTestResult().gauges
  const second = { ...gauge, name: '=G2', bridge: gauge.force.map((force) => force / 1e6) }
  const rows = read(writeGaugesCsv([gauge, second]))
  expect(rows[0]).toEqual([
    'time [s]',
    'G1 stress [Pa]',
    'G1 strain [1]',
    'G1 force [N]',
    'G1 velocity [m/s]',
    'G1 rightgoing force [N]',
    'G1 leftgoing force [N]',
    "'=G2 stress [Pa]",
    "'=G2 strain [1]",
    "'=G2 force [N]",
    "'=G2 velocity [m/s]",
    "'=G2 rightgoing force [N]",
    "'=G2 leftgoing force [N]",
    "'=G2 bridge [V]",
  ])
  expect(rows.length).toBe(gauge.t.length + 1)
  expect(rows.slice(1).map((row) => Number(row[13]))).toEqual(second.bridge)
})

test('gauges whose traces differ in length are a fault of the program', () => {
  const [gauge] = makeTestResult().gauges
  const short = { ...gauge, name: 'short', force: gauge.force.slice(1) }
  expect(() => join(writeGaugesCsv([short]))).toThrow('"short": force')
})

test('without gauges only the heading is left', () => expect(join(writeGaugesCsv([]))).toBe('time [s]\n'))

test('a section without an allowable has empty cells, not zeros', () => {
  const rows = read(writeSectionsCsv(makeTestResult().sections))
  const margin = rows[0].indexOf('compression margin [1]')
  expect(rows[0][1]).toBe('section (from 0)')
  expect(rows[1][margin]).toBe('')
  expect(Number(rows[2][margin])).toBe(makeTestResult().sections[1].compression.margin)
})
