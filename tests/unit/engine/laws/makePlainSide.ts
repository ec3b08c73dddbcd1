import type { Hand, Side } from '../../../../src-main/engine/laws/side'

/** A side that would move at a given velocity if no force acted, and writes down what it is told. */
export interface PlainSide extends Side {
  forces: number[]
  velocities: number[]
}

/**
 * @param velocity of step k if no force acted [m/s]
 * @param admittance [s/kg]
 * @param hand where it stands: its own velocity is checked against `v0 + hand Y F`
 */
export function makePlainSide(velocity: (k: number) => number, admittance: number, hand: Hand): PlainSide {
  const forces: number[] = []
  const velocities: number[] = []
  let last = velocity(0)
  return {
    forces,
    velocities,
    admittance: () => admittance,
    freeVelocity: velocity,
    lastVelocity: () => last,
    take(k, force, v) {
      const right = velocity(k) + hand * admittance * force
      if (!(Math.abs(v - right) <= 1e-12 * (1 + Math.abs(right))))
        throw new Error(`step ${k}: a side that moves at ${right} was told ${v}`)
      forces.push(force)
      velocities.push(v)
      last = v
    },
  }
}
