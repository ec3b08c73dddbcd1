import { stringify } from 'csv-stringify/sync'

export type CsvCell = string | number | null

const ROWS_PER_PART = 500

/**
 * Writes a table as CSV: text cells that a spreadsheet would take for a formula are disarmed with an
 * apostrophe, numbers stand in full and untouched, an absent value is an empty cell.
 *
 * @param headings - names of the columns, units in brackets
 * @param count - number of rows
 * @param row - the cells of row i, one per heading
 * @returns the text in parts, one line per row, each ended by a newline
 */
export function* writeCsv(
  headings: string[],
  count: number,
  row: (i: number) => CsvCell[],
): Generator<string> {
  yield writeRows([headings])
  for (let from = 0; from < count; from += ROWS_PER_PART) {
    const size = Math.min(ROWS_PER_PART, count - from)
    yield writeRows(Array.from({ length: size }, (_none, i) => row(from + i)))
  }
}

function writeRows(rows: CsvCell[][]): string {
  return stringify(rows, { escape_formulas: true, record_delimiter: '\n' })
}
