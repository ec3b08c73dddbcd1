import { readTrace } from '../characteristics/readWaves'
import type { WaveRun } from '../characteristics/waveRun'
import type { EndRecord, NodeTrace } from './record'

/**
 * Traces both sides of a node that has a law of its own over the whole run. Outside an end both
 * sides read the bar's face.
 *
 * @param index of the line's node
 * @returns null at a step inside a graded block
 */
export function traceNode(run: WaveRun, index: number): NodeTrace | null {
  const node = run.nodes.find((one) => one.index === index)
  if (!node) return null
  const readFace = (block: number, face: 'left' | 'right') => {
    const live = run.blocks[block]
    const { force, velocity } = readTrace(run, live, face === 'left' ? 0 : live.cells)
    const fall = run.line.rig.gravity * run.line.dt
    return { force, velocity: fall === 0 ? velocity : velocity.map((v, k) => v + fall * k) }
  }
  const left = node.leftBlock >= 0 ? readFace(node.leftBlock, 'right') : readFace(node.rightBlock, 'left')
  const right = node.rightBlock >= 0 ? readFace(node.rightBlock, 'left') : left
  return {
    forceLeft: left.force,
    velocityLeft: left.velocity,
    forceRight: right.force,
    velocityRight: right.velocity,
  }
}

/**
 * Sums what the surroundings did to the bar at an end: impulse `n F dt`, work `n F v dt`.
 *
 * @param n +1 at the right end, -1 at the left end
 * @param dt [s]
 */
export function sumEnd(trace: NodeTrace, n: 1 | -1, dt: number): EndRecord {
  let impulse = 0
  let work = 0
  trace.forceLeft.forEach((F, k) => {
    impulse += n * F * dt
    work += n * F * trace.velocityLeft[k] * dt
  })
  return { impulse: impulse + 0, work: work + 0 }
}
