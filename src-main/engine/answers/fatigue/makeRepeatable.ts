import { findTurningPoints } from './findTurningPoints'

/**
 * Turns one history of many equal ones in a row so that it starts and ends at its largest value.
 *
 * Counted so, every range of the repeated history is a whole cycle, also the largest one, which a
 * single history from rest counts as a half. Source: ASTM E1049-85, section 5.4.5 (from memory).
 *
 * @param history of one repetition, shape (n), all finite; the next one starts where it starts
 * @param smallest swing that is dropped, in the unit of the history
 * @returns the turning points' values from the largest through the end and the start back to it; empty
 *   for an empty history
 */
export function makeRepeatable(history: ArrayLike<number>, smallest = 0): number[] {
  const values = findTurningPoints(history, smallest).map((i) => history[i])
  if (values.length === 0) return []
  const top = values.reduce((best, value, i) => (value > values[best] ? i : best), 0)
  return [...values.slice(top), ...values.slice(0, top + 1)]
}
