import type { Outside } from './outside'
import { type Beat, evaluateWorking, type Hand, type NodeLaw, type Side } from './side'

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
  beat: Beat,
  outside: Outside,
): NodeLaw {
  return {
    advance(from, to) {
      for (let k = from; k < to; k++) {
        const T = force(k)
        const F = hand * T
        const v = bar.freeVelocity(k) + hand * bar.admittance(k) * F
        outside.add(k, T, evaluateWorking(beat, v, bar.lastVelocity()))
        bar.take(k, F, v)
      }
    },
    strain: () => 0,
    dissipated: () => 0,
  }
}
