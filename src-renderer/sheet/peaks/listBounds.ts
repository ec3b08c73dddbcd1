import type { PageResult } from '../../../src-main/contract/bridge'
import { readLimits } from '../field/readLimits'

/** What a section may bear in one sense, drawn as a line over its length. */
export interface Bound {
  /** [m] */
  from: number
  to: number
  /** Allowable over the factor of safety, negative in compression [Pa]. */
  stress: number
}

/**
 * Lists the allowables of the sections over the factor of safety, those of neighbours that are equal as one.
 *
 * @param result - of the run
 * @param sense - in tension or in compression
 * @returns bounds from left to right; none where no allowable was given
 */
export function listBounds(
  result: Pick<PageResult, 'sections' | 'factorOfSafety'>,
  sense: 'tension' | 'compression',
): Bound[] {
  const bounds: Bound[] = []
  for (const { from, to, high, low } of readLimits(result)) {
    const stress = sense === 'tension' ? high : low
    if (!Number.isFinite(stress)) continue
    const last = bounds.at(-1)
    const follows =
      last && Math.abs(from - last.to) < 1e-9 && Math.abs(stress - last.stress) < 1e-9 * Math.abs(stress)
    if (follows) last.to = to
    else bounds.push({ from, to, stress })
  }
  return bounds
}

/**
 * Largest nominal stress of either sense.
 *
 * @param sections - of a result
 * @returns zero or positive [Pa]
 */
export function findLargestNominal(sections: PageResult['sections']): number {
  return Math.max(0, ...sections.flatMap(({ tension, compression }) => [tension.peak, -compression.peak]))
}

/** Bounds further out than this many times the largest stress are told in words: they would flatten the curves. */
const FAR = 4

/**
 * Chooses the range of the stress axis: the peaks, local ones too, and the allowables that are not far off.
 *
 * @param result - of the run
 * @param frozen - of a run laid under; null for none
 * @returns lower end, negative or zero, and upper end [Pa]
 */
export function findStressRange(result: PageResult, frozen: PageResult | null): [low: number, high: number] {
  let low = 0
  let high = 0
  for (const { sections } of frozen ? [result, frozen] : [result]) {
    for (const { tension, compression } of sections) {
      high = Math.max(high, tension.peak, tension.local)
      low = Math.min(low, compression.peak, compression.local)
    }
  }
  const largest = Math.max(-low, high)
  if (largest === 0) return [-1e6, 1e6]
  const near = (bound: Bound): boolean => Math.abs(bound.stress) <= FAR * largest
  for (const bound of listBounds(result, 'tension').filter(near)) high = Math.max(high, bound.stress)
  for (const bound of listBounds(result, 'compression').filter(near)) low = Math.min(low, bound.stress)
  const room = 0.06 * (high - low)
  return [low - room, high + room]
}
