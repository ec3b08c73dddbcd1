import type { SectionPeaks } from '../contract/result'

/**
 * Reads the factor of safety back from any margin: n = allowable / (|local| (margin + 1)).
 *
 * @param sections - peaks and margins, SI
 * @returns the factor [1]; null where no section has a margin
 */
export function evaluateSafetyFactor(sections: SectionPeaks[]): number | null {
  for (const { tension, compression } of sections) {
    for (const { allowable, local, margin } of [tension, compression]) {
      if (allowable !== null && margin !== null) return allowable / (Math.abs(local) * (margin + 1))
    }
  }
  return null
}
