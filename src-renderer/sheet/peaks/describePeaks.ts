import type { PageResult } from '../../../src-main/contract/bridge'
import { formatMargin } from '../../format/formatMargin'
import { formatNumber } from '../../format/formatNumber'
import { formatQuantity } from '../../format/formatQuantity'
import { UNITS, type UnitSystem } from '../../format/units'
import { findGoverningPeak } from '../margin/governingPeak'

/**
 * Says what the chart of the peaks shows.
 *
 * @param result - of the run
 * @param units - the reader's
 * @returns lines under its name, and a sentence for those who do not see it
 */
export function describePeaks(result: PageResult, units: UnitSystem): { head: string[]; summary: string } {
  const { name } = UNITS.stress[units]
  const governing = findGoverningPeak(result)
  const factor = formatNumber(result.factorOfSafety, { digits: 3, trim: true })
  const head = governing ? [`${name}, with`, 'allowable', `÷ ${factor}`] : [name]
  const extremes = (['tension', 'compression'] as const).map((sense) => {
    const largest = Math.max(...result.sections.map((section) => Math.abs(section[sense].peak)))
    const { text, unit } = formatQuantity(largest, 'stress', units)
    return `largest ${sense} ${text} ${unit}`
  })
  const margin = governing
    ? `governing margin ${formatMargin(governing.margin)}, ${governing.sense}, ${governing.bar} section ${governing.section + 1}`
    : 'no margins'
  return { head, summary: `${extremes.join(', ')}; ${margin}` }
}
