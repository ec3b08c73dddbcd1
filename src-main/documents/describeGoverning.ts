import type { Result } from '../contract/result'
import { formatMargin } from './format/formatMargin'
import { formatQuantity } from './format/formatQuantity'
import { formatSection } from './format/formatSection'

/** The governing margin in words. */
export interface GoverningWords {
  /** The margin with its sign; `none` where no section has one. */
  margin: string
  negative: boolean
  /** What the margin means, one short sentence. */
  verdict: string
  /** Place, moment and stresses. */
  place: string
}

/**
 * Puts the governing margin into words; a negative one says so first.
 *
 * @param result - SI
 * @returns margin, verdict and place
 */
export function describeGoverning({ governing, sections, factorOfSafety }: Result): GoverningWords {
  if (governing === null) {
    return {
      margin: 'none',
      negative: false,
      verdict: 'No margin: no section has both a stress and an allowable.',
      place: '',
    }
  }
  const { bar, section, sense, margin } = governing
  const negative = margin < 0
  const peak = sections.find((row) => row.bar === bar && row.section === section)?.[sense]
  const words = [`${formatSection(bar, section)}, ${sense}`]
  if (peak) {
    words.push(`local stress ${formatQuantity(peak.local, 'stress')}`)
    words.push(
      `allowable ${formatQuantity(peak.allowable, 'stress')}, factor of safety ${formatQuantity(factorOfSafety, 'ratio')}`,
    )
    words.push(`at ${formatQuantity(peak.localAt, 'length')}, ${formatQuantity(peak.localTime, 'time')}`)
  }
  return {
    margin: formatMargin(margin),
    negative,
    verdict: negative
      ? 'NEGATIVE MARGIN: the stress is over what the factor of safety allows.'
      : 'No margin is negative.',
    place: words.join('; '),
  }
}
