import { faultText } from '../faultText'
import type { Range } from '../faultText'
import type { Formula } from '../formula/formula'
import { LIMITS } from '../limits'
import type { Place } from '../place'
import { readQuantity, readQuantityFormula } from '../readQuantity'
import type { Reading } from '../reading'
import { showLength, showNumber, showValue } from '../showValue'
import type { Outline, Profile } from './outline'
import { makeConstantOutline, makeProfileOutline } from './outline'

/** Where a section lies in its bar; null where a length before it is faulty. */
export interface Stretch {
  /** [m] from the bar's left face */
  from: number
  /** [m] */
  length: number
}

interface ProfileForm {
  from?: unknown
  to?: unknown
  profile?: Profile
}

/** What an outline gives. */
export interface OutlineWant {
  what: 'diameter' | 'bore' | 'area'
  range: Exclude<Range, 'any'>
}

/**
 * Reads a diameter, a bore or an area: a value, a formula along the section, or a profile.
 * @param reading gets the faults of quantities, and `out-of-range`, `formula-not-finite`
 * @param place where it stands
 * @param raw a text, or an object with from, to, profile
 * @param want what it gives
 * @param stretch where the section lies; formulas are not tried without it
 * @returns the outline, or null where it is faulty
 */
export function readOutline(
  reading: Reading,
  place: Place,
  raw: unknown,
  want: OutlineWant,
  stretch: Stretch | null,
): Outline | null {
  if (typeof raw === 'object' && raw !== null) return readProfile(reading, place, raw, want)
  const dimension = want.what === 'area' ? 'area' : 'length'
  const formula = readQuantityFormula(reading, place, raw, dimension, 'along')
  if (formula === null) return null
  if (formula.fixed !== null) {
    const value = readQuantity(reading, place, raw, dimension, want.range)
    return value === null ? null : makeConstantOutline(value)
  }
  return stretch === null ? null : readFormulaOutline(reading, place, raw, formula, want, stretch)
}

function readProfile(reading: Reading, place: Place, raw: ProfileForm, want: OutlineWant): Outline | null {
  const profile = raw.profile ?? 'linear'
  const range: Range = profile === 'exponential' ? 'positive' : want.range
  const from = readQuantity(reading, [...place, 'from'], raw.from, 'length', range)
  const to = readQuantity(reading, [...place, 'to'], raw.to, 'length', range)
  return from === null || to === null ? null : makeProfileOutline(from, to, profile)
}

function readFormulaOutline(
  reading: Reading,
  place: Place,
  raw: unknown,
  formula: Formula,
  want: OutlineWant,
  stretch: Stretch,
): Outline | null {
  const at = (s: number) => formula.at(stretch.from + s * stretch.length, s)
  for (let i = 0; i <= LIMITS.samples; i++) {
    const s = i / LIMITS.samples
    const value = at(s)
    const where = `at s = ${showNumber(s)}`
    if (!Number.isFinite(value)) {
      reading.faults.add(place, faultText.formulaNotFinite(raw, ` ${where}`))
      return null
    }
    if (value > LIMITS.length) {
      reading.faults.add(place, faultText.beyondMagnitude(raw, LIMITS.length))
      return null
    }
    if (want.range === 'positive' ? value <= 0 : value < 0) {
      const shown = want.what === 'area' ? `${showNumber(value * 1e6)} mm^2` : showLength(value)
      const text = want.range === 'positive' ? faultText.notPositiveAlong : faultText.negativeAlong
      reading.faults.add(place, text(`${want.what} ${showValue(raw)}`, shown, where))
      return null
    }
  }
  return { kind: 'formula', uniform: false, at, corners: [] }
}
