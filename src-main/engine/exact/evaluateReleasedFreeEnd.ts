/**
 * Displacement of the end that was let go, over eps L: a triangle wave from +1 to -1 and back in 4L/c. Exact.
 *
 * @param tau ct/L since the release
 * @returns displacement over the first one [1]
 */
export function evaluateReleasedFreeEnd(tau: number): number {
  const phase = tau - 4 * Math.floor(tau / 4)
  return phase <= 2 ? 1 - phase : phase - 3
}
