import { formatNumber } from '../../format/formatNumber'
import { UNITS, type UnitDimension, type UnitSystem } from '../../format/units'

/** A column of the table behind a chart. */
export interface Column {
  heading: string
  /** Of numbers; null for words. */
  dimension: UnitDimension | null
  /** Value of row i, SI; null where there is none. */
  at: (row: number) => number | string | null
}

/** What a chart shows, as rows. */
export interface ChartTable {
  name: string
  columns: Column[]
  rows: number
}

/** A cell as CSV has it. */
export type Cell = number | string | null

/**
 * Heading of a column with its unit.
 *
 * @param column - of a table
 * @param units - the reader's
 * @returns such as `stress [MPa]`
 */
export function writeHeading({ heading, dimension }: Column, units: UnitSystem): string {
  const unit = dimension && UNITS[dimension][units].name
  return unit ? `${heading} [${unit}]` : heading
}

/**
 * Value of a cell in the reader's unit, with all its digits.
 *
 * @param column - of a table
 * @param row - from 0
 * @param units - the reader's
 */
export function readCell({ dimension, at }: Column, row: number, units: UnitSystem): Cell {
  const value = at(row)
  if (typeof value !== 'number' || dimension === null) return value
  // Fifteen digits leave out what the division by the unit adds: 0.3 mm is not 0.30000000000000004.
  return Number((value / UNITS[dimension][units].size).toPrecision(15))
}

/**
 * Writes a cell for people.
 *
 * @param column - of a table
 * @param row - from 0
 * @param units - the reader's
 * @returns such as `−215.0`; `none` without a value
 */
export function writeCell(column: Column, row: number, units: UnitSystem): string {
  const cell = readCell(column, row, units)
  return cell === null ? 'none' : typeof cell === 'number' ? formatNumber(cell) : cell
}
