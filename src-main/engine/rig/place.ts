import { quote } from './showValue'

/** Where a value stands in a rig file: keys and indexes from the top. */
export type Place = readonly (string | number)[]

/**
 * Writes a place the way faults name it.
 * @param place keys and indexes from the top
 * @returns such as `bars[0].sections[1].length`; a key that is no plain name stands as `["a b"]`
 */
export function formatPlace(place: Place): string {
  let text = ''
  for (const part of place) {
    if (typeof part === 'number') text += `[${part}]`
    else if (/^[A-Za-z_][A-Za-z0-9_-]*$/.test(part)) text += text === '' ? part : `.${part}`
    else text += `[${quote(part)}]`
  }
  return text
}
