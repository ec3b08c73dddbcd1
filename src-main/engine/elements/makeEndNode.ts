import { type Beat, evaluateWorking } from '../laws/side'
import { elementKernel } from './elementKernel'
import type { EndNode, Stepper } from './piece'

/**
 * Makes an end node of a piece: a side with the admittance dt/M that keeps its history.
 *
 * @param slot of the node in the kernel
 * @param stepper of its piece
 * @param steps of the run
 */
export function makeEndNode(
  slot: number,
  stepper: Stepper,
  end: 'left' | 'right',
  beat: Beat,
  steps: number,
): EndNode {
  const admittance = end === 'left' ? stepper.admittanceLeft : stepper.admittanceRight
  const node: EndNode = {
    velocityNow: elementKernel.v[slot],
    force: new Float64Array(steps + 1),
    velocity: new Float64Array(steps + 1),
    side: {
      admittance: (k) => (admittance * beat.duration(k)) / beat.dt,
      freeVelocity: () => node.velocityNow + (end === 'left' ? stepper.kickLeft : stepper.kickRight),
      lastVelocity: () => node.velocityNow,
      take(k, force, velocity) {
        node.force[k] = force
        node.velocity[k] = evaluateWorking(beat, velocity, node.velocityNow)
        node.velocityNow = velocity
        elementKernel.widen(slot, force, k)
      },
    },
  }
  return node
}
