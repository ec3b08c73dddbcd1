import type { PageGauge, Quantity } from '../../../src-main/contract/bridge'
import type { UnitDimension } from '../../format/units'

/** What the traces show for each quantity of the field; gauges read no energy, so there they show stress. */
export const TRACE_QUANTITY = {
  stress: 'stress',
  force: 'force',
  velocity: 'velocity',
  energy: 'stress',
} as const satisfies Record<Quantity, keyof PageGauge & UnitDimension>

export type TraceQuantity = (typeof TRACE_QUANTITY)[Quantity]

/**
 * Largest magnitude that any of the gauges reads.
 *
 * @param gauges - of one run
 * @param quantity - which trace
 * @returns zero or positive, SI
 */
export function findLargest(gauges: readonly PageGauge[], quantity: TraceQuantity): number {
  let largest = 0
  for (const gauge of gauges)
    for (const value of gauge[quantity]) largest = Math.max(largest, Math.abs(value))
  return largest
}
