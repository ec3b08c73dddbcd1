import type { DelayLine } from './delayLine'
import { TILE } from './tileKernel'

/**
 * Bounds of the force of one sign in each tile of a delay line: column `tile` of positions, `row` of
 * steps. No force in a tile is above its bound [N].
 */
export interface TileBounds {
  /** Takes in the waves that entered in the steps of a row; rows come in order. */
  addRow(row: number): void
  bound(tile: number, row: number): number
  /** Row of a column with the largest bound. */
  findBest(tile: number, from: number, until: number): number
  /** First row of a column whose bound is above a level [N]; `until` where none is. */
  findNext(tile: number, from: number, until: number, level: number): number
}

/**
 * Makes the bounds of a delay line's tiles: the largest right-going plus the largest left-going
 * wave that pass through a tile, each from two neighbouring stretches of 16 waves that cover the
 * tile's 31.
 *
 * @param sign +1 for tension; -1 for compression, whose force is then counted positive
 * @param tiles columns of 16 positions
 * @param rows rows of 16 steps
 */
export function makeTileBounds(line: DelayLine, sign: 1 | -1, tiles: number, rows: number): TileBounds {
  const { cells: n, right, left } = line
  // Stretch j of `right` covers k - p from 16 (j - shift), stretch j of `left` k + p from 16 j.
  const shift = tiles + 1
  const count = rows + tiles + 3
  const rightTop = new Float64Array(count).fill(-Infinity)
  const leftTop = new Float64Array(count).fill(-Infinity)
  // Of stretches j - 1 and j of `right`, and of j and j + 1 of `left`.
  const rightPair = new Float64Array(count)
  const leftPair = new Float64Array(count)

  function takeRight(from: number, to: number): void {
    for (let i = from; i < to; i++) {
      const j = Math.floor((i - n) / TILE) + shift
      const value = sign * right[i]
      if (value > rightTop[j]) rightTop[j] = value
    }
    const last = Math.floor((to - 1 - n) / TILE) + shift
    for (let j = Math.floor((from - n) / TILE) + shift; j <= last; j++) {
      rightPair[j] = Math.max(rightTop[j - 1], rightTop[j])
    }
  }

  function takeLeft(from: number, to: number): void {
    for (let i = from; i < to; i++) {
      const j = (i / TILE) | 0
      const value = sign * left[i]
      if (value > leftTop[j]) leftTop[j] = value
    }
    const last = ((to - 1) / TILE) | 0
    for (let j = Math.max(0, ((from / TILE) | 0) - 1); j <= last; j++) {
      leftPair[j] = Math.max(leftTop[j], leftTop[j + 1])
    }
  }

  takeRight(0, n)
  takeLeft(0, n)

  return {
    addRow(row) {
      const from = row * TILE + n
      const to = Math.min(from + TILE, right.length)
      takeRight(from, to)
      takeLeft(from, to)
    },
    bound: (tile, row) => rightPair[row + shift - tile] + leftPair[row + tile],
    findBest(tile, from, until) {
      const r = shift - tile
      let best = from
      let top = -Infinity
      for (let row = from; row < until; row++) {
        const bound = rightPair[row + r] + leftPair[row + tile]
        if (bound > top) {
          top = bound
          best = row
        }
      }
      return best
    },
    findNext(tile, from, until, level) {
      const r = shift - tile
      let row = from
      while (row < until && rightPair[row + r] + leftPair[row + tile] <= level) row++
      return row
    },
  }
}
