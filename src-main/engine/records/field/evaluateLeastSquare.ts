/** The least of the squares of the numbers from low to high. */
export function evaluateLeastSquare(low: number, high: number): number {
  return low <= 0 && high >= 0 ? 0 : Math.min(low * low, high * high)
}
