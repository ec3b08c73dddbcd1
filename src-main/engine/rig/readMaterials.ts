import type { Allowable, Material } from '../../contract/rig'
import { faultText } from './faultText'
import type { allowableForm, materialForm } from './form/materialForm'
import type { Loose } from './form/loose'
import type { Place } from './place'
import { readOptionalQuantity, readQuantity } from './readQuantity'
import type { Reading } from './reading'
import type { z } from 'zod'

type MaterialForm = Loose<z.infer<typeof materialForm>>
type AllowableForm = Loose<z.infer<typeof allowableForm>>

/** Wave speeds outside [m/s] belong to no solid; a unit is wrong. */
const SLOWEST = 1
const FASTEST = 1e5
/** Fatigue exponents outside belong to no material: metals lie near -0.05 to -0.15, welds near -0.2 to -0.33: common practice. */
const STEEPEST = -1
const FLATTEST = -0.01

/**
 * Reads the materials of a rig.
 * @param reading gets `out-of-range`, `missing` and the faults of quantities
 * @param raw materials by name
 * @returns those that are right, by name; null for a faulty one
 */
export function readMaterials(
  reading: Reading,
  raw: Record<string, MaterialForm | undefined>,
): Map<string, Material | null> {
  const materials = new Map<string, Material | null>()
  for (const [name, form] of Object.entries(raw)) {
    materials.set(name, form ? readMaterial(reading, ['materials', name], name, form) : null)
  }
  return materials
}

function readMaterial(reading: Reading, place: Place, name: string, form: MaterialForm): Material | null {
  const density = readQuantity(reading, [...place, 'density'], form.density, 'density', 'positive')
  const modulus = readQuantity(reading, [...place, 'modulus'], form.modulus, 'stress', 'positive')
  const poisson = readOptionalQuantity(reading, [...place, 'poisson'], form.poisson, 'number', 'any', null)
  if (poisson !== null && !(poisson > -1 && poisson <= 0.5)) {
    reading.faults.add(
      [...place, 'poisson'],
      faultText.outside(String(form.poisson), 'more than -1 and at most 0.5'),
    )
  }
  const hardening = optional(reading, place, 'hardening', form.hardening, 'not-negative')
  if (hardening !== null && modulus !== null && hardening >= modulus) {
    reading.faults.add([...place, 'hardening'], faultText.hardeningOverModulus())
  }
  if (hardening !== null && !Object.hasOwn(form, 'yield')) {
    reading.faults.add([...place, 'yield'], faultText.hardeningWithoutYield())
  }
  const rest = {
    poisson,
    allowable: readAllowable(reading, [...place, 'allowable'], form.allowable),
    yield: optional(reading, place, 'yield', form.yield, 'positive'),
    hardening,
    hardeningRule: form.hardeningRule ?? 'isotropic',
    viscosity: readOptionalQuantity(
      reading,
      [...place, 'viscosity'],
      form.viscosity,
      'viscosity',
      'not-negative',
      null,
    ),
    spall: optional(reading, place, 'spall', form.spall, 'positive'),
    fatigue: readFatigue(reading, [...place, 'fatigue'], form.fatigue),
    source: form.source ?? '',
  } as const
  if (density === null || modulus === null) return null
  const speed = Math.sqrt(modulus / density)
  if (speed < SLOWEST || speed > FASTEST) {
    reading.faults.add(place, faultText.waveSpeed(speed))
    return null
  }
  return { name, density, modulus, ...rest }
}

function optional(
  reading: Reading,
  place: Place,
  key: string,
  value: unknown,
  range: 'positive' | 'not-negative',
) {
  return readOptionalQuantity(reading, [...place, key], value, 'stress', range, null)
}

function readFatigue(reading: Reading, place: Place, form: MaterialForm['fatigue']): Material['fatigue'] {
  if (!form) return null
  const strength = readQuantity(reading, [...place, 'strength'], form.strength, 'stress', 'positive')
  const exponent = readQuantity(reading, [...place, 'exponent'], form.exponent, 'number')
  if (exponent !== null && !(exponent >= STEEPEST && exponent <= FLATTEST)) {
    reading.faults.add([...place, 'exponent'], faultText.fatigueExponent(form.exponent, STEEPEST, FLATTEST))
    return null
  }
  return strength === null || exponent === null ? null : { strength, exponent }
}

/**
 * Reads the allowables of a material, a bar or a section.
 * @param form undefined where none is given
 * @returns each sense [Pa], null where it is not given
 */
export function readAllowable(reading: Reading, place: Place, form: AllowableForm | undefined): Allowable {
  return {
    tension: optional(reading, place, 'tension', form?.tension, 'positive'),
    compression: optional(reading, place, 'compression', form?.compression, 'positive'),
  }
}
