import type { Profile, Quantity } from '../../../src-main/contract/bridge'
import { formatQuantity } from '../../format/formatQuantity'
import type { UnitDimension, UnitSystem } from '../../format/units'
import { findFrom } from '../../plot/thinTrace'
import { QUANTITIES } from './quantities'
import type { Moment } from './useProfile'

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
 * @param moment - along the line at the cursor's time; null where there is none
 * @param x - the place [m]
 * @param units - whose units
 * @returns a row for each quantity
 */
export function listReadouts(
  moment: Pick<Moment, 'profile' | 'scale'> | null,
  x: number | null,
  units: UnitSystem,
): Readout[] {
  const column = moment && x !== null ? findColumn(moment.profile.x, x) : -1
  return ROWS.map(({ name, key, dimension, quantity }) => {
    const value = moment && column >= 0 ? moment.profile[key][column] : Number.NaN
    if (!moment || !Number.isFinite(value)) return { name, quantity, text: '–', unit: '' }
    const isRounding = Math.abs(value) < ROUNDING * moment.scale[key]
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
