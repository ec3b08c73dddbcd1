import { thinTrace } from '../../plot/thinTrace'

/**
 * Points of a trace for an upright chart, thinned to what the plot can show.
 *
 * @param t - ascending [s], shape (n)
 * @param values - shape (n)
 * @param frame - range of time shown [s] and height of the plot [px]
 * @returns `[value, t]` with t ascending
 */
export function thinPoints(
  t: ArrayLike<number>,
  values: ArrayLike<number>,
  { fromT, toT, height }: { fromT: number; toT: number; height: number },
): [number, number][] {
  return thinTrace(t, values, fromT, toT, Math.max(1, Math.round(height))).map((i) => [values[i], t[i]])
}
