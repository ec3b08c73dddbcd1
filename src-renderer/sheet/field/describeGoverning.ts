import type { PageResult } from '../../../src-main/contract/bridge'
import { formatQuantity } from '../../format/formatQuantity'
import type { UnitSystem } from '../../format/units'
import { findGoverningPeak } from '../margin/governingPeak'
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
  const governing = findGoverningPeak(result)
  if (!governing) return null
  const { peak, local, kt } = governing.peak
  const write = (value: number): string => formatQuantity(value, 'stress', units, { digits: 3 }).text
  const { unit } = formatQuantity(local, 'stress', units)
  const isAtFillet = kt !== null && Math.abs(local) > Math.abs(peak) * (1 + 1e-9)
  return {
    x: governing.at,
    t: governing.time,
    text: isAtFillet ? `${write(local)} ${unit} at the fillet` : `${write(peak)} ${unit}`,
    over: governing.margin < 0,
  }
}
