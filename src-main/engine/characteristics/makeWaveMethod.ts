import type { Line } from '../line/line'
import type { Fragment, MethodRun, NodeTrace, SpanExtremes, SpanPlace, Stock } from '../march/methodRun'
import { advanceWaves } from './advanceWaves'
import { makeWaveRun } from './makeWaveRun'
import { readMotion } from './readMotion'
import { readExtremes, readForces, readTrace, sumBlock, sumCells } from './readWaves'
import type { LiveBlock, WaveRun } from './waveRun'

/**
 * Sets up a line for the method of characteristics.
 *
 * @param line the cut line
 */
export function makeWaveMethod(line: Line): MethodRun {
  const run = makeWaveRun(line)
  const seat = (span: number, position: number) => {
    const block = run.blocks.find((one) => span >= one.firstSpan && span <= one.lastSpan)!
    return { block, at: block.spanStart[span - block.firstSpan] + position }
  }
  return {
    line,
    beat: run.beat,
    laws: run.laws,
    breaks: run.breaks,
    listFragments: () => listFragments(run),
    bodies: run.bodies,
    outside: run.outside,
    advance: (from, to) => advanceWaves(run, from, to),
    sumBar: (bar, k, frame) => sumBar(run, bar, k, frame),
    makeForceReader: (places) => makeForceReader(run, places),
    readMotion(span, k, force, velocity) {
      const { block, at } = seat(span, 0)
      readMotion(run, block, at, k, force, velocity)
    },
    readWaves: (span) => seat(span, 0).block.delay?.line ?? null,
    readExtremes: (span) => cutExtremes(run, span),
    addProbe(span, position) {
      const { block, at } = seat(span, position)
      const inner = block.delay === null && at > 0 && at < block.cells
      if (!inner || block.probes.some((probe) => probe.position === at)) return
      const count = line.steps + 1
      block.probes.push({ position: at, force: new Float64Array(count), velocity: new Float64Array(count) })
    },
    readTrace(span, position) {
      const { block, at } = seat(span, position)
      return readTrace(run, block, at)
    },
    readNode: (node) => readNode(run, node),
  }
}

/** Gathers the places block by block, so that each block is read in one loop. */
function makeForceReader(run: WaveRun, places: readonly SpanPlace[]): (k: number, row: Float64Array) => void {
  const parts: { block: LiveBlock; positions: number[]; at: number }[] = []
  places.forEach(({ span, position }, i) => {
    const block = run.blocks.find((one) => span >= one.firstSpan && span <= one.lastSpan)!
    const last = parts[parts.length - 1]
    const here = block.spanStart[span - block.firstSpan] + position
    if (last?.block === block) last.positions.push(here)
    else parts.push({ block, positions: [here], at: i })
  })
  const ready = parts.map((part) => ({ ...part, positions: Int32Array.from(part.positions) }))
  return (k, row) => {
    for (const { block, positions, at } of ready) readForces(run, block, positions, k, row, at)
  }
}

function sumBar(run: WaveRun, bar: number, k: number, frame: number): Stock {
  const sum: Stock = { kinetic: 0, strain: 0, dissipated: 0, momentum: 0, mass: 0 }
  for (const block of run.blocks) {
    if (block.bar !== bar) continue
    const stock = sumBlock(run, block, k, frame)
    sum.kinetic += stock.kinetic
    sum.strain += stock.strain
    sum.momentum += stock.momentum
    sum.mass += stock.mass
  }
  return sum
}

function cutExtremes(run: WaveRun, span: number): SpanExtremes {
  const block = run.blocks.find((one) => span >= one.firstSpan && span <= one.lastSpan)!
  const { high, low, highStep, lowStep } = readExtremes(run, block)
  const from = block.spanStart[span - block.firstSpan]
  const to = from + run.line.spans[span].cells + 1
  return {
    high: high.subarray(from, to),
    low: low.subarray(from, to),
    highStep: highStep.subarray(from, to),
    lowStep: lowStep.subarray(from, to),
  }
}

/** Cuts the bars that came apart at their breaks. */
function listFragments(run: WaveRun): Fragment[] {
  const { steps, bars } = run.line
  return bars.flatMap((bar, index) => {
    const cuts = run.breaks.filter((one) => one.bar === index).map((one) => one.x)
    if (cuts.length === 0) return []
    const stops = [bar.from, ...cuts.sort((a, b) => a - b), bar.to]
    return stops.slice(1).map((to, i) => {
      const inside = (x: number) => x > stops[i] && x < to
      return { bar: index, from: stops[i], to, ...sumCells(run, index, steps, inside) }
    })
  })
}

/** Both sides of a node with a law; outside an end both read the bar's face. */
function readNode(run: WaveRun, index: number): NodeTrace | null {
  const node = run.nodes.find((one) => one.index === index)
  if (!node) return null
  const readFace = (block: number, face: 'left' | 'right') => {
    const live = run.blocks[block]
    return readTrace(run, live, face === 'left' ? 0 : live.cells)
  }
  const left = node.leftBlock >= 0 ? readFace(node.leftBlock, 'right') : readFace(node.rightBlock, 'left')
  const right = node.rightBlock >= 0 ? readFace(node.rightBlock, 'left') : left
  return {
    forceLeft: left.force,
    velocityLeft: left.velocity,
    forceRight: right.force,
    reaction: left.force,
    velocityRight: right.velocity,
  }
}
