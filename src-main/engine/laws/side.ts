/**
 * What a joint sees of a body beside it: a bar's face, a rigid mass, a support, a prescribed motion.
 *
 * Over one step the body answers a force F (tension positive) with the velocity
 * `v = freeVelocity + admittance F` where it stands left of the node, and
 * `v = freeVelocity - admittance F` where it stands right of it. For the face of a bar marched by
 * characteristics this is `F = 2 f + Z v` (left) and `F = 2 g - Z v` (right), the admittance being
 * 1/Z; for the end node of elements it is `v = v_trial + (dt/M) F`, the admittance being dt/M.
 *
 * Velocities are those in a frame that falls with the rig's gravity, so that gravity does no work
 * in it; only what is held by the ground knows the difference.
 */
export interface Side {
  /** 1/Z at step k [s/kg] */
  admittance(k: number): number
  /** Velocity at step k if no force acted [m/s]. */
  freeVelocity(k: number): number
  /** Velocity that `take` was last given, or the initial one [m/s]. */
  lastVelocity(): number
  /** Takes the force [N] and the velocity [m/s] that the joint has found for step k. */
  take(k: number, force: number, velocity: number): void
}

/** A body that holds energy and momentum of its own between two steps. */
export interface Body extends Side {
  /** [J], in the frame of the ground where `frame` is the falling frame's velocity [m/s]. */
  kinetic(frame: number): number
  strain(): number
  /** Energy its own damping has taken so far [J]. */
  dissipated(): number
  /** Momentum in the falling frame [kg m/s]. */
  momentum(): number
  /** Mass that falls with the frame [kg]. */
  mass: number
}

/** One node's law: closes the equations of all steps in from..to-1, in place. */
export interface NodeLaw {
  advance(from: number, to: number): void
  /** Strain energy it holds between two steps [J]. */
  strain(): number
  /** Energy it has taken and will not give back [J]. */
  dissipated(): number
}

/** Which side of the node a body stands on: +1 left of it, -1 right of it. */
export type Hand = 1 | -1

/** Time and gravity as the laws know them. */
export interface Beat {
  /** [s] */
  dt: number
  /** [m/s^2] along x */
  gravity: number
  /**
   * Share of a step's own velocity in the velocity at which its force works, the rest being the
   * velocity before: 1 for characteristics, whose velocity at step k is that at t_k; 1/2 for
   * elements, whose velocity at step k is that at t_k + dt/2.
   */
  alpha: number
  /**
   * Time over which the force of step k works [s]: dt, but half of it in the first step of elements,
   * whose velocity goes from that at 0 to that at dt/2.
   */
  duration(k: number): number
}

/** Makes the beat of a run by characteristics, or of one with elements. */
export function makeBeat(dt: number, gravity: number, method: 'characteristics' | 'elements'): Beat {
  if (method === 'characteristics') return { dt, gravity, alpha: 1, duration: () => dt }
  return { dt, gravity, alpha: 0.5, duration: (k) => (k === 0 ? dt / 2 : dt) }
}

/** Velocity at which the force of a step works [m/s]: see `Beat.alpha`. */
export function evaluateWorking(beat: Beat, velocity: number, before: number): number {
  return beat.alpha === 1 ? velocity : beat.alpha * velocity + (1 - beat.alpha) * before
}
