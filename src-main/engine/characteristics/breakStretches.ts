import { makeBarSide, type Port } from '../laws/barSide'
import { makeContact } from '../laws/contact'
import { evaluatePlace } from '../line/line'
import { findOpenings } from '../march/findOpenings'
import { gradedKernel } from './gradedKernel'
import { Stretch, type WaveRun } from './waveRun'

/**
 * Lets bars come apart at step k, before it is made: where the tension at a node would pass its
 * strength the node opens in this step and is a contact from then on. Of a run of neighbouring nodes
 * over their strength only the one farthest over it opens; its two free faces relieve the others.
 */
export function breakStretches(run: WaveRun, k: number): void {
  for (let i = run.stretches.length - 1; i >= 0; i--) {
    const stretch = run.stretches[i]
    if (stretch.block.strength === null) continue
    const { slot, start, cells, block, opened } = stretch
    const { f, g, T } = gradedKernel
    const forceAt = (p: number) => 2 * g[slot + p] + T[slot + p] * (f[slot + p - 1] - g[slot + p])
    const age = (at: number | null) => (at === null ? null : k - at)
    const places = findOpenings(cells, (p) => forceAt(p) / block.strength![start + p], {
      left: age(opened.left),
      right: age(opened.right),
    })
    // From the right, so that the positions left of a break stay good.
    for (const at of places.reverse()) split(run, i, at, forceAt(at), k)
  }
}

/** Opens stretch `index` of a run at its position `at`: two stretches with a contact between. */
function split(run: WaveRun, index: number, at: number, force: number, k: number): void {
  const { block, start, cells, left, right, opened } = run.stretches[index]
  const makePort = (impedance: number): Port => ({
    impedance,
    arriving: new Float64Array(run.line.steps + 1),
    leaving: new Float64Array(run.line.steps + 1),
    leavingOffset: 0,
  })
  const near = new Stretch(block, start, at, left, makePort(block.impedance[start + at - 1]), {
    left: opened.left,
    right: k,
  })
  const far = new Stretch(block, start + at, cells - at, makePort(block.impedance[start + at]), right, {
    left: k,
    right: opened.right,
  })
  run.stretches.splice(index, 1, near, far)
  const { f, g } = gradedKernel
  const slot = near.slot + at
  const velocity = (2 * (g[slot] - f[slot - 1])) / (near.right.impedance + far.left.impedance)
  const law = makeContact(
    makeBarSide(near.right, 1, velocity),
    makeBarSide(far.left, -1, velocity),
    0,
    run.beat,
  )
  const node = -1 - run.breaks.length
  run.nodes.push({ index: node, law, leftBlock: -1, rightBlock: -1 })
  run.laws.set(node, law)
  // A watched node that opens is watched one cell to its left from then on.
  for (const probe of block.probes) if (probe.position === start + at) probe.position--
  run.breaks.push({
    ...findPlace(run, block.firstSpan, block.spanStart, start + at),
    bar: block.bar,
    force,
    k,
  })
}

/** The span and position of a block's position, and its place along the line. */
function findPlace(run: WaveRun, firstSpan: number, spanStart: number[], position: number) {
  let i = 0
  while (position > spanStart[i + 1]) i++
  const span = run.line.spans[firstSpan + i]
  const p = position - spanStart[i]
  return { x: evaluatePlace(span, p), area: Math.min(span.area[p], adjacentArea(run, firstSpan + i, p)) }
}

/** At a step between sections, the area of the next one's face; else that of the place itself. */
function adjacentArea(run: WaveRun, span: number, p: number): number {
  const { area, cells } = run.line.spans[span]
  return p === cells && span + 1 < run.line.spans.length ? run.line.spans[span + 1].area[0] : area[p]
}
