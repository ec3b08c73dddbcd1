/**
 * Lists the round numbers along an axis: multiples of 1, 2 or 5 times a power of ten.
 *
 * @param from - lower end of the axis
 * @param to - upper end, above the lower one
 * @param count - about how many are wanted
 * @returns the numbers, ascending
 */
export function listTicks(from: number, to: number, count: number): number[] {
  const rough = (to - from) / count
  const power = 10 ** Math.floor(Math.log10(rough))
  const step = [1, 2, 5].map((n) => n * power).find((size) => size >= rough * (1 - 1e-9)) ?? 10 * power
  const ticks: number[] = []
  // Adding zero turns a negative zero into a plain one.
  for (let n = Math.ceil(from / step - 1e-9); n * step <= to + step * 1e-9; n++) ticks.push(n * step + 0)
  return ticks
}
