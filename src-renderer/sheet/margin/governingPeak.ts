import type { PageResult } from '../../../src-main/contract/bridge'
import type { Governing, SectionPeaks, SensePeak } from '../../../src-main/contract/result'

/** The governing margin with the peak that it is of. */
export interface GoverningPeak extends Governing {
  /** Of the section that it stands in. */
  row: SectionPeaks
  peak: SensePeak
  /** Where [m] and when [s] the stress that it is taken of is reached. */
  at: number
  time: number
}

/**
 * Finds the peak that governs.
 *
 * @param result - of a run
 * @returns the peak; null where no section has a margin
 */
export function findGoverningPeak({
  governing,
  sections,
}: Pick<PageResult, 'governing' | 'sections'>): GoverningPeak | null {
  if (!governing) return null
  const row = sections.find((it) => it.bar === governing.bar && it.section === governing.section)
  if (!row) return null
  const peak = row[governing.sense]
  return { ...governing, row, peak, at: peak.localAt, time: peak.localTime }
}
