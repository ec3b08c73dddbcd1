import { parsePath } from './parsePath'
import type { RigDocument } from './rigDocument'

/**
 * Names a part of a rig for people, counted from 1.
 *
 * @param document - the rig
 * @param path - of the part or of something in it
 * @returns such as `shaft, section 3`, `joint 1`, `gauge G1`, `left end`
 */
export function namePart(document: RigDocument, path: string): string {
  const [first, index, inner, innerIndex] = parsePath(path)
  if (typeof index === 'number') {
    if (first === 'bars') {
      const bars = document.bars?.[index]
      const bar = bars?.name || `bar ${index + 1}`
      return inner === 'sections' && typeof innerIndex === 'number'
        ? `${bar}, section ${innerIndex + 1}`
        : bar
    }
    if (first === 'joints') return `joint ${index + 1}`
    if (first === 'gauges') return `gauge ${document.gauges?.[index]?.name || index + 1}`
    if (first === 'loads') return `load ${index + 1}`
  }
  if (first === 'leftEnd') return 'left end'
  if (first === 'rightEnd') return 'right end'
  if (first === 'materials' && typeof index === 'string') return `material ${index}`
  if (first === 'variables' && typeof index === 'string') return `variable ${index}`
  return String(first ?? 'rig')
}
