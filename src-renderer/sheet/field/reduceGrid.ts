import type { FieldGrid } from '../../plot/paintField'

/**
 * Gathers a field into few cells: in each the value of largest magnitude.
 *
 * @param grid - the field
 * @param columns - cells across
 * @param rows - cells up
 * @returns values row by row, the earliest first; not a number where there is no bar
 */
export function reduceGrid(grid: FieldGrid, columns: number, rows: number): number[][] {
  const cells = Array.from({ length: rows }, () => new Array<number>(columns).fill(Number.NaN))
  for (let row = 0; row < grid.rows; row++) {
    const target = cells[Math.floor((row * rows) / grid.rows)]
    for (let column = 0, i = 2 * row * grid.columns; column < grid.columns; column++, i += 2) {
      const low = grid.values[i]
      const high = grid.values[i + 1]
      const value = high + low >= 0 ? high : low
      const at = Math.floor((column * columns) / grid.columns)
      // Also true for the first value of a cell.
      if (!(Math.abs(value) <= Math.abs(target[at])) && Number.isFinite(value)) target[at] = value
    }
  }
  return cells
}
