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
  const force = new Float64Array(steps + 1)
  const face = stepper.linear ? force : new Float64Array(steps + 1)
  const element = end === 'left' ? slot : slot - 1
  const node: EndNode = {
    velocityNow: elementKernel.v[slot],
    force,
    face,
    velocity: new Float64Array(steps + 1),
    side: {
      admittance: (k) => (admittance * beat.duration(k)) / beat.dt,
      freeVelocity: () => node.velocityNow + (end === 'left' ? stepper.kickLeft : stepper.kickRight),
      lastVelocity: () => node.velocityNow,
      take(k, reaction, velocity) {
        force[k] = reaction
        if (!stepper.linear) face[k] = stepper.elementForce(element)
        node.velocity[k] = evaluateWorking(beat, velocity, node.velocityNow)
        node.velocityNow = velocity
        elementKernel.widen(slot, face[k], k)
      },
    },
  }
  return node
}
