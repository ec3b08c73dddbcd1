import type { End, Joint } from '../../contract/rig'
import { makeBond } from '../laws/bonded'
import { makeEnd } from '../laws/makeEnd'
import { makeJoint } from '../laws/makeJoint'
import { Outside } from '../laws/outside'
import { type Beat, type Body, evaluateWorking, type Hand, makeBeat, type NodeLaw, type Side } from '../laws/side'
import { evaluateInitial } from '../line/evaluateInitial'
import type { Line } from '../line/line'
import { WIDENING } from '../march/widening'
import type { MethodRun, NodeTrace, SpanExtremes, SpanTrace, Stock } from '../march/methodRun'
import { elementKernel } from './elementKernel'
import { makePieces, type PieceDraft } from './makePieces'
import type { EndNode, NodeLoad, Piece } from './piece'

/**
 * Sets up a line for elements: total Lagrangian two-node rods, lumped mass, central difference.
 * The joints and ends are those of the other method; an end node is a side with the admittance
 * dt/M.
 *
 * @param line made by `makeElementLine`
 */
export function makeElementMethod(line: Line): MethodRun {
  const beat = makeBeat(line.dt, line.rig.gravity, 'elements')
  const outside = { left: new Outside(beat), right: new Outside(beat), loads: [] as Outside[] }
  const bodies: Body[] = []
  const laws = new Map<number, NodeLaw>()
  const nodes = line.spans.reduce((sum, span) => sum + span.cells, line.bars.length)
  const state = { size: nodes, saved: [] }
  elementKernel.enter(state)

  function makeLoads(node: number, position: number): NodeLoad[] {
    return line.nodes[node].loads.map((load) => {
      const books = new Outside(beat)
      outside.loads.push(books)
      return { position, outside: books, before: 0, force: (k: number) => load.pulse.value(k * line.dt) }
    })
  }
  const pieces: Piece[] = makePieces(line, makeLoads).map((draft) => ({
    ...draft,
    left: makeEndNode(draft, 'left'),
    right: makeEndNode(draft, 'right'),
    probes: [],
  }))

  function makeEndNode(draft: PieceDraft, end: 'left' | 'right'): EndNode {
    const slot = end === 'left' ? draft.first : draft.last
    const { stepper } = draft
    const node: EndNode = {
      next: elementKernel.v[slot],
      force: new Float64Array(line.steps + 1),
      velocity: new Float64Array(line.steps + 1),
      side: {
        admittance: (k) =>
          ((end === 'left' ? stepper.admittanceLeft : stepper.admittanceRight) * beat.duration(k)) / beat.dt,
        freeVelocity: () => elementKernel.v[slot] + (end === 'left' ? stepper.kickLeft : stepper.kickRight),
        lastVelocity: () => elementKernel.v[slot],
        take(k, force, velocity) {
          node.next = velocity
          node.force[k] = force
          node.velocity[k] = evaluateWorking(beat, velocity, elementKernel.v[slot])
          elementKernel.widen(slot, force, k)
        },
      } satisfies Side,
    }
    return node
  }

  function makeEndLaw(end: End, hand: Hand): NodeLaw {
    const span = hand === 1 ? line.spans.length - 1 : 0
    const { cells, impedance } = line.spans[span]
    const { force, velocity } = evaluateInitial(line, span, hand === 1 ? cells : 0)
    const node = hand === 1 ? pieces[pieces.length - 1].right : pieces[0].left
    const face = { side: node.side, hand, impedance: impedance[hand === 1 ? cells - 1 : 0], force, velocity }
    return makeEnd(end, face, beat, hand === 1 ? outside.right : outside.left, bodies)
  }

  function makeInnerLaw(joint: Joint, left: Side, right: Side): NodeLaw {
    return joint.kind === 'bonded' ? makeBond(left, right, beat) : makeJoint(joint, left, right, beat, bodies)
  }

  laws.set(0, makeEndLaw(line.rig.leftEnd, -1))
  line.rig.joints.forEach((joint, i) => {
    const law = makeInnerLaw(joint, pieces[i].right.side, pieces[i + 1].left.side)
    laws.set(line.bars[i].lastSpan + 1, law)
  })
  laws.set(line.spans.length, makeEndLaw(line.rig.rightEnd, 1))
  const order = [...laws.values()]

  function advance(from: number, to: number): void {
    elementKernel.enter(state)
    for (let k = from; k < to; k++) {
      const share = beat.duration(k) / beat.dt
      for (const piece of pieces) begin(piece, k, share)
      for (let i = 0; i < order.length; i++) order[i].advance(k, k + 1)
      for (const piece of pieces) {
        const { left, right } = piece
        piece.stepper.finish({
          k,
          share,
          vLeft: left.next,
          vRight: right.next,
          forceLeft: left.force[k],
          forceRight: right.force[k],
          keep: k === to - 1,
        })
        settle(piece, k, beat)
      }
    }
  }

  const pieceOf = (span: number) => pieces[line.spans[span].bar]
  const positionOf = (span: number, position: number) => {
    const piece = pieceOf(span)
    return piece.spanStart[span - piece.firstSpan] + position
  }

  return {
    line,
    beat,
    laws,
    bodies,
    outside,
    advance,
    sumBar(bar, k, frame): Stock {
      elementKernel.enter(state)
      const { first, nodeMass, stepper } = pieces[bar]
      let momentum = 0
      let mass = 0
      nodeMass.forEach((m, j) => {
        momentum += m * elementKernel.v[first + j]
        mass += m
      })
      const kinetic = stepper.kinetic(frame)
      return { kinetic, strain: stepper.strain(k < 0), dissipated: stepper.dissipated(), momentum, mass }
    },
    readForce(span, position, k) {
      const piece = pieceOf(span)
      const at = positionOf(span, position)
      if (at === 0) return piece.left.force[k]
      if (at === piece.last - piece.first) return piece.right.force[k]
      return piece.stepper.keptForce(at)
    },
    readExtremes(span): SpanExtremes {
      elementKernel.enter(state)
      const { high, low, highStep, lowStep } = elementKernel
      const from = pieceOf(span).first + positionOf(span, 0)
      const to = from + line.spans[span].cells + 1
      return {
        high: high.slice(from, to).map((value) => value / WIDENING),
        low: low.slice(from, to).map((value) => value / WIDENING),
        highStep: highStep.slice(from, to),
        lowStep: lowStep.slice(from, to),
      }
    },
    addProbe(span, position) {
      const piece = pieceOf(span)
      const at = positionOf(span, position)
      const inner = at > 0 && at < piece.last - piece.first
      if (!inner || piece.probes.some((probe) => probe.position === at)) return
      const count = line.steps + 1
      piece.probes.push({ position: at, force: new Float64Array(count), velocity: new Float64Array(count) })
    },
    readTrace(span, position): SpanTrace {
      const piece = pieceOf(span)
      const at = positionOf(span, position)
      if (at === 0) return piece.left
      if (at === piece.last - piece.first) return piece.right
      return piece.probes.find((probe) => probe.position === at)!
    },
    readNode(node): NodeTrace | null {
      if (!laws.has(node)) return null
      const left = node === 0 ? pieces[0].left : pieceOf(node - 1).right
      const right = node === line.spans.length ? left : pieceOf(node).left
      return {
        forceLeft: left.force,
        velocityLeft: left.velocity,
        forceRight: right.force,
        velocityRight: right.velocity,
      }
    },
  }
}

/** Prepares a step of a piece, noting what its watched and loaded nodes have before it. */
function begin(piece: Piece, k: number, share: number): void {
  const { first, stepper, probes, loads } = piece
  for (const load of loads) load.before = elementKernel.v[first + load.position]
  for (const probe of probes) probe.velocity[k] = elementKernel.v[first + probe.position]
  stepper.prepare(k, share)
  for (const probe of probes) probe.force[k] = stepper.nodeForce(probe.position)
}

/** Books what the step did at watched and loaded nodes: a force works at the mean of both velocities. */
function settle(piece: Piece, k: number, beat: Beat): void {
  const { first, probes, loads } = piece
  for (const probe of probes) {
    probe.velocity[k] = evaluateWorking(beat, elementKernel.v[first + probe.position], probe.velocity[k])
  }
  for (const load of loads) {
    const working = evaluateWorking(beat, elementKernel.v[first + load.position], load.before)
    load.outside.add(k, load.force(k), working)
  }
}
