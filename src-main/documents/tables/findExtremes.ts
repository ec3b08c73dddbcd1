/**
 * Finds where a list of numbers is highest and lowest.
 *
 * @param values - shape (n)
 * @returns the first index of each; 0 for an empty list
 */
export function findExtremes(values: ArrayLike<number>): { highest: number; lowest: number } {
  let highest = 0
  let lowest = 0
  for (let i = 1; i < values.length; i++) {
    if (values[i] > values[highest]) highest = i
    if (values[i] < values[lowest]) lowest = i
  }
  return { highest, lowest }
}
