import { describe, expect, test } from 'vitest'
import { chooseUnit } from '../../../src-main/documents/format/chooseUnit'
import { cleanLine } from '../../../src-main/documents/format/cleanLine'
import { formatMargin } from '../../../src-main/documents/format/formatMargin'
import { formatNumber } from '../../../src-main/documents/format/formatNumber'
import { formatQuantity } from '../../../src-main/documents/format/formatQuantity'
import { formatSection } from '../../../src-main/documents/format/formatSection'
import { formatTick } from '../../../src-main/documents/format/formatTick'
import { UNITS, type Quantity } from '../../../src-main/documents/format/quantity'

describe('formatNumber', () => {
  test.each([
    [0, '0'],
    [-0, '0'],
    [12, '12.00'],
    [12.3456, '12.35'],
    [-0.0012, '−0.001200'],
    [0.00012346, '0.0001235'],
    [999.96, '1000'],
    [9.9999, '10.00'],
    [123456, '123500'],
    [1234567, '1.235 × 10⁶'],
    [999999, '1.000 × 10⁶'],
    [3.14159e-16, '3.142 × 10⁻¹⁶'],
    [-2.5e-5, '−2.500 × 10⁻⁵'],
    [6.02214e23, '6.022 × 10²³'],
    [NaN, 'NaN'],
    [Infinity, 'Infinity'],
  ])('%s reads %s', (value, text) => expect(formatNumber(value)).toBe(text))

  test('never moves a number by more than half a unit of its fourth digit', () => {
    for (let power = -20; power <= 20; power++) {
      for (const mantissa of [1, 1.2345, 4.4445, 7.7777, 9.9994, 9.99951]) {
        const value = mantissa * 10 ** power
        const shown = readBack(formatNumber(value))
        expect(Math.abs(shown - value)).toBeLessThanOrEqual(0.5001e-3 * 10 ** power)
      }
    }
  })
})

/** Turns a formatted number back into one. */
function readBack(text: string): number {
  const [mantissa, power] = text.replace('−', '-').split(' × 10')
  const digits = [...(power ?? '⁰')].map((mark) => (mark === '⁻' ? '-' : '⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(mark))).join('')
  return Number(`${mantissa}e${digits}`)
}

describe('formatQuantity', () => {
  test.each([
    [425.31e6, 'stress', '425.3 MPa'],
    [-78_540, 'force', '−78.54 kN'],
    [0.8, 'length', '800.0 mm'],
    [96.1e-6, 'time', '96.10 µs'],
    [1e-3, 'time', '1.000 ms'],
    [0.9999999999e-3, 'time', '1.000 ms'],
    [1.2e-3, 'time', '1.200 ms'],
    [2.5, 'time', '2.500 s'],
    [0, 'time', '0 µs'],
    [12, 'velocity', '12.00 m/s'],
    [53.3, 'energy', '53.30 J'],
    [0.001, 'strain', '1000 µm/m'],
    [12_660, 'impedance', '12660 kg/s'],
    [0.3846, 'ratio', '0.3846'],
    [null, 'stress', 'none'],
  ] as [number | null, Quantity, string][])('%s as %s reads %s', (value, quantity, text) => {
    expect(formatQuantity(value, quantity)).toBe(text)
  })

  test('a unit once chosen serves all numbers of a column', () => {
    expect(chooseUnit('time', [1e-6, 4e-3, 2e-5]).name).toBe('ms')
    expect(chooseUnit('time', []).name).toBe('µs')
  })

  test('every kind has its units in ascending size', () => {
    for (const units of Object.values(UNITS)) {
      expect(units.length).toBeGreaterThan(0)
      expect(units.map((unit) => unit.size)).toEqual(units.map((unit) => unit.size).sort((a, b) => a - b))
    }
  })
})

test('a margin always shows its sign', () => {
  expect(formatMargin(0.35123)).toBe('+0.3512')
  expect(formatMargin(-0.12041)).toBe('−0.1204')
  expect(formatMargin(0)).toBe('0')
  expect(formatMargin(null)).toBe('none')
})

test('a margin a hair under zero never reads as zero or more', () => {
  expect(formatMargin(-1e-9)).toMatch(/^−/)
})

test('sections count from 1 for people', () => expect(formatSection('shaft', 0)).toBe('shaft, section 1'))

test('ticks carry no digits of rounding', () => {
  expect(formatTick(0.1 + 0.2)).toBe('0.3')
  expect(formatTick(-400)).toBe('−400')
})

test('text of a rig cannot move the cursor, start a line or turn the direction of writing', () => {
  expect(cleanLine('a\u001b[2Jb\nc\r\td\u202e\u2028\u009b')).toBe(
    'a\\u{1b}[2Jb\\u{a}c\\u{d}\\u{9}d\\u{202e}\\u{2028}\\u{9b}',
  )
  expect(cleanLine('Schaft Ø 20 µ − 好')).toBe('Schaft Ø 20 µ − 好')
})
