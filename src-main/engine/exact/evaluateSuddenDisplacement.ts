/**
 * Displacement of the free end of a fixed-free rod under a sudden constant load, over P L/(E A): a
 * triangle wave between 0 and 2 of period 4L/c. Exact.
 *
 * @param tau ct/L since the load came on
 * @returns displacement over P L/(E A) [1]
 */
export function evaluateSuddenDisplacement(tau: number): number {
  const phase = tau - 4 * Math.floor(tau / 4)
  return phase <= 2 ? phase : 4 - phase
}
