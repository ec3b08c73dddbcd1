import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { DIMENSIONS } from '../../src-main/engine/rig/formula/dimension'
import { readFormula } from '../../src-main/engine/rig/formula/readFormula'

const RUNS = { numRuns: Number(process.env.FUZZ_RUNS ?? 500), seed: 20240608 }

/** A formula as text, and what it must give at a time t by the language's own arithmetic. */
interface Known {
  text: string
  value(t: number): number
}

const fixed: fc.Arbitrary<Known> = fc
  .integer({ min: 0, max: 1000 })
  .map((n) => ({ text: String(n / 8), value: () => n / 8 }))
const time: fc.Arbitrary<Known> = fc.constant({ text: '(t / (1 s))', value: (t: number) => t })

const { formula } = fc.letrec<{ formula: Known }>((tie) => {
  const part = tie('formula')
  const pair = fc.tuple(part, part)
  const operator = (sign: string, compute: (a: number, b: number) => number): fc.Arbitrary<Known> =>
    pair.map(([a, b]) => ({
      text: `(${a.text} ${sign} ${b.text})`,
      value: (t) => compute(a.value(t), b.value(t)),
    }))
  const call = (name: string, compute: (a: number) => number): fc.Arbitrary<Known> =>
    part.map((a) => ({ text: `(${name}(${a.text}))`, value: (t) => compute(a.value(t)) }))
  const choice = fc.tuple(part, part, part, part).map(([a, b, c, d]): Known => ({
    text: `(${a.text} < ${b.text} ? ${c.text} : ${d.text})`,
    value: (t) => {
      const [left, right] = [a.value(t), b.value(t)]
      if (Number.isNaN(left) || Number.isNaN(right)) return NaN
      return left < right ? c.value(t) : d.value(t)
    },
  }))
  return {
    formula: fc.oneof(
      { maxDepth: 5, withCrossShrink: true },
      fixed,
      time,
      operator('+', (a, b) => a + b),
      operator('-', (a, b) => a - b),
      operator('*', (a, b) => a * b),
      operator('/', (a, b) => a / b),
      operator('^', (a, b) => a ** b),
      call('sqrt', Math.sqrt),
      call('exp', Math.exp),
      call('sin', Math.sin),
      call('abs', Math.abs),
      call('-', (a) => -a),
      choice,
    ),
  }
})

describe('formulas', () => {
  it('give what the arithmetic of the language gives, to the last bit', () => {
    let read = 0
    fc.assert(
      fc.property(formula, fc.double({ min: 0, max: 10, noNaN: true }), ({ text, value }, t) => {
        const reading = readFormula(text, { variables: new Map(), arguments: 't' })
        if (reading.formula === null) {
          // too long or too deep, or without a finite value at any time
          expect(['formula-refused', 'formula-not-finite']).toContain(reading.text?.code)
          if (reading.text?.code === 'formula-not-finite') expect(Number.isFinite(value(t))).toBe(false)
          return
        }
        read++
        expect(reading.formula.at(t, 0)).toBe(value(t))
      }),
      RUNS,
    )
    expect(read).toBeGreaterThan(RUNS.numRuns / 2)
  })

  it('give a number and its unit as their product', () => {
    const units = { mm: 1e-3, us: 1e-6, kN: 1e3, MPa: 1e6, inch: 0.0254, kg: 1 }
    const number = fc.double({ min: -1e9, max: 1e9, noNaN: true })
    fc.assert(
      fc.property(number, fc.constantFrom(...Object.entries(units)), (value, [unit, factor]) => {
        const reading = readFormula(`${value} ${unit}`, { variables: new Map(), arguments: 'none' })
        // one rounding of the product, and one of the factor
        const error = Math.abs((reading.formula?.fixed ?? NaN) - value * factor)
        expect(error).toBeLessThanOrEqual(2 * Number.EPSILON * Math.abs(value * factor))
      }),
      RUNS,
    )
  })

  it('never add what has different dimensions', () => {
    const samples = Object.values(DIMENSIONS)
    fc.assert(
      fc.property(fc.constantFrom(...samples), fc.constantFrom(...samples), (a, b) => {
        const reading = readFormula(`(${a.example}) + (${b.example})`, {
          variables: new Map(),
          arguments: 'none',
        })
        expect(reading.formula === null).toBe(a !== b)
      }),
      RUNS,
    )
  })
})
