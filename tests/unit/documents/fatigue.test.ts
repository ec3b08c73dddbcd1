// @vitest-environment jsdom
import { expect, test } from 'vitest'
import type { FatigueAnswer } from '../../../src-main/contract/result'
import { drawFatiguePart } from '../../../src-main/documents/report/drawFatiguePart'
import { makeFatigueCyclesTable, makeFatigueTable } from '../../../src-main/documents/tables/fatigueTables'

const answer = (parts: Partial<FatigueAnswer> = {}): FatigueAnswer => ({
  bar: 'shaft',
  section: 1,
  at: 0.8,
  kt: 1.97,
  strength: 1.2e9,
  exponent: -0.09,
  amplitude: 245e6,
  cycles: 12,
  largest: [
    { range: 490e6, mean: -10e6, count: 2, damage: 1e-6 },
    { range: 90e6, mean: 0, count: 10, damage: 3e-13 },
  ],
  damage: 1.0000003e-6,
  damageFirstHalf: 0.5e-6,
  impacts: 999999.7,
  ...parts,
})

test('impacts to failure stand beside where and from what', () => {
  const table = makeFatigueTable([answer()])
  expect(table.headings).toEqual([
    'section',
    'at [mm]',
    'Kt',
    'local amplitude [MPa]',
    'cycles per impact',
    'damage per impact',
    'impacts to failure',
  ])
  expect(table.rows).toEqual([
    ['shaft, section 2', '800.0', '1.970', '245.0', '12', '1.000 × 10⁻⁶', '1.000 × 10⁶'],
  ])
  expect(table.alarm).toEqual([false])
})

test('a short life is not lost beside a very long one, nor a small damage beside a large one', () => {
  const table = makeFatigueTable([
    answer({ damage: 1 / 40, impacts: 40 }),
    answer({ damage: 2e-21, impacts: 5e20 }),
  ])
  expect(table.rows.map((row) => row.slice(-2))).toEqual([
    ['0.02500', '40.00'],
    ['2.000 × 10⁻²¹', '5.000 × 10²⁰'],
  ])
  const [large, small] = makeFatigueCyclesTable([
    answer({ largest: [{ ...answer().largest[0], damage: 1 }, answer().largest[1]] }),
  ]).rows
  expect(large.at(-1)).toBe('1.000')
  expect(small.at(-1)).toBe('3.000 × 10⁻¹³')
})

test('a bar that breaks at the first impact is marked, one without damage says so', () => {
  const table = makeFatigueTable([
    answer({ impacts: 0.5 }),
    answer({ impacts: null, damage: 0 }),
    answer({ impacts: 1 }),
  ])
  expect(table.alarm).toEqual([true, false, false])
  expect(table.rows.map((row) => row.at(-1))).toEqual([
    'under 1: BREAKS at the first',
    'no damaging cycle',
    '1.000',
  ])
})

test('the report tells the rule, the line and the largest cycles, and escapes names', () => {
  const read = (fatigue: FatigueAnswer[]) =>
    new DOMParser().parseFromString(drawFatiguePart(fatigue).text, 'text/html').body
  const page = read([answer({ bar: '<b>x</b>' })])
  expect(page.querySelector('b')).toBeNull()
  expect(page.querySelectorAll('table')).toHaveLength(2)
  expect(page.textContent).toContain('<b>x</b>, section 2: strength 1200 MPa, exponent −0.09000.')
  expect(read([]).textContent).toContain('no material of the rig has a fatigue line')
})
