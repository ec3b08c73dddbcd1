import { findFrom } from '../../plot/thinTrace'

/**
 * Reads a trace at the sample nearest to a moment.
 *
 * @param t - ascending [s], shape (n)
 * @param values - shape (n)
 * @param moment - [s]
 * @returns the sample's value; null without samples
 */
export function readNearest(t: ArrayLike<number>, values: ArrayLike<number>, moment: number): number | null {
  if (t.length === 0) return null
  const after = Math.min(t.length - 1, findFrom(t, moment))
  const before = Math.max(0, after - 1)
  return values[moment - t[before] < t[after] - moment ? before : after]
}
