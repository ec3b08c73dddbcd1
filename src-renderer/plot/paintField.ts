import { findEntry, type ColourTable } from './colour/colourMap'
import { evaluateHatchCover } from './hatching'

/** Signed extremes of a quantity in each pixel of a picture; row 0 is the earliest. */
export interface FieldGrid {
  columns: number
  rows: number
  /** Smallest and largest in each pixel, shape (rows, columns, 2); not a number where there is no bar. */
  values: Float32Array
}

/** Where a field is over what is allowed, and how that is marked. */
export interface Limits {
  /** Largest value allowed in each column, positive or infinite, shape (columns). */
  high: Float32Array
  /** Smallest value allowed, negative or minus infinite, shape (columns). */
  low: Float32Array
  /** Packed like an entry of the table. */
  ink: number
  /** Between lines and of a line, in pixels of the picture. */
  gap: number
  width: number
}

/**
 * Paints a field, the latest row on top: each pixel takes the colour of its extreme of larger magnitude, so
 * that no peak vanishes however narrow it is. Pixels over the limits are hatched.
 *
 * @param grid - the field
 * @param table - its colours
 * @param limit - value of the last colour, positive
 * @param pixels - painted into, shape (rows, columns), the top row first
 * @param limits - what is allowed; null where nothing is to be marked
 */
export function paintField(
  { columns, rows, values }: FieldGrid,
  table: ColourTable,
  limit: number,
  pixels: Uint32Array,
  limits: Limits | null,
): void {
  for (let row = 0; row < rows; row++) {
    const target = (rows - 1 - row) * columns
    for (let column = 0, i = 2 * row * columns; column < columns; column++, i += 2) {
      const low = values[i]
      const high = values[i + 1]
      const colour = table[findEntry(high + low >= 0 ? high : low, limit)]
      const over = limits !== null && (high > limits.high[column] || low < limits.low[column])
      pixels[target + column] = over ? hatch(colour, limits, column, rows - 1 - row) : colour
    }
  }
}

/**
 * Finds the extremes of a whole field.
 *
 * @param grid - the field
 * @returns smallest and largest value, both 0 where there is no bar at all
 */
export function findExtremes({ values }: FieldGrid): { low: number; high: number } {
  let low = Infinity
  let high = -Infinity
  for (let i = 0; i < values.length; i += 2) {
    if (values[i] < low) low = values[i]
    if (values[i + 1] > high) high = values[i + 1]
  }
  return low <= high ? { low, high } : { low: 0, high: 0 }
}

/**
 * The extreme of larger magnitude in a pixel.
 *
 * @param grid - the field
 * @param column - 0 at the left
 * @param row - 0 is the earliest
 */
export function readLargest({ columns, values }: FieldGrid, column: number, row: number): number {
  const i = 2 * (row * columns + column)
  return values[i + 1] + values[i] >= 0 ? values[i + 1] : values[i]
}

function hatch(colour: number, { ink, gap, width }: Limits, x: number, y: number): number {
  return mixPacked(colour, ink, evaluateHatchCover(x, y, gap, width, 'rising'))
}

function mixPacked(one: number, other: number, share: number): number {
  let mixed = 0xff000000
  for (let shift = 0; shift < 24; shift += 8) {
    const from = (one >>> shift) & 255
    mixed |= Math.round(from + (((other >>> shift) & 255) - from) * share) << shift
  }
  return mixed >>> 0
}
