/**
 * sin(sqrt q)/sqrt q, which goes on as sinh(sqrt(-q))/sqrt(-q) where q is negative and is 1 at q = 0.
 *
 * @param q square of the phase, of either sign [rad^2]
 */
export function evaluateSineShare(q: number): number {
  // Terms up to q^6: under 1e-16 for |q| < 0.25.
  if (Math.abs(q) < 0.25)
    return 1 - (q / 6) * (1 - (q / 20) * (1 - (q / 42) * (1 - (q / 72) * (1 - (q / 110) * (1 - q / 156)))))
  const K = Math.sqrt(Math.abs(q))
  return (q > 0 ? Math.sin(K) : Math.sinh(K)) / K
}
