import type { MathNode, UnitCtor } from 'mathjs'
import { createUnitClass } from 'mathjs'
import { create, parseDependencies } from 'mathjs/number'

declare module 'mathjs' {
  /** Exported by mathjs, but missing in its types. */
  function createUnitClass(parts: Record<string, unknown>): UnitCtor
}

/** The two parts of mathjs that are used: text to tree, and the table of units. Nothing evaluates. */
export interface Parser {
  parse(text: string): MathNode
  Unit: UnitCtor
}

/** [m] and [N], exact by definition (international yard and pound of 1959, standard gravity). */
const INCH = 0.0254
const POUND_FORCE = 0.45359237 * 9.80665

/** Units that trades write and mathjs lacks, or holds with fewer digits than their definition. */
const MORE_UNITS = {
  psi: `${POUND_FORCE / INCH ** 2} Pa`,
  ksi: `${(1000 * POUND_FORCE) / INCH ** 2} Pa`,
  Msi: `${(1e6 * POUND_FORCE) / INCH ** 2} Pa`,
  kip: `${1000 * POUND_FORCE} N`,
  slug: `${POUND_FORCE / (12 * INCH)} kg`,
  thou: `${INCH / 1000} m`,
  mph: `${1609.344 / 3600} m/s`,
} as const

/**
 * What the class of units computes with: plain numbers. Its own choice brings big numbers, fractions
 * and complex ones, which take ten times as long to start.
 */
const PLAIN_NUMBERS = {
  config: { number: 'number', predictable: false },
  addScalar: (a: number, b: number) => a + b,
  subtractScalar: (a: number, b: number) => a - b,
  multiplyScalar: (a: number, b: number) => a * b,
  divideScalar: (a: number, b: number) => a / b,
  pow: Math.pow,
  abs: Math.abs,
  fix: Math.trunc,
  round: Math.round,
  equal: (a: number, b: number) => a === b,
  isNumeric: (value: unknown) => typeof value === 'number',
  format: String,
  number: Number,
  Complex: class {},
  BigNumber: class {},
  Fraction: class {},
}

let parser: Parser | null = null

/**
 * Gives the one parser, an instance of our own that no formula can configure; made at first use.
 */
export function getParser(): Parser {
  if (parser) return parser
  const { parse } = create({ parseDependencies }, { number: 'number' }) as unknown as Pick<Parser, 'parse'>
  const Unit = createUnitClass(PLAIN_NUMBERS)
  for (const [name, definition] of Object.entries(MORE_UNITS)) {
    Unit.createUnit({ [name]: definition }, { override: true })
  }
  parser = { parse, Unit }
  return parser
}
