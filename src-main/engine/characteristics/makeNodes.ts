import type { End } from '../../contract/rig'
import { makeBarSide } from '../laws/barSide'
import { makeBonded } from '../laws/bonded'
import { makeEnd } from '../laws/makeEnd'
import { makeJoint } from '../laws/makeJoint'
import { Outside } from '../laws/outside'
import { type Body, type Hand, makeBeat, type NodeLaw } from '../laws/side'
import { evaluateInitial } from '../line/evaluateInitial'
import type { Line } from '../line/line'
import type { LiveBlock, LiveNode, WaveRun } from './waveRun'

type Nodes = Pick<WaveRun, 'nodes' | 'bodies' | 'outside' | 'beat'>

/**
 * Makes the law of each node that has one: the ends, the joints, loaded nodes, and bonded steps
 * between two blocks.
 */
export function makeNodes(line: Line, blocks: readonly LiveBlock[]): Nodes {
  const beat = makeBeat(line.dt, line.rig.gravity, 'characteristics')
  const outside = { left: new Outside(beat), right: new Outside(beat), loads: [] as Outside[] }
  const bodies: Body[] = []
  const nodes: LiveNode[] = []
  const lastBlock = blocks.length - 1

  function makeEndLaw(end: End, hand: Hand): NodeLaw {
    const port = hand === 1 ? blocks[lastBlock].right : blocks[0].left
    const span = hand === 1 ? line.spans.length - 1 : 0
    const start = evaluateInitial(line, span, hand === 1 ? line.spans[span].cells : 0)
    const face = { side: makeBarSide(port, hand, start.velocity), hand, impedance: port.impedance, ...start }
    return makeEnd(end, face, beat, hand === 1 ? outside.right : outside.left, bodies)
  }

  function makeInnerLaw(left: LiveBlock, right: LiveBlock): NodeLaw {
    const node = line.nodes[left.rightNode]
    const joint = node.kind === 'joint' ? line.rig.joints[node.joint] : null
    if (joint !== null && joint.kind !== 'bonded') {
      const span = left.rightNode
      const before = evaluateInitial(line, span - 1, line.spans[span - 1].cells).velocity
      const after = evaluateInitial(line, span, 0).velocity
      const faces = [makeBarSide(left.right, 1, before), makeBarSide(right.left, -1, after)] as const
      return makeJoint(joint, ...faces, beat, bodies)
    }
    if (node.loads.length === 0) return makeBonded(left.right, right.left, null)
    const books = new Outside(beat)
    outside.loads.push(books)
    const force = (k: number) => node.loads.reduce((sum, load) => sum + load.pulse.value(k * line.dt), 0)
    return makeBonded(left.right, right.left, { force, outside: books })
  }

  nodes.push({ index: 0, law: makeEndLaw(line.rig.leftEnd, -1), leftBlock: -1, rightBlock: 0 })
  for (let i = 0; i < lastBlock; i++) {
    const law = makeInnerLaw(blocks[i], blocks[i + 1])
    nodes.push({ index: blocks[i].rightNode, law, leftBlock: i, rightBlock: i + 1 })
  }
  const law = makeEndLaw(line.rig.rightEnd, 1)
  nodes.push({ index: line.spans.length, law, leftBlock: lastBlock, rightBlock: -1 })
  return { nodes, bodies, outside, beat }
}
