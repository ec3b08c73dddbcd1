import type { PageResult } from '../../../src-main/contract/bridge'
import type { Governing, SectionPeaks, SensePeak } from '../../../src-main/contract/result'

/** The governing margin with the peak that it is of. */
export interface GoverningPeak extends Governing {
  section: number
  /** Section of the line that it stands in. */
  row: SectionPeaks
  peak: SensePeak
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
  return row ? { ...governing, row, peak: row[governing.sense] } : null
}
