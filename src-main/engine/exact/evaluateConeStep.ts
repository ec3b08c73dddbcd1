/**
 * Force that a unit step leaves behind a cone between two uniform bars, in the first 2L/c after the front:
 *
 *     growing:     F_T/F_I = R [R exp(-s1 tau) + exp(s2 tau)]/(R + 1)
 *     contracting: F_T/F_I = (1/R) [the same bracket]/(R + 1)
 *     s1 = (R - 1)/2, s2 = (R - 1)/(2R), tau = c t/L after arrival, 0 <= tau < 2
 *
 * The front is R or 1/R, not that of the plain step. Own derivation, confirmed by numerical Laplace inversion.
 *
 * @param R larger radius over smaller radius [1]
 * @param tau time after arrival over L/c [1]
 * @param way `growing` where the wave runs from the small end to the large one
 * @returns F_T/F_I [1]
 */
export function evaluateConeStep(R: number, tau: number, way: 'growing' | 'contracting'): number {
  const bracket = R * Math.exp((-(R - 1) / 2) * tau) + Math.exp(((R - 1) / (2 * R)) * tau)
  return ((way === 'growing' ? R : 1 / R) * bracket) / (R + 1)
}
