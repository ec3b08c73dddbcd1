/**
 * Writes a margin of safety with its sign, rounded down so that it never looks larger than it is.
 *
 * @param margin - allowable over factored stress, less one; null where there is none
 * @returns such as `+0.43` or `−0.08`
 */
export function formatMargin(margin: number | null): string {
  if (margin === null) return 'none'
  const cents = Math.floor(margin * 100 + 1e-9)
  return `${cents < 0 ? '−' : '+'}${(Math.abs(cents) / 100).toFixed(2)}`
}
