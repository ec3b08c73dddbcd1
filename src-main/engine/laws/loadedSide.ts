import type { Beat, Body, Hand, Side } from './side'

/**
 * A side with a rigid mass fixed to its face: `m dv/dt = n (F - F_side)`.
 *
 * @param side what carries the mass
 * @param hand of the side
 * @param mass m [kg], positive
 */
export function makeLoadedSide(side: Side, hand: Hand, mass: number, beat: Beat): Body {
  const reach = 1 / (2 * beat.alpha)
  const Zm = mass / (reach * beat.dt)
  const Zs = 1 / side.admittance
  const admittance = 1 / (Zm + Zs)
  let V = side.lastVelocity()
  return {
    mass,
    admittance,
    freeVelocity: (k) => (Zm * V + Zs * side.freeVelocity(k)) * admittance,
    lastVelocity: () => side.lastVelocity(),
    take(k, _force, velocity) {
      const onSide = hand * Zs * (velocity - side.freeVelocity(k))
      V += (velocity - V) / reach
      side.take(k, onSide, velocity)
    },
    kinetic: (frame) => (mass * (V + frame) ** 2) / 2,
    strain: () => 0,
    dissipated: () => 0,
    momentum: () => mass * V,
  }
}
