/** A value typed as one number with one unit, so that a hand can change it. */
export interface PlainValue {
  number: number
  /** As typed; empty where there is none. */
  unit: string
}

const PLAIN = /^\s*([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)\s*([A-Za-zµ%][A-Za-zµ0-9^/* ]*)?\s*$/

/**
 * Reads a value that is one number with at most one unit; formulas are left alone.
 *
 * @param typed - text or number of the rig
 * @returns number and unit; null for a formula or a name
 */
export function readPlainValue(typed: unknown): PlainValue | null {
  if (typeof typed === 'number') return { number: typed, unit: '' }
  if (typeof typed !== 'string') return null
  const match = PLAIN.exec(typed)
  return match && { number: Number(match[1]), unit: (match[2] ?? '').trim() }
}

/**
 * Writes such a value on the grid of a step, without the digits that rounding leaves over.
 *
 * @param number - in its unit
 * @param unit - as typed
 * @param step - 1, 2 or 5 times a power of ten
 * @returns such as `812 mm`
 */
export function writePlainValue(number: number, unit: string, step: number): string {
  const places = Math.max(0, -Math.floor(Math.log10(step) + 1e-9))
  const text = String(Number((Math.round(number / step) * step).toFixed(Math.min(places, 12))))
  return unit === '' ? text : `${text} ${unit}`
}

/**
 * Chooses the largest step of 1, 2 or 5 times a power of ten that is no larger than a size.
 *
 * @param size - positive
 * @returns the step
 */
export function chooseStep(size: number): number {
  const power = 10 ** Math.floor(Math.log10(size))
  const lead = size / power
  const digit = lead >= 5 ? 5 : lead >= 2 ? 2 : 1
  return power < 1 ? digit / Math.round(1 / power) : digit * power
}
