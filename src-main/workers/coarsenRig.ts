import type { Rig } from '../contract/rig'

/** Cells along the line, and steps of the run, that a quick answer is cut into, about. */
const CELLS = 120
const STEPS = 4000

/**
 * Makes a rig that is solved at once: coarse cells, one method, no second run to watch for fatigue.
 *
 * It is solved by characteristics, unless the rig asks for elements alone: their laws may be the point.
 *
 * @param rig - a checked rig
 * @returns the same rig with a coarser run; its own cell where that is coarser still
 */
export function coarsenRig(rig: Rig): Rig {
  const sections = rig.bars.flatMap((bar) => bar.sections)
  const speeds = sections.map(({ material }) => Math.sqrt(material.modulus / material.density))
  const fastest = Math.max(...speeds)
  const travelTime = sections.reduce((sum, { length }, i) => sum + length / speeds[i], 0)
  const own = rig.run.cell ?? rig.run.timeStep! * fastest
  const cell = Math.max(own, (travelTime * fastest) / CELLS, (rig.run.duration * fastest) / STEPS)
  return {
    ...rig,
    bars: rig.bars.map((bar) => ({
      ...bar,
      sections: bar.sections.map((section) => ({
        ...section,
        material: { ...section.material, fatigue: null },
      })),
    })),
    run: {
      ...rig.run,
      cell,
      timeStep: null,
      method: rig.run.method === 'elements' ? 'elements' : 'characteristics',
    },
  }
}
