import type { InterfaceRatios } from '../../contract/result'
import type { Line } from '../line/line'
import { evaluateFaces } from './evaluateFaces'
import { evaluateStepRatios } from './evaluateStepRatios'
import { isJump } from './isJump'

/**
 * The ratios at every joint and at every boundary between sections where area or impedance jumps.
 *
 * Both sides are taken at their faces, so a taper that ends flush with its neighbour makes no entry.
 * At a contact the ratios hold while it is closed; through a cushion or a specimen they are what a
 * pulse much longer than it sees, and the name says so.
 *
 * @param line the cut line
 * @returns the interfaces from left to right; sections count from 1 in the names
 */
export function listInterfaces(line: Line): InterfaceRatios[] {
  const found: InterfaceRatios[] = []
  for (let i = 1; i < line.spans.length; i++) {
    const node = line.nodes[i]
    const left = evaluateFaces(line.spans[i - 1]).right
    const right = evaluateFaces(line.spans[i]).left
    const jumps = isJump(left.impedance, right.impedance) || isJump(left.area, right.area)
    if (node.kind !== 'joint' && !jumps) continue
    found.push({
      name: describeInterface(line, i),
      x: node.x,
      leftImpedance: left.impedance,
      rightImpedance: right.impedance,
      fromLeft: evaluateStepRatios(left.impedance, right.impedance, left.area, right.area),
      fromRight: evaluateStepRatios(right.impedance, left.impedance, right.area, left.area),
    })
  }
  return found
}

function describeInterface(line: Line, node: number): string {
  const left = line.spans[node - 1]
  const right = line.spans[node]
  const { bars, joints } = line.rig
  if (line.nodes[node].kind !== 'joint')
    return `${bars[left.bar].name} ${left.section + 1} | ${bars[right.bar].name} ${right.section + 1}`
  const kind = joints[line.nodes[node].joint].kind
  const long = kind === 'cushion' || kind === 'specimen' ? ` (${kind}, long pulses)` : ''
  return `${bars[left.bar].name} | ${bars[right.bar].name}${long}`
}
