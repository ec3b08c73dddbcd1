import { stringify } from 'csv-stringify/browser/esm/sync'
import type { UnitSystem } from '../../format/units'
import { readCell, writeHeading, type ChartTable } from './chartTable'

/**
 * Writes a table as CSV, numbers in full in the reader's units; text cells that a spreadsheet would take
 * for a formula are disarmed with an apostrophe.
 *
 * @param table - behind a chart
 * @param units - the reader's
 * @returns a heading line and one line per row
 */
export function writeCsvTable(table: ChartTable, units: UnitSystem): string {
  return stringify(listRows(table, units), { escape_formulas: true, record_delimiter: '\n' })
}

/**
 * Writes a table to be pasted into a spreadsheet: columns apart by tabs. Text cells are disarmed as in CSV.
 *
 * @param table - behind a chart
 * @param units - the reader's
 */
export function writePastedTable(table: ChartTable, units: UnitSystem): string {
  return stringify(listRows(table, units), { escape_formulas: true, delimiter: '\t', record_delimiter: '\n' })
}

function listRows({ columns, rows }: ChartTable, units: UnitSystem) {
  return [
    columns.map((column) => writeHeading(column, units)),
    ...Array.from({ length: rows }, (_none, row) => columns.map((column) => readCell(column, row, units))),
  ]
}
