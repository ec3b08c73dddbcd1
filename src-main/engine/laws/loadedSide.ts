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
  const Zm = (k: number) => mass / (reach * beat.duration(k))
  const Zs = (k: number) => 1 / side.admittance(k)
  const admittance = (k: number) => 1 / (Zm(k) + Zs(k))
  let V = side.lastVelocity()
  return {
    mass,
    admittance,
    freeVelocity: (k) => (Zm(k) * V + Zs(k) * side.freeVelocity(k)) * admittance(k),
    lastVelocity: () => side.lastVelocity(),
    take(k, _force, velocity) {
      const onSide = hand * Zs(k) * (velocity - side.freeVelocity(k))
      V += (velocity - V) / reach
      side.take(k, onSide, velocity)
    },
    kinetic: (frame) => (mass * (V + frame) ** 2) / 2,
    strain: () => 0,
    dissipated: () => 0,
    momentum: () => mass * V,
  }
}
