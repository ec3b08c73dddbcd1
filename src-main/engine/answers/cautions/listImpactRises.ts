import type { End, Joint } from '../../../contract/rig'
import type { Line } from '../../line/line'

/** The rise of a wave that starts of itself [s], and what to call it. */
export interface Rise {
  time: number
  what: string
}

/**
 * Rises of the waves that impacts, releases and closing gaps start: at once where the faces touch, and
 * spread out where a cushion or a specimen lies between them.
 *
 *     F = Z V (1 - Z/(Z + D) exp(-K t/(Z + D))),  1/Z = 1/Z1 + 1/Z2
 *
 * is the force of two long bars meeting at V across a spring K with a dashpot D; its rise is that from
 * 10 % to 90 %. Of a loading curve the steepest stretch counts, so that the rise is never taken too long.
 *
 * @param line the cut line
 */
export function listImpactRises(line: Line): Rise[] {
  const { rig } = line
  const impact = 'The wave of an impact or a release'
  const closing = 'The wave of a gap that closes'
  const rises: Rise[] = []
  rig.joints.forEach((joint, i) => {
    const [left, right] = [rig.bars[i], rig.bars[i + 1]]
    const together = left.uniformVelocity !== null && left.uniformVelocity === right.uniformVelocity
    const gap = 'gap' in joint && joint.gap > 0
    if (!together || gap)
      rises.push({ time: evaluateJointRise(line, i, joint), what: gap ? closing : impact })
  })
  const last = rig.bars.length - 1
  for (const [end, bar, Z] of [
    [rig.leftEnd, 0, line.spans[0].impedance[0]],
    [rig.rightEnd, last, readLastImpedance(line, last)],
  ] as const) {
    const speed = end.kind === 'mass' ? end.velocity : 0
    const gap = 'gap' in end && end.gap > 0
    if (!isHeld(end) || (rig.bars[bar].uniformVelocity === speed && !gap)) continue
    rises.push({ time: evaluateEndRise(end, Z), what: gap ? closing : impact })
  }
  // A velocity that varies along a bar, or a preload let go, starts waves of its own.
  if (rig.bars.some((bar) => bar.uniformVelocity === null || bar.preload !== 0)) {
    rises.push({ time: 0, what: impact })
  }
  return rises
}

/** True for an end that a bar may strike. */
function isHeld({ kind }: End): boolean {
  return kind !== 'free' && kind !== 'matched' && kind !== 'force'
}

/** Rise against the ground, which has no end to its impedance. */
function evaluateEndRise(end: End, Z: number): number {
  if (end.kind === 'penetration') return evaluateRise(Z, end.loading, 0)
  if (end.kind === 'support' && end.mass === 0) return evaluateRise(Z, end.stiffness, end.damping)
  return 0
}

function evaluateJointRise(line: Line, index: number, joint: Joint): number {
  const [Z1, Z2] = [readLastImpedance(line, index), line.spans[line.bars[index + 1].firstSpan].impedance[0]]
  return evaluateRise(
    (Z1 * Z2) / (Z1 + Z2),
    evaluateStiffness(joint),
    joint.kind === 'cushion' ? joint.damping : 0,
  )
}

/** Impedance of a bar's right-hand face [kg/s]. */
function readLastImpedance(line: Line, bar: number): number {
  const { impedance, cells } = line.spans[line.bars[bar].lastSpan]
  return impedance[cells - 1]
}

function evaluateRise(Z: number, K: number, D: number): number {
  if (K === Infinity) return 0
  const left = Z / (Z + D)
  const reach = (share: number) => Math.max(0, Math.log(left / (1 - share)) * ((Z + D) / K))
  return reach(0.9) - reach(0.1)
}

/** The steepest stiffness of a joint as it closes [N/m]; infinite for faces that touch. */
function evaluateStiffness(joint: Joint): number {
  switch (joint.kind) {
    case 'bonded':
    case 'contact':
      return Infinity
    case 'cushion': {
      if (joint.curve === null) return joint.stiffness ?? Infinity
      const { closing, force } = joint.curve
      return evaluateSteepest(closing, force)
    }
    case 'specimen': {
      const { law, area, length } = joint
      if (law.kind === 'elastic' || law.kind === 'bilinear') return (law.modulus * area) / length
      if (law.kind === 'power') return Infinity
      const [strain, stress] =
        law.strain[0] > 0
          ? [
              [0, ...law.strain],
              [0, ...law.stress],
            ]
          : [law.strain, law.stress]
      return stress[0] > 0 ? Infinity : (evaluateSteepest(strain, stress) * area) / length
    }
  }
}

function evaluateSteepest(first: readonly number[], second: readonly number[]): number {
  return first
    .slice(1)
    .reduce((most, x, i) => Math.max(most, (second[i + 1] - second[i]) / (x - first[i])), 0)
}
