import type { EndTable, JointTable } from '../../contract/result'
import type { Line } from '../line/line'
import type { EndRecord, NodeTrace, RunRecord } from '../records/record'

/** Share of the peak force under which a joint counts as carrying none. */
const FORCELESS = 1e-9

/** Makes the table of each joint, in order: its force is that on its left face, tension positive. */
export function tabulateJoints(line: Line, record: RunRecord): JointTable[] {
  return line.rig.joints.map((joint, i) => {
    const [left, right] = [line.bars[i], line.bars[i + 1]]
    const { forceLeft, reaction } = record.node(left.lastSpan + 1)!
    const { peakForce, first, count } = findContact(forceLeft)
    return {
      name: `${left.name} | ${right.name}`,
      kind: joint.kind,
      peakForce,
      impulse: reaction.reduce((sum, F) => sum + F * line.dt, 0) + 0,
      closedFrom: first < 0 ? null : first * line.dt,
      contactTime: count * line.dt,
      energyLost: record.jointLoss[i],
    }
  })
}

/** Makes the tables of the two ends: their force is that of the bar's face. */
export function tabulateEnds(line: Line, record: RunRecord): { left: EndTable; right: EndTable } {
  const tabulate = (node: number, end: EndRecord): EndTable => {
    const { peakForce, count } = findContact((record.node(node) as NodeTrace).forceLeft)
    return { peakForce, ...end, contactTime: count * line.dt }
  }
  return {
    left: tabulate(0, record.ends.left),
    right: tabulate(line.spans.length, record.ends.right),
  }
}

/** Force of largest magnitude [N], the first step with force, -1 without any, and the count of such steps. */
function findContact(force: Float64Array): { peakForce: number; first: number; count: number } {
  let peakForce = 0
  for (const F of force) if (Math.abs(F) > Math.abs(peakForce)) peakForce = F
  let first = -1
  let count = 0
  force.forEach((F, k) => {
    if (Math.abs(F) <= FORCELESS * Math.abs(peakForce)) return
    if (first < 0) first = k
    count++
  })
  return { peakForce, first, count }
}
