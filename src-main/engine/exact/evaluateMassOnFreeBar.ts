/** A rigid mass that struck a bar with a free far end, after they have parted. */
export interface MassOnFreeBar {
  /** ct/L at which the contact ends: always 2. */
  contactEnds: number
  /** Velocity of the mass over v0. */
  velocity: number
  /** Mean velocity of the bar over v0. */
  barVelocity: number
  restitution: number
  /** Share of the first energy that the bar has. */
  barEnergy: number
}

/**
 * The exact collision of a rigid mass M with a bar of mass m free at its far end, alpha = m/M: the
 * contact stress rho c v0 exp(-alpha ct/L) is cut off by the return of the front at ct/L = 2.
 *
 *     v = v0 exp(-2 alpha), bar v0 (1 - exp(-2 alpha))/alpha, bar energy 1 - exp(-4 alpha)
 *
 * Source: Love, Treatise, art. 281 (from memory).
 *
 * @param alpha m/M, positive [1]
 */
export function evaluateMassOnFreeBar(alpha: number): MassOnFreeBar {
  const velocity = Math.exp(-2 * alpha)
  const barVelocity = (1 - velocity) / alpha
  return {
    contactEnds: 2,
    velocity,
    barVelocity,
    restitution: barVelocity - velocity,
    barEnergy: 1 - velocity * velocity,
  }
}
