import type { GaugePulse } from '../../contract/result'

/** A stretch of time, or of columns of a picture. */
export interface Stretch {
  from: number
  to: number
}

/**
 * Finds when waves of opposite direction pass at once.
 *
 * @param pulses - of one gauge; those of one direction follow each other without overlap
 * @returns the stretches of time, ascending [s]
 */
export function findOverlaps(pulses: GaugePulse[]): Stretch[] {
  const inTime = (direction: GaugePulse['direction']): GaugePulse[] =>
    pulses.filter((pulse) => pulse.direction === direction).sort((a, b) => a.from - b.from)
  const right = inTime('right')
  const left = inTime('left')
  const overlaps: Stretch[] = []
  for (let i = 0, j = 0; i < right.length && j < left.length;) {
    const from = Math.max(right[i].from, left[j].from)
    const to = Math.min(right[i].to, left[j].to)
    if (from < to) overlaps.push({ from, to })
    if (right[i].to < left[j].to) i++
    else j++
  }
  return overlaps
}
