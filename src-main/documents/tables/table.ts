import { chooseUnit } from '../format/chooseUnit'
import { formatMargin } from '../format/formatMargin'
import { formatNumber } from '../format/formatNumber'
import type { Quantity, Unit } from '../format/quantity'

/** A table for people, ready for a page or a terminal. */
export interface Table {
  headings: string[]
  /** True where a column holds numbers and is set flush right. */
  numeric: boolean[]
  rows: string[][]
  /** True for a row that must not be missed, such as a negative margin. */
  alarm: boolean[]
}

/** One column: what stands over it, what it measures, and where its values come from. */
export interface Column<Row> {
  heading: string
  measures: Quantity | 'margin' | 'text'
  value(row: Row): string | number | null
}

/** Share of a column's largest number under which another one is rounding and reads 0. */
const ROUNDING = 1e-12

/**
 * Lays out a table: all columns of one quantity get one unit, which their headings name.
 *
 * @param columns - in order from the left
 * @param rows - what the columns take their values from, SI
 * @param isAlarm - tells the rows that must not be missed
 * @returns headings and cells as text; an absent value reads `none`
 */
export function makeTable<Row>(
  columns: Column<Row>[],
  rows: Row[],
  isAlarm: (row: Row) => boolean = () => false,
): Table {
  const units = new Map<Quantity, Unit>()
  for (const { measures } of columns) {
    if (measures === 'text' || measures === 'margin' || units.has(measures)) continue
    const alike = columns.filter((column) => column.measures === measures)
    const values = alike.flatMap((column) => listNumbers(rows.map(column.value)))
    units.set(measures, chooseUnit(measures, values))
  }
  const laid = columns.map((column) => layColumn(column, rows, units))
  return {
    headings: laid.map((column) => column.heading),
    numeric: columns.map((column) => column.measures !== 'text'),
    rows: rows.map((_row, i) => laid.map((column) => column.cells[i])),
    alarm: rows.map(isAlarm),
  }
}

function listNumbers(values: (string | number | null)[]): number[] {
  return values.filter((value) => typeof value === 'number')
}

function layColumn<Row>(
  { heading, measures, value }: Column<Row>,
  rows: Row[],
  units: ReadonlyMap<Quantity, Unit>,
) {
  const values = rows.map(value)
  if (measures === 'text') return { heading, cells: values.map((text) => String(text ?? 'none')) }
  if (measures === 'margin')
    return { heading, cells: values.map((margin) => formatMargin(margin as number | null)) }
  const unit = units.get(measures)!
  const nothing = ROUNDING * listNumbers(values).reduce((most, number) => Math.max(most, Math.abs(number)), 0)
  return {
    heading: unit.name === '' ? heading : `${heading} [${unit.name}]`,
    cells: values.map((number) => {
      if (typeof number !== 'number') return 'none'
      return formatNumber(Math.abs(number) < nothing ? 0 : number / unit.size)
    }),
  }
}
