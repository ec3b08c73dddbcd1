/** Marks of a ruler; every value is a whole multiple of a step of 1, 2 or 5 times a power of ten. */
export interface Ticks {
  /** Distance between numbered marks. */
  step: number
  /** Numbered marks. */
  major: number[]
  /** Marks between them, without the numbered ones. */
  minor: number[]
  /** Decimal places that tell the numbered marks apart. */
  places: number
}

/** Marks between two numbered ones, by the leading digit of their step. */
const MINOR = { 1: 5, 2: 4, 5: 5 } as const

/**
 * Chooses the marks of a ruler.
 *
 * @param from - one end of the range
 * @param to - the other end, another than `from`
 * @param wanted - largest count of numbered marks, at least 1, plus the one that both ends may add
 * @returns marks within the range, ascending
 */
export function listTicks(from: number, to: number, wanted: number): Ticks {
  const low = Math.min(from, to)
  const high = Math.max(from, to)
  const { digit, power } = chooseStep((high - low) / Math.max(1, wanted))
  const parts = MINOR[digit]
  const multiples = (unit: number, share: number): number[] => {
    // Powers of ten below one are divided by, not multiplied with, so that 0.3 is 0.3.
    const scale = (i: number) =>
      power < 0 ? (i * unit) / share / 10 ** -power : ((i * unit) / share) * 10 ** power
    const size = scale(1)
    const first = Math.ceil(low / size - 1e-9)
    const last = Math.floor(high / size + 1e-9)
    return Array.from({ length: last - first + 1 }, (_, i) => scale(first + i) || 0)
  }
  const major = multiples(digit, 1)
  const step = digit * 10 ** power
  const minor = multiples(digit, parts).filter((value) => {
    const share = value / step
    return Math.abs(share - Math.round(share)) > 1e-6
  })
  return { step, major, minor, places: Math.max(0, -power) }
}

/**
 * Rounds a largest magnitude up to a limit that reads well: 1, 1.5, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8 or 9
 * times a power of ten.
 *
 * @param largest - zero or positive
 * @returns at least `largest`; 1 where it is zero
 */
export function roundUpLimit(largest: number): number {
  if (!(largest > 0)) return 1
  const power = Math.floor(Math.log10(largest) + 1e-12)
  const lead = largest / 10 ** power
  const nice = [1, 1.5, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 9, 10].find((one) => one >= lead * (1 - 1e-9)) ?? 10
  return power < 0 ? nice / 10 ** -power : nice * 10 ** power
}

function chooseStep(rough: number): { digit: 1 | 2 | 5; power: number } {
  const power = Math.floor(Math.log10(rough) + 1e-12)
  const lead = rough / 10 ** power
  if (lead <= 1 + 1e-9) return { digit: 1, power }
  if (lead <= 2 + 1e-9) return { digit: 2, power }
  if (lead <= 5 + 1e-9) return { digit: 5, power }
  return { digit: 1, power: power + 1 }
}
