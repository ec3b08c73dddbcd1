import type { Caution, SectionPeaks } from '../../../contract/result'
import type { Line } from '../../line/line'
import type { RunRecord } from '../../records/record'
import { describePlace } from '../describePlace'
import { findGoverning } from '../findGoverning'
import { describeQuantity } from './describeQuantity'
import { joinPlaces } from './joinPlaces'

const ROUNDING = 0.005
const CLOSURE = 1e-9
const LAST = 0.02

/**
 * Cautions about the run itself: its closure, its length, its cells, and whose values it stands on.
 *
 * @param line the cut line
 * @param record of the run; its ledger
 * @param sections the peaks of every section
 */
export function listRunCautions(
  line: Line,
  record: Pick<RunRecord, 'energy'>,
  sections: SectionPeaks[],
): Caution[] {
  return [
    ...listClosure(record),
    ...listShortRun(line, sections),
    ...listRounding(line),
    {
      code: 'user-values',
      message:
        'Densities, moduli and allowables are those of the rig file; published values are typical, not certified. ' +
        'Use values of your own material where lives or hardware depend on them.',
      where: '',
    },
  ]
}

function listClosure({ energy }: Pick<RunRecord, 'energy'>): Caution[] {
  const worst = Math.max(energy.closure, energy.momentumClosure)
  if (worst <= CLOSURE) return []
  return [
    {
      code: 'energy-closure',
      message:
        `Energy closes only to ${energy.closure.toExponential(1)} and momentum to ${energy.momentumClosure.toExponential(1)} ` +
        'of the largest at play, where 1e-9 is expected. Do not rely on this run; report the rig.',
      where: '',
    },
  ]
}

function listShortRun(line: Line, sections: SectionPeaks[]): Caution[] {
  const { rig } = line
  const duration = line.steps * line.dt
  const across = line.bars.reduce((sum, bar) => sum + bar.travelTime, 0)
  const back = rig.leftEnd.kind === 'matched' || rig.rightEnd.kind === 'matched' ? across : 2 * across
  const reasons: string[] = []
  if (duration < back * (1 - 1e-9))
    reasons.push(
      `it lasts ${describeQuantity(duration, 'time')}, while a wave needs ${describeQuantity(back, 'time')} ` +
        `${back === across ? 'to cross the line' : 'to cross the line and come back'}`,
    )
  const late = findDecisive(sections)
  if (late !== null && late.time > duration * (1 - LAST))
    reasons.push(
      `the decisive stress comes in its last 2 % (${late.bar}, section ${late.section + 1}) and may still grow`,
    )
  if (reasons.length === 0) return []
  return [
    {
      code: 'short-run',
      message: `The run may be too short: ${reasons.join('; ')}. Larger stresses may come later; make the duration longer.`,
      where: '',
    },
  ]
}

/** The stress that governs, or where no margin is known the largest one. */
function findDecisive(sections: SectionPeaks[]): { bar: string; section: number; time: number } | null {
  const governing = findGoverning(sections)
  if (governing !== null) {
    const { bar, section, sense } = governing
    return {
      bar,
      section,
      time: sections.find((each) => each.bar === bar && each.section === section)![sense].time,
    }
  }
  let decisive: { bar: string; section: number; time: number } | null = null
  let largest = 0
  for (const { bar, section, tension, compression } of sections)
    for (const { local, time } of [tension, compression])
      if (Math.abs(local) > largest) {
        largest = Math.abs(local)
        decisive = { bar, section, time }
      }
  return decisive
}

function listRounding(line: Line): Caution[] {
  const coarse = line.rounding.filter(({ error }) => Math.abs(error) > ROUNDING)
  if (coarse.length === 0) return []
  const worst = coarse.reduce((one, other) => (Math.abs(other.error) > Math.abs(one.error) ? other : one))
  return [
    {
      code: 'travel-time-rounding',
      message:
        `A whole number of cells misses the travel time by up to ${describeQuantity(Math.abs(worst.error), 'share')} ` +
        `(${describePlace(line.rig, worst.bar, worst.section)}): waves arrive that much early or late, and the section ` +
        'weighs that much less or more. Ask for a smaller cell.',
      where: joinPlaces(coarse.map(({ bar, section }) => describePlace(line.rig, bar, section))),
    },
  ]
}
