import type { Quantity } from '../../../contract/bridge'
import { evaluateLeastSquare } from './evaluateLeastSquare'
import { type Reach, reachNodes, type Strip, type Tile, widenPixel } from './pixels'
import { seen } from './seen'
import { findColumn, findRow, type SampledSpan } from './sampleField'

/**
 * Draws a sampled span into a tile: a pixel shows the extremes of the samples in it, or the nearest one
 * where it holds none.
 *
 * @param cells of the span
 * @param columns pixels that see the span, in positions
 * @param rows pixels that see the run, in steps
 * @param stride steps from one sample to the next
 * @param fall velocity that the falling frame gains in a step [m/s]
 */
export function drawSamples(
  { window, values }: Tile,
  sampled: SampledSpan,
  cells: number,
  columns: readonly Strip[],
  rows: readonly Strip[],
  stride: number,
  fall: number,
): void {
  const count = sampled.force.high.length / sampled.columns
  const xs = columns.map((strip) => ({
    index: strip.index,
    reach: reachNodes(strip, (p) => findColumn(p, cells, sampled.columns), sampled.columns),
  }))
  for (const row of rows) {
    const reach = reachNodes(row, (k) => findRow(k, stride), count)
    const G = (fall * (row.from + row.to)) / 2
    for (const x of xs) {
      lookAtSamples(sampled, window.quantity, x.reach, reach, G)
      widenPixel(values, row.index * window.columns + x.index, seen[0], seen[1])
    }
  }
}

function lookAtSamples(sampled: SampledSpan, quantity: Quantity, x: Reach, t: Reach, G: number): void {
  const { columns, force, velocity, places } = sampled
  let low = Infinity
  let high = -Infinity
  for (let row = t.from; row <= t.to; row++) {
    for (let column = x.from; column <= x.to; column++) {
      const i = row * columns + column
      const { area, impedance: Z, modulus } = places[column]
      let bottom = 0
      let top = 0
      if (quantity === 'velocity') {
        bottom = velocity.low[i] + G
        top = velocity.high[i] + G
      } else if (quantity === 'energy') {
        const share = 1 / (2 * modulus * area * area)
        const F0 = force.low[i]
        const F1 = force.high[i]
        const V0 = Z * (velocity.low[i] + G)
        const V1 = Z * (velocity.high[i] + G)
        bottom = share * (evaluateLeastSquare(F0, F1) + evaluateLeastSquare(V0, V1))
        top = share * (Math.max(F0 * F0, F1 * F1) + Math.max(V0 * V0, V1 * V1))
      } else {
        const share = quantity === 'stress' ? 1 / area : 1
        bottom = share * force.low[i]
        top = share * force.high[i]
      }
      if (bottom < low) low = bottom
      if (top > high) high = top
    }
  }
  seen[0] = low
  seen[1] = high
}
