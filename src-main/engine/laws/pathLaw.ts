/** A loading curve: force against closing, both positive in compression, rising from nothing. */
export interface LoadingCurve {
  /** Force at a closing of zero or more [N]. */
  force(closing: number): number
  /** Its integral from zero [J]. */
  work(closing: number): number
}

/**
 * A force that depends on the path of the closing and not on its speed, compression positive.
 * It remembers the closing it was last brought to.
 */
export interface PathLaw {
  readonly closing: number
  /** Mean force over a straight move from the closing it is at to another [N]. */
  mean(to: number): number
  /** Closing at which it has just lost contact: zero, or the set that unloading has left [m]. */
  readonly rest: number
  /** True where a move to that closing would run along the loading curve. */
  loads(to: number): boolean
  /** Brings it to another closing. */
  moveTo(to: number): void
  /** Energy it would give back [J]. */
  stored(): number
}

/**
 * Makes the law of a body squeezed between two faces: it loads along a curve and unloads along the
 * same curve (`unloading` null) or along a straight line of its own slope down to no force, where it
 * is left; it loads again along that line. An infinite slope is a rigid unloading.
 *
 * The mean force over a move is the path's work over its length (a discrete gradient: Gonzalez,
 * J. Nonlinear Sci. 6 (1996) 449, from memory), so a step neither makes nor loses energy but
 * for what the path itself encloses.
 *
 * @param unloading slope [N/m]; null where it unloads as it loads
 * @param start closing at the start [m], negative for a gap
 * @param pulls true where it also pulls, with the curve turned about zero; only without `unloading`
 */
export function makePathLaw(
  curve: LoadingCurve,
  unloading: number | null,
  start: number,
  pulls = false,
): PathLaw {
  let at = start
  // Largest closing so far and its force: where the unloading line hangs.
  let top = 0
  let topForce = 0

  const line = (closing: number) =>
    unloading === Infinity ? (closing >= top ? topForce : 0) : topForce - unloading! * (top - closing)

  function force(closing: number): number {
    if (unloading === null) {
      if (closing < 0) return pulls ? -curve.force(-closing) : 0
      return curve.force(closing)
    }
    if (closing > top) return curve.force(closing)
    return Math.max(0, line(closing))
  }

  /** Integral of the force up to a closing, along the path from where it is. */
  function evaluateWork(closing: number): number {
    if (unloading === null) return closing >= 0 || pulls ? curve.work(Math.abs(closing)) : 0
    const hanging = (topForce * topForce) / (2 * unloading)
    if (closing > top) return hanging + curve.work(closing) - curve.work(top)
    const F = Math.max(0, line(closing))
    return (F * F) / (2 * unloading)
  }

  return {
    get closing() {
      return at
    },
    mean(to) {
      const move = to - at
      return move === 0 ? force(at) : (evaluateWork(to) - evaluateWork(at)) / move
    },
    get rest() {
      return unloading === null || topForce === 0 ? 0 : top - topForce / unloading
    },
    loads: (to) => to > Math.max(0, unloading === null ? at : top),
    moveTo(to) {
      at = to
      if (unloading !== null && to > top) {
        top = to
        topForce = curve.force(to)
      }
    },
    stored: () => evaluateWork(at),
  }
}
