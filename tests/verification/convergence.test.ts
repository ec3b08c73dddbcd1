import { describe, expect, it } from 'vitest'
import type { End, Joint } from '../../src-main/contract/rig'
import { solveMassOnFixedBar } from '../../src-main/engine/exact/solveMassOnFixedBar'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection } from '../unit/engine/testRig'
import { evaluateOrders } from './evaluateOrders'
import { findWorst } from './findWorst'
import { solveHistory } from './solveHistory'

const C = 5000
const AREA = 1e-3
const Z = 4e7 * AREA
/** Travel time of the taper, or of the bar before a joint [s]. */
const T = 1e-4
const LENGTH = C * T

/** A pulse with three continuous derivatives, 1.2 travel times long, of 1 N. */
const smooth = (t: number) => (t > 0 && t < 1.2 * T ? Math.sin((Math.PI * t) / (1.2 * T)) ** 4 : 0)

/** Expects order 2 within 10 % between every two of four grids. */
function expectSecondOrder(errors: number[]) {
  expect(errors).toHaveLength(4)
  for (const order of evaluateOrders(errors)) {
    expect(order, `${errors}`).toBeGreaterThan(1.8)
    expect(order, `${errors}`).toBeLessThan(2.2)
  }
}

/** Force of the smooth pulse behind a taper at every step since its front may have arrived. */
function passTaper(area: (s: number) => number, cells: number): Float64Array {
  const dt = T / cells
  const sections = [
    makeSection(2 * LENGTH, AREA * area(0)),
    makeSection(LENGTH, (s) => AREA * area(s)),
    makeSection(LENGTH, AREA * area(1)),
  ]
  const rig = makeRig(
    [makeBar('bar', sections)],
    { duration: 6 * T, timeStep: dt },
    {
      leftEnd: { kind: 'force', pulse: makePulse((t) => -smooth(t)) },
      rightEnd: { kind: 'matched' },
      gauges: [{ name: 'G', bar: 0, at: 4 * LENGTH, bridge: null }],
    },
  )
  return marchRig(rig).record.gauges[0].force.slice(4 * cells)
}

const GRIDS = [20, 40, 80, 160]

describe('second order of tapers with a smooth pulse, over four grids', () => {
  it('a cone against the convolution with its exact step response', () => {
    const R = 2
    const [s1, s2] = [(R - 1) / 2, (R - 1) / (2 * R)]
    /** F_T = R p + integral of p(t - s) h'(s), h the exact response to a step, by Simpson's rule. */
    const exact = (t: number) => {
      const slope = (tau: number) =>
        ((R / (R + 1)) * (-s1 * R * Math.exp(-s1 * tau) + s2 * Math.exp(s2 * tau))) / T
      const panels = 400
      let sum = 0
      for (let i = 0; i <= panels; i++) {
        const weight = i === 0 || i === panels ? 1 : i % 2 === 0 ? 2 : 4
        sum += weight * smooth(t - (i * t) / panels) * slope((i * t) / panels / T)
      }
      return R * smooth(t) + ((t / panels) * sum) / 3
    }
    const errors = GRIDS.map((cells) =>
      findWorst(passTaper((s) => (1 + (R - 1) * s) ** 2, cells).map((F, k) => F - exact((k * T) / cells))),
    )
    expect(errors[0]).toBeLessThan(0.01)
    expectSecondOrder(errors)
  })

  it.each([
    ['exponential', (s: number) => 4 ** s],
    ['area-linear', (s: number) => 1 + 3 * s],
    ['contracting cone', (s: number) => (2 - s) ** 2],
    ['waist', (s: number) => 1 - 0.6 * Math.sin(Math.PI * s) ** 2],
  ])('%s, against 1280 cells', (_name, area) => {
    const finest = passTaper(area, 1280)
    const errors = GRIDS.map((cells) =>
      findWorst(passTaper(area, cells).map((F, k) => F - finest[(k * 1280) / cells])),
    )
    expectSecondOrder(errors)
  })
})

/** Force at a node at every step, when the smooth pulse of compression runs on it through a bar. */
function hitNode(cells: number, far: { joint: Joint; area: number } | { end: End }): Float64Array {
  const bars = [makeBar('bar', [makeSection(LENGTH, AREA)])]
  if ('joint' in far) bars.push(makeBar('next', [makeSection(LENGTH, far.area)]))
  const rig = makeRig(
    bars,
    { duration: 2.9 * T, timeStep: T / cells },
    {
      leftEnd: { kind: 'force', pulse: makePulse((t) => smooth(t)) },
      rightEnd: 'end' in far ? far.end : { kind: 'matched' },
      joints: 'joint' in far ? [far.joint] : [],
    },
  )
  return marchRig(rig).record.node(1)!.forceLeft.slice(cells)
}

