import { evaluatePlace } from '../line/line'
import { gradedKernel } from './gradedKernel'
import { WIDENING } from '../march/widening'
import type { SpanExtremes, SpanTrace, Stock } from '../march/methodRun'
import type { LiveBlock, WaveRun } from './waveRun'

/**
 * Sums a block's cells after step k (k = -1: before the first): kinetic `dt (g - f + Z G)^2 / 2 Z`,
 * strain `dt (f + g)^2 / 2 Z`, momentum `dt (g - f)`; kinetic + strain = `dt (f^2 + g^2)/Z` at G = 0.
 *
 * @param frame velocity G of the falling frame [m/s]
 */
export function sumBlock(run: WaveRun, block: LiveBlock, k: number, frame: number): Stock {
  const { dt } = run.line
  const { cells: n, impedance, delay, slot } = block
  let kinetic = 0
  let strain = 0
  let momentum = 0
  let mass = 0
  if (delay) {
    const { right, left } = delay.line
    const Z = impedance[0]
    for (let i = 0; i < n; i++) {
      const fi = right[k + n - i]
      const gi = left[k + i + 1]
      const difference = gi - fi
      const v = difference + Z * frame
      const sum = fi + gi
      kinetic += v * v
      strain += sum * sum
      momentum += difference
    }
    kinetic /= Z
    strain /= Z
    mass = n * Z
  } else {
    gradedKernel.enter(run.graded)
    const { f, g } = gradedKernel
    for (let i = 0; i < n; i++) {
      const Z = impedance[i]
      const fi = f[slot + i]
      const gi = g[slot + i]
      const v = gi - fi + Z * frame
      kinetic += (v * v) / Z
      strain += ((fi + gi) * (fi + gi)) / Z
      momentum += gi - fi
      mass += Z
    }
  }
  return {
    kinetic: (dt * kinetic) / 2,
    strain: (dt * strain) / 2,
    dissipated: 0,
    momentum: dt * momentum,
    mass: dt * mass,
  }
}

/**
 * Sums mass and momentum of the cells of a bar whose middles lie where asked, after step k.
 *
 * @param inside tells by the place along the line [m]
 */
export function sumCells(
  run: WaveRun,
  bar: number,
  k: number,
  inside: (x: number) => boolean,
): { mass: number; momentum: number } {
  gradedKernel.enter(run.graded)
  const { spans, dt } = run.line
  let mass = 0
  let momentum = 0
  for (const block of run.blocks) {
    if (block.bar !== bar) continue
    for (let i = 0; i < block.cells; i++) {
      let s = 0
      while (i >= block.spanStart[s + 1]) s++
      const span = spans[block.firstSpan + s]
      if (!inside(evaluatePlace(span, i - block.spanStart[s] + 0.5))) continue
      const { delay, slot, impedance, cells } = block
      mass += dt * (delay ? impedance[0] : impedance[i])
      momentum += delay
        ? dt * (delay.line.left[k + i + 1] - delay.line.right[k + cells - i])
        : dt * (gradedKernel.g[slot + i] - gradedKernel.f[slot + i])
    }
  }
  return { mass, momentum }
}

/**
 * Reads the force at positions of a block after the latest step k into a row [N].
 *
 * @param positions of the block, shape (count)
 * @param at first place of the row to fill
 */
export function readForces(
  run: WaveRun,
  block: LiveBlock,
  positions: Int32Array,
  k: number,
  row: Float64Array,
  at: number,
): void {
  const { delay, cells } = block
  if (delay) {
    const { right, left } = delay.line
    for (let i = 0; i < positions.length; i++) {
      row[at + i] = right[k - positions[i] + cells] + left[k + positions[i]]
    }
    return
  }
  gradedKernel.enter(run.graded)
  positions.forEach((position, i) => {
    row[at + i] = readGraded(run, block, position, k)
  })
}

function readGraded(run: WaveRun, block: LiveBlock, position: number, k: number): number {
  const { left, right, cells } = block
  if (position === 0) return left.arriving[k] + left.leaving[k]
  if (position === cells) return right.arriving[k] + right.leaving[k]
  const opened = run.breaks.length > 0 && run.stretches.find((s) => s.block === block && s.start === position)
  return opened ? opened.left.arriving[k] + opened.left.leaving[k] : evaluateInner(block, position)
}

/**
 * Force inside a graded block after its latest step, from the waves that left the node:
 * `F = 2 (Z1 f + Z2 g)/(Z1 + Z2)`.
 */
function evaluateInner(block: LiveBlock, position: number): number {
  const i = block.slot + position
  const Z1 = block.impedance[position - 1]
  const Z2 = block.impedance[position]
  return (2 * (Z1 * gradedKernel.f[i] + Z2 * gradedKernel.g[i - 1])) / (Z1 + Z2)
}

/** Largest tension and compression of a block at each position, with the steps, shape (cells + 1). */
export function readExtremes(run: WaveRun, block: LiveBlock): SpanExtremes {
  const narrow = (values: Float64Array) => values.map((value) => value / WIDENING)
  if (block.delay) {
    const { tension, compression } = block.delay.envelope
    return {
      high: narrow(tension.peak),
      low: narrow(compression.peak).map((value) => 0 - value),
      highStep: tension.step,
      lowStep: compression.step,
    }
  }
  gradedKernel.enter(run.graded)
  const { high, low, highStep, lowStep } = gradedKernel
  const cut = <A extends Float64Array | Int32Array>(array: A) =>
    array.slice(block.slot, block.slot + block.cells + 1) as A
  return { high: narrow(cut(high)), low: narrow(cut(low)), highStep: cut(highStep), lowStep: cut(lowStep) }
}

/**
 * Force and velocity (falling frame) at a position of a block over the whole run, shape (steps + 1).
 * An inner position of a graded block must have a probe.
 */
export function readTrace(run: WaveRun, block: LiveBlock, position: number): SpanTrace {
  const probe = block.probes.find((one) => one.position === position)
  if (probe) return probe
  const count = run.line.steps + 1
  const force = new Float64Array(count)
  const velocity = new Float64Array(count)
  const { cells: n, delay } = block
  if (delay) {
    const { right, left } = delay.line
    const Y = 1 / block.impedance[0]
    for (let k = 0; k < count; k++) {
      const f = right[k - position + n]
      const g = left[k + position]
      force[k] = f + g
      velocity[k] = (g - f) * Y
    }
  } else {
    const { arriving, leaving, impedance } = position === 0 ? block.left : block.right
    const Y = (position === 0 ? 1 : -1) / impedance
    for (let k = 0; k < count; k++) {
      force[k] = arriving[k] + leaving[k]
      velocity[k] = (arriving[k] - leaving[k]) * Y
    }
  }
  return { force, velocity }
}
