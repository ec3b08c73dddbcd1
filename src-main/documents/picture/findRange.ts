/**
 * Finds the range of an axis that shows all values and zero, with a little room at both ends.
 *
 * @param lists - values in one unit
 * @returns the axis's ends, ascending; -1 to 1 where everything is zero
 */
export function findRange(lists: ArrayLike<number>[]): [number, number] {
  let lowest = 0
  let highest = 0
  for (const list of lists) {
    for (let i = 0; i < list.length; i++) {
      if (list[i] < lowest) lowest = list[i]
      if (list[i] > highest) highest = list[i]
    }
  }
  if (lowest === highest) return [-1, 1]
  const room = (highest - lowest) * 0.05
  return [lowest - room, highest + room]
}
