import type { ForceEnvelope } from '../records/record'

/** Share of the largest force of a run that rounding alone may leave. */
const ROUNDING = 1e-9

/**
 * The force up to which a place of this run carries none but rounding, 1e-9 of the largest force anywhere.
 *
 * @param envelope of the run
 * @returns [N]
 */
export function evaluateForceless({ tension, compression }: ForceEnvelope): number {
  let largest = 0
  for (let i = 0; i < tension.length; i++) largest = Math.max(largest, tension[i], -compression[i])
  return ROUNDING * largest
}
