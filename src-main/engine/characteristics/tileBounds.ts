import type { DelayLine } from './delayLine'
import { TILE } from './tileKernel'

/** Bounds of the force in each tile of a delay line: column `tile` of positions, `row` of steps. */
export interface TileBounds {
  /** Takes in the waves that entered in the 16 steps of a row; rows come in order. */
  addRow(row: number): void
  /** No force in the tile is above `upper` or below `lower` [N]. */
  upper(tile: number, row: number): number
  lower(tile: number, row: number): number
  /** Finds the rows of a column with the largest upper and the smallest lower bound. */
  findBest(tile: number, from: number, until: number): void
  /** What `findBest` found last. */
  readonly highRow: number
  readonly lowRow: number
  /** First row of a column whose bounds pass `high` or `low`; `until` where none does. */
  findNext(tile: number, from: number, until: number, high: number, low: number): number
}

/**
 * Makes the bounds of a delay line's tiles: the largest right-going plus the largest left-going
 * wave that pass through a tile, each from a stretch of 32 waves that covers the tile's 31.
 *
 * @param tiles columns of 16 positions
 * @param rows rows of 16 steps
 */
export function makeTileBounds(line: DelayLine, tiles: number, rows: number): TileBounds {
  const { cells: n, right, left } = line
  // Stretch j of `right` covers k - p from 16 (j - shift) - 16, stretch j of `left` k + p from 16 j.
  const shift = tiles + 1
  const count = rows + tiles + 2
  const rightHigh = new Float64Array(count)
  const rightLow = new Float64Array(count)
  const leftHigh = new Float64Array(count)
  const leftLow = new Float64Array(count)
  let highRow = 0
  let lowRow = 0

  function bound(waves: Float64Array, at: number, high: Float64Array, low: Float64Array, j: number): void {
    const from = Math.max(0, at)
    const to = Math.min(waves.length, at + 2 * TILE)
    let top = from < to ? waves[from] : 0
    let bottom = top
    for (let i = from + 1; i < to; i++) {
      const value = waves[i]
      if (value > top) top = value
      else if (value < bottom) bottom = value
    }
    high[j] = top
    low[j] = bottom
  }
  const boundRight = (j: number) => bound(right, TILE * (j - shift - 1) + n, rightHigh, rightLow, j)
  const boundLeft = (j: number) => bound(left, TILE * j, leftHigh, leftLow, j)

  for (let j = 0; j < shift; j++) boundRight(j)
  for (let j = 0; j <= tiles; j++) boundLeft(j)

  return {
    addRow(row) {
      boundRight(row + shift)
      const newest = Math.floor((TILE * row + n) / TILE)
      for (let j = Math.max(0, newest - 1); j <= newest + 1; j++) boundLeft(j)
    },
    upper: (tile, row) => rightHigh[row + shift - tile] + leftHigh[row + tile],
    lower: (tile, row) => rightLow[row + shift - tile] + leftLow[row + tile],
    get highRow() {
      return highRow
    },
    get lowRow() {
      return lowRow
    },
    findBest(tile, from, until) {
      const r = shift - tile
      let top = -Infinity
      let bottom = Infinity
      for (let row = from; row < until; row++) {
        const upper = rightHigh[row + r] + leftHigh[row + tile]
        const lower = rightLow[row + r] + leftLow[row + tile]
        if (upper > top) {
          top = upper
          highRow = row
        }
        if (lower < bottom) {
          bottom = lower
          lowRow = row
        }
      }
    },
    findNext(tile, from, until, high, low) {
      const r = shift - tile
      let row = from
      while (
        row < until &&
        rightHigh[row + r] + leftHigh[row + tile] <= high &&
        rightLow[row + r] + leftLow[row + tile] >= low
      ) {
        row++
      }
      return row
    },
  }
}
