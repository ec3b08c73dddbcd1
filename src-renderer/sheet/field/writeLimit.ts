import type { Quantity } from '../../../src-main/contract/bridge'
import { formatQuantity } from '../../format/formatQuantity'
import type { UnitSystem } from '../../format/units'
import { QUANTITIES } from './quantities'

/**
 * Writes the value of the last colour.
 *
 * @param quantity - shown
 * @param limit - the value [SI]
 * @param units - whose units
 * @returns number, without the zeros at its end, and unit
 */
export function writeLimit(
  quantity: Quantity,
  limit: number,
  units: UnitSystem,
): { text: string; unit: string } {
  return formatQuantity(limit, QUANTITIES[quantity].dimension, units, { digits: 2, trim: true })
}

/**
 * Lists the words beside the colours, from the top down.
 *
 * @param quantity - shown
 * @param limit - value of the last colour [SI]
 * @param units - whose units
 */
export function listBarWords(quantity: Quantity, limit: number, units: UnitSystem): string[] {
  const { text, unit } = writeLimit(quantity, limit, units)
  const { signs } = QUANTITIES[quantity]
  if (!signs) return [`${text} ${unit}`, '0']
  return [`+${text} ${unit}`, signs.positive, '0', signs.negative, `−${text} ${unit}`]
}