/** Errors of the force, the largest or another measure, on four grids against a reference at equal steps of T/1280. */
const missReference = (
  reference: number[],
  march: (cells: number) => Float64Array,
  measure: (miss: Float64Array) => number = findWorst,
) => GRIDS.map((cells) => measure(march(cells).map((F, k) => F - reference[(k * 1280) / cells])))

describe('second order of joints and ends with a smooth pulse, against a Runge-Kutta reference', () => {
  const h = T / 1280
  const count = Math.round(1.9 * 1280)
  /** Velocity with which the bar's face would move if no force acted: 2 p/Z. */
  const push = (t: number) => (2 * smooth(t)) / Z

  it.each([
    [0, true, 0],
    [3e3, true, 0],
    [0, false, 0],
    [3e3, false, 0],
  ])('cushion with damping %d N s/m, pulling: %s', (damping, tension) => {
    expectSecondOrder(missCushion(damping, tension, 0, findWorst))
  })

  it('cushion whose gap closes and opens: its force has kinks, so the mean error is looked at', () => {
    const mean = (miss: Float64Array) => miss.reduce((sum, value) => sum + Math.abs(value), 0) / miss.length
    const errors = missCushion(0, false, 3e-10, mean)
    // Where in a step the kinks fall changes from grid to grid, and with it the constant.
    expect(Math.log(errors[0] / errors[3]) / Math.log(8)).toBeGreaterThan(1.8)
  })

  function missCushion(
    damping: number,
    tension: boolean,
    gap: number,
    measure: (miss: Float64Array) => number,
  ): number[] {
    const area = 2 * AREA
    const K = (20 * Z) / T
    const Y = 1 / Z + 1 / (2 * Z)
    const force = (t: number, o: number) => (K * o - damping * push(t)) / (1 + damping * Y)
    const held = (t: number, o: number) => (tension || (o < 0 && force(t, o) < 0) ? force(t, o) : 0)
    const history = solveHistory((t, [o]) => [-push(t) - Y * held(t, o)], [gap], h, count)
    const reference = history.map(([o], k) => held(k * h, o))
    const joint: Joint = {
      kind: 'cushion',
      stiffness: K,
      curve: null,
      unloading: null,
      damping,
      mass: 0,
      gap,
      tension,
    }
    return missReference(reference, (cells) => hitNode(cells, { joint, area }), measure)
  }

  it('mass', () => {
    const mass = Z * T * 0.7
    const history = solveHistory((t, [V]) => [(Z * (push(t) - V)) / mass], [0], h, count)
    const reference = history.map(([V], k) => -Z * (push(k * h) - V))
    const end: End = { kind: 'mass', mass, velocity: 0, joint: 'bonded', gap: 0 }
    expectSecondOrder(missReference(reference, (cells) => hitNode(cells, { end })))
  })

  it.each([
    [0, 0],
    [0, 0.5],
    [0.4, 0],
    [0.4, 0.5],
  ])('support with mass %d and damping %d of the bar', (m, d) => {
    const [mass, damping, K] = [m * Z * T, d * Z, (3 * Z) / T]
    const velocity = (t: number, V: number, S: number) => (mass > 0 ? V : (Z * push(t) - S) / (Z + damping))
    const history = solveHistory(
      (t, [V, S]) => [mass > 0 ? (Z * (push(t) - V) - S - damping * V) / mass : 0, K * velocity(t, V, S)],
      [0, 0],
      h,
      count,
    )
    const reference = history.map(([V, S], k) => -Z * (push(k * h) - velocity(k * h, V, S)))
    const end: End = { kind: 'support', stiffness: K, damping, mass, joint: 'bonded', gap: 0 }
    expectSecondOrder(missReference(reference, (cells) => hitNode(cells, { end })))
  })

  it('a struck mass, in the middles of the steps, against the exact polynomials', () => {
    const alpha = 0.5
    const exact = solveMassOnFixedBar(alpha)
    const errors = GRIDS.map((cells) => {
      const end: End = { kind: 'mass', mass: (Z * T) / alpha, velocity: 1, joint: 'contact', gap: 0 }
      const rig = makeRig(
        [makeBar('bar', [makeSection(LENGTH, AREA)])],
        { duration: 4.6 * T, timeStep: T / cells },
        { leftEnd: end, rightEnd: { kind: 'fixed' } },
      )
      const { forceLeft } = marchRig(rig).record.node(0)!
      return findWorst(forceLeft.map((F, k) => -F / Z - exact.stress((k + 0.5) / cells)))
    })
    expectSecondOrder(errors)
  })
})
