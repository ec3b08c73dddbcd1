import type { Joint } from '../../contract/rig'
import { makeContact } from './contact'
import { makeLoadedSide } from './loadedSide'
import { makeStraightCurve, makeTableCurve } from './loadingCurves'
import { makePathJoint } from './pathJoint'
import { makePathLaw } from './pathLaw'
import type { Beat, Body, NodeLaw, Side } from './side'
import { makeSpecimen } from './specimenLaw'

/**
 * Makes the law of a joint that is not bonded.
 *
 * @param left face left of the joint
 * @param right face right of it
 * @param bodies takes the masses that the joint brings along
 */
export function makeJoint(
  joint: Exclude<Joint, { kind: 'bonded' }>,
  left: Side,
  right: Side,
  beat: Beat,
  bodies: Body[],
): NodeLaw {
  switch (joint.kind) {
    case 'contact':
      return makeContact(left, right, joint.gap, beat)
    case 'specimen': {
      const { law, options } = makeSpecimen(joint)
      return makePathJoint(left, right, law, options, beat)
    }
    case 'cushion': {
      const { stiffness, curve, unloading, damping, mass, gap, tension } = joint
      const loading =
        curve === null ? makeStraightCurve(stiffness!) : makeTableCurve(curve.closing, curve.force)
      const law = makePathLaw(loading, unloading, -gap, tension)
      const [near, far] = mass > 0 ? loadFaces(left, right, mass, beat, bodies) : [left, right]
      return makePathJoint(near, far, law, { damping, pulls: tension }, beat)
    }
  }
}

/** Puts half of a cushion's mass on each of its faces. */
function loadFaces(left: Side, right: Side, mass: number, beat: Beat, bodies: Body[]): [Side, Side] {
  const near = makeLoadedSide(left, 1, mass / 2, beat)
  const far = makeLoadedSide(right, -1, mass / 2, beat)
  bodies.push(near, far)
  return [near, far]
}
