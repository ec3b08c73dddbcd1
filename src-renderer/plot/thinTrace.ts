/**
 * Thins a trace to what a screen can show, keeping every extreme: of the samples in each column the
 * first, the smallest, the largest and the last stay, in their order.
 *
 * @param t - ascending, shape (n)
 * @param values - shape (n)
 * @param from - start of the range shown, in the unit of `t`
 * @param to - its end
 * @param columns - pixels across the range, at least 1
 * @returns places of the samples that stay, ascending, with one before and one after the range
 */
export function thinTrace(
  t: ArrayLike<number>,
  values: ArrayLike<number>,
  from: number,
  to: number,
  columns: number,
): number[] {
  const first = Math.max(0, findFrom(t, from) - 1)
  const last = Math.min(t.length - 1, findFrom(t, to))
  const kept: number[] = []
  const keep = (i: number): void => {
    if (kept.length === 0 || kept[kept.length - 1] < i) kept.push(i)
  }
  const columnOf = (i: number): number => Math.floor(((t[i] - from) / (to - from)) * columns)
  for (let i = first; i <= last;) {
    const column = columnOf(i)
    let low = i
    let high = i
    let end = i
    for (; end <= last && columnOf(end) === column; end++) {
      if (values[end] < values[low]) low = end
      if (values[end] > values[high]) high = end
    }
    keep(i)
    keep(Math.min(low, high))
    keep(Math.max(low, high))
    keep(end - 1)
    i = end
  }
  return kept
}

/**
 * Finds the first sample at or after a time.
 *
 * @param t - ascending, shape (n)
 * @param time - in the unit of `t`
 * @returns 0..n, n where every sample is earlier
 */
export function findFrom(t: ArrayLike<number>, time: number): number {
  let low = 0
  let high = t.length
  while (low < high) {
    const middle = (low + high) >> 1
    if (t[middle] < time) low = middle + 1
    else high = middle
  }
  return low
}
