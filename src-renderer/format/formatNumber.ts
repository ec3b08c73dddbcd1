const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹'

export interface NumberOptions {
  /** Significant digits; four where left out. */
  digits?: number
  /** Takes off the zeros at the end of a fraction. */
  trim?: boolean
  /** Writes a plus before what is larger than zero. */
  signed?: boolean
}

/**
 * Writes a number for people, with a true minus and a power of ten outside 0.0001 to 999999.
 *
 * @param value - any number, in the unit it is shown in
 * @param options - how
 * @returns such as `−215.0`, `12.35` or `7.700 × 10⁻¹⁵`
 */
export function formatNumber(
  value: number,
  { digits = 4, trim = false, signed = false }: NumberOptions = {},
): string {
  if (value === 0) return '0'
  if (!Number.isFinite(value)) return Number.isNaN(value) ? 'none' : value > 0 ? '∞' : '−∞'
  const sign = value < 0 ? '−' : signed ? '+' : ''
  const [mantissa, power] = Math.abs(value)
    .toExponential(digits - 1)
    .split('e')
  const exponent = Number(power)
  const cut = (text: string): string => (trim && text.includes('.') ? text.replace(/\.?0+$/, '') : text)
  if (exponent < -4 || exponent > 5) return `${sign}${cut(mantissa)} × 10${superscript(exponent)}`
  return sign + cut(Number(`${mantissa}e${exponent}`).toFixed(Math.max(0, digits - 1 - exponent)))
}

function superscript(exponent: number): string {
  const digits = [...String(Math.abs(exponent))].map((digit) => SUPERSCRIPTS[Number(digit)]).join('')
  return (exponent < 0 ? '⁻' : '') + digits
}
