import type { Range } from './faultText'
import { faultText } from './faultText'
import type { DimensionName } from './formula/dimension'
import { DIMENSIONS, isSameDimension, PLAIN } from './formula/dimension'
import type { Formula, FormulaArguments } from './formula/formula'
import { makeFixedFormula } from './formula/formula'
import { LIMITS } from './limits'
import type { Place } from './place'
import type { Reading } from './reading'

/**
 * Reads a physical value, text to SI.
 * @param reading gets `needs-unit`, `wrong-dimension`, `out-of-range`, `formula-refused`,
 *   `formula-syntax`, `formula-unknown-name`, `formula-not-finite`
 * @param place where it stands
 * @param value a text with a formula, or a number where no unit is needed; undefined
 *   and NaN, which have a fault already, are passed over
 * @param dimension what it must be
 * @param range values that it may take
 * @returns SI, or null where it is missing or faulty
 */
export function readQuantity(
  reading: Reading,
  place: Place,
  value: unknown,
  dimension: DimensionName,
  range: Range = 'any',
): number | null {
  const formula = readQuantityFormula(reading, place, value, dimension, 'none')
  if (formula === null || formula.fixed === null) return null
  const fixed = formula.fixed
  if ((range === 'positive' && fixed <= 0) || (range === 'not-negative' && fixed < 0)) {
    reading.faults.add(place, faultText.outOfRange(value, range))
    return null
  }
  const size = Math.abs(fixed)
  const largest = dimension === 'length' ? LIMITS.length : LIMITS.magnitude
  if (size > largest || (range === 'positive' && size < 1 / LIMITS.magnitude)) {
    reading.faults.add(place, faultText.beyondMagnitude(value, largest))
    return null
  }
  reading.notes?.value(place, fixed, dimension)
  return fixed
}

/**
 * Reads a physical value that may be left out.
 * @param fallback SI value where it is left out
 * @returns SI, or null where it is faulty
 */
export function readOptionalQuantity<Fallback extends number | null>(
  reading: Reading,
  place: Place,
  value: unknown,
  dimension: DimensionName,
  range: Range,
  fallback: Fallback,
): number | null {
  return value === undefined ? fallback : readQuantity(reading, place, value, dimension, range)
}

/**
 * Reads a physical value that may depend on the time or on the place along a bar.
 * @param args names that it may depend on
 * @returns the formula in SI, or null where it is missing or faulty
 */
export function readQuantityFormula(
  reading: Reading,
  place: Place,
  value: unknown,
  dimension: DimensionName,
  args: FormulaArguments,
): Formula | null {
  if (typeof value === 'number') return Number.isNaN(value) ? null : makeFixedFormula(value, PLAIN)
  if (typeof value !== 'string') return null
  const read = reading.formula(value, args)
  if (read.formula === null) {
    if (read.text) reading.faults.add(place, read.text)
    return null
  }
  const got = read.formula.dimension
  if (isSameDimension(got, DIMENSIONS[dimension].dimension)) return read.formula
  const text = isSameDimension(got, PLAIN)
    ? faultText.needsUnit(value, dimension)
    : faultText.wrongDimension(dimension, got, value)
  reading.faults.add(place, text)
  return null
}
