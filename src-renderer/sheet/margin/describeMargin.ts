import type { PageResult } from '../../../src-main/contract/bridge'
import { formatMargin } from '../../format/formatMargin'
import { formatNumber } from '../../format/formatNumber'
import { formatQuantity } from '../../format/formatQuantity'
import { UNITS, type UnitSystem } from '../../format/units'
import { findGoverningPeak } from './governingPeak'

/** A number with its unit, and what stands behind them. */
export interface Fact {
  before?: string
  text: string
  unit: string
}

/** The governing margin in the words of the sheet. */
export interface MarginWords {
  over: boolean
  /** Such as `+0.43`. */
  figure: string
  /** Such as `Tension, shaft section 1`. */
  place: string
  /** Where and when. */
  at: Fact[]
  /** Stress without its sign, such as `326`. */
  stress: string
  /** What is allowed, such as `of 467 MPa (700 ÷ 1.5)`. */
  limit: string
  /** Factor of the fillet that it counts; empty without one. */
  fillet: string
}

/**
 * Puts the governing margin into words.
 *
 * @param result - of the run
 * @param units - the reader's
 * @returns the words; null where no section has a margin
 */
export function describeMargin(result: PageResult, units: UnitSystem): MarginWords | null {
  const governing = findGoverningPeak(result)
  if (!governing) return null
  const { bar, section, sense, margin, row, peak, at, time } = governing
  const alone = result.sections.filter((it) => it.bar === row.bar).length === 1
  const { size, name } = UNITS.stress[units]
  const { allowable, local, kt } = peak
  const whole = (value: number): string => formatNumber(value / size, { digits: 3 })
  const factor = result.factorOfSafety
  return {
    over: margin < 0,
    figure: formatMargin(margin),
    place: `${sense === 'tension' ? 'Tension' : 'Compression'}, ${bar}${alone ? '' : ` section ${section + 1}`}`,
    at: [
      { before: 'x', ...formatQuantity(at, 'length', units, { trim: true }) },
      { before: 't', ...formatQuantity(time, 'time', units, { digits: 3 }) },
    ],
    stress: whole(Math.abs(local)),
    limit:
      allowable === null
        ? name
        : `of ${whole(allowable / factor)} ${name} (${whole(allowable)} ÷ ${formatNumber(factor, { digits: 3, trim: true })})`,
    fillet:
      kt !== null && Math.abs(local) > Math.abs(peak.peak) * (1 + 1e-9)
        ? `with Kt ${formatNumber(kt, { digits: 3 })} at the fillet`
        : '',
  }
}

/**
 * Writes the speed at which the governing margin is zero, rounded down so that it is never too high.
 *
 * @param striker - of the run
 * @param units - the reader's
 * @returns the speed with its unit and its meaning; null without a striker
 */
export function describeSafeSpeed(striker: PageResult['striker'], units: UnitSystem): Fact | null {
  if (!striker) return null
  if (striker.safeSpeed === null) return { text: '', unit: 'no one safe speed for this rig' }
  const { size, name } = UNITS.velocity[units]
  const speed = Math.abs(striker.safeSpeed) / size
  const step = 10 ** (Math.floor(Math.log10(speed)) - 2)
  const down = speed > 0 ? Math.floor(speed / step + 1e-9) * step : 0
  return { text: formatNumber(down, { digits: 3 }), unit: `${name} safe striker speed` }
}
