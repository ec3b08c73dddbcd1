import { breakStretches } from './breakStretches'
import { gradedKernel } from './gradedKernel'
import type { LiveBlock, Stretch, WaveRun } from './waveRun'

/** Steps between two sweeps for subnormal numbers. */
const SWEEP_EVERY = 64

/**
 * Marches steps from..to-1 in place: the laws at the nodes, then scatter and shift inside blocks.
 *
 * A wave cannot cross a delay line in fewer steps than it has cells, so without graded blocks each
 * node takes as many steps in one go as the shortest line has cells. With graded blocks the nodes
 * go step by step and the insides of the blocks in pairs of steps, or step by step where bars may
 * come apart.
 */
export function advanceWaves(run: WaveRun, from: number, to: number): void {
  gradedKernel.enter(run.graded)
  const delays = run.blocks.filter((block) => block.delay !== null)
  const graded = run.blocks.filter((block) => block.delay === null)
  const stride = Math.min(...delays.map((block) => block.cells))
  for (let start = from; start < to; start += SWEEP_EVERY) {
    const end = Math.min(to, start + SWEEP_EVERY)
    if (graded.length > 0) advanceGraded(run, graded, start, end)
    else for (let k = start; k < end; k += stride) closeNodes(run, k, Math.min(end, k + stride))
    for (const block of delays) block.delay!.envelope.takeIn(end)
  }
  for (const block of delays) block.delay!.envelope.advance(to)
}

function advanceGraded(run: WaveRun, graded: readonly LiveBlock[], from: number, to: number): void {
  for (const { slot, cells } of graded) gradedKernel.flush(slot, slot + cells - 1)
  let k = from
  if (!run.line.rig.run.spall) for (; k + 2 <= to; k += 2) advancePair(run, graded, k)
  for (; k < to; k++) advanceOne(run, graded, k)
}

function closeNodes(run: WaveRun, from: number, to: number): void {
  const { nodes } = run
  for (let i = 0; i < nodes.length; i++) nodes[i].law.advance(from, to)
}

function advanceOne(run: WaveRun, graded: readonly LiveBlock[], k: number): void {
  for (const block of graded) beginStep(block, k)
  if (run.line.rig.run.spall) breakStretches(run, k)
  for (const stretch of run.stretches) arrive(stretch, k)
  closeNodes(run, k, k + 1)
  for (const stretch of run.stretches) stepOne(stretch, k)
}

/** Two steps: stretches of one cell, which have no inside, take them one by one. */
function advancePair(run: WaveRun, graded: readonly LiveBlock[], k: number): void {
  for (const block of graded) beginStep(block, k)
  for (const stretch of run.stretches) arrive(stretch, k)
  closeNodes(run, k, k + 1)
  for (const stretch of run.stretches) {
    const { slot, cells, left, right } = stretch
    if (cells === 1) {
      stepOne(stretch, k)
      arrive(stretch, k + 1)
    } else {
      gradedKernel.stepPair(slot, slot + cells - 1, k, left.leaving[k], right.leaving[k])
      left.arriving[k + 1] = gradedKernel.pairToLeft
      right.arriving[k + 1] = gradedKernel.pairToRight
    }
  }
  for (const block of graded) probeLeaving(block, k + 1)
  closeNodes(run, k + 1, k + 2)
  for (const stretch of run.stretches) {
    if (stretch.cells > 1) widenFaces(stretch, k)
    receive(stretch, k + 1)
  }
}

function stepOne(stretch: Stretch, k: number): void {
  gradedKernel.step(stretch.slot, stretch.slot + stretch.cells - 1, k)
  receive(stretch, k)
}

/** Notes what a block's probes see at step k before it is made. */
function beginStep(block: LiveBlock, k: number): void {
  const { slot, probes, impedance } = block
  const { f, g } = gradedKernel
  for (let i = 0; i < probes.length; i++) {
    const { position, force, velocity } = probes[i]
    const Y = 2 / (impedance[position - 1] + impedance[position])
    const fIn = f[slot + position - 1]
    const gIn = g[slot + position]
    force[k] = 2 * gIn + impedance[position] * Y * (fIn - gIn)
    velocity[k] = Y * (gIn - fIn)
  }
}

/**
 * Notes what a block's probes see at step k once the step is made, from the waves a and b that left the
 * node to the right and to the left: `F = 2 (Z1 a + Z2 b)/(Z1 + Z2)`, `v = 2 (b - a)/(Z1 + Z2)`.
 */
function probeLeaving(block: LiveBlock, k: number): void {
  const { slot, probes, impedance } = block
  for (let i = 0; i < probes.length; i++) {
    const { position, force, velocity } = probes[i]
    const Y = 2 / (impedance[position - 1] + impedance[position])
    const a = gradedKernel.f[slot + position]
    const b = gradedKernel.g[slot + position - 1]
    force[k] = Y * (impedance[position - 1] * a + impedance[position] * b)
    velocity[k] = Y * (b - a)
  }
}

/** Notes what arrives at a stretch's faces at step k, before its inside makes the step. */
function arrive(stretch: Stretch, k: number): void {
  const { slot, cells, left, right } = stretch
  left.arriving[k] = gradedKernel.g[slot]
  right.arriving[k] = gradedKernel.f[slot + cells - 1]
}

/** Puts the waves that its nodes sent at step k into a stretch, once its inside has made that step. */
function receive(stretch: Stretch, k: number): void {
  const { slot, cells, left, right } = stretch
  gradedKernel.f[slot] = left.leaving[k]
  gradedKernel.g[slot + cells - 1] = right.leaving[k]
  widenFaces(stretch, k)
}

function widenFaces(stretch: Stretch, k: number): void {
  const { slot, cells, left, right } = stretch
  gradedKernel.widen(slot, left.arriving[k] + left.leaving[k], k)
  gradedKernel.widen(slot + cells, right.arriving[k] + right.leaving[k], k)
}
