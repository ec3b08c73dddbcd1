import type { Caution, SectionPeaks } from '../../../contract/result'
import type { Section } from '../../../contract/rig'
import type { Line } from '../../line/line'
import { describePlace } from '../describePlace'
import { listShoulders, type LineShoulder } from '../listShoulders'
import { describeQuantity } from './describeQuantity'
import { joinPlaces } from './joinPlaces'

/** Half angle over which a taper is steep: common practice. */
const STEEP = (15 * Math.PI) / 180
const SLOPES = 64

/**
 * Cautions about the form of the bars: steep tapers, the stretch beside a step, shoulders with and without a factor.
 *
 * @param line the cut line
 * @param sections the peaks of every section
 */
export function listShapeCautions(line: Line, sections: SectionPeaks[]): Caution[] {
  const shoulders = listShoulders(line)
  return [
    ...listSteepTapers(line),
    ...listNoFactor(line, shoulders),
    ...listStaticFactor(line, shoulders, sections),
    ...listNearStep(line, shoulders),
  ]
}

function listSteepTapers(line: Line): Caution[] {
  const { rig } = line
  const places: string[] = []
  let steepest = 0
  rig.bars.forEach((bar, b) =>
    bar.sections.forEach((section, s) => {
      const angle = evaluateHalfAngle(section)
      if (angle <= STEEP * (1 + 1e-9)) return
      places.push(describePlace(rig, b, s))
      steepest = Math.max(steepest, angle)
    }),
  )
  if (places.length === 0) return []
  return [
    {
      code: 'steep-taper',
      message:
        `Half angle up to ${describeQuantity(steepest, 'angle')}; over about 15 degrees the stress is not uniform ` +
        'over the section of a taper. Make it longer, or check its stresses by finite elements.',
      where: joinPlaces(places),
    },
  ]
}

function evaluateHalfAngle({ shape, length }: Section): number {
  if (shape.uniform) return 0
  let steepest = 0
  for (const width of [shape.diameter, shape.bore])
    for (let i = 0; i < SLOPES; i++) {
      const rise = Math.abs(width((i + 1) / SLOPES) - width(i / SLOPES)) / 2
      steepest = Math.max(steepest, Math.atan((rise * SLOPES) / length))
    }
  return steepest
}

function listNoFactor(line: Line, shoulders: LineShoulder[]): Caution[] {
  const bare = shoulders.filter(({ factor }) => factor.kt === null)
  if (bare.length === 0) return []
  const reasons = [...new Set(bare.map(({ factor }) => factor.reason))]
  return [
    {
      code: 'no-fillet-factor',
      message:
        `No fillet factor (${reasons.join('; ')}): the local stress in the corner is higher than the one shown and is ` +
        'not in the margin. Give a fillet radius between 1/20 and 10 times the height of the step, or apply a factor of your own.',
      where: joinPlaces(bare.map(({ bar, smallerSection }) => describePlace(line.rig, bar, smallerSection))),
    },
  ]
}

function listStaticFactor(line: Line, shoulders: LineShoulder[], sections: SectionPeaks[]): Caution[] {
  const used = shoulders.filter(({ factor }) => factor.kt !== null)
  const counts = sections.some(({ tension, compression }) => tension.kt !== null || compression.kt !== null)
  if (used.length === 0 || !counts) return []
  const largest = Math.max(...used.map(({ factor }) => factor.kt ?? 0))
  return [
    {
      code: 'static-fillet-factor',
      message:
        `Fillet factors up to ${Number(largest.toPrecision(3))} are static and elastic: they hold for pulses long against ` +
        'the fillet and for stresses under yield, and say nothing of fatigue.',
      where: joinPlaces(used.map(({ bar, smallerSection }) => describePlace(line.rig, bar, smallerSection))),
    },
  ]
}

function listNearStep(line: Line, shoulders: LineShoulder[]): Caution[] {
  const { rig } = line
  if (shoulders.length === 0) return []
  const reach = (shoulder: LineShoulder): number => {
    const { sections } = rig.bars[shoulder.bar]
    return Math.max(
      sections[shoulder.section].shape.diameter(1),
      sections[shoulder.section + 1].shape.diameter(0),
    )
  }
  const near = rig.gauges.filter((gauge) => {
    const x = line.bars[gauge.bar].from + gauge.at
    return shoulders.some(
      (shoulder) => shoulder.bar === gauge.bar && Math.abs(x - shoulder.x) < reach(shoulder),
    )
  })
  const widest = Math.max(...shoulders.map(reach))
  const gauges = near.map(({ name }) => name).join(', ')
  return [
    {
      code: 'near-step',
      message:
        `Within about one diameter of a step (up to ${describeQuantity(widest, 'length')} here) the stress is not uniform ` +
        `over the section.${near.length === 0 ? '' : ` Move ${gauges} further away: a gauge there reads something else.`}`,
      where: joinPlaces(
        shoulders.map(({ bar, section }) => `${rig.bars[bar].name} ${section + 1} | ${section + 2}`),
      ),
    },
  ]
}
