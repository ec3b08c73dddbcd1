import type { z } from 'zod'
import type { Along, Allowable, Bar, Material, Section } from '../../../contract/rig'
import { faultText } from '../faultText'
import type { barForm } from '../form/barForm'
import type { Loose } from '../form/loose'
import type { DimensionName } from '../formula/dimension'
import { LIMITS } from '../limits'
import { nearestName } from '../nearestName'
import type { Place } from '../place'
import { readAllowable } from '../readMaterials'
import { readOptionalQuantity, readQuantityFormula } from '../readQuantity'
import type { Reading } from '../reading'
import { showNumber } from '../showValue'
import { readSection } from './readSection'

type BarForm = Loose<z.infer<typeof barForm>>

/** A bar as far as it could be read. */
export interface BarReading {
  /** Null where it is missing. */
  name: string | null
  /** [m]; null where any of its lengths is faulty */
  length: number | null
  /** Null where anything in it is faulty. */
  bar: Bar | null
}

/**
 * Reads the bars of a rig.
 * @param reading gets `unknown-material`, `missing`, `conflict`, and the faults of sections and quantities
 * @param forms the bars from left to right
 * @param materials by name, null for a faulty one
 */
export function readBars(
  reading: Reading,
  forms: (BarForm | undefined)[],
  materials: Map<string, Material | null>,
): BarReading[] {
  return forms.map((form, i) =>
    form ? readBar(reading, ['bars', i], form, materials) : { name: null, length: null, bar: null },
  )
}

function readBar(
  reading: Reading,
  place: Place,
  form: BarForm,
  materials: Map<string, Material | null>,
): BarReading {
  const own = readAllowable(reading, [...place, 'allowable'], form.allowable)
  const barMaterial = findMaterial(reading, [...place, 'material'], form.material, materials)
  const sections: Section[] = []
  let length: number | null = form.sections ? 0 : null
  let missing = false
  form.sections?.forEach((section, i) => {
    const at: Place = [...place, 'sections', i]
    if (!section) {
      length = null
      return
    }
    if (!Object.hasOwn(section, 'material') && !Object.hasOwn(form, 'material')) missing = true
    const material =
      section.material === undefined
        ? barMaterial
        : findMaterial(reading, [...at, 'material'], section.material, materials)
    const read = readSection(reading, at, section, length, material, fallBack(own, material))
    length = length === null || read.length === null ? null : length + read.length
    if (read.section) sections.push(read.section)
  })
  if (missing) reading.faults.add([...place, 'material'], faultText.noMaterial())
  const motion = readStart(reading, place, form, length)
  const name = form.name ?? null
  const whole =
    name !== null && motion !== null && length !== null && sections.length === form.sections?.length
  return { name, length, bar: whole ? { name, sections, ...motion } : null }
}

function fallBack(own: Allowable, material: Material | null): Allowable {
  return {
    tension: own.tension ?? material?.allowable.tension ?? null,
    compression: own.compression ?? material?.allowable.compression ?? null,
  }
}

function findMaterial(
  reading: Reading,
  place: Place,
  name: string | undefined,
  materials: Map<string, Material | null>,
): Material | null {
  if (name === undefined) return null
  const material = materials.get(name)
  if (material !== undefined) return material
  const known = [...materials.keys()]
  reading.faults.add(place, faultText.unknownMaterial(name, nearestName(name, known), known))
  return null
}

/** Reads the state of a bar at the start of the run. */
function readStart(
  reading: Reading,
  place: Place,
  form: BarForm,
  length: number | null,
): Pick<Bar, 'velocity' | 'uniformVelocity' | 'displacement' | 'preload'> | null {
  if (form.displacement !== undefined && form.preload !== undefined) {
    reading.faults.add([...place, 'preload'], faultText.displacementAndPreload())
  }
  const rest = { along: () => 0, fixed: 0 }
  const velocity =
    form.velocity === undefined
      ? rest
      : readAlong(reading, [...place, 'velocity'], form.velocity, 'velocity', length)
  const displacement =
    form.displacement === undefined
      ? null
      : readAlong(reading, [...place, 'displacement'], form.displacement, 'length', length)
  const preload = readOptionalQuantity(reading, [...place, 'preload'], form.preload, 'force', 'any', 0)
  if (velocity === null || preload === null) return null
  if (form.displacement !== undefined && displacement === null) return null
  return {
    velocity: velocity.along,
    uniformVelocity: velocity.fixed,
    displacement: displacement?.along ?? null,
    preload,
  }
}

function readAlong(
  reading: Reading,
  place: Place,
  raw: unknown,
  dimension: DimensionName,
  length: number | null,
): { along: Along; fixed: number | null } | null {
  const formula = readQuantityFormula(reading, place, raw, dimension, 'along')
  if (formula === null) return null
  if (formula.fixed === null && length !== null) {
    for (let i = 0; i <= LIMITS.samples; i++) {
      const s = i / LIMITS.samples
      const value = formula.at(s * length, s)
      if (Number.isFinite(value) && Math.abs(value) <= LIMITS.magnitude) continue
      reading.faults.add(place, faultText.formulaNotFinite(raw, ` at s = ${showNumber(s)}`))
      return null
    }
  }
  return { along: (x, s) => formula.at(x, s), fixed: formula.fixed }
}
