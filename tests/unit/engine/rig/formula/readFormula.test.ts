import { describe, expect, it } from 'vitest'
import type { DimensionName } from '../../../../../src-main/engine/rig/formula/dimension'
import { DIMENSIONS, isSameDimension } from '../../../../../src-main/engine/rig/formula/dimension'
import type { Formula, FormulaArguments } from '../../../../../src-main/engine/rig/formula/formula'
import { readFormula } from '../../../../../src-main/engine/rig/formula/readFormula'
import { HOSTILE_FORMULAS } from '../brokenRigs'

const VARIABLES = new Map([
  ['drop', { value: 1.5, dimension: DIMENSIONS.length.dimension }],
  ['ratio', { value: 0.25, dimension: DIMENSIONS.number.dimension }],
])

function read(text: string, args: FormulaArguments = 'none') {
  return readFormula(text, { variables: VARIABLES, arguments: args })
}

function good(text: string, args: FormulaArguments = 'none'): Formula {
  const reading = read(text, args)
  if (reading.formula === null) throw new Error(`${text}: ${reading.text?.message ?? 'no reason'}`)
  return reading.formula
}

function refusal(text: string, args: FormulaArguments = 'none'): string {
  const reading = read(text, args)
  return reading.formula === null ? `${reading.text?.code}: ${reading.text?.message}` : 'accepted'
}

/** Within one rounding of each of a few operations. */
function expectNear(value: number, expected: number): void {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(4 * Number.EPSILON * Math.abs(expected))
}

