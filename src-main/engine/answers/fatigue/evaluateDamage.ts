import type { Material } from '../../../contract/rig'
import { evaluateBasquin } from './evaluateBasquin'

/** Cycles at the strength coefficient, one reversal: a shorter life has no meaning. */
const SHORTEST = 0.5

/**
 * The share of a life that some cycles use up.
 *
 *     D = sum of count / N
 *
 * with N by the Basquin line at half the range, not under half a cycle; mean stress is not counted.
 * Failure is taken at D = 1. Source: Miner (1945), from memory.
 *
 * @param cycles ranges [Pa] and their counts
 * @param line the material's fatigue line
 * @returns the damage [1], zero or positive
 */
export function evaluateDamage(
  cycles: readonly { range: number; count: number }[],
  { strength, exponent }: NonNullable<Material['fatigue']>,
): number {
  return cycles.reduce(
    (sum, { range, count }) =>
      sum + count / Math.max(SHORTEST, evaluateBasquin(strength, exponent, range / 2)),
    0,
  )
}
