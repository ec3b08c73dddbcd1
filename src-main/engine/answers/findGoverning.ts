import type { Governing, SectionPeaks } from '../../contract/result'

/**
 * The smallest margin of all sections and senses; the first one along the line where several are equal.
 *
 * @param sections the peaks of every section
 * @returns where the smallest margin is; null where no section has one
 */
export function findGoverning(sections: SectionPeaks[]): Governing | null {
  let governing: Governing | null = null
  for (const { bar, section, tension, compression } of sections) {
    for (const [sense, { margin }] of [
      ['tension', tension],
      ['compression', compression],
    ] as const) {
      if (margin !== null && (governing === null || margin < governing.margin))
        governing = { bar, section, sense, margin }
    }
  }
  return governing
}
