/**
 * What a preloaded length, held at its far end, sends into an unstressed bar when it is let go: the force
 * F0 Z2/(Z1 + Z2) for 2 Lp/c, half of it in equal bars. Exact until then. Source: Staab and Gilat, Exp.
 * Mech. 31 (1991) 232 (from memory).
 *
 * @param preload F0, tension positive [N]
 * @param z1 impedance of the preloaded length [kg/s]
 * @param z2 impedance of the bar [kg/s]
 * @returns force of the wave in the bar [N]
 */
export function evaluateReleasedForce(preload: number, z1: number, z2: number): number {
  return (preload * z2) / (z1 + z2)
}
