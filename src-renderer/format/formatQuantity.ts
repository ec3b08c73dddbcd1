import { formatNumber, type NumberOptions } from './formatNumber'
import { UNITS, type UnitDimension, type UnitSystem } from './units'

/**
 * Writes a physical value as the sheet does, the unit apart so that it can stand in lighter ink.
 *
 * @param value - in SI; null where there is none
 * @param dimension - what it is
 * @param units - whose units
 * @param options - digits and sign
 * @returns the number in that unit, and the unit
 */
export function formatQuantity(
  value: number | null,
  dimension: UnitDimension,
  units: UnitSystem,
  options?: NumberOptions,
): { text: string; unit: string } {
  const { name, size } = UNITS[dimension][units]
  return value === null
    ? { text: 'none', unit: '' }
    : { text: formatNumber(value / size, options), unit: name }
}
