/**
 * Writes the number at a tick of an axis, without the digits that rounding leaves over.
 *
 * @param tick - a round number, in the unit of its axis
 * @returns such as `−0.4` or `1200`
 */
export function formatTick(tick: number): string {
  return String(Number(tick.toPrecision(6))).replace(/-/g, '−')
}
