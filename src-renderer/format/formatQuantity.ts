/** The unit in which the sheet writes each quantity, and its size in SI. */
const UNITS = {
  stress: { unit: 'MPa', size: 1e6 },
  length: { unit: 'mm', size: 1e-3 },
  time: { unit: 'ms', size: 1e-3 },
  speed: { unit: 'm/s', size: 1 },
} as const

export type Quantity = keyof typeof UNITS

/**
 * Writes a quantity as the sheet does: four significant digits, a true minus, the unit apart.
 *
 * @param value - in SI
 * @param quantity - what it is
 * @returns the number in the sheet's unit, and that unit
 */
export function formatQuantity(value: number, quantity: Quantity): { number: string; unit: string } {
  const { unit, size } = UNITS[quantity]
  return { number: formatNumber(value / size), unit }
}

/**
 * Writes a plain number with four significant digits and a true minus.
 *
 * @param value - any finite number
 * @returns such as `−215` or `7.7e−15`
 */
export function formatNumber(value: number): string {
  return String(Number(value.toPrecision(4))).replaceAll('-', '−')
}

/**
 * Writes a margin of safety with its sign, rounded down so that it never looks larger than it is.
 *
 * @param margin - allowable over factored stress, less one
 * @returns such as `+0.43` or `−0.08`
 */
export function formatMargin(margin: number): string {
  const cents = Math.floor(margin * 100 + 1e-9)
  return `${cents < 0 ? '−' : '+'}${(Math.abs(cents) / 100).toFixed(2)}`
}
