import { makeNodes } from './makeNodes'
import { evaluateInitial } from '../line/evaluateInitial'
import type { Line, Span } from '../line/line'
import { makeBlocks, type Block } from './block'
import { makeDelayEnvelope } from './delayEnvelope'
import { makeDelayLine } from './delayLine'
import { gradedKernel } from './gradedKernel'
import { LiveBlock, Stretch, type WaveRun } from './waveRun'

/**
 * Sets up a line for the method of characteristics: blocks with their initial waves, and the laws
 * at the nodes between them.
 *
 * @param line the cut line
 */
export function makeWaveRun(line: Line): WaveRun {
  const plain = (node: number) => line.nodes[node].kind === 'step' && line.nodes[node].loads.length === 0
  const spalls = (span: Span) => line.rig.run.spall && span.source.material.spall !== null
  const drafts = makeBlocks(line.spans, plain, spalls)
  const size = drafts.reduce((sum, block) => sum + (block.kind === 'graded' ? block.cells + 1 : 0), 0)
  const graded = { size, saved: [] }
  gradedKernel.enter(graded)
  let slot = 0
  const blocks = drafts.map((draft) => {
    if (draft.kind === 'delay') return makeDelayBlock(line, draft)
    const block = makeGradedBlock(line, draft, slot)
    slot += draft.cells + 1
    return block
  })
  const stretches = blocks
    .filter((block) => block.delay === null)
    .map((block) => new Stretch(block, 0, block.cells, block.left, block.right))
  const { nodes, ...rest } = makeNodes(line, blocks)
  const laws = new Map(nodes.map((node) => [node.index, node.law]))
  return { line, blocks, graded, stretches, breaks: [], nodes, laws, ...rest }
}

function makeDelayBlock(line: Line, draft: Block): LiveBlock {
  const { cells: n, firstSpan, impedance } = draft
  const Z = impedance[0]
  const delay = makeDelayLine(n, line.steps)
  for (let p = 0; p <= n; p++) {
    const { force, velocity } = evaluateInitial(line, firstSpan, p)
    if (p > 0) delay.right[n - p] = (force - Z * velocity) / 2
    if (p < n) delay.left[p] = (force + Z * velocity) / 2
  }
  const left = { impedance: Z, arriving: delay.left, leaving: delay.right, leavingOffset: n }
  const right = { impedance: Z, arriving: delay.right, leaving: delay.left, leavingOffset: n }
  return new LiveBlock(draft, left, right, -1, {
    line: delay,
    envelope: makeDelayEnvelope(delay, line.steps + 1),
  })
}

function makeGradedBlock(line: Line, draft: Block, slot: number): LiveBlock {
  const { cells, impedance: Z, firstSpan, lastSpan, spanStart } = draft
  const { f, g, T } = gradedKernel
  for (let i = 1; i < cells; i++) T[slot + i] = (2 * Z[i]) / (Z[i - 1] + Z[i])
  for (let span = firstSpan; span <= lastSpan; span++) {
    const start = spanStart[span - firstSpan]
    for (let p = 0; p <= line.spans[span].cells; p++) {
      const { force, velocity } = evaluateInitial(line, span, p)
      const i = start + p
      if (p > 0) f[slot + i - 1] = (force - Z[i - 1] * velocity) / 2
      if (p < line.spans[span].cells) g[slot + i] = (force + Z[i] * velocity) / 2
    }
  }
  const makePort = (impedance: number) => ({
    impedance,
    arriving: new Float64Array(line.steps + 1),
    leaving: new Float64Array(line.steps + 1),
    leavingOffset: 0,
  })
  const block = new LiveBlock(draft, makePort(Z[0]), makePort(Z[cells - 1]), slot, null)
  if (line.rig.run.spall) block.strength = makeStrength(line, draft)
  return block
}

/** Tension at which each position of a block comes apart: strength times area, the least of both sides [N]. */
function makeStrength(line: Line, draft: Block): Float64Array | null {
  const strength = new Float64Array(draft.cells + 1).fill(Infinity)
  for (let span = draft.firstSpan; span <= draft.lastSpan; span++) {
    const { source, area } = line.spans[span]
    const { spall } = source.material
    if (spall === null) continue
    const start = draft.spanStart[span - draft.firstSpan]
    area.forEach((A, p) => (strength[start + p] = Math.min(strength[start + p], spall * A)))
  }
  return strength.some((force) => force < Infinity) ? strength : null
}
