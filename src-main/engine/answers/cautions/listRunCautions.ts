import type { Caution, SectionPeaks } from '../../../contract/result'
import type { Rig } from '../../../contract/rig'
import type { Line } from '../../line/line'
import type { RunRecord } from '../../records/record'
import { describePlace } from '../describePlace'
import { findGoverning } from '../findGoverning'
import { describeQuantity } from './describeQuantity'
import { joinPlaces } from './joinPlaces'

const ROUNDING = 0.005
/** Largest closure of a sound run. */
const CLOSURE = 1e-9
/**
 * The same of energy with finite strain: central difference does not keep the energy of a law that is not straight.
 * Sharp impacts at 1 to 50 m/s close to 3e-6 to 2e-4 on 20 cells, and nearer on more.
 */
const FINITE_STRAIN_CLOSURE = 1e-3
const LAST = 0.02
/** Share of the largest stress under which a late peak elsewhere is not worth a word. */
const FAINT = 0.05

/**
 * Cautions about the run itself: what its method leaves out, its closure, its length, its cells, and whose
 * values it stands on.
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
    ...listLeftOut(line.rig),
    ...listClosure(line, record),
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

/** With both methods the tables are those of the characteristics, which follow fewer laws. */
function listLeftOut({ run, bars }: Rig): Caution[] {
  if (run.method !== 'both') return []
  const materials = bars.flatMap((bar) => bar.sections.map(({ material }) => material))
  const laws = [
    materials.some((one) => one.yield !== null && one.hardening !== null) ? 'yielding' : '',
    materials.some(({ viscosity }) => (viscosity ?? 0) > 0) ? 'viscosity' : '',
    run.finiteStrain ? 'finite strain' : '',
    run.lateralInertia ? 'lateral inertia' : '',
    run.bulkViscosity ? 'bulk viscosity' : '',
  ].filter((law) => law !== '')
  if (laws.length === 0) return []
  return [
    {
      code: 'laws-left-out',
      message:
        `All stresses, margins and traces of this result are those of the characteristics, which leave out ${laws.join(', ')}; ` +
        'the elements were run for the comparison alone. For tables that follow these laws run with the method elements.',
      where: '',
    },
  ]
}

function listClosure({ rig }: Line, { energy }: Pick<RunRecord, 'energy'>): Caution[] {
  const allowed = rig.run.finiteStrain && rig.run.method === 'elements' ? FINITE_STRAIN_CLOSURE : CLOSURE
  if (energy.closure <= allowed && energy.momentumClosure <= CLOSURE) return []
  return [
    {
      code: 'energy-closure',
      message:
        `Energy closes only to ${energy.closure.toExponential(1)} and momentum to ${energy.momentumClosure.toExponential(1)} ` +
        `of the largest at play, where ${allowed.toExponential()} and ${CLOSURE.toExponential()} are expected. ` +
        'Do not rely on this run; report the rig.',
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
  const late = listLatePeaks(sections, duration * (1 - LAST))
  if (late.length > 0) reasons.push(`peaks that come in its last 2 % may still grow (${joinPlaces(late)})`)
  if (reasons.length === 0) return []
  return [
    {
      code: 'short-run',
      message: `The run may be too short: ${reasons.join('; ')}. Larger stresses may come later; make the duration longer.`,
      where: '',
    },
  ]
}

/** The sections whose largest stress comes after a time [s], the governing one first; faint ones are passed over. */
function listLatePeaks(sections: SectionPeaks[], after: number): string[] {
  const governing = findGoverning(sections)
  const peaks = sections.flatMap(({ bar, section, tension, compression }) =>
    (
      [
        ['tension', tension],
        ['compression', compression],
      ] as const
    ).map(([sense, { local, localTime }]) => ({
      place: `${bar}, section ${section + 1}`,
      sense,
      size: Math.abs(local),
      time: localTime,
      governs: governing?.bar === bar && governing.section === section && governing.sense === sense,
    })),
  )
  const faint = FAINT * peaks.reduce((most, { size }) => Math.max(most, size), 0)
  return peaks
    .filter(({ size, time, governs }) => time > after && size > 0 && (governs || size >= faint))
    .sort((one, other) => Number(other.governs) - Number(one.governs))
    .map(({ place, sense, governs }) => `${place}, ${sense}${governs ? ', which governs' : ''}`)
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
