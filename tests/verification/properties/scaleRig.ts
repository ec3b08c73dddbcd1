import type { Bar, End, Joint, Pulse, Rig } from '../../../src-main/contract/rig'

/** How much larger everything of a kind is. */
interface Scales {
  length: number
  time: number
  area: number
  force: number
  /** Displacements and gaps; they need not scale as the lengths do in a linear line. */
  motion: number
}

/**
 * A rig larger in every respect: bars, motions, forces, times. Materials stay, so that only scales that keep
 * `E = force length/(area motion)` and the wave speed `length/time` give the same waves.
 */
export function scaleRig(rig: Rig, scales: Scales): Rig {
  const { length, time, area, force, motion } = scales
  const velocity = motion / time
  const scalePulse = (pulse: Pulse, by: number): Pulse => ({
    ...pulse,
    value: (t) => by * pulse.value(t / time),
  })
  const scaleBar = (bar: Bar): Bar => ({
    ...bar,
    sections: bar.sections.map((section) => ({
      ...section,
      length: length * section.length,
      shape: { ...section.shape, area: (s) => area * section.shape.area(s) },
    })),
    velocity: (x, s) => velocity * bar.velocity(x / length, s),
    uniformVelocity: bar.uniformVelocity === null ? null : velocity * bar.uniformVelocity,
    displacement: bar.displacement && ((x, s) => motion * bar.displacement!(x / length, s)),
    preload: force * bar.preload,
  })
  const scaleEnd = (end: End): End => {
    switch (end.kind) {
      case 'force':
        return { ...end, pulse: scalePulse(end.pulse, force) }
      case 'velocity':
        return { ...end, pulse: scalePulse(end.pulse, velocity) }
      case 'displacement':
        return { ...end, pulse: scalePulse(end.pulse, motion) }
      case 'mass':
        return {
          ...end,
          mass: ((force * time) / velocity) * end.mass,
          velocity: velocity * end.velocity,
          gap: motion * end.gap,
        }
      case 'support':
        return {
          ...end,
          stiffness: (force / motion) * end.stiffness,
          damping: (force / velocity) * end.damping,
          mass: ((force * time) / velocity) * end.mass,
          gap: motion * end.gap,
        }
      case 'wall':
        return { ...end, gap: motion * end.gap }
      default:
        return end
    }
  }
  const scaleJoint = (joint: Joint): Joint => {
    if (joint.kind === 'contact') return { ...joint, gap: motion * joint.gap }
    if (joint.kind !== 'cushion') return joint
    return {
      ...joint,
      stiffness: (force / motion) * joint.stiffness!,
      damping: (force / velocity) * joint.damping,
      gap: motion * joint.gap,
    }
  }
  return {
    ...rig,
    bars: rig.bars.map(scaleBar),
    joints: rig.joints.map(scaleJoint),
    leftEnd: scaleEnd(rig.leftEnd),
    rightEnd: scaleEnd(rig.rightEnd),
    loads: rig.loads.map((load) => ({
      ...load,
      at: length * load.at,
      pulse: scalePulse(load.pulse, force),
    })),
    gravity: (velocity / time) * rig.gravity,
    gauges: rig.gauges.map((gauge) => ({ ...gauge, at: length * gauge.at })),
    run: { ...rig.run, duration: time * rig.run.duration, timeStep: time * rig.run.timeStep! },
  }
}
