import type { z } from 'zod'
import type { Joint, SpecimenLaw } from '../../../contract/rig'
import { faultText } from '../faultText'
import type { Range } from '../faultText'
import type { jointForm } from '../form/jointForm'
import type { Loose } from '../form/loose'
import type { Place } from '../place'
import { readOptionalQuantity, readQuantity } from '../readQuantity'
import type { Reading } from '../reading'
import { checkLoading } from './checkLoading'
import { checkOneOf } from './checkOneOf'
import { type Columns, readPairs } from './readPairs'

type SpecimenForm = Extract<Loose<z.infer<typeof jointForm>>, { kind?: 'specimen' }>
type LawForm = NonNullable<SpecimenForm['law']>

/**
 * Reads a specimen between two bars.
 * @param reading gets `conflict`, `missing`, `out-of-range` and the faults of quantities
 * @param place where it stands
 * @param form as far as its form is right
 * @returns the specimen, or null where anything in it is faulty
 */
export function readSpecimen(reading: Reading, place: Place, form: SpecimenForm): Joint | null {
  const length = readQuantity(reading, [...place, 'length'], form.length, 'length', 'positive')
  checkOneOf(reading, place, form, ['diameter', 'area'])
  const diameter = readQuantity(reading, [...place, 'diameter'], form.diameter, 'length', 'positive')
  const given = readQuantity(reading, [...place, 'area'], form.area, 'area', 'positive')
  const area = diameter === null ? given : (Math.PI / 4) * diameter * diameter
  const law = form.law ? readLaw(reading, [...place, 'law'], form.law) : null
  return length === null || area === null || law === null ? null : { kind: 'specimen', length, area, law }
}

function readLaw(reading: Reading, place: Place, form: LawForm): SpecimenLaw | null {
  const stress = (key: string, value: unknown, range: Range) =>
    readQuantity(reading, [...place, key], value, 'stress', range)
  const rate = form.kind === undefined ? null : readRate(reading, place, form)
  switch (form.kind) {
    case undefined:
      return null
    case 'elastic': {
      const modulus = stress('modulus', form.modulus, 'positive')
      return modulus === null || rate === null ? null : { kind: 'elastic', modulus, ...rate }
    }
    case 'bilinear': {
      const modulus = stress('modulus', form.modulus, 'positive')
      const limit = stress('yield', form.yield, 'positive')
      const hardening = stress('hardening', form.hardening, 'not-negative')
      if (modulus === null || limit === null || hardening === null || rate === null) return null
      if (hardening >= modulus) reading.faults.add([...place, 'hardening'], faultText.hardeningOverModulus())
      return { kind: 'bilinear', modulus, yield: limit, hardening, ...rate }
    }
    case 'power': {
      const strength = stress('strength', form.strength, 'positive')
      const exponent = readQuantity(reading, [...place, 'exponent'], form.exponent, 'number', 'positive')
      return strength === null || exponent === null || rate === null
        ? null
        : { kind: 'power', strength, exponent, ...rate }
    }
    case 'curve': {
      const rows = readPairs(reading, [...place, 'curve'], form.curve, ['number', 'stress'], 'strains')
      if (rows) checkCurve(reading, [...place, 'curve'], rows)
      return rows === null || rate === null
        ? null
        : { kind: 'curve', strain: rows.first, stress: rows.second, ...rate }
    }
  }
}

function checkCurve(reading: Reading, place: Place, { first, second }: Columns): void {
  if (first[0] < 0) reading.faults.add([...place, 0, 0], faultText.outOfRange(first[0], 'not-negative'))
  if (second[0] < 0) reading.faults.add([...place, 0, 1], faultText.outOfRange(second[0], 'not-negative'))
  checkLoading(reading, place, second, 'stresses')
}

/** Reads how a law depends on the strain rate; not at all where nothing is given. */
function readRate(
  reading: Reading,
  place: Place,
  form: { rateSensitivity?: unknown; referenceRate?: unknown },
): { rateSensitivity: number; referenceRate: number } | null {
  const rateSensitivity = readOptionalQuantity(
    reading,
    [...place, 'rateSensitivity'],
    form.rateSensitivity,
    'number',
    'not-negative',
    0,
  )
  if (Object.hasOwn(form, 'rateSensitivity') && !Object.hasOwn(form, 'referenceRate')) {
    reading.faults.add([...place, 'referenceRate'], faultText.missing('a strain rate, such as "1 / s"'))
  }
  const referenceRate = readOptionalQuantity(
    reading,
    [...place, 'referenceRate'],
    form.referenceRate,
    'frequency',
    'positive',
    1,
  )
  return rateSensitivity === null || referenceRate === null ? null : { rateSensitivity, referenceRate }
}
