import { faultText } from '../faultText'
import type { Place } from '../place'
import type { Reading } from '../reading'

/**
 * Checks that exactly one of some keys is given.
 * @param reading gets `missing` at the first key, or `conflict`
 * @param place of the object
 * @param form the object
 * @param keys of which one is expected
 */
export function checkOneOf(reading: Reading, place: Place, form: object, keys: readonly string[]): void {
  const given = keys.filter((key) => Object.hasOwn(form, key))
  if (given.length === 1) return
  reading.faults.add(given.length === 0 ? [...place, keys[0]] : place, faultText.oneOf(keys, given.length))
}
