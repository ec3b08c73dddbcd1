import type { Hand, Side } from './side'

/**
 * One face of a stretch of bar as its neighbours know it: the wave that arrives at step k is
 * `arriving[k]`, the wave that leaves is put at `leaving[k + leavingOffset]`.
 */
export interface Port {
  /** Z [kg/s] */
  impedance: number
  /** [N] */
  arriving: Float64Array
  /** [N] */
  leaving: Float64Array
  leavingOffset: number
}

/**
 * A bar's face as a side of a joint: `F = 2 f + Z v` left of the node, `F = 2 g - Z v` right of it.
 *
 * @param port the face
 * @param hand +1 where the bar stands left of the node
 * @param velocity of the face at the start [m/s]
 */
export function makeBarSide(port: Port, hand: Hand, velocity: number): Side {
  const { arriving, leaving, leavingOffset } = port
  const Y = 1 / port.impedance
  let last = velocity
  return {
    admittance: () => Y,
    freeVelocity: (k) => -hand * 2 * arriving[k] * Y,
    lastVelocity: () => last,
    take(k, force, now) {
      leaving[k + leavingOffset] = force - arriving[k]
      last = now
    },
  }
}
