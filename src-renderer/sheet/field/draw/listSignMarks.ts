import { readLargest, type FieldGrid } from '../../../plot/paintField'

/** A sign in the field, so that tension and compression are told apart without colour. */
export interface SignMark {
  /** Share of the picture's width and height, from the left and from its earliest moment. */
  across: number
  up: number
  positive: boolean
}

/** Share of the limit under which a place bears no sign. */
const WEAKEST = 0.12

/**
 * Chooses the places of the signs: in every other cell of a coarse grid, like the squares of one colour of
 * a chessboard, where the field is of one sign all about it.
 *
 * @param grid - the picture
 * @param limit - value of the last colour
 * @param across - cells across
 * @param up - cells up
 * @returns marks, few enough to be drawn one by one
 */
export function listSignMarks(grid: FieldGrid, limit: number, across: number, up: number): SignMark[] {
  const marks: SignMark[] = []
  for (let row = 0; row < up; row++) {
    for (let column = row % 2; column < across; column += 2) {
      const middle = { across: (column + 0.5) / across, up: (row + 0.5) / up }
      const sign = findSign(grid, middle, limit, 0.16 / across, 0.16 / up)
      if (sign !== 0) marks.push({ ...middle, positive: sign > 0 })
    }
  }
  return marks
}

/** 1 or -1 where the middle and four places about it agree; 0 where they do not or are weak. */
function findSign(
  grid: FieldGrid,
  middle: { across: number; up: number },
  limit: number,
  dx: number,
  dy: number,
): number {
  let sign = 0
  for (const [x, y] of [
    [0, 0],
    [-dx, -dy],
    [dx, -dy],
    [-dx, dy],
    [dx, dy],
  ]) {
    const column = Math.min(grid.columns - 1, Math.max(0, Math.floor((middle.across + x) * grid.columns)))
    const row = Math.min(grid.rows - 1, Math.max(0, Math.floor((middle.up + y) * grid.rows)))
    const value = readLargest(grid, column, row)
    if (!(Math.abs(value) > WEAKEST * limit)) return 0
    if (sign !== 0 && Math.sign(value) !== sign) return 0
    sign = Math.sign(value)
  }
  return sign
}
