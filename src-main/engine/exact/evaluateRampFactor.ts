import { evaluateFixedEndForce } from './evaluateFixedEndForce'

/**
 * Largest fixed-end force over P for a load that rises evenly over tr and then stays, exact: the force is
 * linear between its kinks, and it repeats every 4L/c once the load is up.
 *
 * @param rise tr c/L, 0 for a sudden load [1]
 * @returns dynamic load factor [1]
 */
export function evaluateRampFactor(rise: number): number {
  const load = (tau: number) => (tau < 0 ? 0 : rise === 0 ? 1 : Math.min(1, tau / rise))
  let largest = 0
  for (let n = 0; 2 * n + 1 <= rise + 6; n++)
    for (const tau of [2 * n + 1, 2 * n + 1 + rise])
      largest = Math.max(largest, evaluateFixedEndForce(load, tau))
  return largest
}
