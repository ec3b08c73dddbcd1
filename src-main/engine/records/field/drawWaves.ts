import { reachNodes, type Strip, type Tile, widenPixel } from './pixels'
import type { SpanPlace } from './spanPlace'
import { chooseLooks, lookAtDiamonds, lookAtNodes, type Mix, seen, type WaveSpan } from './waveSpan'

/** Levels at most: diamonds of about a million steps. */
const MOST_LEVELS = 20

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
  const level = Math.min(chooseLevel(columns), chooseLevel(rows), MOST_LEVELS)
  const size = level > 0 ? 2 ** level : 0
  const cut = (end: number) => (strip: Strip) => ({
    ...strip,
    inside: level > 0 && strip.from >= size && strip.to <= end - size,
    // With those of the diamonds whose middles lie in it: a pixel beside it may leave them out.
    nodes: reachNodes({ from: strip.from - size / 2, to: strip.to + size / 2 }, (at) => at, end + 1),
    looks: chooseLooks(strip.from, strip.to, level),
  })
  const xs = columns.map(cut(span.cells))
  const ts = rows.map(cut(span.steps))
  const { area, impedance: Z, modulus } = place
  const share = { stress: 1 / area, force: 1, velocity: 1 / Z, energy: 1 / (modulus * area * area) }[quantity]
  const mix: Mix = { sign: quantity === 'velocity' ? -1 : quantity === 'energy' ? 0 : 1, h: 0 }

  for (const t of ts) {
    const G = (fall * (t.from + t.to)) / 2
    const shift = quantity === 'velocity' ? G : 0
    mix.h = (Z * G) / 2
    for (const x of xs) {
      if (x.inside && t.inside) lookAtDiamonds(span, x.looks, t.looks, level, mix)
      else lookAtNodes(span, x.nodes, t.nodes, mix)
      const at = t.index * window.columns + x.index
      widenPixel(values, at, share * seen.low + shift, share * seen.high + shift)
    }
  }
}

/** The largest diamonds that fit twice into a pixel; 0 where pixels see so little that each node is looked at. */
function chooseLevel(strips: readonly Strip[]): number {
  const widest = Math.max(...strips.map(({ from, to }) => to - from))
  return widest < 4 ? 0 : Math.floor(Math.log2(widest / 2))
}
