import { WIDENING } from '../march/widening'
import type { DelayLine } from './delayLine'
import { makeTileBounds } from './tileBounds'
import { type Peaks, TILE, tileKernel } from './tileKernel'

/** Rows of tiles taken together: enough that most tiles meet the peak of their place before it is passed. */
const WINDOW = 256

/** Largest force of one sign at each position of a delay line, kept as it is marched. */
export interface DelayEnvelope extends Peaks {
  /** Takes in all steps before `to`; those of an unfinished window wait unless `to` is the end of the run. */
  advance(to: number): void
}

/**
 * Keeps the largest tension, or the largest compression, of `F = right[k - p + n] + left[k + p]` of a
 * delay line, with the first step at which it is reached.
 *
 * The (position, step) plane is cut into tiles of 16 by 16. A tile whose largest right-going plus
 * largest left-going wave cannot pass the envelope so far is skipped: exact, and nearly all are.
 * To raise the envelope early, the most promising tile of each column of a window is looked at
 * first, without settling the time; the tiles that may pass it then follow in order of time.
 *
 * @param line the delay line, filled up to the steps that are taken in
 * @param sign +1 for tension; -1 for compression, whose force is then counted positive
 * @param end number of steps the run will have recorded (steps + 1)
 */
export function makeDelayEnvelope(line: DelayLine, sign: 1 | -1, end: number): DelayEnvelope {
  const positions = line.cells + 1
  const tiles = Math.ceil(positions / TILE)
  const rows = Math.ceil(end / TILE)
  const bounds = makeTileBounds(line, sign, tiles, rows)
  const peaks: Peaks = { sign, peak: new Float64Array(positions), step: new Int32Array(positions) }
  // Least peak over each column of tiles.
  const least = new Float64Array(tiles)
  let nextRow = 0

  function scanTile(tile: number, row: number, to: number, share: number): void {
    const p0 = tile * TILE
    const k0 = row * TILE
    const p1 = Math.min(positions, p0 + TILE)
    least[tile] = tileKernel.scan(line, p0, p1, k0, Math.min(to, k0 + TILE), peaks, share)
  }

  function scanColumn(tile: number, from: number, until: number, to: number): void {
    const best = bounds.findBest(tile, from, until)
    if (bounds.bound(tile, best) <= least[tile]) return
    scanTile(tile, best, to, 1 / WIDENING)
    let row = bounds.findNext(tile, from, until, least[tile])
    while (row < until) {
      scanTile(tile, row, to, WIDENING)
      row = bounds.findNext(tile, row + 1, until, least[tile])
    }
  }

  return {
    ...peaks,
    advance(to) {
      while (nextRow < rows && (to === end || (nextRow + WINDOW) * TILE <= to)) {
        const until = Math.min(nextRow + WINDOW, rows)
        for (let row = nextRow; row < until; row++) bounds.addRow(row)
        for (let tile = 0; tile < tiles; tile++) scanColumn(tile, nextRow, until, to)
        nextRow = until
      }
    },
  }
}
