import { chooseUnit } from './chooseUnit'
import { formatNumber } from './formatNumber'
import type { Quantity } from './quantity'

/**
 * Writes a physical value for people, with its unit.
 *
 * @param value - SI; null where there is none
 * @param quantity - what it measures
 * @returns such as `425.3 MPa`; `none` for null
 */
export function formatQuantity(value: number | null, quantity: Quantity): string {
  if (value === null) return 'none'
  const unit = chooseUnit(quantity, [value])
  const number = formatNumber(value / unit.size)
  return unit.name === '' ? number : `${number} ${unit.name}`
}
