import { CompensatedSum } from './compensatedSum'
import { type Beat, evaluateWorking, type NodeLaw, type Side } from './side'

/**
 * Flat faces that press but never pull: `F <= 0`, with a gap `d >= 0` kept between the steps.
 * Over a step either the faces are apart (`F = 0`) or they end it touching,
 * `d + dt (v_right - v_left) = 0`. A gap that closes inside a step takes a little energy, first
 * order in dt, which is booked as the joint's loss: `F (v_right - v_left) dt`.
 *
 * @param gap at the start [m], zero or positive
 */
export function makeContact(left: Side, right: Side, gap: number, beat: Beat): NodeLaw {
  const { dt } = beat
  const lost = new CompensatedSum()
  let d = gap
  return {
    advance(from, to) {
      for (let k = from; k < to; k++) {
        const vl = left.freeVelocity(k)
        const vr = right.freeVelocity(k)
        const apart = d + dt * (vr - vl)
        if (apart >= 0) {
          d = apart
          left.take(k, 0, vl)
          right.take(k, 0, vr)
        } else {
          const Yl = left.admittance(k)
          const Yr = right.admittance(k)
          const F = apart / (dt * (Yl + Yr))
          const parting = evaluateWorking(beat, -d / dt, right.lastVelocity() - left.lastVelocity())
          if (parting !== 0) lost.add(beat.duration(k) * F * parting)
          d = 0
          left.take(k, F, vl + Yl * F)
          right.take(k, F, vr - Yr * F)
        }
      }
    },
    strain: () => 0,
    dissipated: () => lost.value,
  }
}