describe('readFormula', () => {
  // factors exact by definition: inch 25.4 mm and pound 0.45359237 kg (1959 agreement),
  // standard gravity 9.80665 m/s^2 (CGPM 1901); the rest is SI
  it.each<[string, number, DimensionName]>([
    ['25 mm', 0.025, 'length'],
    ['2.5 cm', 0.025, 'length'],
    ['-3e2 um', -3e-4, 'length'],
    ['3 µm', 3e-6, 'length'],
    ['3 μm', 3e-6, 'length'],
    ['.5 m', 0.5, 'length'],
    ['1/8 inch', 0.003175, 'length'],
    ['2 in', 0.0508, 'length'],
    ['2in', 0.0508, 'length'],
    ['2 in + 1 in', 0.0762, 'length'],
    ['3 ft', 0.9144, 'length'],
    ['10 mil', 0.000254, 'length'],
    ['400 mm^2', 4e-4, 'area'],
    ['400 mm²', 4e-4, 'area'],
    ['400 mm2', 4e-4, 'area'],
    ['7850 kg/m^3', 7850, 'density'],
    ['7850 kg/m³', 7850, 'density'],
    ['7.85 g/cm^3', 7850, 'density'],
    ['207 GPa', 207e9, 'stress'],
    ['700 MPa', 700e6, 'stress'],
    ['700 N/mm^2', 700e6, 'stress'],
    ['1 bar', 1e5, 'stress'],
    ['1 psi', (0.45359237 * 9.80665) / 0.0254 ** 2, 'stress'],
    ['30 ksi', (30e3 * 0.45359237 * 9.80665) / 0.0254 ** 2, 'stress'],
    ['30 Msi', (30e6 * 0.45359237 * 9.80665) / 0.0254 ** 2, 'stress'],
    ['10 kN', 1e4, 'force'],
    ['1 lbf', 0.45359237 * 9.80665, 'force'],
    ['1 kip', 453.59237 * 9.80665, 'force'],
    ['2 kg', 2, 'mass'],
    ['2 lbm', 0.90718474, 'mass'],
    ['2 lb', 0.90718474, 'mass'],
    ['1 slug', (0.45359237 * 9.80665) / 0.3048, 'mass'],
    ['3 tonne', 3000, 'mass'],
    ['50 us', 5e-5, 'time'],
    ['50 µs', 5e-5, 'time'],
    ['1.2 ms', 1.2e-3, 'time'],
    ['5 m/s', 5, 'velocity'],
    ['200 ft/s', 60.96, 'velocity'],
    ['9.81 m/s^2', 9.81, 'acceleration'],
    ['5 kN/mm', 5e6, 'stiffness'],
    ['200 N s/m', 200, 'damping'],
    ['500 Pa s', 500, 'viscosity'],
    ['5 V', 5, 'voltage'],
    ['20 kHz', 2e4, 'frequency'],
    ['180 deg', Math.PI, 'angle'],
    ['gravity', 9.80665, 'acceleration'],
    ['2 * pi', 2 * Math.PI, 'number'],
    ['sqrt(2 * gravity * drop)', Math.sqrt(2 * 9.80665 * 1.5), 'velocity'],
    ['sqrt(207 GPa / (7850 kg/m^3))', Math.sqrt(207e9 / 7850), 'velocity'],
    ['cbrt(8 m^3)', 2, 'length'],
    ['drop / 3', 0.5, 'length'],
    ['-(2 mm)^2', -4e-6, 'area'],
    ['2^3^2', 512, 'number'],
    ['-2^2', -4, 'number'],
    ['pow(2 mm, 2)', 4e-6, 'area'],
    ['sin(30 deg)', 0.5, 'number'],
    ['atan2(1 mm, 1 mm)', Math.PI / 4, 'number'],
    ['max(1 mm, 2 mm, 0.5 mm)', 2e-3, 'length'],
    ['hypot(3 mm, 4 mm)', 5e-3, 'length'],
    ['round(2.4)', 2, 'number'],
    ['sign(-3 mm)', -1, 'number'],
    ['abs(-3 mm)', 3e-3, 'length'],
    ['ratio > 0.2 ? 1 mm : 2 mm', 1e-3, 'length'],
    ['0.2 < ratio < 0.3 ? 1 mm : 2 mm', 1e-3, 'length'],
    ['(ratio == 1) ? 1 mm : 2 mm', 2e-3, 'length'],
    ['ratio > 0.2 ? 1 mm : 1 mm / 0', 1e-3, 'length'],
  ])('reads %s', (text, value, dimension) => {
    const formula = good(text)
    expect(isSameDimension(formula.dimension, DIMENSIONS[dimension].dimension)).toBe(true)
    expect(formula.fixed).not.toBeNull()
    expectNear(formula.fixed ?? NaN, value)
    expectNear(formula.at(NaN, NaN), value)
  })

  it.each([
    ['5 us', 5e-6],
    ['0.3 mm', 0.3e-3],
    ['1.2 ms', 1.2e-3],
    ['7 um', 7e-6],
    ['33 ns', 33e-9],
    ['207 GPa', 207e9],
    ['9.81 kN', 9810],
    ['0.1 inch', 0.1 * 0.0254],
  ])('rounds %s once, as the number that it is', (text, value) => {
    expect(good(text).fixed).toBe(value)
  })

  it('knows the time in pulses', () => {
    const pulse = good('10 kN * exp(-t / (50 us)) * sin(2 * pi * 20 kHz * t)', 't')
    expect(pulse.fixed).toBeNull()
    for (const t of [0, 1e-5, 3e-4]) {
      expectNear(pulse.at(t, 0), 1e4 * Math.exp(-t / 5e-5) * Math.sin(2 * Math.PI * 2e4 * t))
    }
    const gate = good('1 us <= t < 3 us ? 2 kN : 0 kN', 't')
    expect([0, 1e-6, 2e-6, 3e-6].map((t) => gate.at(t, 0))).toEqual([0, 2000, 2000, 0])
  })

  it('takes s for the place along a bar, and for the second behind a division sign', () => {
    expect(good('10 m/s', 'along').fixed).toBe(10)
    expect(good('10 m/s * (1 - s)', 'along').at(0, 0.25)).toBe(7.5)
    expect(good('10 m/s * s', 'along').at(0, 0.25)).toBe(2.5)
    expect(good('s * 10 m/s', 'along').at(0, 0.25)).toBe(2.5)
    expect(good('10 m s^-1 * s^2', 'along').at(0, 0.5)).toBe(2.5)
    expect(good('200 / s * x', 'along').at(0.5, 9)).toBe(100)
    expect(good('20 mm * (1 + s)', 'along').at(0, 0.5)).toBe(0.03)
    expect(good('20 mm / (1 + s)', 'along').at(0, 1)).toBe(0.01)
    expect(isSameDimension(good('20 mm * s', 'along').dimension, DIMENSIONS.length.dimension)).toBe(true)
    expect(good('5 s').fixed).toBe(5)
  })

  it.each([
    ['1 mm + 1 us', 'wrong-dimension: cannot add a length and a time'],
    ['1 mm - 0', 'wrong-dimension: cannot subtract a length and a plain number; zero needs a unit too'],
    ['1 mm > 1 us ? 1 : 2', 'wrong-dimension: cannot compare a length and a time'],
    ['1 > 2 ? 1 mm : 2', 'wrong-dimension: cannot choose between a length and a plain number'],
    ['exp(1 mm)', 'wrong-dimension: exp(...) takes a plain number, got a length'],
    ['sin(1 mm)', 'wrong-dimension: sin(...) takes a plain number or an angle, got a length'],
    ['2^(1 mm)', 'wrong-dimension: an exponent must be a plain number, got a length'],
    ['sqrt(1 mm, 2 mm)', 'formula-refused: the formula is refused: sqrt(...) takes 1 value, got 2'],
    [
      '100 mm (2)',
      'formula-refused: the formula is refused: "mm" is no function; to multiply, write mm * (...)',
    ],
    [
      'sqr(2)',
      'formula-refused: the formula is refused: the function "sqr" has no place in it; did you mean "sqrt"?',
    ],
    ['5 Ns', 'formula-unknown-name: the name "Ns" is not known; did you mean "N s"?'],
    ['5 KN', 'formula-unknown-name: the name "KN" is not known; did you mean "kN"? Capitals matter'],
    [
      'sqrt * 2',
      'formula-unknown-name: the name "sqrt" is not known without parentheses; a function is written sqrt(...)',
    ],
  ])('refuses %s', (text, why) => {
    expect(refusal(text)).toBe(why)
  })

  it.each([
    'drop / 2 ratio',
    '1/2 ratio',
    '1/2 mm ratio',
    'drop / 2 pi',
    '1/2 (3 mm)',
    '1 / 2 sqrt(4)',
    '2 mm / 3 (1 + ratio)',
  ])('refuses %s, which can be read in two ways', (text) => {
    expect(refusal(text)).toMatch(/^formula-refused: .* can be read in two ways/)
  })

  it.each<[string, number]>([
    ['5 kN / 2 mm', 2.5e6],
    ['7850 kg/m^3', 7850],
    ['2 pi ratio', 0.5 * Math.PI],
    ['drop / (2 ratio)', 3],
    ['drop / 2 * ratio', 0.1875],
    ['3 / 4 in', 0.01905],
    ['5 J / 2 N m^-1', 2.5],
  ])('reads %s, which is clear', (text, value) => {
    expectNear(good(text).fixed ?? NaN, value)
  })

  it('does not let a comparison hide that a side has no value', () => {
    expect(refusal('sqrt(-1) > 0 ? 1 mm : 2 mm')).toMatch(/^formula-not-finite/)
    expect(good('sqrt(t / (1 us) - 1) > 0 ? 1 kN : 2 kN', 't').at(0, 0)).toBeNaN()
  })

  it('passes over a formula whose variable has a fault of its own', () => {
    const variables = new Map([['bad', null]])
    expect(readFormula('bad * 2', { variables, arguments: 'none' })).toEqual({ formula: null, text: null })
  })

  it.each(HOSTILE_FORMULAS)('refuses %j in under 50 ms', (text, code) => {
    // the best of a few tries: what is slow by itself is slow in each, a busy machine is not
    let best = Infinity
    for (const args of ['none', 't', 'along', 'none', 't'] as const) {
      const begin = performance.now()
      const reading = read(text, args)
      best = Math.min(best, performance.now() - begin)
      expect(reading.formula).toBeNull()
      expect(reading.formula === null && reading.text?.code).toBe(code)
    }
    expect(best).toBeLessThan(50)
    expect(good('25 mm + 1 mm').fixed).toBe(0.026000000000000002)
  })
})
