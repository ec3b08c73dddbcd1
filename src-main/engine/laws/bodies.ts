import { CompensatedSum } from './compensatedSum'
import type { Outside } from './outside'
import type { Beat, Body, Hand, Side } from './side'

/**
 * A rigid mass, `M dV/dt = F` by the midpoint rule: V is kept at the half steps and the face moves
 * with the mean of two of them, so that the work of F is exactly the gain of M V^2 / 2.
 *
 * @param mass [kg], positive
 * @param velocity at the start [m/s]
 */
export function makeMass(mass: number, velocity: number, beat: Beat): Body {
  let V = velocity
  return {
    mass,
    admittance: beat.dt / (2 * mass),
    freeVelocity: () => V,
    take(_k, _force, faceVelocity) {
      V = 2 * faceVelocity - V
    },
    kinetic: (frame) => (mass * (V + frame) ** 2) / 2,
    strain: () => 0,
    dissipated: () => 0,
    momentum: () => mass * V,
  }
}

/**
 * A mass on a spring and a dashpot to the ground, `m dV/dt = F - S - D v`, `dS/dt = K v`, by the
 * midpoint rule: energy is kept exactly but for D v^2. The mass may be zero.
 *
 * @param support stiffness K [N/m], damping D [N s/m], mass m [kg]; not all zero
 * @param outside where the ground's force is booked
 */
export function makeSupport(
  support: { stiffness: number; damping: number; mass: number },
  beat: Beat,
  outside: Outside,
): Body {
  const { stiffness: K, damping: D, mass } = support
  const { dt, gravity } = beat
  const Zm = (2 * mass) / dt
  const Zg = D + (K * dt) / 2
  const admittance = 1 / (Zm + Zg)
  const lost = new CompensatedSum()
  let V = 0
  let S = 0
  return {
    mass,
    admittance,
    freeVelocity: (k) => (Zm * V - S - Zg * gravity * dt * k) * admittance,
    take(k, _force, velocity) {
      const v = velocity + gravity * dt * k
      const before = S
      S += K * dt * v
      if (mass > 0) V = 2 * velocity - V
      lost.add(D * v * v * dt)
      outside.add(k, -(before + S) / 2 - D * v, -gravity * dt * k)
    },
    kinetic: (frame) => (mass * (V + frame) ** 2) / 2,
    strain: () => (K > 0 ? (S * S) / (2 * K) : 0),
    dissipated: () => lost.value,
    momentum: () => mass * V,
  }
}

/**
 * A face that moves as prescribed, whatever the force; a rigid wall is one at rest.
 *
 * @param velocity prescribed velocity at step k [m/s]
 * @param outside where its force and work are booked
 */
export function makeMotion(
  velocity: (k: number) => number,
  hand: Hand,
  beat: Beat,
  outside: Outside,
): Side {
  return {
    admittance: 0,
    freeVelocity: (k) => velocity(k) - beat.gravity * beat.dt * k,
    take: (k, force, v) => outside.add(k, -hand * force, v),
  }
}

/**
 * A bar that goes on for ever with the impedance and the initial state of the one it is matched to:
 * nothing comes back from it.
 *
 * @param impedance Z [kg/s]
 * @param arriving the wave that stands in it at the start and goes on arriving [N]
 */
export function makeMatched(impedance: number, arriving: number, hand: Hand, outside: Outside): Side {
  const admittance = 1 / impedance
  return {
    admittance,
    freeVelocity: () => -hand * 2 * arriving * admittance,
    take: (k, force, v) => outside.add(k, -hand * force, v),
  }
}
