/**
 * Names a section for people, counted from 1 as it is counted on the bench; files count from 0.
 *
 * @param bar - the bar's name
 * @param section - the section's index in its bar, from 0
 * @returns such as `shaft, section 2`
 */
export function formatSection(bar: string, section: number): string {
  return `${bar}, section ${section + 1}`
}
