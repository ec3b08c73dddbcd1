import { describe, expect, it } from 'vitest'
import type { Section } from '../../src-main/contract/rig'
import { answerTapers } from '../../src-main/engine/answers/answerTapers'
import { evaluateConeStep } from '../../src-main/engine/exact/evaluateConeStep'
import {
  CONE_STEP,
  CONE_STEP_LATE,
  CONE_TRANSMISSION,
  EQUAL_STEPS,
} from '../../src-main/engine/exact/published/taperTables'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection } from '../unit/engine/testRig'
import { expectNear } from './expectNear'
import { findWorst } from './findWorst'

const DT = 1e-6
const AREA = 1e-3
const ofCells = (cells: number, area: number | ((s: number) => number)): Section =>
  makeSection(cells * 5000 * DT, area)
const cone = (cells: number, R: number): Section => ofCells(cells, (s) => AREA * (1 + (R - 1) * s) ** 2)
/** The same cone from its large end, scaled to start with the same area. */
const contracting = (cells: number, R: number): Section =>
  ofCells(cells, (s) => (AREA * (R - (R - 1) * s) ** 2) / R ** 2)

/**
 * Sends a unit step that lasts for ever (a bar under way that is matched to one without end) through a middle
 * part into a bar without end.
 *
 * @returns force over the incident one behind the middle part, from the step at which the front leaves it
 */
function marchStep(middle: Section[], cells: number, steps: number): Float64Array {
  const [first, last] = [middle[0], middle[middle.length - 1]]
  const before = makeBar('before', [ofCells(10, first.shape.area(0))], {
    preload: -4e7 * first.shape.area(0),
    uniformVelocity: 1,
  })
  const after = makeBar('after', [...middle, ofCells(10, last.shape.area(1))])
  const at = middle.reduce((sum, { length }) => sum + length, 0) + 5 * 5000 * DT
  const rig = makeRig(
    [before, after],
    { duration: (cells + 5 + steps) * DT, timeStep: DT },
    {
      leftEnd: { kind: 'matched' },
      rightEnd: { kind: 'matched' },
      joints: [{ kind: 'bonded' }],
      gauges: [{ name: 'G', bar: 1, at, bridge: null }],
    },
  )
  const { record } = marchRig(rig)
  const force = record.gauges[0].force.map((F) => F / (-4e7 * first.shape.area(0)))
  expect(findWorst(force.slice(0, cells + 5))).toBe(0)
  return force.slice(cells + 5)
}

/**
 * Between two even steps after the front the force stays, and stands for the odd step in their middle: there
 * it is exact to second order. In between by the line through two of them, at the front by its extension.
 */
function readAt(force: Float64Array, step: number): number {
  const i = 2 * Math.min(Math.floor(force.length / 2) - 2, Math.max(0, Math.floor((step - 1) / 2)))
  return force[i] + ((force[i + 2] - force[i]) * (step - (i + 1))) / 2
}

describe(`marched, ${CONE_STEP.label}: ${CONE_STEP.source}`, () => {
  const CELLS = 400
  /** Second order: 1.5e-5 of the incident force at the front for R = 3 on 400 cells, less elsewhere. */
  const SECOND_ORDER = 2e-5
  const radii = [Math.SQRT2, 2, 3]
  const grown = radii.map((R) => marchStep([cone(CELLS, R)], CELLS, 2 * CELLS - 1))
  const shrunk = radii.map((R) => marchStep([contracting(CELLS, R)], CELLS, 2 * CELLS - 1))

  it.each(CONE_STEP.rows)('growing, tau = %d', (tau, ...printed) => {
    printed.forEach((value, i) => expectNear(readAt(grown[i], tau * CELLS), value, SECOND_ORDER))
  })

  it.each(CONE_STEP.rows)('contracting, tau = %d: the same bracket over R', (tau, ...printed) => {
    printed.forEach((value, i) => {
      expectNear(readAt(shrunk[i], tau * CELLS), value / radii[i] ** 2, SECOND_ORDER)
      expectNear(value / radii[i] ** 2, evaluateConeStep(radii[i], tau, 'contracting'), 1e-8)
    })
  })

  it('the front is R, not that of the plain step', () => {
    radii.forEach((R, i) => {
      expectNear(readAt(grown[i], 0), R, SECOND_ORDER)
      expectNear(readAt(shrunk[i], 0), 1 / R, SECOND_ORDER)
    })
  })

  it('and every step between follows the closed form', () => {
    radii.forEach((R, i) => {
      const miss = grown[i]
        .slice(0, 2 * CELLS - 2)
        .map((F, k) => (k % 2 === 0 ? F - evaluateConeStep(R, (k + 1) / CELLS, 'growing') : 0))
      expectNear(findWorst(miss), 0, SECOND_ORDER)
    })
  })
})

