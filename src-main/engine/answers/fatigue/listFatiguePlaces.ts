import type { Line } from '../../line/line'
import type { RunRecord } from '../../records/record'
import { listShoulders } from '../listShoulders'
import { evaluateBasquin } from './evaluateBasquin'

/** A place whose stress history decides on fatigue. */
export interface FatiguePlace {
  /** Indices of the bar, and of the section in it. */
  bar: number
  section: number
  /** Index of the span, and the position in it. */
  span: number
  position: number
  /** Factor on the nominal stress there; null where there is no shoulder or its factor is not known. */
  kt: number | null
}

interface Candidate extends FatiguePlace {
  /** Half the local range between the largest tension and the largest compression [Pa]. */
  amplitude: number
  life: number
}

/** Places looked at in one bar. */
const MOST = 4
/** Amplitudes that differ by less than this share are equal. */
const SAME = 1e-9

/**
 * Chooses the places whose histories are counted: in each section with a fatigue line the place with
 * the largest local range, of these the four in each bar with the shortest life at that range.
 *
 *     amplitude = Kt (largest tension - largest compression) / (2 A)
 *
 * It is the range and not the peak that decides: a place that is pulled and pushed by 250 MPa is worse
 * than one that is pulled by 300 MPa alone. Each of the two extremes is taken as zero where the stress
 * has one sign only. Of a stretch of equal places the middle one stands for all.
 *
 * @param line the cut line
 * @param record what the run recorded; of it the envelope
 * @returns the places, bar by bar, the one with the shortest life first; none for a bar without a
 *   fatigue line
 */
export function listFatiguePlaces(line: Line, record: Pick<RunRecord, 'envelope'>): FatiguePlace[] {
  const candidates = listCandidates(line, record)
  return line.bars.flatMap((_, bar) =>
    candidates
      .filter((each) => each.bar === bar)
      .sort((one, other) =>
        one.life === other.life ? other.amplitude - one.amplitude : one.life - other.life,
      )
      .slice(0, MOST)
      .map(({ section, span, position, kt }) => ({ bar, section, span, position, kt })),
  )
}

function listCandidates(line: Line, record: Pick<RunRecord, 'envelope'>): Candidate[] {
  const factors = new Map<string, number>()
  for (const { span, position, factor } of listShoulders(line))
    if (factor.kt !== null) factors.set(`${span} ${position}`, factor.kt)
  return line.rig.bars.flatMap((bar, b) =>
    bar.sections.flatMap(({ material }, s) => {
      if (material.fatigue === null) return []
      const { strength, exponent } = material.fatigue
      const places = listPlaces(line, record, b, s, factors)
      const amplitude = places.reduce((most, place) => Math.max(most, place.amplitude), 0)
      const equal = places.filter((place) => place.amplitude >= amplitude * (1 - SAME))
      const life = evaluateBasquin(strength, exponent, amplitude)
      return [{ ...equal[Math.floor((equal.length - 1) / 2)], life }]
    }),
  )
}

function listPlaces(
  line: Line,
  { envelope }: Pick<RunRecord, 'envelope'>,
  bar: number,
  section: number,
  factors: Map<string, number>,
): Omit<Candidate, 'life'>[] {
  const places: Omit<Candidate, 'life'>[] = []
  line.spans.forEach((each, span) => {
    if (each.bar !== bar || each.section !== section) return
    for (let position = 0; position <= each.cells; position++) {
      const at = envelope.start[span] + position
      const kt = factors.get(`${span} ${position}`) ?? null
      const nominal = (envelope.tension[at] - envelope.compression[at]) / (2 * each.area[position])
      places.push({ bar, section, span, position, kt, amplitude: (kt ?? 1) * nominal })
    }
  })
  return places
}
