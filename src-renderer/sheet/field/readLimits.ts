import type { PageResult } from '../../../src-main/contract/bridge'

/** What a section may bear at most, the factor of safety taken off; infinite where nothing was given. */
export interface SectionLimit {
  /** [m] */
  from: number
  to: number
  /** Largest tension, positive [Pa]. */
  high: number
  /** Largest compression, negative [Pa]. */
  low: number
}

/**
 * Lists what each section may bear: allowable over the factor of safety.
 *
 * @param result - of a run
 * @returns a limit for each section
 */
export function readLimits({
  sections,
  factorOfSafety,
}: Pick<PageResult, 'sections' | 'factorOfSafety'>): SectionLimit[] {
  return sections.map(({ from, to, tension, compression }) => ({
    from,
    to,
    high: tension.allowable === null ? Infinity : tension.allowable / factorOfSafety,
    low: compression.allowable === null ? -Infinity : -compression.allowable / factorOfSafety,
  }))
}

/**
 * Spreads the limits of sections over the columns of a picture, each by its middle.
 *
 * @param limits - of the sections
 * @param fromX - left edge of the picture [m]
 * @param toX - its right edge [m]
 * @param columns - of the picture
 * @returns limits by column
 */
export function spreadLimits(
  limits: readonly SectionLimit[],
  fromX: number,
  toX: number,
  columns: number,
): { high: Float32Array; low: Float32Array } {
  const high = new Float32Array(columns).fill(Infinity)
  const low = new Float32Array(columns).fill(-Infinity)
  for (const section of limits) {
    const first = Math.max(0, Math.ceil(((section.from - fromX) / (toX - fromX)) * columns - 0.5))
    const last = Math.min(columns - 1, Math.floor(((section.to - fromX) / (toX - fromX)) * columns - 0.5))
    for (let column = first; column <= last; column++) {
      high[column] = Math.min(high[column], section.high)
      low[column] = Math.max(low[column], section.low)
    }
  }
  return { high, low }
}
