import type { End } from '../../contract/rig'
import { makeMass, makeMatched, makeMotion, makeSupport } from './bodies'
import { makeBond } from './bonded'
import { makeContact } from './contact'
import { makeStraightCurve } from './loadingCurves'
import type { Outside } from './outside'
import { makePathJoint } from './pathJoint'
import { makePathLaw } from './pathLaw'
import { makePrescribedForce } from './prescribedForce'
import { sampleForce, sampleMotion } from './samplePulse'
import type { Beat, Body, Hand, NodeLaw, Side } from './side'

/** The bar's face at an end, as it is at the start. */
export interface EndFace {
  side: Side
  /** +1 where the bar stands left of the node: at the right end. */
  hand: Hand
  /** Z of the bar there [kg/s] */
  impedance: number
  /** [N] */
  force: number
  /** [m/s] */
  velocity: number
}

/**
 * Makes the law at one end of the line.
 *
 * @param outside where the surroundings' force is booked
 * @param bodies takes the body that stands at the end, if any
 */
export function makeEnd(end: End, face: EndFace, beat: Beat, outside: Outside, bodies: Body[]): NodeLaw {
  const { side: bar, hand, impedance } = face
  const { dt } = beat
  const other: Hand = hand === 1 ? -1 : 1
  // The time at which a step's velocity stands: t_k by characteristics, t_k + dt/2 with elements.
  const timeOf = (k: number) => (k + 1 - beat.alpha) * dt

  function place(body: Side): [Side, Side] {
    return hand === 1 ? [bar, body] : [body, bar]
  }
  function join(body: Side, joint: 'bonded' | 'contact', gap: number): NodeLaw {
    const [left, right] = place(body)
    return joint === 'bonded' ? makeBond(left, right, beat) : makeContact(left, right, gap, beat)
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
      return makePrescribedForce(bar, hand, () => 0, beat, outside)
    case 'force':
      return makePrescribedForce(bar, hand, sampleForce(end.pulse, beat), beat, outside)
    case 'fixed':
      return join(
        makeMover(() => 0),
        'bonded',
        0,
      )
    case 'velocity':
      return join(makeMover(sampleMotion(end.pulse, beat)), 'bonded', 0)
    case 'displacement': {
      const u = (t: number) => (t <= 0 ? 0 : end.pulse.value(t))
      const mover = makeMover((k) => (u(timeOf(k + 0.5)) - u(timeOf(k - 0.5))) / dt)
      return join(mover, 'bonded', 0)
    }
    case 'matched': {
      const arriving = (face.force + hand * impedance * face.velocity) / 2
      const beyond = makeMatched(impedance, arriving, face.velocity, other, beat, outside)
      return join(beyond, 'bonded', 0)
    }
    case 'wall':
      return join(
        makeMover(() => 0),
        'contact',
        end.gap,
      )
    case 'mass':
      return join(addBody(makeMass(end.mass, end.velocity, beat)), end.joint, end.gap)
    case 'support':
      return join(addBody(makeSupport(end, beat, outside)), end.joint, end.gap)
    case 'penetration': {
      const [left, right] = place(makeMover(() => 0))
      const law = makePathLaw(makeStraightCurve(end.loading), end.unloading, 0)
      return makePathJoint(left, right, law, { damping: 0, pulls: false }, beat)
    }
  }
}
