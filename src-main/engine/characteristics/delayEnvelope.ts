import { WIDENING } from '../march/widening'
import type { DelayLine } from './delayLine'
import { makeLineBounds, type TileBounds } from './tileBounds'
import { type Peaks, TILE, tileKernel } from './tileKernel'

/** Rows of tiles taken together: enough that most tiles meet the peak of their place before it is passed. */
const WINDOW = 256

/** Largest tension and largest compression at each position of a delay line, kept as it is marched. */
export interface DelayEnvelope {
  tension: Peaks
  /** Counted positive. */
  compression: Peaks
  /** Bounds the whole rows of 16 steps before `to`, sweeping tiny waves out. */
  takeIn(to: number): void
  /** Takes in all steps before `to`; those of an unfinished window wait unless `to` is the end of the run. */
  advance(to: number): void
}

/**
 * Keeps the largest tension and the largest compression of `F = right[k - p + n] + left[k + p]` of a
 * delay line, with the first step at which each is reached.
 *
 * The (position, step) plane is cut into tiles of 16 by 16. A tile whose largest right-going plus
 * largest left-going wave cannot pass the envelope so far is skipped: exact, and nearly all are.
 * To raise the envelope early, the most promising tile of each column of a window is looked at
 * first, without settling the time; the tiles that may pass it then follow in order of time.
 *
 * @param line the delay line, filled up to the steps that are taken in
 * @param end number of steps the run will have recorded (steps + 1)
 */
export function makeDelayEnvelope(line: DelayLine, end: number): DelayEnvelope {
  const positions = line.cells + 1
  const tiles = Math.ceil(positions / TILE)
  const rows = Math.ceil(end / TILE)
  const bounds = makeLineBounds(line, tiles, rows)
  const tension = makeSide(1, bounds.tension)
  const compression = makeSide(-1, bounds.compression)
  let bounded = 0
  let nextRow = 0

  function makeSide(sign: 1 | -1, side: TileBounds) {
    const peaks: Peaks = { sign, peak: new Float64Array(positions), step: new Int32Array(positions) }
    // Least peak over each column of tiles.
    const least = new Float64Array(tiles)

    function scanTile(tile: number, row: number, to: number, share: number): void {
      const p0 = tile * TILE
      const k0 = row * TILE
      const p1 = Math.min(positions, p0 + TILE)
      least[tile] = tileKernel.scan(line, p0, p1, k0, Math.min(to, k0 + TILE), peaks, share)
    }

    function scanColumn(tile: number, from: number, until: number, to: number): void {
      const best = side.findBest(tile, from, until)
      if (side.bound(tile, best) <= least[tile]) return
      scanTile(tile, best, to, 1 / WIDENING)
      let row = side.findNext(tile, from, until, least[tile])
      while (row < until) {
        scanTile(tile, row, to, WIDENING)
        row = side.findNext(tile, row + 1, until, least[tile])
      }
    }
    return { peaks, scanColumn }
  }

  function takeIn(to: number): void {
    while (bounded < rows && (to === end || (bounded + 1) * TILE <= to)) bounds.addRow(bounded++)
  }

  return {
    takeIn,
    tension: tension.peaks,
    compression: compression.peaks,
    advance(to) {
      takeIn(to)
      while (nextRow < rows && (to === end || (nextRow + WINDOW) * TILE <= to)) {
        const until = Math.min(nextRow + WINDOW, rows)
        for (let tile = 0; tile < tiles; tile++) {
          tension.scanColumn(tile, nextRow, until, to)
          compression.scanColumn(tile, nextRow, until, to)
        }
        nextRow = until
      }
    },
  }
}
