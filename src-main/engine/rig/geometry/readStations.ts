import { faultText } from '../faultText'
import type { Place } from '../place'
import { readQuantity } from '../readQuantity'
import type { Reading } from '../reading'

/** Diameters at places along a section, as read. */
export interface Stations {
  /** [m] from the section's left face, the first 0, rising */
  places: number[]
  /** [m] */
  diameters: number[]
}

/**
 * Reads stations off a drawing.
 * @param reading gets `out-of-range` and the faults of quantities
 * @param place where they stand
 * @param rows [place, diameter] as texts
 * @returns the stations, or null where any is faulty
 */
export function readStations(reading: Reading, place: Place, rows: unknown[]): Stations | null {
  const places: number[] = []
  const diameters: number[] = []
  let whole = true
  rows.forEach((row, i) => {
    if (!Array.isArray(row)) {
      whole = false
      return
    }
    const at = readQuantity(reading, [...place, i, 0], row[0], 'length', 'not-negative')
    const diameter = readQuantity(reading, [...place, i, 1], row[1], 'length', 'positive')
    if (at === null || diameter === null) {
      whole = false
      return
    }
    if (i === 0 && at !== 0) {
      reading.faults.add([...place, 0, 0], faultText.stationsStart(at))
      whole = false
    }
    const before = places[places.length - 1]
    if (before !== undefined && at <= before) {
      reading.faults.add([...place, i, 0], faultText.stationsOrder(at, before))
      whole = false
    }
    places.push(at)
    diameters.push(diameter)
  })
  return whole ? { places, diameters } : null
}
