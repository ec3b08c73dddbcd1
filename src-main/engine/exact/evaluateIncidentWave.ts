/** The wave that a striker sends into the first bar of a split-bar test, compression positive. */
export interface IncidentWave {
  /** [1] */
  strain: number
  /** [Pa] */
  stress: number
  /** [N] */
  force: number
  /** [s] */
  duration: number
  /** [m] */
  length: number
  /** [J] */
  energy: number
}

/**
 * The incident wave of a striker of the bar's own material and area: stress rho c v/2 for 2 L/c.
 * Source: Kolsky, Proc. Phys. Soc. B 62 (1949) 676; Chen and Song, Split Hopkinson (Kolsky) Bar (2011)
 * (from memory).
 *
 * @param density of striker and bar [kg/m^3]
 * @param modulus of both [Pa]
 * @param area of both [m^2]
 * @param length of the striker [m]
 * @param speed of the striker [m/s]
 */
export function evaluateIncidentWave(
  density: number,
  modulus: number,
  area: number,
  length: number,
  speed: number,
): IncidentWave {
  const c = Math.sqrt(modulus / density)
  const stress = (density * c * speed) / 2
  const duration = (2 * length) / c
  const force = stress * area
  return {
    strain: stress / modulus,
    stress,
    force,
    duration,
    length: duration * c,
    energy: (force * force * duration) / (density * c * area),
  }
}
