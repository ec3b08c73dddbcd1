import type { FatigueAnswer } from '../../../contract/result'
import { evaluatePlace, type Line } from '../../line/line'
import { countRainflow, type RainflowCycle } from './countRainflow'
import { evaluateDamage } from './evaluateDamage'
import type { FatiguePlace } from './listFatiguePlaces'
import { listLargestCycles } from './listLargestCycles'
import { makeRepeatable } from './makeRepeatable'

/** Swings under this share of the largest stress are rounding, not load. */
const DUST = 1e-9

/**
 * Counts the cycles of one impact at the places given, and how many equal impacts the bars bear.
 *
 *     local history = Kt x nominal history, repeated without end; impacts = 1 / D
 *
 * with the rainflow count and Miner's sum D along the material's Basquin line. Every impact starts
 * where the first one does, so the range between its largest and its smallest stress is a whole cycle.
 *
 * @param line the cut line
 * @param places from `listFatiguePlaces`
 * @param history nominal stress at a place at every step, shape (steps + 1) [Pa]
 * @returns a row for each bar with a place, from the left: that of its most damaged place, the first
 *   one where several are equal
 */
export function listFatigue(
  line: Line,
  places: readonly FatiguePlace[],
  history: (place: FatiguePlace) => Float64Array,
): FatigueAnswer[] {
  return line.bars.flatMap((_, bar) => {
    const answers = places
      .filter((place) => place.bar === bar)
      .map((place) => answerPlace(line, place, history(place)))
    if (answers.length === 0) return []
    return [answers.reduce((worst, answer) => (answer.damage > worst.damage ? answer : worst))]
  })
}

function answerPlace(line: Line, place: FatiguePlace, nominal: Float64Array): FatigueAnswer {
  const { bar, section, span, position, kt } = place
  const { material } = line.rig.bars[bar].sections[section]
  const fatigue = material.fatigue!
  const local = nominal.map((stress) => (kt ?? 1) * stress)
  const cycles = countRepeated(local)
  const damage = evaluateDamage(cycles, fatigue)
  const impacts = damage > 0 ? 1 / damage : Infinity
  return {
    bar: line.rig.bars[bar].name,
    section,
    at: evaluatePlace(line.spans[span], position),
    kt,
    strength: fatigue.strength,
    exponent: fatigue.exponent,
    amplitude: cycles.reduce((most, { range }) => Math.max(most, range / 2), 0),
    cycles: cycles.reduce((sum, { count }) => sum + count, 0),
    largest: listLargestCycles(cycles, fatigue),
    damage,
    damageFirstHalf: evaluateDamage(countRepeated(local.subarray(0, (local.length + 1) >> 1)), fatigue),
    impacts: Number.isFinite(impacts) ? impacts : null,
  }
}

/** Cycles of the local history when every repetition starts where the first one does. */
function countRepeated(local: Float64Array): RainflowCycle[] {
  const dust = DUST * local.reduce((most, stress) => Math.max(most, Math.abs(stress)), 0)
  return countRainflow(makeRepeatable(local, dust), dust)
}
