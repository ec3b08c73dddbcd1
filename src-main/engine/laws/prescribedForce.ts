import type { Outside } from './outside'
import type { Hand, NodeLaw, Side } from './side'

/**
 * An end where the surroundings push with a prescribed force T, positive to the right:
 * `n F = T` with n = +1 at the right end and -1 at the left end. A free end is T = 0.
 *
 * @param bar the bar's face
 * @param hand of the bar: +1 where it stands left of the node (a right end)
 * @param force T at step k [N]
 * @param outside where its impulse and work are booked
 */
export function makePrescribedForce(
  bar: Side,
  hand: Hand,
  force: (k: number) => number,
  outside: Outside,
): NodeLaw {
  return {
    advance(from, to) {
      for (let k = from; k < to; k++) {
        const T = force(k)
        const F = hand * T
        const v = bar.freeVelocity(k) + hand * bar.admittance * F
        bar.take(k, F, v)
        outside.add(k, T, v)
      }
    },
    strain: () => 0,
    dissipated: () => 0,
  }
}
