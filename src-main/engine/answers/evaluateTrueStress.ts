/**
 * True stress of a rod whose section contracts with the logarithmic strain, a/A0 = lambda^(-2 nu):
 *
 *     sigma = P lambda^(2 nu)
 *
 * Incompressible with nu = 1/2. Source: Wang, Foundations of Stress Waves (2007) (from memory).
 *
 * @param nominal P, force over the undeformed area [Pa]
 * @param stretch lambda = 1 + du/dX, positive [1]
 * @param poisson nu [1]
 * @returns force over the deformed area [Pa]
 */
export function evaluateTrueStress(nominal: number, stretch: number, poisson: number): number {
  return nominal * stretch ** (2 * poisson)
}
