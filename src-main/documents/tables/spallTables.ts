import type { FragmentState, Spall } from '../../contract/result'
import { makeTable, type Table } from './table'

/**
 * Lists where bars came apart.
 *
 * @param spalls - in order of time, SI
 * @returns place, time and the tension that opened each
 */
export function makeSpallsTable(spalls: Spall[]): Table {
  return makeTable<Spall>(
    [
      { heading: 'bar', measures: 'text', value: ({ bar }) => bar },
      { heading: 'came apart at', measures: 'length', value: ({ x }) => x },
      { heading: 'time', measures: 'time', value: ({ time }) => time },
      { heading: 'tension', measures: 'stress', value: ({ stress }) => stress },
    ],
    spalls,
  )
}

/**
 * Lists the pieces of the bars that came apart.
 *
 * @param fragments - from the left, SI
 * @returns place, mass and mean velocity of each after the run
 */
export function makeFragmentsTable(fragments: FragmentState[]): Table {
  return makeTable<FragmentState>(
    [
      { heading: 'piece of', measures: 'text', value: ({ bar }) => bar },
      { heading: 'from', measures: 'length', value: ({ from }) => from },
      { heading: 'to', measures: 'length', value: ({ to }) => to },
      { heading: 'length', measures: 'length', value: ({ from, to }) => to - from },
      { heading: 'mass', measures: 'mass', value: ({ mass }) => mass },
      { heading: 'mean velocity', measures: 'velocity', value: ({ velocity }) => velocity },
    ],
    fragments,
  )
}
