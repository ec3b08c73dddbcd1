import type { Quantity } from '../../../src-main/contract/bridge'
import type { UnitDimension } from '../../format/units'

/** How a quantity of the field is written. */
export interface QuantityWords {
  name: string
  dimension: UnitDimension
  /** What its two signs are called; null for a quantity without sign. */
  signs: { positive: string; negative: string } | null
}

const PULL = { positive: 'tension', negative: 'compression' }

/** The quantities that the field shows. */
export const QUANTITIES: Record<Quantity, QuantityWords> = {
  stress: { name: 'Stress', dimension: 'stress', signs: PULL },
  force: { name: 'Force', dimension: 'force', signs: PULL },
  velocity: {
    name: 'Velocity',
    dimension: 'velocity',
    signs: { positive: 'rightward', negative: 'leftward' },
  },
  energy: { name: 'Energy', dimension: 'energyDensity', signs: null },
}

/** In the order in which they are offered. */
export const QUANTITY_ORDER: readonly Quantity[] = ['stress', 'force', 'velocity', 'energy']
