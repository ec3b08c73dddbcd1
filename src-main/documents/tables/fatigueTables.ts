import type { FatigueAnswer, FatigueCycle } from '../../contract/result'
import { formatNumber } from '../format/formatNumber'
import { formatSection } from '../format/formatSection'
import { makeTable, type Table } from './table'

/**
 * Lists how many equal impacts each bar bears. Damage and impacts differ by many powers of ten from
 * row to row, so each is written by itself and none is taken for rounding beside a larger one.
 *
 * @param fatigue - from the left, SI
 * @returns a row for each bar; one that breaks at the first impact is named in words
 */
export function makeFatigueTable(fatigue: FatigueAnswer[]): Table {
  return makeTable<FatigueAnswer>(
    [
      { heading: 'section', measures: 'text', value: ({ bar, section }) => formatSection(bar, section) },
      { heading: 'at', measures: 'length', value: ({ at }) => at },
      { heading: 'Kt', measures: 'ratio', value: ({ kt }) => kt },
      { heading: 'local amplitude', measures: 'stress', value: ({ amplitude }) => amplitude },
      { heading: 'cycles per impact', measures: 'text', value: ({ cycles }) => cycles },
      { heading: 'damage per impact', measures: 'text', value: ({ damage }) => formatNumber(damage) },
      { heading: 'impacts to failure', measures: 'text', value: describeImpacts },
    ],
    fatigue,
    ({ impacts }) => impacts !== null && impacts < 1,
  )
}

function describeImpacts({ impacts }: FatigueAnswer): string {
  if (impacts === null) return 'no damaging cycle'
  return impacts < 1 ? 'under 1: BREAKS at the first' : formatNumber(impacts)
}

interface CycleRow {
  answer: FatigueAnswer
  cycle: FatigueCycle
}

/**
 * Lists the largest cycles of one impact in each bar.
 *
 * @param fatigue - from the left, SI
 * @returns a row for each range, the largest of a bar first
 */
export function makeFatigueCyclesTable(fatigue: FatigueAnswer[]): Table {
  return makeTable<CycleRow>(
    [
      {
        heading: 'section',
        measures: 'text',
        value: ({ answer }) => formatSection(answer.bar, answer.section),
      },
      { heading: 'local range', measures: 'stress', value: ({ cycle }) => cycle.range },
      { heading: 'mean', measures: 'stress', value: ({ cycle }) => cycle.mean },
      { heading: 'cycles per impact', measures: 'text', value: ({ cycle }) => cycle.count },
      { heading: 'damage per impact', measures: 'text', value: ({ cycle }) => formatNumber(cycle.damage) },
    ],
    fatigue.flatMap((answer) => answer.largest.map((cycle) => ({ answer, cycle }))),
  )
}
