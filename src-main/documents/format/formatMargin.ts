import { formatNumber } from './formatNumber'

/**
 * Writes a margin of safety, always with its sign.
 *
 * @param margin - allowable over the factored stress, less one [1]; null where there is none
 * @returns such as `+0.3512` or `−0.1204`; `none` for null
 */
export function formatMargin(margin: number | null): string {
  if (margin === null) return 'none'
  return margin > 0 ? `+${formatNumber(margin)}` : formatNumber(margin)
}
