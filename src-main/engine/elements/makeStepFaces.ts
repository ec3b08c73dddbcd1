import { WIDENING } from '../march/widening'
import type { NodeLoad, StepFaces } from './piece'

/**
 * Makes the two faces of an inner node where sections meet. The force there is that of the element
 * beside it and what moves the half of the element's mass that the node carries, with
 * `a = (F2 - F1 + Q) / (m1 + m2)`: `F_left = F1 + m1 a`, `F_right = F2 - m2 a`. The mean of F1 and F2, good
 * inside a section, is off by `a (m2 - m1)/2`, first order in the cell, and by `Q/2` where a load acts.
 *
 * @param slot of the node
 * @param massLeft half the mass of the element left of it, m1 [kg]
 * @param massRight half that of the element right of it, m2 [kg]
 * @param loads of its bar; those at the node make Q
 */
export function makeStepFaces(
  slot: number,
  massLeft: number,
  massRight: number,
  loads: readonly NodeLoad[],
): StepFaces {
  const here = loads.filter((load) => load.slot === slot)
  const share = massLeft / (massLeft + massRight)
  const left = { force: 0, high: 0, low: 0, highStep: 0, lowStep: 0 }
  const right = { ...left }

  function put(face: StepFaces['left'], force: number, k: number): void {
    face.force = force
    if (force > face.high) {
      face.high = force * WIDENING
      face.highStep = k
    } else if (force < face.low) {
      face.low = force * WIDENING
      face.lowStep = k
    }
  }

  return {
    slot,
    left,
    right,
    take(k, before, after) {
      let push = after - before
      for (const load of here) push += load.force(k)
      put(left, before + share * push, k)
      put(right, after - (1 - share) * push, k)
    },
  }
}
