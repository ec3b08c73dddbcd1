/**
 * Writes a share with three decimals; one that comes back shows its sign.
 *
 * @param share - of what arrives; null where it is not known
 * @param signed - whether a plus is written
 * @returns such as `+0.385`; a dash without a share
 */
export function writeShare(share: number | null, signed: boolean): string {
  if (share === null) return '–'
  const text = Math.abs(share).toFixed(3)
  const sign = Number(text) === 0 ? '' : share < 0 ? '−' : signed ? '+' : ''
  return sign + text
}
