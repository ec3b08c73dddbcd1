import type { Caution, SectionPeaks } from '../../../contract/result'
import type { Material, Section } from '../../../contract/rig'
import type { Line } from '../../line/line'
import { describePlace } from '../describePlace'
import { describeQuantity } from './describeQuantity'
import { joinPlaces } from './joinPlaces'

/** Strain over which small-strain theory is off by more than about its own percent: common practice. */
const LARGE_STRAIN = 0.02

interface Row {
  place: string
  source: Section
  peaks: SectionPeaks
}

/**
 * Cautions about strength: negative margins, stress over yield, large strain, missing allowables.
 *
 * @param line the cut line
 * @param sections the peaks of every section, in order
 */
export function listStrengthCautions(line: Line, sections: SectionPeaks[]): Caution[] {
  const sources = line.rig.bars.flatMap((bar, b) =>
    bar.sections.map((source, s) => ({ source, place: describePlace(line.rig, b, s) })),
  )
  const rows = sections.map((peaks, i) => ({ ...sources[i], peaks }))
  return [
    ...listNegativeMargins(rows, line.rig.factorOfSafety),
    ...listOverYield(rows, line.rig.run.method === 'elements'),
    ...(line.rig.run.finiteStrain ? [] : listLargeStrain(rows, line.rig.run.method === 'elements')),
    ...listNoAllowable(rows),
  ]
}

function listNegativeMargins(rows: Row[], factor: number): Caution[] {
  const senses = rows.flatMap(({ place, peaks }) =>
    (['tension', 'compression'] as const).map((sense) => ({ place, sense, ...peaks[sense] })),
  )
  const negative = senses.filter(({ margin }) => margin !== null && margin < 0)
  if (negative.length === 0) return []
  const worst = negative.reduce((one, other) => (other.margin! < one.margin! ? other : one))
  return [
    {
      code: 'negative-margin',
      message:
        `The margin is negative: at worst ${Number(worst.margin!.toPrecision(3))} in ${worst.place} (${worst.sense}), ` +
        `${describeQuantity(Math.abs(worst.local), 'stress')} against ${describeQuantity(worst.allowable!, 'stress')} ` +
        `allowed, with a factor of safety of ${factor}. The part does not hold by these numbers.`,
      where: joinPlaces(negative.map(({ place }) => place)),
    },
  ]
}

function listOverYield(rows: Row[], byElements: boolean): Caution[] {
  const over = rows
    .map(({ place, source, peaks: { tension, compression } }) => {
      const nominal = Math.max(tension.peak, -compression.peak)
      const local = Math.max(tension.local, -compression.local)
      const { yield: limit, hardening } = source.material
      return { place, nominal, local, limit: limit ?? Infinity, hardens: hardening !== null }
    })
    .filter(({ local, limit }) => local > limit)
  if (over.length === 0) return []
  const worst = over.reduce((one, other) => (other.local / other.limit > one.local / one.limit ? other : one))
  const only = over.every(({ nominal, limit }) => nominal <= limit)
  return [
    {
      code: 'over-yield',
      message:
        `${only ? 'Local stress at a fillet' : 'Stress'} over yield: up to ${describeQuantity(worst.local, 'stress')} in ` +
        `${worst.place}, yield ${describeQuantity(worst.limit, 'stress')}. ` +
        describeYielding(only, over, byElements),
      where: joinPlaces(over.map(({ place }) => place)),
    },
  ]
}

/** What stress over yield means for the numbers: only in corners, followed by the run, or left out by it. */
function describeYielding(only: boolean, over: { hardens: boolean }[], byElements: boolean): string {
  if (only) return 'The corner yields, which the run does not follow; the waves hardly change.'
  const hardens = over.every((each) => each.hardens)
  if (byElements && hardens) {
    return (
      'The run follows yielding and hardening, and the part stays deformed. Fillet factors are still those of an ' +
      'elastic bar.'
    )
  }
  const linear =
    'The run is linear: real stresses are lower there, the part stays deformed, and what comes after is not as computed.'
  const give = hardens ? '' : ' Give the material its hardening, "0 Pa" for none.'
  return `${linear}${give}${byElements ? '' : ' A run by elements follows it.'}`
}

function listLargeStrain(rows: Row[], byElements: boolean): Caution[] {
  const large = rows
    .map(({ place, source, peaks: { tension, compression } }) => ({
      place,
      strain: evaluateStrain(source.material, Math.max(tension.peak, -compression.peak), byElements),
    }))
    .filter(({ strain }) => strain > LARGE_STRAIN)
  if (large.length === 0) return []
  const largest = Math.max(...large.map(({ strain }) => strain))
  return [
    {
      code: 'large-strain',
      message:
        `Strain up to ${describeQuantity(largest, 'share')}: over about 2 % the bar's length and area change too much ` +
        'for small-strain theory, and stress means force over the first area.',
      where: joinPlaces(large.map(({ place }) => place)),
    },
  ]
}

/** Strain under a stress [Pa]; where the run follows yielding, that of the first pull or push past yield. */
function evaluateStrain(material: Material, stress: number, byElements: boolean): number {
  const { modulus, yield: limit, hardening } = material
  const elastic = stress / modulus
  if (!byElements || limit === null || !hardening || stress <= limit) return elastic
  return elastic + (stress - limit) * (1 / hardening - 1 / modulus)
}

function listNoAllowable(rows: Row[]): Caution[] {
  const stressed = rows.filter(
    ({ peaks: { tension, compression } }) =>
      (tension.allowable === null && tension.peak !== 0) ||
      (compression.allowable === null && compression.peak !== 0),
  )
  if (stressed.length === 0) return []
  return [
    {
      code: 'no-allowable',
      message:
        'No allowable stress was given for the stress that occurs here, so there is no margin and the governing ' +
        'one does not count it. Give the material, the bar or the section one for tension and for compression.',
      where: joinPlaces(stressed.map(({ place }) => place)),
    },
  ]
}
