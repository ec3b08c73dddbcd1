import type { End, Joint } from '../../contract/rig'
import { makeBond } from '../laws/bonded'
import { makeEnd } from '../laws/makeEnd'
import { makeJoint } from '../laws/makeJoint'
import { Outside } from '../laws/outside'
import { sampleForce } from '../laws/samplePulse'
import {
  type Beat,
  type Body,
  evaluateWorking,
  type Hand,
  makeBeat,
  type NodeLaw,
  type Side,
} from '../laws/side'
import { evaluateInitial } from '../line/evaluateInitial'
import type { Line } from '../line/line'
import type { MethodRun } from '../march/methodRun'
import { elementKernel } from './elementKernel'
import { makePieces } from './makePieces'
import type { NodeLoad, Piece } from './piece'
import { makeElementReader } from './readElements'

/**
 * Sets up a line for elements: total Lagrangian two-node rods, lumped mass, central difference.
 * The joints and ends are those of the other method; an end node is a side with the admittance
 * dt/M.
 *
 * @param line made by `makeElementLine`
 */
export function makeElementMethod(line: Line): MethodRun {
  const { rig } = line
  const beat = makeBeat(line.dt, rig.gravity, 'elements')
  const outside = { left: new Outside(beat), right: new Outside(beat), loads: [] as Outside[] }
  const bodies: Body[] = []
  const laws = new Map<number, NodeLaw>()
  const state = { size: line.spans.reduce((sum, span) => sum + span.cells, line.bars.length), saved: [] }
  elementKernel.enter(state)

  function makeLoads(node: number, slot: number): NodeLoad[] {
    return line.nodes[node].loads.map((load) => {
      const books = new Outside(beat)
      outside.loads.push(books)
      return { slot, outside: books, before: 0, force: sampleForce(load.pulse, beat) }
    })
  }
  const pieces = makePieces(line, beat, makeLoads)

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

  laws.set(0, makeEndLaw(rig.leftEnd, -1))
  rig.joints.forEach((joint, i) => {
    const law = makeInnerLaw(joint, pieces[i].right.side, pieces[i + 1].left.side)
    laws.set(line.bars[i].lastSpan + 1, law)
  })
  laws.set(line.spans.length, makeEndLaw(rig.rightEnd, 1))
  const order = [...laws.values()]

  function advance(from: number, to: number): void {
    elementKernel.enter(state)
    for (let k = from; k < to; k++) {
      for (const piece of pieces) begin(piece, k, beat)
      for (let i = 0; i < order.length; i++) order[i].advance(k, k + 1)
      for (const piece of pieces) finish(piece, k, beat, k === to - 1)
    }
  }

  return {
    line,
    beat,
    laws,
    bodies,
    outside,
    breaks: [],
    advance,
    ...makeElementReader(line, pieces, () => elementKernel.enter(state)),
  }
}

/** Prepares a step of a piece, noting what its watched and loaded nodes have before it. */
function begin(piece: Piece, k: number, beat: Beat): void {
  const { first, stepper, faces, probes, loads } = piece
  const share = beat.duration(k) / beat.dt
  for (const load of loads) load.before = elementKernel.v[load.slot]
  for (const probe of probes) probe.velocity[k] = elementKernel.v[first + probe.position]
  stepper.prepare(k, share)
  for (const { slot, take } of faces) take(k, stepper.elementForce(slot - 1), stepper.elementForce(slot))
  for (const probe of probes) {
    probe.force[k] = probe.face === null ? stepper.nodeForce(first + probe.position) : probe.face.force
  }
}

/** Finishes a step of a piece and books what it did at watched and loaded nodes. */
function finish(piece: Piece, k: number, beat: Beat, keep: boolean): void {
  const { stepper, left, right } = piece
  stepper.finish({
    k,
    share: beat.duration(k) / beat.dt,
    vLeft: left.velocityNow,
    vRight: right.velocityNow,
    forceLeft: left.force[k],
    forceRight: right.force[k],
    keep,
  })
  for (const watch of piece.strains) {
    watch.strain[k] = watch.now
    watch.now += (beat.dt * (elementKernel.v[watch.to] - elementKernel.v[watch.from])) / watch.length
  }
  for (const probe of piece.probes) {
    const now = elementKernel.v[piece.first + probe.position]
    probe.velocity[k] = evaluateWorking(beat, now, probe.velocity[k])
  }
  for (const load of piece.loads) {
    load.outside.add(k, load.force(k), evaluateWorking(beat, elementKernel.v[load.slot], load.before))
  }
}
