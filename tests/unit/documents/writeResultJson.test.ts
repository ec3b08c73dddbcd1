import { expect, test } from 'vitest'
import type { Result } from '../../../src-main/contract/result'
import { writeResultJson } from '../../../src-main/documents/writeResultJson'
import { makeTestResult } from './makeTestResult'

const write = (result: Result): string => [...writeResultJson(result)].join('')

test('what is written is read back the same, to the last bit', () => {
  const result = makeTestResult()
  result.run.timeStep = 0.1 + 0.2
  result.energy.closure = Number.MIN_VALUE
  const text = write(result)
  expect(JSON.parse(text)).toEqual(result)
  expect(text.endsWith('}\n')).toBe(true)
  expect(text.endsWith('\n\n')).toBe(false)
})

test('the order of keys does not depend on how the result was put together', () => {
  const result = makeTestResult()
  const turned = turnKeys(result) as Result
  expect(Object.keys(turned)[0]).toBe('notice')
  expect(write(turned)).toBe(write(result))
  expect(Object.keys(JSON.parse(write(turned)))[0]).toBe('format')
})

function turnKeys(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(turnKeys)
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(
    Object.entries(value)
      .reverse()
      .map(([key, member]) => [key, turnKeys(member)]),
  )
}

test('typed arrays are written as lists', () => {
  const plain = makeTestResult()
  const typed = makeTestResult()
  typed.gauges[0].force = Float64Array.from(typed.gauges[0].force) as unknown as number[]
  typed.field.stress = typed.field.stress.map((row) => Float64Array.from(row) as unknown as number[])
  expect(write(typed)).toBe(write(plain))
})

test('a row of the field, a trace and a section take one line each', () => {
  const result = makeTestResult()
  const lines = write(result).split('\n')
  const rows = lines.indexOf('    "stress": [')
  expect(lines[rows + 1]).toMatch(/^ {6}\[0,-240000000,.*\],$/)
  expect(lines[rows + result.field.t.length + 1]).toBe('    ]')
  expect(lines.filter((line) => line.startsWith('      "rightgoingForce": [')).length).toBe(1)
  expect(lines.filter((line) => line.includes('"bar": "shaft", "section": 1, "from"')).length).toBe(1)
})

test.each([
  ['result.momentum.closure', (result: Result) => (result.momentum.closure = NaN)],
  ['result.gauges[0].force', (result: Result) => (result.gauges[0].force[3] = Infinity)],
  ['result.field.stress[2]', (result: Result) => (result.field.stress[2][1] = -Infinity)],
  ['result.sections[1].tension.peak', (result: Result) => (result.sections[1].tension.peak = NaN)],
  ['result.extra', (result: Result) => Object.assign(result, { extra: 1 })],
  ['result.joints[0].colour', (result: Result) => Object.assign(result.joints[0], { colour: 'red' })],
  ['result.governing', (result: Result) => delete (result as Partial<Result>).governing],
])('%s is named where it cannot be written', (path, spoil) => {
  const result = makeTestResult()
  spoil(result)
  expect(() => write(result)).toThrow(`${path}:`)
})

test('empty lists and absent answers are written as such', () => {
  const result = { ...makeTestResult(), gauges: [], governing: null, striker: null, cautions: [] }
  const text = write(result)
  expect(JSON.parse(text)).toEqual(result)
  expect(text).toContain('\n  "gauges": [],\n')
})
