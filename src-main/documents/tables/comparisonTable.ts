import type { Comparison } from '../../contract/result'
import { formatShare } from '../format/formatShare'
import { makeTable, type Table } from './table'

/**
 * Lists how far the methods are apart at the gauges.
 *
 * @param gauges - of a comparison, in the rig's order
 * @returns a row for each gauge, shares of the largest stress there
 */
export function makeComparisonTable(gauges: Comparison['gauges']): Table {
  return makeTable<Comparison['gauges'][number]>(
    [
      { heading: 'gauge', measures: 'text', value: ({ name }) => name },
      { heading: 'largest difference', measures: 'text', value: ({ largest }) => formatShare(largest) },
      {
        heading: 'root mean square',
        measures: 'text',
        value: ({ rootMeanSquare }) => formatShare(rootMeanSquare),
      },
    ],
    gauges,
  )
}
