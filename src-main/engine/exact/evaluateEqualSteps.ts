/**
 * Front of a force wave that has passed N steps of equal area ratio, [2q/(1 + q)]^N with q = (A2/A1)^(1/N);
 * it tends to sqrt(A2/A1) as the steps grow many. Product of exact step ratios.
 *
 * @param ratio area after the last step over that before the first, A2/A1 [1]
 * @param steps N, at least 1
 * @returns F_T/F_I of the front [1]
 */
export function evaluateEqualSteps(ratio: number, steps: number): number {
  const q = ratio ** (1 / steps)
  return ((2 * q) / (1 + q)) ** steps
}
