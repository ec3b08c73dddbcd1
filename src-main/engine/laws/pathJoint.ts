import { CompensatedSum } from './compensatedSum'
import type { PathLaw } from './pathLaw'
import { type Beat, evaluateWorking, type NodeLaw, type Side } from './side'

/** Halvings at most when the closing of a step is sought; the interval is then below rounding. */
const MOST_TURNS = 200

/** How a path law is damped and hurried in a joint. */
export interface JointOptions {
  /** Dashpot beside the law [N s/m]. */
  damping: number
  /** True where the joint may pull. */
  pulls: boolean
  /** Factor on the force at a rate of closing while it runs along its loading curve; at least 1. */
  hurry?: (rate: number) => number
}

/**
 * A body without mass squeezed between two faces: `C = law(closing) + D d(closing)/dt`, `F = -C`.
 * The closing of a step and its force are found together, so that no stiffness is too high for it;
 * second order in dt. Unless it pulls, it lets go where C would be negative. Its loss is the work
 * done on it less what it stores.
 */
export function makePathJoint(
  left: Side,
  right: Side,
  law: PathLaw,
  options: JointOptions,
  beat: Beat,
): NodeLaw {
  const { alpha } = beat
  const { damping, pulls, hurry } = options
  const lost = new CompensatedSum()

  /** Force of the joint if its closing moves to `to` over a step of the given duration. */
  function evaluateForce(to: number, duration: number): number {
    const rate = (to - law.closing) / duration
    const speed = hurry !== undefined && rate > 0 && law.loads(to) ? hurry(rate) : 1
    // Where it cannot pull, the dashpot spans no open gap: only what closes beyond touching counts.
    const { closing, rest } = law
    const squeeze = pulls ? to - closing : Math.max(rest, to) - Math.max(rest, closing)
    const C = law.mean(to) * speed + (damping * squeeze) / duration
    return pulls ? C : Math.max(0, C)
  }

  /** Solves `to = free - give C(to)`, C rising with `to`: false position kept from stalling (Illinois). */
  function solveClosing(free: number, give: number, duration: number): number {
    const residual = (to: number) => to - free + give * evaluateForce(to, duration)
    const first = give * evaluateForce(free, duration)
    if (first === 0) return free
    let a = free
    let ra = first
    let b = free - first
    let rb = residual(b)
    // A level force leaves it at the root but for rounding, which may fall on the wrong side of zero.
    if (rb * first >= 0) return b
    for (let turn = 0; turn < MOST_TURNS && rb !== 0 && b !== a; turn++) {
      const slope = (rb - ra) / (b - a)
      let next = b - rb / slope
      if (!(next > Math.min(a, b) && next < Math.max(a, b))) next = (a + b) / 2
      if (next === a || next === b) break
      const rn = residual(next)
      if (rn * rb < 0) {
        a = b
        ra = rb
      } else {
        ra /= 2
      }
      b = next
      rb = rn
    }
    return b
  }

  return {
    advance(from, to) {
      for (let k = from; k < to; k++) {
        const vl = left.freeVelocity(k)
        const vr = right.freeVelocity(k)
        const before = right.lastVelocity() - left.lastVelocity()
        const Yl = left.admittance(k)
        const Yr = right.admittance(k)
        const duration = beat.duration(k)
        const give = alpha * duration * (Yl + Yr)
        const start = law.closing
        const free = start - duration * evaluateWorking(beat, vr - vl, before)
        const closing = solveClosing(free, give, duration)
        // From the motion, not from the law: exact also where the law is steep or jumps.
        const F = -(free - closing) / give
        const stored = law.stored()
        law.moveTo(closing)
        lost.add(-F * (closing - start) - (law.stored() - stored))
        left.take(k, F, vl + Yl * F)
        right.take(k, F, vr - Yr * F)
      }
    },
    strain: () => law.stored(),
    dissipated: () => lost.value,
  }
}
