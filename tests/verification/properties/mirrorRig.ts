import type { Bar, End, Pulse, Rig, Section } from '../../../src-main/contract/rig'

const negate = (pulse: Pulse): Pulse => ({ ...pulse, value: (t) => -pulse.value(t) })

/** The same rig seen from its other side: left and right change places, motions and forces of place change sign. */
export function mirrorRig(rig: Rig): Rig {
  const lengths = rig.bars.map(({ sections }) => sections.reduce((sum, { length }) => sum + length, 0))
  const other = (bar: number) => rig.bars.length - 1 - bar
  return {
    ...rig,
    bars: rig.bars.map((bar, i) => mirrorBar(bar, lengths[i])).reverse(),
    joints: [...rig.joints].reverse(),
    leftEnd: mirrorEnd(rig.rightEnd),
    rightEnd: mirrorEnd(rig.leftEnd),
    loads: rig.loads.map(({ bar, at, pulse }) => ({
      bar: other(bar),
      at: lengths[bar] - at,
      pulse: negate(pulse),
    })),
    gravity: -rig.gravity,
    gauges: rig.gauges.map((gauge) => ({
      ...gauge,
      bar: other(gauge.bar),
      at: lengths[gauge.bar] - gauge.at,
    })),
  }
}

function mirrorBar(bar: Bar, length: number): Bar {
  const { velocity, uniformVelocity, displacement } = bar
  return {
    ...bar,
    sections: bar.sections.map(mirrorSection).reverse(),
    velocity: (x, s) => -velocity(length - x, 1 - s),
    uniformVelocity: uniformVelocity === null ? null : -uniformVelocity,
    displacement: displacement && ((x, s) => -displacement(length - x, 1 - s)),
  }
}

function mirrorSection(section: Section): Section {
  const { shape } = section
  return {
    ...section,
    shape: {
      ...shape,
      area: (s) => shape.area(1 - s),
      diameter: (s) => shape.diameter(1 - s),
      bore: (s) => shape.bore(1 - s),
    },
  }
}

function mirrorEnd(end: End): End {
  if ('pulse' in end) return { ...end, pulse: negate(end.pulse) }
  if (end.kind === 'mass') return { ...end, velocity: -end.velocity }
  return end
}
