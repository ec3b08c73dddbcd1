/**
 * cos(sqrt q), which goes on as cosh(sqrt(-q)) where q is negative; the series where q is small.
 *
 * @param q square of the phase, of either sign [rad^2]
 */
export function evaluateCosine(q: number): number {
  // Terms up to q^6: under 1e-15 for |q| < 0.25.
  if (Math.abs(q) < 0.25)
    return 1 - (q / 2) * (1 - (q / 12) * (1 - (q / 30) * (1 - (q / 56) * (1 - (q / 90) * (1 - q / 132)))))
  return q > 0 ? Math.cos(Math.sqrt(q)) : Math.cosh(Math.sqrt(-q))
}
