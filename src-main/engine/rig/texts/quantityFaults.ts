import type { Dimension, DimensionName } from '../formula/dimension'
import { describeDimension, DIMENSIONS } from '../formula/dimension'
import { LIMITS } from '../limits'
import { quote, showValue } from '../showValue'
import type { FaultText, Range } from './faultShape'

const RANGES: Record<Exclude<Range, 'any'>, string> = {
  positive: 'more than zero',
  'not-negative': 'zero or more',
}

/** Why a quantity or a formula is refused. */
export const quantityFaults = {
  needsUnit: (value: unknown, dimension: DimensionName): FaultText => {
    const { label, example } = DIMENSIONS[dimension]
    const unit = example.slice(example.indexOf(' ') + 1)
    const bare = String(value).trim()
    const like = /^[-+]?[0-9.]+(e[-+]?[0-9]+)?$/i.test(bare) ? `${bare} ${unit}` : example
    const why =
      Number(bare) === 0 ? 'zero needs a unit too' : `the bare number ${showValue(value)} has no unit`
    return { code: 'needs-unit', message: `expected ${label}; ${why}: write for instance "${like}"` }
  },
  wrongDimension: (dimension: DimensionName, got: Dimension, text: unknown): FaultText => ({
    code: 'wrong-dimension',
    message: `expected ${DIMENSIONS[dimension].label}, got ${describeDimension(got)} (${showValue(text)})`,
  }),
  mixedDimensions: (what: string): FaultText => ({ code: 'wrong-dimension', message: what }),
  formulaRefused: (what: string): FaultText => ({
    code: 'formula-refused',
    message: `the formula is refused: ${what}`,
  }),
  formulaSyntax: (what: string): FaultText => ({
    code: 'formula-syntax',
    message: `cannot be read as a formula: ${what}`,
  }),
  formulaUnknownName: (name: string, hint: string): FaultText => ({
    code: 'formula-unknown-name',
    message: `the name ${quote(name)} is not known${hint}`,
  }),
  formulaNotFinite: (text: unknown, where: string): FaultText => ({
    code: 'formula-not-finite',
    message: `the formula ${showValue(text)} has no finite real value${where}; look for a division by zero or the root of a negative number`,
  }),
  formulasTooLong: (): FaultText => ({
    code: 'too-large',
    message: `the formulas of this file have more than ${LIMITS.formulaTotal} characters together; write long tables as plain values such as "25 mm", or as a record beside the rig`,
  }),
  variableCycle: (chain: readonly string[]): FaultText => ({
    code: 'variable-cycle',
    message: `the variables refer to one another in a circle: ${chain.slice(0, 10).join(' -> ')}; give one of them a value of its own`,
  }),
  variableName: (name: string): FaultText => ({
    code: 'wrong-format',
    message: `${quote(name)} cannot be the name of a variable; use letters, digits and _, starting with a letter`,
  }),
  variableTaken: (name: string, meaning: string): FaultText => ({
    code: 'conflict',
    message: `the name ${quote(name)} already means ${meaning} in formulas; take another, such as ${quote(`${name}1`)}`,
  }),
  outOfRange: (value: unknown, range: Exclude<Range, 'any'>): FaultText => ({
    code: 'out-of-range',
    message: `got ${showValue(value)}; it must be ${RANGES[range]}`,
  }),
  outside: (value: string, allowed: string): FaultText => ({
    code: 'out-of-range',
    message: `got ${value}; it must be ${allowed}`,
  }),
  beyondMagnitude: (value: unknown, largest: number): FaultText => ({
    code: 'out-of-range',
    message: `${showValue(value)} is beyond any bar: in SI units it must lie between ${(1 / LIMITS.magnitude).toExponential()} and ${largest.toExponential()}; check the units`,
  }),
}
