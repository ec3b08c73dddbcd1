/**
 * The root of a function between two places where its signs differ, by bisection down to rounding.
 *
 * @param f a continuous function
 * @param low lower end of the bracket
 * @param high upper end
 * @returns the root, same unit as the ends
 * @throws RangeError where the signs do not differ, a fault of the caller
 */
export function solveBracket(f: (x: number) => number, low: number, high: number): number {
  const below = f(low)
  if (below === 0) return low
  if (below * f(high) > 0) throw new RangeError(`No change of sign between ${low} and ${high}`)
  for (;;) {
    const middle = low + (high - low) / 2
    if (middle <= low || middle >= high) return middle
    const value = f(middle)
    if (value === 0) return middle
    if (value * below > 0) low = middle
    else high = middle
  }
}
