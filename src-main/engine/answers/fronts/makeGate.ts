import type { NodeTrace } from '../../records/record'
import type { FrontNode } from './frontNode'

/** What lets a change of force through at a node. */
export interface Gate {
  /** Force at every step where it can open, else null [N]. */
  force: Float64Array | null
  /**
   * The change of force that happens at a step, out of the one that closed faces would see [N].
   * Faces that part or meet at that step change by no more than the force recorded.
   */
  limit(step: number, change: number): number
}

/**
 * Makes the gate of a node: open to all where it is bonded, as recorded where it can open.
 *
 * @param node what a front meets there
 * @param trace the recorded force; null where it cannot open
 * @param forceless force up to which a contact is open, over the rounding of the run [N]
 */
export function makeGate(node: FrontNode, trace: NodeTrace | null, forceless: number): Gate {
  if (trace === null || !node.canOpen) return { force: null, limit: (_step, change) => change }
  const force = trace.forceLeft
  const isClosed = (step: number) => -force[step] > forceless
  return {
    force,
    limit(step, change) {
      if (change === 0) return 0
      const before = step > 0 && isClosed(step - 1)
      const after = isClosed(step)
      if (before && after) return change
      if (!before && !after) return 0
      const recorded = force[step] - (step > 0 ? force[step - 1] : 0)
      return recorded * change <= 0 ? 0 : Math.sign(change) * Math.min(Math.abs(change), Math.abs(recorded))
    },
  }
}
