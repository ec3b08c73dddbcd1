import type { Result, SectionPeaks, SensePeak } from '../../contract/result'
import { formatSection } from '../format/formatSection'
import { makeTable, type Table } from './table'

interface PeakRow {
  section: SectionPeaks
  sense: 'tension' | 'compression'
  peak: SensePeak
}

/**
 * Lists the peaks and margins of every section, a row for each sense.
 *
 * @param result - SI
 * @returns the table, with place and time of the local stress; a negative margin is named in words in its own column
 */
export function makePeaksTable(result: Result): Table {
  const rows = result.sections.flatMap((section): PeakRow[] => [
    { section, sense: 'tension', peak: section.tension },
    { section, sense: 'compression', peak: section.compression },
  ])
  return makeTable<PeakRow>(
    [
      {
        heading: 'section',
        measures: 'text',
        value: ({ section }) => formatSection(section.bar, section.section),
      },
      { heading: 'sense', measures: 'text', value: (row) => row.sense },
      { heading: 'peak', measures: 'stress', value: ({ peak }) => peak.peak },
      { heading: 'Kt', measures: 'ratio', value: ({ peak }) => peak.kt },
      { heading: 'local', measures: 'stress', value: ({ peak }) => peak.local },
      { heading: 'at', measures: 'length', value: ({ peak }) => peak.localAt },
      { heading: 'time', measures: 'time', value: ({ peak }) => peak.localTime },
      { heading: 'allowable', measures: 'stress', value: ({ peak }) => peak.allowable },
      { heading: 'margin', measures: 'margin', value: ({ peak }) => peak.margin },
      { heading: 'verdict', measures: 'text', value: (row) => describeRow(row, result) },
    ],
    rows,
    ({ peak }) => peak.margin !== null && peak.margin < 0,
  )
}

function describeRow({ section, sense, peak }: PeakRow, { governing }: Result): string {
  const governs =
    governing !== null &&
    governing.bar === section.bar &&
    governing.section === section.section &&
    governing.sense === sense
  const verdict =
    peak.margin === null ? '' : peak.margin < 0 ? 'NEGATIVE: over the limit' : 'within the limit'
  return [verdict, governs ? 'governing' : ''].filter((word) => word !== '').join(', ')
}
