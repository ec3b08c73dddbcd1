import type { Rig } from '../../contract/rig'

/**
 * The name of a section for people, such as `shaft, section 2 (neck)`; sections count from 1.
 *
 * @param rig the rig
 * @param bar index of the bar, from 0
 * @param section index of the section in its bar, from 0
 * @returns words for a caution or a report
 */
export function describePlace(rig: Rig, bar: number, section: number): string {
  const own = rig.bars[bar].sections[section].name
  return `${rig.bars[bar].name}, section ${section + 1}${own === '' ? '' : ` (${own})`}`
}
