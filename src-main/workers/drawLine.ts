import type { DrawnBar, DrawnSection, LineDrawing } from '../contract/lineDrawing'
import type { Bar, End, Joint, Rig, Section } from '../contract/rig'

/** Stretches that the outline of a section is cut into where it is no cylinder. */
const STRETCHES = 48
const FREE_STRETCHES = 192

const END_LABELS: Readonly<Record<End['kind'], string>> = {
  free: 'free',
  fixed: 'fixed',
  matched: 'no echo',
  force: 'force',
  velocity: 'velocity',
  displacement: 'displacement',
  mass: 'mass',
  support: 'support',
  wall: 'wall',
  penetration: 'penetration',
}

/**
 * Draws the line of a rig: where each part lies and how it is shaped, SI.
 *
 * @param rig - a checked rig
 * @returns plain data; bars stand face to face, gaps take no length
 */
export function drawLine(rig: Rig): LineDrawing {
  const bars: DrawnBar[] = []
  for (const [index, bar] of rig.bars.entries()) {
    bars.push(drawBar(bar, bars[index - 1]?.to ?? 0, `bars[${index}]`))
  }
  const length = bars[bars.length - 1].to
  const drawEnd = ({ kind }: End, x: number, path: string) => ({ kind, x, label: END_LABELS[kind], path })
  return {
    bars,
    joints: rig.joints.map((joint, i) => ({
      kind: joint.kind,
      x: bars[i].to,
      gap: readGap(joint),
      path: `joints[${i}]`,
    })),
    ends: [drawEnd(rig.leftEnd, 0, 'leftEnd'), drawEnd(rig.rightEnd, length, 'rightEnd')],
    gauges: rig.gauges.map(({ name, bar, at }, i) => ({
      name,
      x: bars[bar].from + at,
      path: `gauges[${i}]`,
    })),
    loads: rig.loads.map(({ bar, at }, i) => ({ x: bars[bar].from + at, path: `loads[${i}]` })),
  }
}

function readGap(joint: Joint): number {
  return joint.kind === 'contact' || joint.kind === 'cushion' ? joint.gap : 0
}

function drawBar(bar: Bar, from: number, path: string): DrawnBar {
  const sections: DrawnSection[] = []
  let at = from
  for (const [index, section] of bar.sections.entries()) {
    sections.push(drawSection(section, at, index, `${path}.sections[${index}]`))
    at += section.length
  }
  const velocity = bar.uniformVelocity ?? bar.velocity((at - from) / 2, 0.5)
  return { name: bar.name, from, to: at, velocity, sections, path }
}

function drawSection(section: Section, from: number, index: number, path: string): DrawnSection {
  const { kind, uniform, diameter, bore } = section.shape
  const free = kind === 'formula' || kind === 'stations' || kind === 'area'
  const count = uniform ? 1 : free ? FREE_STRETCHES : STRETCHES
  return {
    index,
    name: section.name,
    from,
    to: from + section.length,
    outline: Array.from({ length: count + 1 }, (_, i) => {
      const s = i / count
      return [from + section.length * s, diameter(s), bore(s)]
    }),
    material: section.material.name,
    fillet: section.fillet,
    path,
  }
}
