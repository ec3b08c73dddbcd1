import { CompensatedSum } from './compensatedSum'
import type { NodeLaw, Side } from './side'

/**
 * A linear spring and dashpot between two faces, massless: `F = K o + D do/dt` with the opening o
 * kept at the half steps. Without `tension` it lets go where it would pull, and has a gap.
 *
 * The spring's force over a step is `(W(o+) - W(o-)) / (o+ - o-)` with `W = K min(o, 0)^2 / 2`
 * (a discrete gradient, Gonzalez, J. Nonlinear Sci. 6 (1996) 449, from memory): exactly the
 * midpoint rule while it stays closed, second order, and it neither makes nor loses energy when
 * the faces meet or part inside a step.
 *
 * @param cushion K [N/m], D [N s/m], gap [m]
 * @param dt [s]
 */
export function makeCushion(
  left: Side,
  right: Side,
  cushion: { stiffness: number; damping: number; gap: number; tension: boolean },
  dt: number,
): NodeLaw {
  const { stiffness: K, damping: D, tension } = cushion
  const Y = left.admittance + right.admittance
  const lost = new CompensatedSum()
  const stored = (o: number) => (tension || o < 0 ? (K * o * o) / 2 : 0)
  let o = cushion.gap

  /** Force over the step from the opening o, with w0 the parting velocity if no force acted. */
  function evaluateForce(w0: number): number {
    if (!tension && o > 0) return o + dt * w0 >= 0 ? 0 : evaluateMeeting(w0)
    const R = (K * dt) / 2 + D
    const F = (K * o + R * w0) / (1 + Y * R)
    if (tension) return F
    if (F >= 0) return 0
    return o + dt * (w0 - Y * F) <= 0 ? F : evaluateParting(w0)
  }

  /** Open at the start of the step, closed at its end: a quadratic in q = o+ - o-. */
  function evaluateMeeting(w0: number): number {
    const h = (dt * Y * K) / 2
    const b = 2 * h * o - dt * w0
    const q = -(b + Math.sqrt(Math.max(0, b * b - 4 * (1 + h) * h * o * o))) / (2 * (1 + h))
    return (K * (o + q) ** 2) / (2 * q)
  }

  /** Closed at the start, open at its end; where the dashpot would pull, it lets go. */
  function evaluateParting(w0: number): number {
    const h = (dt * Y * K) / 2
    const b = dt * w0
    const q = (b + Math.sqrt(b * b + 4 * (1 + D * Y) * h * o * o)) / (2 * (1 + D * Y))
    return Math.min(0, -(K * o * o) / (2 * q) + (D * q) / dt)
  }

  return {
    advance(from, to) {
      for (let k = from; k < to; k++) {
        const vl = left.freeVelocity(k)
        const vr = right.freeVelocity(k)
        const F = evaluateForce(vr - vl)
        const w = vr - vl - Y * F
        const before = stored(o)
        o += dt * w
        lost.add(dt * F * w - (stored(o) - before))
        left.take(k, F, vl + left.admittance * F)
        right.take(k, F, vr - right.admittance * F)
      }
    },
    strain: () => stored(o),
    dissipated: () => lost.value,
  }
}
