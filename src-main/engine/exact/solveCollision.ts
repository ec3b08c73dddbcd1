/** The collision of two bars in a lattice of whole cells, striker 1 at v, target 2 at rest. */
export interface Collision {
  /** Contact force over Z1 v in its steps, compression positive, without repeats. */
  forceSteps: number[]
  /** Cells of time until the force ends, and until the faces part. */
  forceEnds: number
  part: number
  /** Mean velocities over v after parting, and their difference. */
  V1: number
  V2: number
  restitution: number
}

const ZERO = 1e-12

/**
 * The exact collision of two free bars of whole cells by their characteristics, apart from the engine's own
 * march: each bar is two delays, the faces carry no tension.
 *
 * Source of the method: de Saint-Venant 1867; Love, Treatise, 4th ed., arts. 281-284 (from memory).
 *
 * @param ratio Z1/Z2 [1]
 * @param cells1 travel time of the striker in cells
 * @param cells2 travel time of the target in cells
 * @returns see `Collision`; times in cells
 */
export function solveCollision(ratio: number, cells1: number, cells2: number): Collision {
  const [Z1, Z2] = [ratio, 1]
  // Waves on their way: rightgoing f and leftgoing g of each bar, index 0 the next to arrive.
  const f1 = new Array<number>(cells1).fill(-Z1 / 2)
  const g1 = new Array<number>(cells1).fill(Z1 / 2)
  const f2 = new Array<number>(cells2).fill(0)
  const g2 = new Array<number>(cells2).fill(0)
  const forceSteps: number[] = []
  let forceEnds = 0
  for (let step = 0; ; step++) {
    const [f, g] = [f1.shift()!, g2.shift()!]
    let velocity1 = (2 * g - 2 * f) / (Z1 + Z2)
    let velocity2 = velocity1
    const force = -(2 * f + Z1 * velocity1) / Z1
    if (force < -ZERO) {
      velocity1 = (-2 * f) / Z1
      velocity2 = (2 * g) / Z2
    }
    if (velocity2 - velocity1 > ZERO) {
      const V1 = evaluateMean([f, ...f1], g1, Z1)
      const V2 = evaluateMean(f2, [g, ...g2], Z2)
      return { forceSteps, forceEnds, part: step, V1, V2, restitution: V2 - V1 }
    }
    if (force > ZERO) {
      forceEnds = step + 1
      if (Math.abs(force - (forceSteps[forceSteps.length - 1] ?? 0)) > ZERO) forceSteps.push(force)
    }
    // Free far ends turn a wave round with the other sign.
    f1.push(-g1.shift()!)
    g1.push(f + Z1 * velocity1)
    g2.push(-f2.shift()!)
    f2.push(g - Z2 * velocity2)
  }
}

function evaluateMean(f: number[], g: number[], Z: number): number {
  return f.reduce((sum, wave, i) => sum + (g[i] - wave) / Z, 0) / f.length
}
