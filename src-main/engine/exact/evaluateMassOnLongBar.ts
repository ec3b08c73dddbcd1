/**
 * Contact stress over rho c v0, and velocity over v0, of a rigid mass on a bar without end: exp(-Z t/M).
 *
 * The mass never rebounds and gives up its whole momentum. The same holds on a bar with a matched end,
 * and on any bar until 2L/c. Source: Love, Treatise, art. 281 (from memory).
 *
 * @param impedance of the bar [kg/s]
 * @param mass of the striker [kg]
 * @param t time since the impact [s]
 * @returns share of the first value [1]
 */
export function evaluateMassOnLongBar(impedance: number, mass: number, t: number): number {
  return t < 0 ? 0 : Math.exp((-impedance * t) / mass)
}
