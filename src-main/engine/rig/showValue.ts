const LONGEST = 60

/**
 * Writes a value of a rig file into a message: short, on one line.
 * @param value as it was read
 * @returns such as `"25 mm"`, `true`, `a list` or `an object`
 */
export function showValue(value: unknown): string {
  if (Array.isArray(value)) return 'a list'
  if (typeof value === 'object' && value !== null) return 'an object'
  if (typeof value !== 'string') return String(value)
  return JSON.stringify(value.length > LONGEST ? `${value.slice(0, LONGEST)}...` : value)
}

/**
 * Writes a number with at most six digits, in the same way on every machine.
 * @param value any
 * @returns such as `32` or `1.25e-7`
 */
export function showNumber(value: number): string {
  return String(Number(value.toPrecision(6)))
}

/**
 * Writes a length in millimetres.
 * @param length [m]
 */
export function showLength(length: number): string {
  return `${showNumber(length * 1000)} mm`
}
