import type { DelayLine } from './delayLine'
import { TILE } from './tileKernel'

/** Waves under this are set to zero as they are taken in: subnormal numbers are slow [N]. */
const TINY = 1e-200

/** Bounds of the force of one sign in each tile of a delay line: column `tile`, `row` of steps. */
export interface TileBounds {
  /** No force of this sign in the tile is above it [N]; compression counts positive. */
  bound(tile: number, row: number): number
  /** Row of a column with the largest bound. */
  findBest(tile: number, from: number, until: number): number
  /** First row of a column whose bound is above a level [N]; `until` where none is. */
  findNext(tile: number, from: number, until: number, level: number): number
}

/** The bounds of both signs, kept as waves enter. */
export interface LineBounds {
  tension: TileBounds
  compression: TileBounds
  /** Takes in the waves that entered in the steps of a row, sweeping tiny ones out; rows come in order. */
  addRow(row: number): void
}

/**
 * Makes the bounds of a delay line's tiles: the largest right-going plus the largest left-going
 * wave that pass through a tile, each from two neighbouring stretches of 16 waves that cover the
 * tile's 31.
 *
 * @param tiles columns of 16 positions
 * @param rows rows of 16 steps
 */
export function makeLineBounds(line: DelayLine, tiles: number, rows: number): LineBounds {
  const { cells: n, right, left } = line
  // Stretch j of `right` covers k - p from 16 (j - shift), stretch j of `left` k + p from 16 j.
  const shift = tiles + 1
  const count = rows + tiles + 3
  const makeTops = () => new Float64Array(count).fill(-Infinity)
  const rightTops = { tension: makeTops(), compression: makeTops() }
  const leftTops = { tension: makeTops(), compression: makeTops() }
  const tension = makeSide(rightTops.tension, leftTops.tension, shift)
  const compression = makeSide(rightTops.compression, leftTops.compression, shift)

  /** Takes waves from..to-1 into stretches of 16, the first of which starts at `origin`. */
  function take(waves: Float64Array, from: number, to: number, origin: number, tops: typeof rightTops): void {
    const { tension: high, compression: low } = tops
    for (let i = from; i < to;) {
      const j = Math.floor((i - origin) / TILE)
      const end = Math.min(to, origin + (j + 1) * TILE)
      let top = high[j]
      let bottom = -low[j]
      for (; i < end; i++) {
        const value = waves[i]
        if (value < TINY && value > -TINY && value !== 0) waves[i] = 0
        if (value > top) top = value
        if (value < bottom) bottom = value
      }
      high[j] = top
      low[j] = -bottom
    }
  }

  function takeBoth(fromRight: number, toRight: number, fromLeft: number, toLeft: number): void {
    const rightOrigin = n - shift * TILE
    take(right, fromRight, toRight, rightOrigin, rightTops)
    take(left, fromLeft, toLeft, 0, leftTops)
    for (const side of [tension, compression]) {
      side.pairRight(
        Math.floor((fromRight - rightOrigin) / TILE),
        Math.floor((toRight - 1 - rightOrigin) / TILE),
      )
      side.pairLeft(Math.max(0, Math.floor(fromLeft / TILE) - 1), Math.floor((toLeft - 1) / TILE))
    }
  }

  takeBoth(0, n, 0, n)

  return {
    tension,
    compression,
    addRow(row) {
      const from = row * TILE + n
      const to = Math.min(from + TILE, right.length)
      takeBoth(from, to, from, to)
    },
  }
}

/** One sign's bounds over the tops of its stretches. */
function makeSide(rightTop: Float64Array, leftTop: Float64Array, shift: number) {
  // Of stretches j - 1 and j of `right`, and of j and j + 1 of `left`.
  const rightPair = new Float64Array(rightTop.length)
  const leftPair = new Float64Array(leftTop.length)
  return {
    pairRight(from: number, to: number): void {
      for (let j = from; j <= to; j++) rightPair[j] = Math.max(rightTop[j - 1], rightTop[j])
    },
    pairLeft(from: number, to: number): void {
      for (let j = from; j <= to; j++) leftPair[j] = Math.max(leftTop[j], leftTop[j + 1])
    },
    bound: (tile: number, row: number) => rightPair[row + shift - tile] + leftPair[row + tile],
    findBest(tile: number, from: number, until: number): number {
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
    findNext(tile: number, from: number, until: number, level: number): number {
      const r = shift - tile
      let row = from
      while (row < until && rightPair[row + r] + leftPair[row + tile] <= level) row++
      return row
    },
  }
}
