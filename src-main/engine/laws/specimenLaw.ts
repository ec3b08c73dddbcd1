import type { SpecimenLaw } from '../../contract/rig'
import { makePowerCurve, makeStraightCurve, makeTableCurve } from './loadingCurves'
import type { JointOptions } from './pathJoint'
import { makePathLaw, type PathLaw } from './pathLaw'

/** Strain up to which the first stretch past yield is drawn; it goes on with the same slope. */
const FAR = 1

/**
 * Makes the law of a specimen pressed between two bars: nominal stress against nominal strain, one
 * stress all through it. It presses and never pulls.
 *
 * Elastic unloads as it loads; bilinear unloads with its modulus; a curve with its steepest slope;
 * a power law, which has no modulus, unloads rigidly. Along the loading curve the stress is raised
 * by `(rate / referenceRate)^rateSensitivity`, rates under the reference counting as the reference.
 *
 * @param specimen length [m], area [m^2] and law
 */
export function makeSpecimen(specimen: { length: number; area: number; law: SpecimenLaw }): {
  law: PathLaw
  options: JointOptions
} {
  const { length, law } = specimen
  const { rateSensitivity: m, referenceRate } = law
  const hurry = (rate: number) => Math.pow(Math.max(1, rate / length / referenceRate), m)
  return {
    law: makeLaw(specimen),
    options: { damping: 0, pulls: false, hurry: m === 0 ? undefined : hurry },
  }
}

function makeLaw({ length, area, law }: { length: number; area: number; law: SpecimenLaw }): PathLaw {
  const stiffness = (modulus: number) => (modulus * area) / length
  switch (law.kind) {
    case 'elastic':
      return makePathLaw(makeStraightCurve(stiffness(law.modulus)), null, 0)
    case 'bilinear': {
      const strain = law.yield / law.modulus
      const curve = makeTableCurve(
        [0, strain * length, (strain + FAR) * length],
        [0, law.yield * area, (law.yield + law.hardening * FAR) * area],
      )
      return makePathLaw(curve, stiffness(law.modulus), 0)
    }
    case 'power':
      return makePathLaw(
        makePowerCurve((law.strength * area) / Math.pow(length, law.exponent), law.exponent),
        Infinity,
        0,
      )
    case 'curve': {
      const closing = law.strain.map((strain) => strain * length)
      const force = law.stress.map((stress) => stress * area)
      if (closing[0] > 0) {
        closing.unshift(0)
        force.unshift(0)
      }
      return makePathLaw(makeTableCurve(closing, force), evaluateSteepest(closing, force), 0)
    }
  }
}

/** Steepest slope of a table that starts at zero closing; infinite where it starts with a force. */
function evaluateSteepest(closing: readonly number[], force: readonly number[]): number {
  if (force[0] > 0) return Infinity
  return Math.max(...closing.slice(1).map((x, i) => (force[i + 1] - force[i]) / (x - closing[i])))
}
