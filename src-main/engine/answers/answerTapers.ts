import type { TaperAnswer } from '../../contract/result'
import type { Section } from '../../contract/rig'
import type { Line } from '../line/line'
import { evaluateChain } from './harmonic/evaluateChain'
import { evaluateHarmonicRatios } from './harmonic/evaluateHarmonicRatios'
import { solveSectionMatrices } from './harmonic/solveSectionMatrices'
import { evaluateImpedance } from './evaluateImpedance'
import { evaluateStepRatios } from './evaluateStepRatios'
import { evaluateTravelTime } from './evaluateTravelTime'
import { listStepRuns } from './listStepRuns'

/** kL at which a taper is asked: 15 points by equal ratios to 1, 45 by equal differences to 20. */
const PHASES = [
  ...Array.from({ length: 15 }, (_, i) => 0.05 ** (1 - i / 14)),
  ...Array.from({ length: 45 }, (_, i) => 1 + (19 * (i + 1)) / 45),
]

/**
 * What every taper, and every run of small steps (`listStepRuns`), does to a pulse from the left.
 *
 *     short pulse: sqrt(Z2/Z1) passes a smooth taper and nothing comes back from it; through steps,
 *                  the product of their transmissions, and what the first one reflects comes back first
 *     long pulse:  the plain step from the impedance before to the impedance after
 *     harmonic:    transfer matrices, exact for cones and exponentials
 *
 * Before and after are the neighbouring sections of the same bar at their faces; where the bar ends, the
 * taper's own end. A jump at a taper's face counts as a step in all three. Energy share and harmonic
 * magnitudes do not depend on the side; the force that passes from the right is that from the left
 * times Z_before/Z_after. Source of the limits: check by the exact cone (`exact/coneStep`).
 *
 * @param line the cut line
 * @returns the answers from left to right, kL from 0.05 to 20 with kL = w (travel time) [Hz]
 */
export function answerTapers(line: Line): TaperAnswer[] {
  return line.rig.bars.flatMap((bar, b) => {
    const { sections } = bar
    const places = evaluatePlaces(sections, line.bars[b].from)
    const tapers = sections.flatMap(({ shape }, i) => (shape.uniform ? [] : [{ first: i, last: i }]))
    return [...tapers, ...listStepRuns(bar)]
      .sort((one, other) => one.first - other.first)
      .map(({ first, last }) => {
        const name = first === last ? `${bar.name} ${first + 1}` : `${bar.name} ${first + 1} to ${last + 1}`
        return { name, from: places[first], to: places[last + 1], ...evaluateTaper(sections, first, last) }
      })
  })
}

function evaluatePlaces(sections: Section[], from: number): number[] {
  const places = [from]
  for (const { length } of sections) places.push(places[places.length - 1] + length)
  return places
}

function evaluateTaper(
  sections: Section[],
  first: number,
  last: number,
): Omit<TaperAnswer, 'name' | 'from' | 'to'> {
  const inner = sections.slice(first, last + 1)
  const before = sections[first - 1]
    ? evaluateImpedance(sections[first - 1], 1)
    : evaluateImpedance(inner[0], 0)
  const after = sections[last + 1]
    ? evaluateImpedance(sections[last + 1], 0)
    : evaluateImpedance(inner[inner.length - 1], 1)
  const times = inner.map(evaluateTravelTime)
  const travelTime = times.reduce((sum, time) => sum + time, 0)
  const matrices = inner
    .map((section, i) =>
      solveSectionMatrices(
        section,
        PHASES.map((phase) => (phase * times[i]) / travelTime),
      ),
    )
    .reduce((left, right) => left.map((matrix, i) => evaluateChain(matrix, right[i])))
  const ratios = matrices.map((matrix) => evaluateHarmonicRatios(matrix, before, after))
  const long = evaluateStepRatios(before, after, 1, 1)
  return {
    travelTime,
    shortPulse: evaluateShortPulse(inner, before, after),
    longPulse: { reflectedForce: long.reflectedForce, transmittedForce: long.transmittedForce },
    frequency: PHASES.map((phase) => phase / (2 * Math.PI * travelTime)),
    reflectedForce: ratios.map((each) => each.reflectedForce),
    transmittedForce: ratios.map((each) => each.transmittedForce),
    transmittedEnergy: ratios.map((each) => each.transmittedEnergy),
  }
}

function evaluateShortPulse(inner: Section[], before: number, after: number): TaperAnswer['shortPulse'] {
  let passed = 1
  let Z = before
  for (const section of inner) {
    const [left, right] = [evaluateImpedance(section, 0), evaluateImpedance(section, 1)]
    passed *= evaluateStepRatios(Z, left, 1, 1).transmittedForce * Math.sqrt(right / left)
    Z = right
  }
  const firstFace = evaluateImpedance(inner[0], 0)
  return {
    reflectedForce: evaluateStepRatios(before, firstFace, 1, 1).reflectedForce,
    transmittedForce: passed * evaluateStepRatios(Z, after, 1, 1).transmittedForce,
  }
}
