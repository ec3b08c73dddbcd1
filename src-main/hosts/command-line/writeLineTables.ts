import { NOTICE } from '../../contract/notice'
import { cleanLine } from '../../documents/format/cleanLine'
import { formatQuantity } from '../../documents/format/formatQuantity'
import { formatShare } from '../../documents/format/formatShare'
import { formatSection } from '../../documents/format/formatSection'
import { makeBarsTable } from '../../documents/tables/lineTables'
import { makeTable, type Table } from '../../documents/tables/table'
import { writeTextTable } from '../../documents/tables/writeTextTable'
import type { Solve } from '../../engine/solveRig'
import { wrapText } from './wrapText'
import { writeFacts } from './writeFacts'

type Line = Solve['line']

const WIDTH = 96

/**
 * Writes what a rig is cut into, for the terminal.
 *
 * @param line - the cut line, SI
 * @returns bars, sections with their cells and rounding, the run's size, and the notice
 */
export function writeLineTables(line: Line): string {
  const title = line.rig.title === '' ? '' : `${cleanLine(line.rig.title)}\n\n`
  return [
    `${title}The rig has no faults.\n`,
    `Bars\n${writeTextTable(makeBarsTable(line.bars))}`,
    `Sections\n${writeTextTable(makeCellsTable(line))}`,
    `The run\n${writeFacts([
      ['duration', formatQuantity(line.rig.run.duration, 'time')],
      ['time step', formatQuantity(line.dt, 'time')],
      ['steps', String(line.steps)],
      ['cells', String(line.spans.reduce((sum, span) => sum + span.cells, 0))],
    ])}`,
    wrapText(NOTICE, WIDTH),
  ].join('\n')
}

/** Sections with the cells they are cut into and what their travel time loses by it. */
function makeCellsTable({ rig, rounding, spans }: Line): Table {
  return makeTable<Line['rounding'][number]>(
    [
      {
        heading: 'section',
        measures: 'text',
        value: (row) => formatSection(rig.bars[row.bar].name, row.section),
      },
      {
        heading: 'form',
        measures: 'text',
        value: (row) => rig.bars[row.bar].sections[row.section].shape.kind,
      },
      {
        heading: 'length',
        measures: 'length',
        value: (row) => rig.bars[row.bar].sections[row.section].length,
      },
      {
        heading: 'cells',
        measures: 'text',
        value: (row) =>
          spans
            .filter(({ bar, section }) => bar === row.bar && section === row.section)
            .reduce((sum, span) => sum + span.cells, 0),
      },
      { heading: 'rounding of travel time', measures: 'text', value: (row) => formatShare(row.error) },
    ],
    rounding,
  )
}