describe(`marched, ${CONE_STEP_LATE.label}: ${CONE_STEP_LATE.source}`, () => {
  const CELLS = 100
  const late = new Map([2, 3].map((R) => [R, marchStep([cone(CELLS, R)], CELLS, 10.1 * CELLS)]))

  it.each(CONE_STEP_LATE.rows)('R = %d, tau = %d', (R, tau, printed) => {
    // Printed to five decimals; second order on 100 cells leaves up to 4e-5.
    expectNear(readAt(late.get(R)!, tau * CELLS), printed, 5e-5)
  })

  it('comes to that of the plain step, 2 A2/(A1 + A2)', () => {
    for (const R of [2, 3]) expectNear(readAt(late.get(R)!, 10 * CELLS), (2 * R * R) / (1 + R * R), 1e-4)
  })
})

/** Amplitude of the part of a signal at angular frequency w, from a whole number of periods at its end. */
function fitAmplitude(signal: Float64Array, w: number, periods: number): number {
  const count = Math.round((periods * 2 * Math.PI) / w)
  const from = signal.length - count
  let [cc, cs, ss, c1, s1] = [0, 0, 0, 0, 0]
  for (let k = from; k < signal.length; k++) {
    const [c, s] = [Math.cos(w * k), Math.sin(w * k)]
    cc += c * c
    cs += c * s
    ss += s * s
    c1 += c * signal[k]
    s1 += s * signal[k]
  }
  const determinant = cc * ss - cs * cs
  return Math.hypot(c1 * ss - s1 * cs, s1 * cc - c1 * cs) / determinant
}

/**
 * Sends a long sine over a cone between two bars and reads the amplitudes that pass and come back.
 * The incident bar is long enough that what comes back has not been turned round at its end.
 */
function marchSine(R: number, phase: number, cells: number) {
  const w = phase / cells
  const period = (2 * Math.PI) / w
  // The answer settles within a few transits of the cone, or of the wave where that is longer.
  const settle = Math.round(12 * cells + 2 * period)
  const steps = settle + Math.round(2 * period)
  const sections = [ofCells(steps, AREA), cone(cells, R), ofCells(20, AREA * R * R)]
  const places = [steps - 10, steps + cells + 10]
  const rig = makeRig(
    [makeBar('bar', sections)],
    { duration: 2 * steps * DT, timeStep: DT },
    {
      leftEnd: { kind: 'force', pulse: makePulse((t) => -Math.sin((w * t) / DT)) },
      rightEnd: { kind: 'matched' },
      gauges: places.map((place, i) => ({ name: `G${i}`, bar: 0, at: place * 5000 * DT, bridge: null })),
    },
  )
  const [before, after] = marchRig(rig).record.gauges
  return {
    reflected: fitAmplitude(before.leftgoing, w, 2),
    transmitted: fitAmplitude(after.rightgoing, w, 2),
  }
}

describe(`marched sines, ${CONE_TRANSMISSION.label}: ${CONE_TRANSMISSION.source}`, () => {
  const radii = [Math.SQRT2, 2, 3]
  // Second order in the cell: extrapolated from 40 and 80 cells to the cone. At kL = 20 a cell of 1/80 is a
  // 25th of the wave, and 4e-4 is left of it.
  it.each(CONE_TRANSMISSION.rows.filter(([phase]) => phase >= 0.5))('kL = %d', (phase, ...printed) => {
    radii.forEach((R, i) => {
      const [coarse, fine] = [40, 80].map((cells) => marchSine(R, phase, cells))
      const passed = fine.transmitted + (fine.transmitted - coarse.transmitted) / 3
      expectNear(passed / printed[2 * i], 1, phase > 10 ? 4e-4 : 1e-4)
      expectNear(passed ** 2 / R ** 2, printed[2 * i + 1], phase > 10 ? 8e-4 : 2e-4)
      expectNear(fine.reflected ** 2 + fine.transmitted ** 2 / R ** 2, 1, 1e-4)
    })
  })

  it('agree with the answers of the taper at their own frequencies', () => {
    const cells = 80
    const R = 2
    const bar = makeBar('bar', [ofCells(20, AREA), cone(cells, R), ofCells(20, AREA * R * R)])
    const { line } = marchRig(makeRig([bar], { duration: DT, timeStep: DT }))
    const [answer] = answerTapers(line)
    for (const i of [14, 18, 25]) {
      const found = marchSine(R, 2 * Math.PI * answer.frequency[i] * answer.travelTime, cells)
      expectNear(found.transmitted / answer.transmittedForce[i], 1, 1e-3)
      expectNear(found.reflected, answer.reflectedForce[i], 1e-3)
    }
  })
})

describe(`marched, ${EQUAL_STEPS.label}: ${EQUAL_STEPS.source}`, () => {
  it.each(EQUAL_STEPS.rows)('A2/A1 = %d in %d steps', (ratio, steps, front) => {
    const q = ratio ** (1 / steps)
    // The first section is the bar before the steps, the last one the bar after them.
    const middle = Array.from({ length: steps + 1 }, (_, i) => ofCells(3, AREA * q ** i))
    const [found] = marchStep(middle, 3 * (steps + 1), 2)
    expectNear(found, front, 0.51e-8)
    expectNear(found / ((2 * q) / (1 + q)) ** steps, 1, 1e-13)
  })
})
