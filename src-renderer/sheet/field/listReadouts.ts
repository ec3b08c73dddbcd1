import type { Profile, Quantity } from '../../../src-main/contract/bridge'
import { formatQuantity } from '../../format/formatQuantity'
import type { UnitDimension, UnitSystem } from '../../format/units'
import { findFrom } from '../../plot/thinTrace'
import { QUANTITIES } from './quantities'
import type { ProfileScale } from './useProfile'

/** One quantity at the cursor, as it is read. */
export interface Readout {
  name: string
  /** Number and unit; a dash and nothing where there is no bar. */
  text: string
  unit: string
  /** The quantity of the field that it chooses; null where it is read only. */
  quantity: Quantity | null
}

const ROWS: {
  name: string
  key: Exclude<keyof Profile, 'x'>
  dimension: UnitDimension
  quantity: Quantity | null
}[] = [
  ...(['stress', 'force', 'velocity', 'energy'] as const).map((key) => ({
    name: QUANTITIES[key].name,
    key,
    dimension: QUANTITIES[key].dimension,
    quantity: key,
  })),
  { name: 'Strain', key: 'strain', dimension: 'strain', quantity: null },
  { name: 'Right-going', key: 'rightgoing', dimension: 'force', quantity: null },
  { name: 'Left-going', key: 'leftgoing', dimension: 'force', quantity: null },
]

/** Share of the largest value met under which a value is the rounding of zero. */
const ROUNDING = 1e-9

/**
 * Reads every quantity at a place.
 *
 * @param values - at the place, profiles of one column; null where there is none
 * @param scale - largest magnitude of each quantity met so far in the run; null where none was met
 * @param units - whose units
 * @returns a row for each quantity
 */
export function listReadouts(
  values: Profile | null,
  scale: ProfileScale | null,
  units: UnitSystem,
): Readout[] {
  return ROWS.map(({ name, key, dimension, quantity }) => {
    const value = values?.[key][0] ?? Number.NaN
    if (!Number.isFinite(value)) return { name, quantity, text: '–', unit: '' }
    const isRounding = scale !== null && Math.abs(value) < ROUNDING * scale[key]
    return { name, quantity, ...formatQuantity(isRounding ? 0 : value, dimension, units) }
  })
}

/**
 * Finds the column whose middle is nearest to a place.
 *
 * @param x - middles, ascending [m]
 * @param place - [m]
 * @returns its index; -1 where there are none
 */
export function findColumn(x: ArrayLike<number>, place: number): number {
  const after = findFrom(x, place)
  if (after === 0) return x.length === 0 ? -1 : 0
  if (after === x.length) return x.length - 1
  return x[after] - place < place - x[after - 1] ? after : after - 1
}
