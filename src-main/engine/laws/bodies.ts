import { CompensatedSum } from './compensatedSum'
import type { Outside } from './outside'
import { type Beat, type Body, evaluateWorking, type Hand, type Side } from './side'

/** Share of a step over which a force has moved a mass when its face has the step's velocity. */
function evaluateReach(beat: Beat): number {
  return 1 / (2 * beat.alpha)
}

/**
 * A rigid mass, `M dV/dt = F`, its velocity V kept at the half steps, so that the work of F is
 * exactly the gain of M V^2 / 2. By characteristics its face moves with the mean of two V (the
 * midpoint rule), with elements with the new V (central difference).
 *
 * @param mass [kg], positive
 * @param velocity at the start [m/s]
 */
export function makeMass(mass: number, velocity: number, beat: Beat): Body {
  const reach = evaluateReach(beat)
  let V = velocity
  let last = velocity
  return {
    mass,
    admittance: (k) => (reach * beat.duration(k)) / mass,
    freeVelocity: () => V,
    lastVelocity: () => last,
    take(_k, _force, faceVelocity) {
      V += (faceVelocity - V) / reach
      last = faceVelocity
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
  const { dt, gravity, alpha } = beat
  const reach = evaluateReach(beat)
  const Zm = (k: number) => mass / (reach * beat.duration(k))
  const Zg = (k: number) => D + (K * beat.duration(k)) / 2
  const admittance = (k: number) => 1 / (Zm(k) + alpha * Zg(k))
  const lost = new CompensatedSum()
  let V = 0
  let S = 0
  let last = 0
  const fall = (k: number) => gravity * dt * k
  return {
    mass,
    admittance,
    freeVelocity: (k) => (Zm(k) * V - S - Zg(k) * (fall(k) + (1 - alpha) * last)) * admittance(k),
    lastVelocity: () => last,
    take(k, _force, velocity) {
      const v = evaluateWorking(beat, velocity, last) + fall(k)
      const before = S
      const duration = beat.duration(k)
      S += K * duration * v
      if (mass > 0) V += (velocity - V) / reach
      last = velocity
      lost.add(D * v * v * duration)
      outside.add(k, -(before + S) / 2 - D * v, -fall(k))
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
 * @param velocity prescribed velocity of step k, in the frame of the ground [m/s]
 * @param outside where its force and work are booked
 */
export function makeMotion(velocity: (k: number) => number, hand: Hand, beat: Beat, outside: Outside): Side {
  let last = velocity(0)
  return {
    admittance: () => 0,
    freeVelocity: (k) => velocity(k) - beat.gravity * beat.dt * (k + 1 - beat.alpha),
    lastVelocity: () => last,
    take(k, force, v) {
      outside.add(k, -hand * force, evaluateWorking(beat, v, last))
      last = v
    },
  }
}

/**
 * A bar that goes on for ever with the impedance and the initial state of the one it is matched to:
 * nothing comes back from it.
 *
 * @param impedance Z [kg/s]
 * @param arriving the wave that stands in it at the start and goes on arriving [N]
 * @param velocity of the bar at the start [m/s]
 */
export function makeMatched(
  impedance: number,
  arriving: number,
  velocity: number,
  hand: Hand,
  beat: Beat,
  outside: Outside,
): Side {
  const { alpha } = beat
  let last = velocity
  return {
    admittance: () => 1 / (alpha * impedance),
    freeVelocity: () => ((-hand * 2 * arriving) / impedance - (1 - alpha) * last) / alpha,
    lastVelocity: () => last,
    take(k, force, v) {
      outside.add(k, -hand * force, evaluateWorking(beat, v, last))
      last = v
    },
  }
}
