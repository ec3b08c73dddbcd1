import type { z } from 'zod'
import type { Allowable, Material, Section, SectionShape } from '../../../contract/rig'
import { faultText } from '../faultText'
import type { sectionForm } from '../form/barForm'
import type { Loose } from '../form/loose'
import { LIMITS } from '../limits'
import type { Place } from '../place'
import { readAllowable } from '../readMaterials'
import { readOptionalQuantity, readQuantity } from '../readQuantity'
import type { Reading } from '../reading'
import { showNumber } from '../showValue'
import { makeAreaShape, makeRoundShape } from './makeShape'
import type { Outline } from './outline'
import { makeStationsOutline } from './outline'
import type { Stretch } from './readOutline'
import { readOutline } from './readOutline'
import type { Stations } from './readStations'
import { readStations } from './readStations'

export type SectionForm = Loose<z.infer<typeof sectionForm>>

/** A section, and where it lies as far as that is known. */
export interface SectionReading {
  section: Section | null
  /** [m]; null where it is faulty */
  length: number | null
}

/** Relative difference up to which the last station and a given length are the same. */
const SAME_LENGTH = 1e-9

/**
 * Reads one section: its length, its form, and what it does not take from its bar.
 * @param reading gets `missing`, `conflict`, `bore-too-wide`, `out-of-range` and the faults of quantities
 * @param place where it stands
 * @param form what it says
 * @param from distance of its left face from that of the bar [m]; null where that is not known
 * @param material its own or that of its bar; null where that is faulty
 * @param defaults allowables of its bar and its material
 */
export function readSection(
  reading: Reading,
  place: Place,
  form: SectionForm,
  from: number | null,
  material: Material | null,
  defaults: Allowable,
): SectionReading {
  const stations = form.stations ? readStations(reading, [...place, 'stations'], form.stations) : null
  const length = readLength(reading, place, form, stations)
  const stretch = length === null || from === null ? null : { from, length }
  const shape = readShape(reading, place, form, stations, stretch)
  const own = readAllowable(reading, [...place, 'allowable'], form.allowable)
  const fillet = readOptionalQuantity(
    reading,
    [...place, 'fillet'],
    form.fillet,
    'length',
    'not-negative',
    null,
  )
  if (length === null || shape === null || material === null) return { section: null, length }
  const allowable = {
    tension: own.tension ?? defaults.tension,
    compression: own.compression ?? defaults.compression,
  }
  return { section: { name: form.name ?? '', length, material, shape, fillet, allowable }, length }
}

function readLength(
  reading: Reading,
  place: Place,
  form: SectionForm,
  stations: Stations | null,
): number | null {
  const last = stations === null ? null : stations.places[stations.places.length - 1]
  if (form.length === undefined) {
    const given = Object.hasOwn(form, 'length') || Object.hasOwn(form, 'stations')
    if (!given) reading.faults.add([...place, 'length'], faultText.missing(`a length, such as "300 mm"`))
    return last
  }
  const length = readQuantity(reading, [...place, 'length'], form.length, 'length', 'positive')
  if (length !== null && last !== null && Math.abs(last - length) > SAME_LENGTH * length) {
    reading.faults.add([...place, 'stations'], faultText.stationsEnd(last, length))
  }
  return length
}

function readShape(
  reading: Reading,
  place: Place,
  form: SectionForm,
  stations: Stations | null,
  stretch: Stretch | null,
): SectionShape | null {
  const given = (['diameter', 'area', 'stations'] as const).filter((key) => Object.hasOwn(form, key))
  if (given.length === 0) reading.faults.add(place, faultText.noForm())
  if (given.length > 1) reading.faults.add(place, faultText.severalForms(given))
  const bore =
    form.bore === undefined
      ? null
      : readOutline(reading, [...place, 'bore'], form.bore, { what: 'bore', range: 'not-negative' }, stretch)
  if (form.area !== undefined) {
    if (form.bore !== undefined) reading.faults.add([...place, 'bore'], faultText.boreWithArea())
    const want = { what: 'area', range: 'positive' } as const
    const area = readOutline(reading, [...place, 'area'], form.area, want, stretch)
    return area ? makeAreaShape(area) : null
  }
  const diameter = stations
    ? makeStationsOutline(shares(stations.places), stations.diameters)
    : readOutline(
        reading,
        [...place, 'diameter'],
        form.diameter,
        { what: 'diameter', range: 'positive' },
        stretch,
      )
  if (diameter === null || (form.bore !== undefined && bore === null)) return null
  if (bore !== null && !checkBore(reading, [...place, 'bore'], diameter, bore)) return null
  return makeRoundShape(diameter, bore)
}

function shares(places: number[]): number[] {
  const length = places[places.length - 1]
  return places.map((it) => it / length)
}

function checkBore(reading: Reading, place: Place, diameter: Outline, bore: Outline): boolean {
  const even = Array.from({ length: LIMITS.samples + 1 }, (_, i) => i / LIMITS.samples)
  const uniform = diameter.uniform && bore.uniform
  for (const s of uniform ? [0] : [...even, ...diameter.corners]) {
    const outside = diameter.at(s)
    const inside = bore.at(s)
    if (inside < outside) continue
    reading.faults.add(
      place,
      faultText.boreTooWide(inside, outside, uniform ? '' : ` at s = ${showNumber(s)}`),
    )
    return false
  }
  return true
}
