import type { FieldGrid } from '../../plot/paintField'
import type { ChartTable } from '../charts/chartTable'
import { QUANTITIES } from './quantities'
import type { FieldPicture } from './useFieldPicture'

/** Most cells of a saved field across and up; more would be no help to a spreadsheet. */
const MOST = 160

/**
 * Makes the table of a field that is saved: smallest and largest value in each cell of place and time.
 *
 * @param picture - as the host gave it
 * @returns a row for each cell, time by time from the earliest
 */
export function makeFieldTable(picture: FieldPicture): ChartTable {
  const { request } = picture
  const columns = Math.min(MOST, picture.columns)
  const rows = Math.min(MOST, picture.rows)
  const cells = gatherExtremes(picture, columns, rows)
  const { name, dimension } = QUANTITIES[request.quantity]
  const edge = (from: number, to: number, index: number, count: number): number =>
    from + ((to - from) * index) / count
  const x = (i: number): number => edge(request.fromX, request.toX, i, columns)
  const t = (i: number): number => edge(request.fromT, request.toT, i, rows)
  const give = (value: number): number | null => (Number.isFinite(value) ? value : null)
  const word = name.toLowerCase()
  return {
    name: `Field of ${word}`,
    rows: columns * rows,
    columns: [
      { heading: 't from', dimension: 'time', at: (row) => t(Math.floor(row / columns)) },
      { heading: 't to', dimension: 'time', at: (row) => t(Math.floor(row / columns) + 1) },
      { heading: 'x from', dimension: 'length', at: (row) => x(row % columns) },
      { heading: 'x to', dimension: 'length', at: (row) => x((row % columns) + 1) },
      { heading: `smallest ${word}`, dimension, at: (row) => give(cells[2 * row]) },
      { heading: `largest ${word}`, dimension, at: (row) => give(cells[2 * row + 1]) },
    ],
  }
}

/** Smallest and largest value in each cell, shape (rows, columns, 2); not a number where there is no bar. */
function gatherExtremes(grid: FieldGrid, columns: number, rows: number): Float64Array {
  const cells = new Float64Array(2 * columns * rows).fill(Number.NaN)
  for (let row = 0; row < grid.rows; row++) {
    const target = Math.floor((row * rows) / grid.rows) * columns
    for (let column = 0; column < grid.columns; column++) {
      const from = 2 * (row * grid.columns + column)
      const to = 2 * (target + Math.floor((column * columns) / grid.columns))
      const low = grid.values[from]
      const high = grid.values[from + 1]
      if (Number.isNaN(low)) continue
      // A comparison with a cell that holds no number yet is false, and takes the value.
      if (!(low >= cells[to])) cells[to] = low
      if (!(high <= cells[to + 1])) cells[to + 1] = high
    }
  }
  return cells
}
