import { faultText } from '../faultText'
import type { Place } from '../place'
import type { Reading } from '../reading'

/**
 * Checks the second column of a loading curve: it never falls and it ends above zero.
 * @param reading gets `out-of-range`
 * @param place where the rows stand
 * @param values shape (rows), SI
 * @param what they are called, such as `forces`
 */
export function checkLoading(reading: Reading, place: Place, values: readonly number[], what: string): void {
  values.forEach((value, i) => {
    if (i > 0 && value < values[i - 1])
      reading.faults.add([...place, i, 1], faultText.notFalling(what, i + 1))
  })
  if (values.every((value) => value === 0)) {
    reading.faults.add([...place, values.length - 1, 1], faultText.curveAllZero(what))
  }
}
