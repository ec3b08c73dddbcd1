import type { Caution } from '../../../contract/result'
import type { End, Pulse, Rig } from '../../../contract/rig'
import type { Line } from '../../line/line'
import type { RunRecord } from '../../records/record'
import { describePlace } from '../describePlace'
import { evaluateForceless } from '../evaluateForceless'
import { describeQuantity } from './describeQuantity'
import { joinPlaces } from './joinPlaces'
import { listImpactRises } from './listImpactRises'

/**
 * Cautions about fronts: shorter than the bar lets them be, and faces that are not flat.
 *
 * A real front rises over about 4 d/c: a bar is not one-dimensional for what is shorter (Pochhammer and
 * Chree; the number is common practice).
 *
 * @param line the cut line
 * @param record of the run; its envelope and the traces of its joints and ends
 */
export function listFrontCautions(line: Line, record: Pick<RunRecord, 'node' | 'envelope'>): Caution[] {
  return [...listShortRise(line), ...listFlatFaces(line, record)]
}

function listShortRise(line: Line): Caution[] {
  const { rig } = line
  const slowest = findSlowestRise(rig)
  const shortest = findShortest(line)
  if (shortest === null || shortest.time >= slowest.time) return []
  const is = shortest.time === 0 ? 'rises at once' : `takes ${describeQuantity(shortest.time, 'time')}`
  return [
    {
      code: 'short-rise',
      message:
        `${shortest.what} ${is}, but in this line a front rises over about 4 d/c = ` +
        `${describeQuantity(slowest.time, 'time')}: real fronts are less steep, with ripples behind them, and ` +
        'peaks that last less than that time are uncertain. Judge by the stress after that time, or give a pulse that rises more slowly.',
      where: slowest.where,
    },
  ]
}

/** The largest 4 d/c of the line. */
function findSlowestRise(rig: Rig): { time: number; where: string } {
  let slowest = { time: 0, where: '' }
  rig.bars.forEach((bar, b) =>
    bar.sections.forEach(({ shape, material }, s) => {
      const speed = Math.sqrt(material.modulus / material.density)
      const time = (4 * Math.max(shape.diameter(0), shape.diameter(1))) / speed
      if (time > slowest.time * (1 + 1e-9)) slowest = { time, where: describePlace(rig, b, s) }
    }),
  )
  return slowest
}

/** The shortest rise or pulse that the rig sends off; null where none is known. */
function findShortest(line: Line): { time: number; what: string } | null {
  const { rig } = line
  const found = listImpactRises(line)
  const ends: [string, End][] = [
    ['The pulse at the left end', rig.leftEnd],
    ['The pulse at the right end', rig.rightEnd],
  ]
  for (const [what, end] of ends)
    if ('pulse' in end)
      found.push(...listTimes(end.pulse, end.kind === 'displacement').map((time) => ({ time, what })))
  for (const load of rig.loads)
    found.push(
      ...listTimes(load.pulse, false).map((time) => ({ time, what: `A load on ${rig.bars[load.bar].name}` })),
    )
  return found.reduce<{ time: number; what: string } | null>(
    (least, each) => (least === null || each.time < least.time ? each : least),
    null,
  )
}

/** Rise and length of a pulse as the stress has them; a prescribed displacement jumps in stress where its slope does. */
function listTimes(pulse: Pulse, isDisplacement: boolean): number[] {
  const { breaks, rise, shape } = pulse
  const times = isDisplacement ? (breaks.length > 0 ? [0] : []) : rise === null ? [] : [rise]
  if (shape === 'rectangle' && breaks.length > 1) times.push(breaks[1] - breaks[0])
  return times
}

function listFlatFaces(line: Line, record: Pick<RunRecord, 'node' | 'envelope'>): Caution[] {
  const { rig } = line
  const places: string[] = []
  const forceless = evaluateForceless(record.envelope)
  const carries = (node: number) => record.node(node)?.forceLeft.some((force) => -force > forceless) ?? false
  line.nodes.forEach((node, i) => {
    if (node.kind !== 'joint' || rig.joints[node.joint].kind !== 'contact' || !carries(i)) return
    places.push(`${rig.bars[node.joint].name} | ${rig.bars[node.joint + 1].name}`)
  })
  const last = line.nodes.length - 1
  if (isContactEnd(rig.leftEnd) && carries(0)) places.unshift('left end')
  if (isContactEnd(rig.rightEnd) && carries(last)) places.push('right end')
  if (places.length === 0) return []
  return [
    {
      code: 'flat-faces',
      message:
        'A contact is taken between flat, square faces that touch all over at once: tilted or crowned faces ' +
        'lengthen the rise and bend the bar. Check the faces, and compare the rise with a measured one.',
      where: joinPlaces(places),
    },
  ]
}

function isContactEnd(end: End): boolean {
  return end.kind === 'wall' || ((end.kind === 'mass' || end.kind === 'support') && end.joint === 'contact')
}
