import type { PageResult } from '../../../src-main/contract/bridge'
import { formatQuantity } from '../../format/formatQuantity'
import type { UnitSystem } from '../../format/units'
import type { GoverningMark } from './draw/fieldModel'

/**
 * Finds the governing point and the words of its ring: the local stress that its margin is taken of, with
 * the factor of the shoulder where it comes from one.
 *
 * @param result - of the run
 * @param units - whose units
 * @returns null without a margin
 */
export function describeGoverning(result: PageResult, units: UnitSystem): GoverningMark | null {
  const { governing, sections } = result
  const section =
    governing && sections.find((it) => it.bar === governing.bar && it.section === governing.section)
  if (!governing || !section) return null
  const { at, time, peak, local, kt } = section[governing.sense]
  const write = (value: number): string => formatQuantity(value, 'stress', units, { digits: 3 }).text
  const { unit } = formatQuantity(local, 'stress', units)
  const isLocal = kt !== null && Math.abs(local) > Math.abs(peak) * (1 + 1e-9)
  return {
    x: at,
    t: time,
    text: isLocal ? `${write(local)} ${unit} at the fillet` : `${write(peak)} ${unit}`,
    over: governing.margin < 0,
  }
}
