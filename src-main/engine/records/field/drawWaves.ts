import { lookAtDiamondSquares, lookAtDiamondSums } from './lookAtDiamonds'
import { lookAtNodeSquares, lookAtNodeSums } from './lookAtNodes'
import { makeLooks } from './looks'
import { type Strip, type Tile, widenPixel } from './pixels'
import { seen } from './seen'
import type { SpanPlace } from './spanPlace'
import type { WaveSpan } from './waveSpan'

/** Diamonds of less than 2^2 steps cost more than looking at each node, of more than 2^20 gain nothing. */
const LEAST_LEVEL = 2
const MOST_LEVEL = 20

/**
 * Draws a span with known waves into a tile: every value that the run had at a position and a step, the
 * nearest one where a pixel holds none. Pixels that see more than a few cells and steps are made from
 * diamonds of at most half a pixel, so that a value may show half a pixel beside its place but none is
 * lost; those at the ends of the span and of the run look at each.
 *
 * @param columns pixels that see the span, in positions
 * @param rows pixels that see the run, in steps
 * @param fall velocity that the falling frame gains in a step [m/s]
 */
export function drawWaves(
  { window, values }: Tile,
  span: WaveSpan,
  place: SpanPlace,
  columns: readonly Strip[],
  rows: readonly Strip[],
  fall: number,
): void {
  const { quantity } = window
  const level = chooseLevel(columns, rows)
  const x = makeLooks(columns, span.cells, level)
  const t = makeLooks(rows, span.steps, level)
  const { area, impedance: Z, modulus } = place
  const share = { stress: 1 / area, force: 1, velocity: 1 / Z, energy: 1 / (modulus * area * area) }[quantity]
  const sign = quantity === 'velocity' ? -1 : 1

  for (let j = 0; j < rows.length; j++) {
    const G = fall * t.middle[j]
    const shift = quantity === 'velocity' ? G : 0
    const h = (Z * G) / 2
    for (let i = 0; i < columns.length; i++) {
      const rough = x.rough[i] === 1 && t.rough[j] === 1
      if (quantity === 'energy') {
        if (rough) lookAtDiamondSquares(span, x, i, t, j, level, h)
        else lookAtNodeSquares(span, x.first[i], x.last[i], t.first[j], t.last[j], h)
      } else if (rough) lookAtDiamondSums(span, x, i, t, j, level, sign)
      else lookAtNodeSums(span, x.first[i], x.last[i], t.first[j], t.last[j], sign)
      widenPixel(
        values,
        t.index[j] * window.columns + x.index[i],
        share * seen[0] + shift,
        share * seen[1] + shift,
      )
    }
  }
}

/** The largest diamonds that fit twice into a pixel; 0 where each node is looked at. */
function chooseLevel(columns: readonly Strip[], rows: readonly Strip[]): number {
  const widest = (strips: readonly Strip[]) => Math.max(...strips.map(({ from, to }) => to - from))
  const level = Math.floor(Math.log2(Math.min(widest(columns), widest(rows)) / 2))
  return level < LEAST_LEVEL ? 0 : Math.min(level, MOST_LEVEL)
}
