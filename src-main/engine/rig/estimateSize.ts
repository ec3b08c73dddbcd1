import type { Rig, Section } from '../../contract/rig'
import { estimateTimeStep, evaluateSectionSpeed } from './estimateTimeStep'

/** What a solve will need, before anything is made. */
export interface SizeEstimate {
  cells: number
  /** Of its longest run. */
  steps: number
  /** [byte] */
  memory: number
}

const NUMBER = 8
/** Numbers per step of a gauge: histories of two positions, its trace, its table. */
const PER_GAUGE = 16
/** Of a joint or an end: both sides' force and velocity, as they are read. */
const PER_NODE = 4
/** Of a uniform section by characteristics: its two waves. */
const PER_DELAY = 2
/** Of a taper, or of any section that may come apart: the waves at both of its faces. */
const PER_GRADED = 4
/** Breaks of a run with spall for whose faces room is kept. */
const BREAKS = 16
/** Places that a run for fatigue watches in each bar. */
const WATCHED = 4
/** Of all else over the run. */
const PER_RUN = 8
/** Numbers per cell of either method: state, extremes and geometry. */
const PER_CELL = 24

/** As `makeElementLine` sets the step: damping of its bulk viscosity, and share kept with finite strain. */
const LINEAR_BULK = 0.06
const FINITE_STRAIN_SHARE = 0.7

/**
 * Estimates cells, steps and memory of a solve: of the runs that the method asks for (`both` makes one
 * of each), and of one more where a material has a fatigue line. Each section takes `length / (c dt)`
 * cells, at least one; the step of elements follows the shortest element and its damping.
 *
 * @param rig checked
 */
export function estimateSize(rig: Rig): SizeEstimate {
  const sections = rig.bars.flatMap((bar) => bar.sections)
  const timeStep = estimateTimeStep(rig.run, sections)
  const counts = sections.map((section) =>
    Math.max(1, section.length / (evaluateSectionSpeed(section) * timeStep)),
  )
  const cells = counts.reduce((a, b) => a + b, 0)
  const waveSteps = rig.run.duration / timeStep
  const elementSteps = rig.run.duration / estimateElementStep(rig, sections, counts)

  const { method } = rig.run
  const watched = sections.some(({ material }) => material.fatigue !== null)
  const waves = { steps: waveSteps, perStep: countOfWaves(rig, sections) }
  const elements = { steps: elementSteps, perStep: PER_NODE * rig.bars.length }
  const runs = method === 'both' ? [waves, elements] : [method === 'elements' ? elements : waves]
  if (watched) runs.push({ ...runs[0], perStep: runs[0].perStep + 2 * WATCHED * rig.bars.length })

  const shared = PER_GAUGE * rig.gauges.length + PER_NODE * (rig.joints.length + 2) + PER_RUN
  const numbers = runs.map(({ steps, perStep }) => (perStep + shared) * steps + PER_CELL * cells)
  return {
    cells,
    steps: Math.max(...runs.map(({ steps }) => steps)),
    memory: NUMBER * numbers.reduce((a, b) => a + b, 0),
  }
}

/** Numbers per step that the waves of a run by characteristics take. */
function countOfWaves({ run }: Rig, sections: readonly Section[]): number {
  const graded = sections.filter(
    ({ shape, material }) => !shape.uniform || (run.spall && material.spall !== null),
  ).length
  const breaks = run.spall ? PER_GRADED * BREAKS : 0
  return PER_DELAY * (sections.length - graded) + PER_GRADED * graded + breaks
}

/** dt = h/c (sqrt(1 + xi^2) - xi) of the element with the least, xi the damping ratio of its highest mode [s]. */
function estimateElementStep({ run }: Rig, sections: readonly Section[], counts: readonly number[]): number {
  const steps = sections.map((section, i) => {
    const { material, length } = section
    const c = evaluateSectionSpeed(section)
    const h = length / Math.max(1, Math.round(counts[i]))
    const viscous = ((material.viscosity ?? 0) * c) / (material.modulus * h)
    const xi = viscous + (run.bulkViscosity ? LINEAR_BULK : 0)
    return (h / c) * (Math.sqrt(1 + xi * xi) - xi)
  })
  return steps.reduce((a, b) => Math.min(a, b), Infinity) * (run.finiteStrain ? FINITE_STRAIN_SHARE : 1)
}
