import { faultText } from '../faultText'
import { nearestName } from '../nearestName'
import { didYouMean } from '../texts/nameHint'
import { DIMENSIONS, PLAIN } from './dimension'
import { findUnit } from './findUnit'
import type { Formula, Scope } from './formula'
import { CONSTANTS, makeFixedFormula } from './formula'
import { FORMULA_FUNCTIONS } from './formulaFunctions'
import { FormulaRefusal } from './formulaRefusal'

const COMMON_UNITS =
  'm mm cm um km mm2 inch ft mil s ms us ns kg g mg tonne lbm slug N kN MN mN lbf kip Pa kPa MPa GPa bar psi ksi J kJ Hz kHz MHz V mV deg rad'.split(
    ' ',
  )

/**
 * Gives a name in a formula its meaning. `t` is the time in pulses; along a bar `x` is the distance
 * and `s` the place 0..1, except where `s` divides: as in m/s it is the second there, because a
 * place that starts at zero divides nothing.
 * Throws a refusal with `formula-unknown-name` or `formula-refused`.
 * @param name as it stands in the formula
 * @param scope names that the formula may use
 * @param divides true where the name is a factor of a divisor
 */
export function compileName(name: string, scope: Scope, divides: boolean): Formula {
  if (scope.arguments === 't' && name === 't') {
    return { dimension: DIMENSIONS.time.dimension, fixed: null, at: (time) => time }
  }
  if (scope.arguments === 'along' && name === 'x') {
    return { dimension: DIMENSIONS.length.dimension, fixed: null, at: (x) => x }
  }
  if (scope.arguments === 'along' && name === 's' && !divides) {
    return { dimension: PLAIN, fixed: null, at: (_x, s) => s }
  }
  if (scope.variables.has(name)) {
    const variable = scope.variables.get(name)
    if (!variable) throw new FormulaRefusal(null)
    return makeFixedFormula(variable.value, variable.dimension)
  }
  const constant = CONSTANTS.get(name)
  if (constant) return makeFixedFormula(constant.value, constant.dimension)
  if (name === 't' || name === 'x')
    throw new FormulaRefusal(faultText.formulaUnknownName(name, OUT_OF_PLACE[name]))
  const unit = findUnit(name)
  if (typeof unit === 'string') {
    throw new FormulaRefusal(faultText.formulaRefused(`"${name}" cannot be used: ${unit}`))
  }
  if (unit) return makeFixedFormula(unit.factor, unit.dimension)
  throw new FormulaRefusal(faultText.formulaUnknownName(name, hintFor(name, scope)))
}

const OUT_OF_PLACE = {
  t: ' here; t is the time and stands only in pulses, and a metric ton is written "tonne"',
  x: ' here; x is the place along a bar and stands only in formulas along a bar or a section',
}

function hintFor(name: string, scope: Scope): string {
  if (FORMULA_FUNCTIONS.has(name)) return ` without parentheses; a function is written ${name}(...)`
  const parts = COMMON_UNITS.flatMap((a) => COMMON_UNITS.map((b) => [a, b])).find(([a, b]) => a + b === name)
  const known = [...scope.variables.keys(), ...CONSTANTS.keys(), ...COMMON_UNITS]
  if (parts) return didYouMean(parts.join(' '))
  const sameLetters = known.find((it) => it.toLowerCase() === name.toLowerCase())
  if (sameLetters) return `${didYouMean(sameLetters)} Capitals matter`
  const nearest = name.length < 3 ? null : nearestName(name, known)
  return nearest ? didYouMean(nearest) : '; it is no unit, no constant and none of the variables'
}
