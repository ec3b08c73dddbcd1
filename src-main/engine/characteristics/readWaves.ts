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
      const v = gi - fi + Z * frame
      kinetic += v * v
      strain += (fi + gi) * (fi + gi)
      momentum += gi - fi
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
 * Force at a position of a block at step k [N]. For a delay line any step marched so far; for the
 * inside of a graded block the latest step only.
 */
export function readForce(block: LiveBlock, position: number, k: number): number {
  const { delay, cells, left, right } = block
  if (delay) return delay.line.right[k - position + cells] + delay.line.left[k + position]
  if (position === 0) return left.arriving[k] + left.leaving[k]
  if (position === cells) return right.arriving[k] + right.leaving[k]
  return evaluateInner(block, position)
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
    const { envelope } = block.delay
    return { ...envelope, high: narrow(envelope.high), low: narrow(envelope.low) }
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
  const { cells: n, delay, impedance } = block
  const port = position === 0 ? block.left : block.right
  const Y = 1 / (delay ? impedance[0] : port.impedance)
  const sign = position === 0 ? 1 : -1
  for (let k = 0; k < count; k++) {
    if (delay) {
      const fk = delay.line.right[k - position + n]
      const gk = delay.line.left[k + position]
      force[k] = fk + gk
      velocity[k] = (gk - fk) * Y
    } else {
      force[k] = port.arriving[k] + port.leaving[k]
      velocity[k] = sign * (port.arriving[k] - port.leaving[k]) * Y
    }
  }
  return { force, velocity }
}
