import type { End } from '../../../contract/rig'
import { evaluateInitial } from '../../line/evaluateInitial'
import type { Line } from '../../line/line'
import { evaluatePulseSteps } from './evaluatePulseSteps'
import type { FrontNode } from './frontNode'
import { listPulseJumps } from './listPulseJumps'

/** A sudden change at a node that sends fronts off: what each side's force changes by [N]. */
export interface FrontSource {
  step: number
  node: number
  left: number
  right: number
}

/**
 * The sudden changes at one node that no arriving front causes: bars that do not fit together at the
 * start (an impact, a release) and what an end or a load prescribes.
 *
 *     force at the start F = (v_right - v_left)/(Y_left + Y_right + Y_joint), v the velocities if no force acted
 *
 * @param line the cut line
 * @param index of the node
 * @param node what a front meets there
 * @returns in order of time; several of one node belong to one start
 */
export function listFrontSources(line: Line, index: number, node: FrontNode): FrontSource[] {
  const { rig, dt, steps, spans } = line
  const end = index === 0 ? rig.leftEnd : index === spans.length ? rig.rightEnd : null
  const pulse = evaluatePulseSteps(end ?? line.nodes[index].loads, dt, steps)
  const found: FrontSource[] = []
  const first = evaluateStart(line, index, node, end, pulse === null ? 0 : pulse[0])
  if (first.left !== 0 || first.right !== 0) found.push({ step: 0, node: index, ...first })
  if (pulse === null) return found
  for (const { step, change } of listPulseJumps(pulse)) {
    if (end === null) {
      const left = (change * node.right) / (node.left + node.right)
      found.push({ step, node: index, left, right: left - change })
    } else {
      const hand = index === 0 ? -1 : 1
      const force =
        end.kind === 'force' ? hand * change : (hand * change) / (index === 0 ? node.right : node.left)
      found.push({ step, node: index, left: index === 0 ? 0 : force, right: index === 0 ? force : 0 })
    }
  }
  return found
}

/** What the force on each side of a node changes by at once as the run starts. */
function evaluateStart(
  line: Line,
  index: number,
  node: FrontNode,
  end: End | null,
  prescribed: number,
): { left: number; right: number } {
  const { spans } = line
  const leftBar = index > 0 ? evaluateInitial(line, index - 1, spans[index - 1].cells) : null
  const rightBar = index < spans.length ? evaluateInitial(line, index, 0) : null
  if (end?.kind === 'matched' || node.heavy) return { left: 0, right: 0 }
  const outside = end?.kind === 'mass' ? end.velocity : end?.kind === 'force' ? 0 : prescribed
  const freeLeft = leftBar === null ? outside : leftBar.velocity - leftBar.force * node.left
  const freeRight = rightBar === null ? outside : rightBar.velocity + rightBar.force * node.right
  const load = end === null ? prescribed : 0
  let force =
    (freeRight - freeLeft + (load === 0 ? 0 : load * node.right)) / (node.left + node.right + node.joint)
  if (node.canOpen && (node.gap > 0 || force > 0)) force = 0
  if (end?.kind === 'force') force = index === 0 ? -prescribed : prescribed
  return {
    left: leftBar === null ? 0 : force - leftBar.force,
    right: rightBar === null ? 0 : force - load - rightBar.force,
  }
}
