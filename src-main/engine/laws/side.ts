/**
 * What a joint sees of a body beside it: a bar's face, a rigid mass, a support, a prescribed motion.
 *
 * Over one step the body answers a force F (tension positive) with the velocity
 * `v = freeVelocity + admittance F` where it stands left of the node, and
 * `v = freeVelocity - admittance F` where it stands right of it. For a bar's face this is
 * `F = 2 f + Z v` (left) and `F = 2 g - Z v` (right), the admittance being 1/Z.
 *
 * Velocities are those in a frame that falls with the rig's gravity, so that gravity does no work
 * in it; only what is held by the ground knows the difference.
 */
export interface Side {
  /** 1/Z [s/kg] */
  admittance: number
  /** Velocity at step k if no force acted [m/s]. */
  freeVelocity(k: number): number
  /** Takes the force [N] and the velocity [m/s] that the joint has found for step k. */
  take(k: number, force: number, velocity: number): void
}

/** A body that holds energy and momentum of its own between two steps. */
export interface Body extends Side {
  /** [J], in the falling frame where `velocity` is that frame's own velocity [m/s]. */
  kinetic(frameVelocity: number): number
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
}
