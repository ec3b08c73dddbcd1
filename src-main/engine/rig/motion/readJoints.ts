import type { z } from 'zod'
import type { Joint, SpecimenLaw } from '../../../contract/rig'
import { faultText } from '../faultText'
import type { Range } from '../faultText'
import type { jointForm } from '../form/jointForm'
import type { Loose } from '../form/loose'
import type { DimensionName } from '../formula/dimension'
import type { Place } from '../place'
import { readOptionalQuantity, readQuantity } from '../readQuantity'
import type { Reading } from '../reading'
import { readPairs } from './readPairs'

type JointForm = Loose<z.infer<typeof jointForm>>
type CushionForm = Extract<JointForm, { kind?: 'cushion' }>
type SpecimenForm = Extract<JointForm, { kind?: 'specimen' }>
type LawForm = NonNullable<SpecimenForm['law']>

/**
 * Reads the joints between the bars; contacts without gap where they are left out.
 * @param reading gets `wrong-count`, `conflict`, `missing` and the faults of quantities
 * @param forms undefined where they are left out
 * @param count one fewer than bars; null where the bars are missing
 * @returns one per joint, or null where any is faulty
 */
export function readJoints(
  reading: Reading,
  forms: (JointForm | undefined)[] | undefined,
  count: number | null,
): Joint[] | null {
  const joints = forms?.map((form, i) => (form ? readJoint(reading, ['joints', i], form) : null))
  if (count === null) return null
  if (joints === undefined) return Array.from({ length: count }, () => ({ kind: 'contact', gap: 0 }))
  if (joints.length !== count) {
    const expected = `${count} joint${count === 1 ? '' : 's'}, one fewer than bars`
    reading.faults.add(['joints'], faultText.wrongCount(expected, joints.length))
  }
  return joints.length === count && joints.every((joint) => joint !== null) ? joints : null
}

function readJoint(reading: Reading, place: Place, form: JointForm): Joint | null {
  switch (form.kind) {
    case undefined:
      return null
    case 'bonded':
      return { kind: 'bonded' }
    case 'contact': {
      const gap = readOptionalQuantity(reading, [...place, 'gap'], form.gap, 'length', 'not-negative', 0)
      return gap === null ? null : { kind: 'contact', gap }
    }
    case 'cushion':
      return readCushion(reading, place, form)
    case 'specimen':
      return readSpecimen(reading, place, form)
  }
}

function readCushion(reading: Reading, place: Place, form: CushionForm): Joint | null {
  const optional = (key: 'damping' | 'mass' | 'gap', dimension: DimensionName, range: Range) =>
    readOptionalQuantity(reading, [...place, key], form[key], dimension, range, 0)
  checkOneOf(reading, place, form, ['stiffness', 'curve'])
  const stiffness = readOptionalQuantity(
    reading,
    [...place, 'stiffness'],
    form.stiffness,
    'stiffness',
    'positive',
    null,
  )
  const rows = readPairs(reading, [...place, 'curve'], form.curve, ['length', 'force'], 'closings')
  const unloading = readOptionalQuantity(
    reading,
    [...place, 'unloading'],
    form.unloading,
    'stiffness',
    'positive',
    null,
  )
  const damping = optional('damping', 'damping', 'not-negative')
  const mass = optional('mass', 'mass', 'not-negative')
  const gap = optional('gap', 'length', 'not-negative')
  if (rows && (rows.first[0] !== 0 || rows.second[0] !== 0)) {
    reading.faults.add(
      [...place, 'curve', 0],
      faultText.outside('another first row', 'a first row of "0 mm" and "0 N"'),
    )
  }
  if (damping === null || mass === null || gap === null) return null
  const curve = rows && { closing: rows.first, force: rows.second }
  return { kind: 'cushion', stiffness, curve, unloading, damping, mass, gap, tension: form.tension ?? false }
}

function checkOneOf(reading: Reading, place: Place, form: object, keys: readonly [string, string]): void {
  const given = keys.filter((key) => Object.hasOwn(form, key))
  if (given.length === 1) return
  reading.faults.add(given.length === 0 ? [...place, keys[0]] : place, faultText.oneOf(keys, given.length))
}

function readSpecimen(reading: Reading, place: Place, form: SpecimenForm): Joint | null {
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
      return rows === null || rate === null
        ? null
        : { kind: 'curve', strain: rows.first, stress: rows.second, ...rate }
    }
  }
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
