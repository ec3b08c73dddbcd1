import type { End } from '../../../contract/rig'
import type { Line } from '../../line/line'
import { evaluateFaces } from '../evaluateFaces'

/**
 * What a sudden front meets at a node: how much speed each side takes per force [s/kg]. A bar takes 1/Z,
 * what cannot move at once (a mass, a wall) nothing, what cannot push at once (air, a spring) any speed.
 */
export interface FrontNode {
  left: number
  right: number
  /** The joint's own: 0 where the faces move as one, 1/D for a dashpot, Infinity for a spring. */
  joint: number
  /** True where each face carries a mass of its own: a front turns back from it and nothing passes at once. */
  heavy: boolean
  /** True where it carries no tension. */
  canOpen: boolean
  /** [m] at the start */
  gap: number
}

/**
 * Makes what a front meets at a node.
 *
 * @param line the cut line
 * @param index of the node
 */
export function makeFrontNode(line: Line, index: number): FrontNode {
  const { rig, spans, nodes } = line
  const left = index > 0 ? 1 / evaluateFaces(spans[index - 1]).right.impedance : null
  const right = index < spans.length ? 1 / evaluateFaces(spans[index]).left.impedance : null
  if (left === null)
    return { left: evaluateOutside(rig.leftEnd, right!), right: right!, ...describeEnd(rig.leftEnd) }
  if (right === null)
    return { left, right: evaluateOutside(rig.rightEnd, left), ...describeEnd(rig.rightEnd) }
  const joint = nodes[index].kind === 'joint' ? rig.joints[nodes[index].joint] : { kind: 'bonded' as const }
  switch (joint.kind) {
    case 'bonded':
      return { left, right, joint: 0, heavy: false, canOpen: false, gap: 0 }
    case 'contact':
      return { left, right, joint: 0, heavy: false, canOpen: true, gap: joint.gap }
    case 'cushion':
      return {
        left,
        right,
        joint: 1 / joint.damping,
        heavy: joint.mass > 0,
        canOpen: !joint.tension && joint.mass === 0,
        gap: joint.gap,
      }
    case 'specimen':
      return { left, right, joint: Infinity, heavy: false, canOpen: false, gap: 0 }
  }
}

function evaluateOutside(end: End, bar: number): number {
  switch (end.kind) {
    case 'free':
    case 'force':
    case 'penetration':
      return Infinity
    case 'matched':
      return bar
    case 'support':
      return end.mass > 0 ? 0 : 1 / end.damping
    default:
      return 0
  }
}

function describeEnd(end: End): Pick<FrontNode, 'joint' | 'heavy' | 'canOpen' | 'gap'> {
  if (end.kind === 'wall') return { joint: 0, heavy: false, canOpen: true, gap: end.gap }
  const canOpen = (end.kind === 'mass' || end.kind === 'support') && end.joint === 'contact'
  return { joint: 0, heavy: false, canOpen, gap: canOpen ? end.gap : 0 }
}
