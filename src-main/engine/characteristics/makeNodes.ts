import type { End, Joint } from '../../contract/rig'
import { makeBarSide } from '../laws/barSide'
import { makeMass, makeMatched, makeMotion, makeSupport } from '../laws/bodies'
import { makeBond, makeBonded } from '../laws/bonded'
import { makeContact } from '../laws/contact'
import { makeCushion } from '../laws/cushion'
import { Outside } from '../laws/outside'
import { makePrescribedForce } from '../laws/prescribedForce'
import type { Beat, Body, Hand, NodeLaw, Side } from '../laws/side'
import { evaluateInitial } from '../line/evaluateInitial'
import type { Line } from '../line/line'
import type { LiveBlock, LiveNode, WaveRun } from './waveRun'

type Nodes = Pick<WaveRun, 'nodes' | 'bodies' | 'outside'>

/**
 * Makes the law of each node that has one: the ends, the joints, loaded nodes, and bonded steps
 * between two blocks.
 */
export function makeNodes(line: Line, blocks: readonly LiveBlock[]): Nodes {
  const beat: Beat = { dt: line.dt, gravity: line.rig.gravity }
  const outside = { left: new Outside(beat), right: new Outside(beat), loads: [] as Outside[] }
  const bodies: Body[] = []
  const nodes: LiveNode[] = []

  function addEnd(end: End, hand: Hand): void {
    const block = hand === 1 ? blocks[blocks.length - 1] : blocks[0]
    const books = hand === 1 ? outside.right : outside.left
    const law = makeEnd(line, end, block, hand, beat, books, bodies)
    const at = hand === 1 ? blocks.length - 1 : -1
    nodes.push({ index: hand === 1 ? line.spans.length : 0, law, leftBlock: at, rightBlock: hand === 1 ? -1 : 0 })
  }

  addEnd(line.rig.leftEnd, -1)
  for (let i = 0; i + 1 < blocks.length; i++) {
    const index = blocks[i].rightNode
    const node = line.nodes[index]
    let law: NodeLaw
    if (node.kind === 'joint' && line.rig.joints[node.joint].kind !== 'bonded') {
      const left = makeBarSide(blocks[i].right, 1)
      const right = makeBarSide(blocks[i + 1].left, -1)
      law = makeJoint(line.rig.joints[node.joint], left, right, line.dt)
    } else {
      const books = node.loads.length > 0 ? new Outside(beat) : null
      if (books) outside.loads.push(books)
      const force = (k: number) => node.loads.reduce((sum, load) => sum + load.pulse.value(k * line.dt), 0)
      law = makeBonded(blocks[i].right, blocks[i + 1].left, books && { force, outside: books })
    }
    nodes.push({ index, law, leftBlock: i, rightBlock: i + 1 })
  }
  addEnd(line.rig.rightEnd, 1)
  return { nodes, bodies, outside }
}

function makeJoint(joint: Joint, left: Side, right: Side, dt: number): NodeLaw {
  if (joint.kind === 'contact') return makeContact(left, right, joint.gap, dt)
  if (joint.kind === 'cushion' && joint.stiffness !== null) {
    const { stiffness, damping, gap, tension } = joint
    return makeCushion(left, right, { stiffness, damping, gap, tension }, dt)
  }
  throw new Error(`a ${joint.kind} joint has no law here; the reader should have refused it`)
}

/** The law at one end. `hand` is the bar's: +1 where it stands left of the node, at the right end. */
function makeEnd(
  line: Line,
  end: End,
  block: LiveBlock,
  hand: Hand,
  beat: Beat,
  outside: Outside,
  bodies: Body[],
): NodeLaw {
  const { dt } = line
  const port = hand === 1 ? block.right : block.left
  const bar = makeBarSide(port, hand)
  const other: Hand = hand === 1 ? -1 : 1

  function join(body: Side, joint: 'bonded' | 'contact', gap: number): NodeLaw {
    const [left, right] = hand === 1 ? [bar, body] : [body, bar]
    return joint === 'bonded' ? makeBond(left, right) : makeContact(left, right, gap, dt)
  }
  function addBody(body: Body): Body {
    bodies.push(body)
    return body
  }
  function makeMover(velocity: (k: number) => number): Side {
    return makeMotion(velocity, other, beat, outside)
  }

  switch (end.kind) {
    case 'free':
      return makePrescribedForce(bar, hand, () => 0, outside)
    case 'force':
      return makePrescribedForce(bar, hand, (k) => end.pulse.value(k * dt), outside)
    case 'fixed':
      return join(makeMover(() => 0), 'bonded', 0)
    case 'velocity':
      return join(makeMover((k) => end.pulse.value(k * dt)), 'bonded', 0)
    case 'displacement': {
      const u = (t: number) => (t <= 0 ? 0 : end.pulse.value(t))
      return join(makeMover((k) => (u((k + 0.5) * dt) - u((k - 0.5) * dt)) / dt), 'bonded', 0)
    }
    case 'matched': {
      const span = hand === 1 ? line.spans.length - 1 : 0
      const { force, velocity } = evaluateInitial(line, span, hand === 1 ? line.spans[span].cells : 0)
      const arriving = (force + hand * port.impedance * velocity) / 2
      return join(makeMatched(port.impedance, arriving, other, outside), 'bonded', 0)
    }
    case 'wall':
      return join(makeMover(() => 0), 'contact', end.gap)
    case 'mass':
      return join(addBody(makeMass(end.mass, end.velocity, beat)), end.joint, end.gap)
    case 'support':
      return join(addBody(makeSupport(end, beat, outside)), end.joint, end.gap)
    case 'penetration':
      throw new Error('a penetration end has no law here; the reader should have refused it')
  }
}
