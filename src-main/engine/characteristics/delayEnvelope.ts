import type { DelayLine } from './delayLine'
import { type Extremes, TILE, tileKernel } from './tileKernel'

/** Envelope of a delay line's force at each of its positions, kept as it is marched. */
export interface DelayEnvelope extends Extremes {
  /** Takes in all steps before `to`; whole tiles of steps unless `to` is the end of the run. */
  advance(to: number): void
}

/**
 * Keeps the largest tension and compression `F = right[k - p + n] + left[k + p]` of a delay line.
 *
 * Tiles of 16 positions by 16 steps are skipped where the largest right-going plus the largest
 * left-going wave in them cannot pass the envelope so far; every value that could is looked at.
 *
 * @param line the delay line, filled up to the steps that are taken in
 * @param end number of steps the run will have recorded (steps + 1)
 */
export function makeDelayEnvelope(line: DelayLine, end: number): DelayEnvelope {
  const { cells: n, right, left } = line
  const positions = n + 1
  const tiles = Math.ceil(positions / TILE)
  const envelope = {
    high: new Float64Array(positions),
    low: new Float64Array(positions),
    highStep: new Int32Array(positions),
    lowStep: new Int32Array(positions),
  }
  // Least of `high` and largest of `low` over each tile of positions.
  const leastHigh = new Float64Array(tiles)
  const largestLow = new Float64Array(tiles)
  // Extremes of pairs of neighbouring stretches of 16 waves: pair j of `right` covers k - p from
  // 16 (j - shift) - 16, pair j of `left` covers k + p from 16 j; together all of a tile's values.
  const shift = tiles + 1
  const columns = Math.ceil(end / TILE) + tiles + 2
  const rightHigh = new Float64Array(columns)
  const rightLow = new Float64Array(columns)
  const leftHigh = new Float64Array(columns)
  const leftLow = new Float64Array(columns)
  let done = 0

  for (let j = 0; j < shift; j++) scanRight(j)
  for (let j = 0; j < tiles + 1; j++) scanLeft(j)

  function scanRight(j: number): void {
    const at = TILE * (j - shift) + n
    const from = Math.max(0, at - TILE)
    const to = Math.min(right.length, at + TILE)
    let top = from < to ? right[from] : 0
    let bottom = top
    for (let i = from + 1; i < to; i++) {
      const value = right[i]
      if (value > top) top = value
      else if (value < bottom) bottom = value
    }
    rightHigh[j] = top
    rightLow[j] = bottom
  }

  function scanLeft(j: number): void {
    const from = TILE * j
    const to = Math.min(left.length, from + 2 * TILE)
    let top = from < to ? left[from] : 0
    let bottom = top
    for (let i = from + 1; i < to; i++) {
      const value = left[i]
      if (value > top) top = value
      else if (value < bottom) bottom = value
    }
    leftHigh[j] = top
    leftLow[j] = bottom
  }

  function scanTile(tile: number, k0: number, k1: number): void {
    const p0 = tile * TILE
    tileKernel.scan(line, p0, Math.min(positions, p0 + TILE), k0, k1, envelope)
    leastHigh[tile] = tileKernel.leastHigh
    largestLow[tile] = tileKernel.largestLow
  }

  function scanRow(row: number, to: number): void {
    scanRight(row + shift)
    const newest = Math.floor((TILE * row + n) / TILE)
    for (let j = Math.max(0, newest - 1); j <= newest + 1; j++) scanLeft(j)
    const k0 = row * TILE
    const base = row + shift
    for (let tile = 0; tile < tiles; tile++) {
      const top = rightHigh[base - tile] + leftHigh[row + tile]
      const bottom = rightLow[base - tile] + leftLow[row + tile]
      if (top > leastHigh[tile] || bottom < largestLow[tile]) scanTile(tile, k0, to)
    }
  }

  return {
    ...envelope,
    advance(to) {
      while (done < to && (done + TILE <= to || to === end)) {
        const until = Math.min(done + TILE, to)
        scanRow(done / TILE, until)
        done += TILE
      }
    },
  }
}
