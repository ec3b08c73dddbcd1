import type { End, Joint, Rig } from '../../contract/rig'

/**
 * True where every force of the run is proportional to the speed of what moves at the start.
 *
 * That needs linear material, joints and ends; a contact keeps it as long as its gap is zero, since
 * opening and closing then come at the same times at every speed. Pulses, loads, gravity, preloads and
 * displacements act at their own size whatever the speed.
 *
 * @param rig the rig
 */
export function isProportional(rig: Rig): boolean {
  const { bars, joints, leftEnd, rightEnd, loads, gravity, run } = rig
  if (loads.length > 0 || gravity !== 0 || run.finiteStrain || run.spall) return false
  if (bars.some((bar) => bar.preload !== 0 || bar.displacement !== null)) return false
  const hardens = bars.some((bar) => bar.sections.some(({ material }) => material.hardening !== null))
  if (run.method !== 'characteristics' && (hardens || run.bulkViscosity)) return false
  return joints.every(isProportionalJoint) && isProportionalEnd(leftEnd) && isProportionalEnd(rightEnd)
}

function isProportionalJoint(joint: Joint): boolean {
  switch (joint.kind) {
    case 'bonded':
      return true
    case 'contact':
      return joint.gap === 0
    case 'cushion':
      return joint.gap === 0 && joint.curve === null && joint.unloading === null
    case 'specimen':
      return joint.law.kind === 'elastic' && joint.law.rateSensitivity === 0
  }
}

function isProportionalEnd(end: End): boolean {
  switch (end.kind) {
    case 'free':
    case 'fixed':
    case 'matched':
      return true
    case 'mass':
    case 'support':
      return end.joint === 'bonded' || end.gap === 0
    case 'wall':
      return end.gap === 0
    default:
      return false
  }
}
