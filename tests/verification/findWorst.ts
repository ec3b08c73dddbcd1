/** The largest magnitude in a list; NaN where one is not a number. */
export function findWorst(values: ArrayLike<number>): number {
  let worst = 0
  for (let i = 0; i < values.length; i++) {
    const size = Math.abs(values[i])
    if (Number.isNaN(size)) return NaN
    if (size > worst) worst = size
  }
  return worst
}
