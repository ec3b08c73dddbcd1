import type { Port } from './barSide'
import { CompensatedSum } from './compensatedSum'
import type { Outside } from './outside'
import { type Beat, evaluateWorking, type NodeLaw, type Side } from './side'

/**
 * Two bars bonded, with an outside force Q at the node: `v = (2 g - 2 f + Q) / (Z1 + Z2)`,
 * `F_left = F_right + Q`. By characteristics.
 *
 * @param load Q at step k, positive to the right [N], and where it is booked; null for none
 */
export function makeBonded(
  left: Port,
  right: Port,
  load: { force: (k: number) => number; outside: Outside } | null,
): NodeLaw {
  const { arriving: fs, leaving: gOut, leavingOffset: gAt } = left
  const { arriving: gs, leaving: fOut, leavingOffset: fAt } = right
  const Z1 = left.impedance
  const Z2 = right.impedance
  const T = (2 * Z2) / (Z1 + Z2)
  const Y = 1 / (Z1 + Z2)

  function advance(from: number, to: number): void {
    for (let k = from; k < to; k++) {
      const f = fs[k]
      const g = gs[k]
      const F = 2 * g + T * (f - g)
      gOut[k + gAt] = F - f
      fOut[k + fAt] = F - g
    }
  }

  function advanceLoaded(from: number, to: number): void {
    for (let k = from; k < to; k++) {
      const f = fs[k]
      const g = gs[k]
      const Q = load!.force(k)
      const v = (2 * g - 2 * f + Q) * Y
      gOut[k + gAt] = f + Z1 * v
      fOut[k + fAt] = g - Z2 * v
      load!.outside.add(k, Q, v)
    }
  }

  return {
    advance: load === null ? advance : advanceLoaded,
    strain: () => 0,
    dissipated: () => 0,
  }
}

/**
 * Two sides that stay together: one velocity, one force `F = (v_right0 - v_left0) / (Y_left + Y_right)`.
 * With elements, sides that start at different velocities are brought together at a loss.
 */
export function makeBond(left: Side, right: Side, beat: Beat): NodeLaw {
  const lost = new CompensatedSum()
  return {
    advance(from, to) {
      for (let k = from; k < to; k++) {
        const v0 = left.freeVelocity(k)
        const Y = left.admittance(k)
        const F = (right.freeVelocity(k) - v0) / (Y + right.admittance(k))
        const v = v0 + Y * F
        const parting = evaluateWorking(beat, 0, right.lastVelocity() - left.lastVelocity())
        if (parting !== 0) lost.add(beat.duration(k) * F * parting)
        left.take(k, F, v)
        right.take(k, F, v)
      }
    },
    strain: () => 0,
    dissipated: () => lost.value,
  }
}
