const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹'
const DIGITS = 4

/**
 * Writes a number for people: four significant digits, a true minus, a power of ten outside 0.0001 to 999999.
 *
 * @param value - any number, in the unit it is shown in
 * @returns such as `12.35`, `−0.001200` or `3.142 × 10⁻¹⁶`
 */
export function formatNumber(value: number): string {
  if (value === 0) return '0'
  if (!Number.isFinite(value)) return String(value)
  const sign = value < 0 ? '−' : ''
  const [mantissa, power] = Math.abs(value)
    .toExponential(DIGITS - 1)
    .split('e')
  const exponent = Number(power)
  if (exponent < -4 || exponent > 5) return `${sign}${mantissa} × 10${superscript(exponent)}`
  return sign + Number(`${mantissa}e${exponent}`).toFixed(Math.max(0, DIGITS - 1 - exponent))
}

function superscript(exponent: number): string {
  const digits = [...String(Math.abs(exponent))].map((digit) => SUPERSCRIPTS[Number(digit)]).join('')
  return (exponent < 0 ? '⁻' : '') + digits
}
