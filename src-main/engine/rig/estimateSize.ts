import type { Rig } from '../../contract/rig'

/** What a run will need, before anything is made. */
export interface SizeEstimate {
  cells: number
  steps: number
  /** [byte] */
  memory: number
}

const NUMBER = 8
/** Records over time of a gauge, a joint and the whole line: numbers per step. */
const PER_GAUGE = 8
const PER_JOINT = 2
const PER_RUN = 8

/**
 * Estimates cells, steps and memory of a run. The time step is the given one, or the time in which
 * the fastest wave passes the wanted cell; each section takes `length / (c dt)` cells, at least one.
 * A uniform section keeps both of its waves for every step, a taper two waves and its extremes for
 * every cell.
 * @param rig checked
 */
export function estimateSize(rig: Rig): SizeEstimate {
  const sections = rig.bars.flatMap((bar) => bar.sections)
  const speeds = sections.map(({ material }) => Math.sqrt(material.modulus / material.density))
  const fastest = speeds.reduce((a, b) => Math.max(a, b), 0)
  const timeStep = rig.run.timeStep ?? (rig.run.cell ?? Infinity) / fastest
  const counts = sections.map(({ length }, i) => Math.max(1, length / (speeds[i] * timeStep)))
  const cells = counts.reduce((a, b) => a + b, 0)
  const steps = rig.run.duration / timeStep
  const uniform = sections.filter(({ shape }) => shape.uniform).length
  const perStep = 2 * uniform + PER_GAUGE * rig.gauges.length + PER_JOINT * rig.joints.length + PER_RUN
  const memory = NUMBER * (perStep * steps + 16 * cells)
  return { cells, steps, memory }
}
