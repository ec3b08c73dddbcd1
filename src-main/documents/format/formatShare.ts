import { formatNumber } from './formatNumber'

/** Share under which a number is rounding of the machine. */
const ROUNDING = 1e-12

/**
 * Writes a share in per cent; one that rounding alone leaves reads 0.
 *
 * @param share - of 1
 * @returns such as `1.250 %`
 */
export function formatShare(share: number): string {
  return `${formatNumber(Math.abs(share) < ROUNDING ? 0 : share * 100)} %`
}
