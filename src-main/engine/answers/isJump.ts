/**
 * True where two values differ by more than the rounding of a drawing's arithmetic, 1e-9 of the larger.
 *
 * @param a one value, not negative
 * @param b the other, same unit
 */
export function isJump(a: number, b: number): boolean {
  return Math.abs(a - b) > 1e-9 * Math.max(a, b)
}
