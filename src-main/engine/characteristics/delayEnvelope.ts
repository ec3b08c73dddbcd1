import type { DelayLine } from './delayLine'
import { makeTileBounds } from './tileBounds'
import { type Extremes, TILE, tileKernel } from './tileKernel'
import { WIDENING } from '../march/widening'

/** Rows of tiles taken together: enough that most tiles meet the peak of their place before it is passed. */
const WINDOW = 256

/** Envelope of a delay line's force at each of its positions, kept as it is marched. */
export interface DelayEnvelope extends Extremes {
  /** Takes in all steps before `to`; those of an unfinished window wait unless `to` is the end of the run. */
  advance(to: number): void
}

/**
 * Keeps the largest tension and compression `F = right[k - p + n] + left[k + p]` of a delay line,
 * with the first step at which each is reached.
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
  const bounds = makeTileBounds(line, tiles, rows)
  const extremes: Extremes = {
    high: new Float64Array(positions),
    low: new Float64Array(positions),
    highStep: new Int32Array(positions),
    lowStep: new Int32Array(positions),
  }
  // Least of `high` and largest of `low` over each column of tiles.
  const leastHigh = new Float64Array(tiles)
  const largestLow = new Float64Array(tiles)
  let nextRow = 0

  function scanTile(tile: number, row: number, to: number, share: number): void {
    const p0 = tile * TILE
    const k0 = row * TILE
    tileKernel.scan(line, p0, Math.min(positions, p0 + TILE), k0, Math.min(to, k0 + TILE), extremes, share)
    leastHigh[tile] = tileKernel.leastHigh
    largestLow[tile] = tileKernel.largestLow
  }

  function scanColumn(tile: number, from: number, until: number, to: number): void {
    bounds.findBest(tile, from, until)
    const { highRow, lowRow } = bounds
    const rises = bounds.upper(tile, highRow) > leastHigh[tile]
    const sinks = bounds.lower(tile, lowRow) < largestLow[tile]
    if (!rises && !sinks) return
    if (rises) scanTile(tile, highRow, to, 1 / WIDENING)
    if (sinks) scanTile(tile, lowRow, to, 1 / WIDENING)
    let row = bounds.findNext(tile, from, until, leastHigh[tile], largestLow[tile])
    while (row < until) {
      scanTile(tile, row, to, WIDENING)
      row = bounds.findNext(tile, row + 1, until, leastHigh[tile], largestLow[tile])
    }
  }

  return {
    ...extremes,
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
