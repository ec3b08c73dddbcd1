import { faultText } from './faultText'
import type { BarReading } from './geometry/readBars'
import { nearestName } from './nearestName'
import type { Place } from './place'
import { readQuantity } from './readQuantity'
import type { Reading } from './reading'

/** Share of a bar's length by which the sum of its sections may round. */
const ROUNDING = 1e-12

/** A point on a bar. */
export interface BarPoint {
  /** Index of the bar. */
  bar: number
  /** [m] from its left face */
  at: number
}

/**
 * Reads a bar's name and a place on it.
 * @param reading gets `unknown-bar`, `out-of-range` and the faults of quantities
 * @param place of the object that names them
 * @param form its `bar` and `at`
 * @param bars of the rig
 * @returns the point, or null where it is faulty
 */
export function readBarPoint(
  reading: Reading,
  place: Place,
  form: { bar?: string; at?: unknown },
  bars: BarReading[],
): BarPoint | null {
  const at = readQuantity(reading, [...place, 'at'], form.at, 'length')
  if (form.bar === undefined) return null
  const bar = bars.findIndex(({ name }) => name === form.bar)
  if (bar === -1) {
    if (bars.length === 0 || bars.some(({ name }) => name === null)) return null
    const known = bars.flatMap(({ name }) => (name === null ? [] : [name]))
    reading.faults.add([...place, 'bar'], faultText.unknownBar(form.bar, nearestName(form.bar, known), known))
    return null
  }
  const length = bars[bar].length
  if (at === null || length === null) return null
  if (at < 0 || at > length * (1 + ROUNDING)) {
    reading.faults.add([...place, 'at'], faultText.notOnBar(at, length))
    return null
  }
  return { bar, at: Math.min(at, length) }
}
