import type { Bar, Section } from '../../contract/rig'
import { evaluateImpedance } from './evaluateImpedance'
import { evaluateTravelTime } from './evaluateTravelTime'
import { isJump } from './isJump'

/** Sections `first`..`last` of a bar that lie between the first and the last step of a run. */
export interface StepRun {
  first: number
  last: number
}

/** A step is small up to this ratio of impedances. */
const SMALL_STEP = 2
/** A section is short up to this share of its bar's travel time. */
const SHORT = 0.1

/**
 * The runs of small steps in a bar, which act on long pulses as a taper does.
 *
 * A run is a row of at least two neighbouring steps that all go the same way, each changing the
 * impedance by a factor of at most 2, with a uniform section between one step and the next that takes
 * at most a tenth of the bar's travel time. Runs are as long as they can be.
 *
 * @param bar the bar
 * @returns the runs from left to right
 */
export function listStepRuns(bar: Bar): StepRun[] {
  const { sections } = bar
  const times = sections.map(evaluateTravelTime)
  const longest = SHORT * (1 + 1e-9) * times.reduce((sum, time) => sum + time, 0)
  const ways = sections.slice(1).map((section, i) => evaluateWay(sections[i], section))
  const runs: StepRun[] = []
  for (let first = 0; first < ways.length;) {
    let last = first
    while (
      ways[first] !== 0 &&
      ways[last + 1] === ways[first] &&
      sections[last + 1].shape.uniform &&
      times[last + 1] <= longest
    )
      last++
    if (last > first) runs.push({ first: first + 1, last })
    first = last + 1
  }
  return runs
}

/** +1 for a small step up, -1 for one down, 0 for no step or a large one. */
function evaluateWay(left: Section, right: Section): number {
  const before = evaluateImpedance(left, 1)
  const after = evaluateImpedance(right, 0)
  if (!isJump(before, after) || Math.max(before / after, after / before) > SMALL_STEP * (1 + 1e-9)) return 0
  return Math.sign(after - before)
}
