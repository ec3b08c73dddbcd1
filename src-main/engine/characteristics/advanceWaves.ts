import { flushDelayLine } from './delayLine'
import { f, g, high, highStep, low, lowStep, enterWorkspace, WIDENING } from './gradedWorkspace'
import { flushGraded, stepGraded } from './stepGraded'
import type { LiveBlock, WaveRun } from './waveRun'

/** Steps between two sweeps for subnormal numbers in graded blocks. */
const FLUSH_EVERY = 64

/**
 * Marches steps from..to-1 in place: scatter at every node, then shift by one cell.
 *
 * A wave cannot cross a delay line in fewer steps than it has cells, so without graded blocks each
 * node takes as many steps in one go as the shortest line has cells.
 */
export function advanceWaves(run: WaveRun, from: number, to: number): void {
  enterWorkspace(run.graded)
  const graded = run.blocks.filter((block) => block.delay === null)
  const delays = run.blocks.filter((block) => block.delay !== null)
  const stride = graded.length > 0 ? 1 : Math.min(...delays.map((block) => block.cells))
  const { nodes } = run
  for (let k = from; k < to; k += stride) {
    const end = Math.min(to, k + stride)
    for (let i = 0; i < graded.length; i++) scatterGraded(graded[i], k)
    for (let i = 0; i < nodes.length; i++) nodes[i].law.advance(k, end)
    for (let i = 0; i < graded.length; i++) receiveGraded(graded[i], k)
  }
  for (const block of delays) {
    flushDelayLine(block.delay!.line, from, to)
    block.delay!.envelope.advance(to)
  }
}

function scatterGraded(block: LiveBlock, k: number): void {
  const { slot, cells } = block
  block.left.arriving[k] = g[slot]
  block.right.arriving[k] = stepGraded(slot, slot + cells - 1, k)
  if (k % FLUSH_EVERY === 0) flushGraded(slot, slot + cells - 1)
}

function receiveGraded(block: LiveBlock, k: number): void {
  const { slot, cells, left, right, probes } = block
  f[slot] = left.leaving[k]
  g[slot + cells - 1] = right.leaving[k]
  widen(slot, left.arriving[k] + left.leaving[k], k)
  widen(slot + cells, right.arriving[k] + right.leaving[k], k)
  for (let i = 0; i < probes.length; i++) {
    const { position, force, velocity } = probes[i]
    const node = evaluateInner(block, position)
    force[k] = node.force
    velocity[k] = node.velocity
  }
}

function widen(slot: number, F: number, k: number): void {
  if (F > high[slot]) {
    high[slot] = F * WIDENING
    highStep[slot] = k
  } else if (F < low[slot]) {
    low[slot] = F * WIDENING
    lowStep[slot] = k
  }
}

/**
 * Force and velocity at an inner position of a graded block after its latest step, from the waves
 * that leave it: `F = 2 (Z1 f + Z2 g)/(Z1 + Z2)`, `v = 2 (g - f)/(Z1 + Z2)`.
 *
 * @param position 1..cells-1
 */
export function evaluateInner(block: LiveBlock, position: number): { force: number; velocity: number } {
  const i = block.slot + position
  const Z1 = block.impedance[position - 1]
  const Z2 = block.impedance[position]
  const Y = 2 / (Z1 + Z2)
  return { force: Y * (Z1 * f[i] + Z2 * g[i - 1]), velocity: Y * (g[i - 1] - f[i]) }
}
