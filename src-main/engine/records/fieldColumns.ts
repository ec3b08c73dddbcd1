import { evaluatePlace, type Line } from '../line/line'

/** Columns of a field that is not asked for in full. */
const COLUMNS = 240
/** Rows of a field that is not asked for in full, and samples of the energy. */
const ROWS = 128

/** One column of the field: a position of a span. */
export interface FieldColumn {
  span: number
  position: number
  /** [m] */
  x: number
  /** [m^2] */
  area: number
}

/**
 * Chooses the positions at which the field is kept: all of them, or about 240, always with both
 * faces of every span.
 */
export function listFieldColumns(line: Line, full: boolean): FieldColumn[] {
  return line.spans.flatMap((span, index) => {
    const share = Math.max(1, Math.round((COLUMNS * (span.to - span.from)) / line.length))
    const count = full ? span.cells : Math.min(span.cells, share)
    return Array.from({ length: count + 1 }, (_, i) => {
      const position = Math.round((i * span.cells) / count)
      return { span: index, position, x: evaluatePlace(span, position), area: span.area[position] }
    })
  })
}

/**
 * Chooses the steps after which energy and field are kept: every one, or about 128 evenly spaced,
 * always with the first and the last.
 */
export function listSampleSteps(steps: number, full: boolean): Int32Array {
  const count = full ? steps : Math.min(steps, ROWS)
  return Int32Array.from({ length: count + 1 }, (_, i) => Math.round((i * steps) / count))
}
