import { parse } from 'csv-parse/browser/esm/sync'
import { LIMITS } from '../limits'
import { quote } from '../showValue'

/** A record as numbers, before its units. */
export interface RecordColumns {
  /** Empty where the record has none. */
  headings: string[]
  /** A list per column, of equal length. */
  columns: number[][]
  /** Row of the file in which the numbers begin, from 1. */
  firstRow: number
}

const NUMBER = /^[-+]?([0-9]+\.?[0-9]*|\.[0-9]+)([eE][-+]?[0-9]+)?$/

/**
 * Reads the text of a record: comma, semicolon or tab between columns, a row of headings or none.
 * @param text the whole file
 * @returns its columns, or why it is refused
 */
export function parseRecord(text: string): RecordColumns | { refused: string } {
  if (text.length > LIMITS.recordBytes) {
    return { refused: `the record has more than ${LIMITS.recordBytes / 1024 / 1024} MB` }
  }
  const rows = splitRows(text)
  if ('refused' in rows) return rows
  const table = rows.rows
  if (table.length === 0) return { refused: 'the record is empty' }
  const width = table[0].length
  if (width < 2)
    return { refused: 'the record has one column; it needs a time and a value, separated by , or ; or a tab' }
  if (width > LIMITS.recordColumns) {
    return { refused: `the record has ${width} columns; at most ${LIMITS.recordColumns} are read` }
  }
  const hasHeadings = !table[0].every((cell) => NUMBER.test(cell))
  const first = hasHeadings ? 1 : 0
  if (table.length - first < 2) return { refused: 'the record has fewer than two rows of numbers' }
  const columns: number[][] = Array.from({ length: width }, () => [])
  for (let row = first; row < table.length; row++) {
    const cells = table[row]
    if (cells.length !== width) {
      return { refused: `row ${row + 1} has ${cells.length} columns, the first has ${width}` }
    }
    for (let i = 0; i < width; i++) {
      const value = NUMBER.test(cells[i]) ? Number(cells[i]) : NaN
      if (!Number.isFinite(value)) return { refused: notNumber(cells[i], row + 1, i + 1) }
      columns[i].push(value)
    }
  }
  return { headings: hasHeadings ? table[0] : [], columns, firstRow: first + 1 }
}

function notNumber(cell: string, row: number, column: number): string {
  const comma = /^[-+]?[0-9]+,[0-9]+$/.test(cell) ? '; write decimals with a point' : ''
  return `row ${row}, column ${column} holds ${quote(cell)}, which is no number${comma}`
}

function splitRows(text: string): { rows: string[][] } | { refused: string } {
  const firstLine = text.slice(0, LIMITS.recordRowLength).split(/\r?\n/, 1)[0]
  const delimiter = firstLine.includes(';') ? ';' : firstLine.includes('\t') ? '\t' : ','
  try {
    const rows = parse(text, {
      bom: true,
      delimiter,
      trim: true,
      skip_empty_lines: true,
      relax_column_count: true,
      max_record_size: LIMITS.recordRowLength,
      to: LIMITS.recordRows + 2,
    }) as string[][]
    if (rows.length > LIMITS.recordRows + 1) {
      return { refused: `the record has more than ${LIMITS.recordRows} rows` }
    }
    return { rows }
  } catch (error) {
    const said = error instanceof Error ? error.message : String(error)
    return { refused: `the record is no table of numbers: ${said.slice(0, 160)}` }
  }
}
