/**
 * Stress at the fixed end of a rod under tension whose other end is let go at t = 0, over the first
 * stress: +1 until L/c, -1 until 3L/c, and so on. Exact.
 *
 * @param tau ct/L since the release
 * @returns stress over the first stress [1]; at a jump the value after it
 */
export function evaluateReleasedFixedEnd(tau: number): number {
  return Math.floor((tau + 1) / 2) % 2 === 0 ? 1 : -1
}
