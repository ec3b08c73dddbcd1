import type { EndTable, JointTable } from '../../contract/result'
import type { Line } from '../line/line'
import type { NodeTrace, RunRecord } from '../records/record'

/** Share of the peak force under which a joint counts as carrying none. */
const FORCELESS = 1e-9

/** Makes the table of each joint, in order: its force is that on its left face, tension positive. */
export function tabulateJoints(line: Line, record: RunRecord): JointTable[] {
  return line.rig.joints.map((joint, i) => {
    const [left, right] = [line.bars[i], line.bars[i + 1]]
    const { forceLeft } = record.node(left.lastSpan + 1)!
    const peakForce = findPeak(forceLeft)
    let impulse = 0
    let first = -1
    let count = 0
    forceLeft.forEach((F, k) => {
      impulse += F * line.dt
      if (Math.abs(F) <= FORCELESS * Math.abs(peakForce)) return
      if (first < 0) first = k
      count++
    })
    return {
      name: `${left.name} | ${right.name}`,
      kind: joint.kind,
      peakForce,
      impulse: impulse + 0,
      closedFrom: first < 0 ? null : first * line.dt,
      contactTime: count * line.dt,
      energyLost: record.jointLoss[i],
    }
  })
}

/** Makes the tables of the two ends. */
export function tabulateEnds(line: Line, record: RunRecord): { left: EndTable; right: EndTable } {
  const peakAt = (node: number) => findPeak((record.node(node) as NodeTrace).forceLeft)
  return {
    left: { peakForce: peakAt(0), ...record.ends.left },
    right: { peakForce: peakAt(line.spans.length), ...record.ends.right },
  }
}

function findPeak(force: Float64Array): number {
  let peak = 0
  for (const F of force) if (Math.abs(F) > Math.abs(peak)) peak = F
  return peak
}
