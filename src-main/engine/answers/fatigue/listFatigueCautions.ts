import type { Caution, FatigueAnswer } from '../../../contract/result'
import type { Line } from '../../line/line'
import { describeQuantity } from '../cautions/describeQuantity'
import { joinPlaces } from '../cautions/joinPlaces'
import { describePlace } from '../describePlace'
import { listShoulders } from '../listShoulders'
import { evaluateBasquin } from './evaluateBasquin'

/** Lives between which stress lines are usually measured, in cycles: common practice. */
const FEWEST = 1e3
const MOST = 1e7
/** Share of the damage in the first half of the run over which it has ceased to grow. */
const SETTLED = 0.9

interface Row {
  bar: number
  place: string
  yield: number | null
  answer: FatigueAnswer
}

/**
 * Cautions about impacts to failure: what the number rests on, and where it leaves its line's range.
 *
 * @param line the cut line
 * @param fatigue the answers of `listFatigue`
 * @returns none where no bar has an answer; else `fatigue-range` where it applies, then `fatigue-basis`
 */
export function listFatigueCautions(line: Line, fatigue: readonly FatigueAnswer[]): Caution[] {
  if (fatigue.length === 0) return []
  const rows = fatigue.map((answer) => {
    const bar = line.rig.bars.findIndex(({ name }) => name === answer.bar)
    const { material } = line.rig.bars[bar].sections[answer.section]
    return { bar, place: describePlace(line.rig, bar, answer.section), yield: material.yield, answer }
  })
  return [...listOutOfRange(rows), describeBasis(line, rows)]
}

type RangeFault = 'strength' | 'few' | 'many' | 'yield'

function listOutOfRange(rows: Row[]): Caution[] {
  const places: string[] = []
  const reasons = new Map<RangeFault, string>()
  const life = ({ answer }: Row): number =>
    evaluateBasquin(answer.strength, answer.exponent, answer.amplitude)
  // The shortest life first: of each kind the worst row is told, all are named.
  for (const row of [...rows].sort((one, other) => life(one) - life(other))) {
    const faults = listRangeFaults(row, life(row))
    if (faults.length > 0) places.push(row.place)
    for (const [kind, words] of faults) if (!reasons.has(kind)) reasons.set(kind, words)
  }
  if (places.length === 0) return []
  return [
    {
      code: 'fatigue-range',
      message:
        `Impacts to failure leave the range of the fatigue line: ${[...reasons.values()].join('; ')}. The number is no ` +
        'estimate of a life there; take it as a sign of which side of the range the part is on.',
      where: joinPlaces(places),
    },
  ]
}

/** Where the answer leaves the range of its line, in words; empty where it does not. */
function listRangeFaults({ answer, yield: limit }: Row, life: number): [RangeFault, string][] {
  const { amplitude, strength, largest } = answer
  const faults: [RangeFault, string][] = []
  if (amplitude >= strength)
    faults.push([
      'strength',
      `the local amplitude, ${describeQuantity(amplitude, 'stress')}, is not under the strength coefficient, ` +
        `${describeQuantity(strength, 'stress')}: by its line the part breaks at the first impact`,
    ])
  else if (life < FEWEST)
    faults.push([
      'few',
      `by the line the largest range alone lasts ${Number(life.toPrecision(3))} cycles; under about 1000, plastic ` +
        'strain decides and a stress line does not hold',
    ])
  else if (life > MOST && amplitude > 0)
    faults.push([
      'many',
      `by the line even the largest range lasts ${life.toExponential(1)} cycles, more than the about 1e7 to which ` +
        'lines are usually measured',
    ])
  const highest = largest.length === 0 ? 0 : Math.abs(largest[0].mean) + largest[0].range / 2
  if (limit !== null && highest > limit)
    faults.push([
      'yield',
      `the local stress reaches ${describeQuantity(highest, 'stress')}, over the yield stress of ` +
        `${describeQuantity(limit, 'stress')}, while the count takes it as elastic`,
    ])
  return faults
}

function describeBasis(line: Line, rows: Row[]): Caution {
  return {
    code: 'fatigue-basis',
    message: [
      'Impacts to failure stand on the fatigue line of the rig file, for fully reversed stress. Local stress is taken ' +
        'as elastic, the full static factor times the nominal stress. Mean stress is not counted: where the mean is ' +
        'tension, the life is shorter. Surface, size, corrosion, residual stress and scatter are not counted, no ' +
        'endurance limit is assumed, and failure is taken at a Miner sum of 1, about which tests scatter widely.',
      `Every impact is taken as the same and from the same start; only the ${describeQuantity(line.steps * line.dt, 'time')} ` +
        'of the run are counted, not the ringing after it.',
      ...describeGrowth(rows),
      ...describeGaps(line, rows),
      'The place is the worst of those with the largest local range in each section, at most four in a bar; one with ' +
        'more cycles of nearly that range may be worse.',
    ].join(' '),
    where: joinPlaces(rows.map(({ place }) => place)),
  }
}

function describeGrowth(rows: Row[]): string[] {
  const growing = rows.filter(({ answer }) => answer.damageFirstHalf < SETTLED * answer.damage)
  if (growing.length === 0) return []
  const share = ({ answer }: Row): number => answer.damageFirstHalf / answer.damage
  const worst = growing.reduce((one, other) => (share(other) < share(one) ? other : one))
  return [
    `The first half of the run alone gives ${describeQuantity(share(worst), 'share')} of the damage in ${worst.place}: ` +
      'it is still growing when the run ends, and a longer run gives fewer impacts.',
  ]
}

function describeGaps(line: Line, rows: Row[]): string[] {
  const { rig } = line
  const bars = new Set(rows.map(({ bar }) => bar))
  const corners = listShoulders(line).filter(({ bar, factor }) => bars.has(bar) && factor.kt === null)
  const blank = rig.bars.flatMap(({ sections }, b) =>
    sections.flatMap(({ material }, s) => (material.fatigue === null ? [describePlace(rig, b, s)] : [])),
  )
  return [
    ...(corners.length === 0
      ? []
      : [
          `Corners without a fillet factor count with their nominal stress, so their life is shorter than counted ` +
            `(${joinPlaces(corners.map(({ bar, smallerSection }) => describePlace(rig, bar, smallerSection)))}).`,
        ]),
    ...(blank.length === 0
      ? []
      : [`Sections whose material has no fatigue line are not looked at (${joinPlaces(blank)}).`]),
  ]
}
