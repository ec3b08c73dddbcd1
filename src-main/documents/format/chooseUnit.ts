import { UNITS, type Quantity, type Unit } from './quantity'

/**
 * Chooses the unit in which numbers of one kind are read: the largest unit that the largest number reaches.
 *
 * @param quantity - what the numbers measure
 * @param values - the numbers that share the unit, SI; an empty list or zeros take the first unit
 * @returns the unit's name and size
 */
export function chooseUnit(quantity: Quantity, values: Iterable<number>): Unit {
  let largest = 0
  for (const value of values) largest = Math.max(largest, Math.abs(value))
  const units = UNITS[quantity]
  // A number that rounding alone keeps below a unit, such as 0.9999999 ms, belongs to that unit.
  return units.findLast((unit) => largest >= unit.size * (1 - 1e-9)) ?? units[0]
}
