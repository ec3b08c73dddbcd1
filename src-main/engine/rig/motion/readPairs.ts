import { faultText } from '../faultText'
import type { DimensionName } from '../formula/dimension'
import type { Place } from '../place'
import { readQuantity } from '../readQuantity'
import type { Reading } from '../reading'

/** Two columns of equal length, SI. */
export interface Columns {
  first: number[]
  second: number[]
}

/**
 * Reads rows of two values, of which the first rises from row to row.
 * @param reading gets `out-of-range` and the faults of quantities
 * @param place where the rows stand
 * @param rows undefined where they are missing
 * @param dimensions of the two values
 * @param what the first values are called, such as `times`
 * @returns both columns, or null where anything in them is faulty
 */
export function readPairs(
  reading: Reading,
  place: Place,
  rows: unknown,
  dimensions: readonly [DimensionName, DimensionName],
  what: string,
): Columns | null {
  if (!Array.isArray(rows)) return null
  const first: number[] = []
  const second: number[] = []
  let whole = true
  rows.forEach((row: unknown, i) => {
    const [a, b] = (Array.isArray(row) ? row : []) as unknown[]
    const left = readQuantity(reading, [...place, i, 0], a, dimensions[0])
    const right = readQuantity(reading, [...place, i, 1], b, dimensions[1])
    if (left === null || right === null) {
      whole = false
      return
    }
    const before = first[first.length - 1]
    if (before !== undefined && left <= before) {
      reading.faults.add([...place, i, 0], faultText.notAscending(what, i + 1))
      whole = false
    }
    first.push(left)
    second.push(right)
  })
  return whole ? { first, second } : null
}
