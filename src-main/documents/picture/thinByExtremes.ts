/**
 * Thins a trace for drawing: of every column the first, lowest, highest and last sample stay, so that no
 * peak is lost.
 *
 * @param x - ascending, shape (n)
 * @param y - shape (n)
 * @param columns - how many columns the picture has
 * @returns indices of the samples that stay, ascending; all of them where there are few
 */
export function thinByExtremes(x: ArrayLike<number>, y: ArrayLike<number>, columns: number): number[] {
  const count = x.length
  if (count <= 4 * columns) return Array.from({ length: count }, (_none, i) => i)
  const width = (x[count - 1] - x[0]) / columns
  const kept: number[] = []
  for (let first = 0; first < count;) {
    const edge = x[0] + width * (Math.floor((x[first] - x[0]) / width) + 1)
    let next = first
    let lowest = first
    let highest = first
    while (next < count && (next === first || x[next] < edge)) {
      if (y[next] < y[lowest]) lowest = next
      if (y[next] > y[highest]) highest = next
      next++
    }
    kept.push(...[...new Set([first, lowest, highest, next - 1])].sort((a, b) => a - b))
    first = next
  }
  return kept
}
