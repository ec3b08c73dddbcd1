import { describe, expect, it } from 'vitest'
import type { End, Joint, Material, Rig } from '../../src-main/contract/rig'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../unit/engine/testRig'
import { marchElementsAtCourant } from './elementsAtCourant'
import { evaluateOrders } from './evaluateOrders'
import { findWorst } from './findWorst'
import { solveHistory } from './solveHistory'

const C = 5000
const AREA = 1e-3
const Z = 4e7 * AREA
/** Travel time of a section [s]. */
const T = 1e-4
const LENGTH = C * T
/** Three quarters of the limit: the finest reference's steps are then a whole number to each of theirs. */
const COURANT = 0.75
const GRIDS = [20, 40, 80, 160]
const FINEST = 640

/** A pulse with three continuous derivatives, 1.2 travel times long, of 1 N. */
const smooth = (t: number) => (t > 0 && t < 1.2 * T ? Math.sin((Math.PI * t) / (1.2 * T)) ** 4 : 0)
const pull = makePulse((t) => -smooth(t))
const push = makePulse(smooth)

/** Expects order 2 within 10 % between every two of four grids. */
function expectSecondOrder(errors: number[]) {
  expect(errors).toHaveLength(4)
  for (const order of evaluateOrders(errors)) {
    expect(order, `${errors}`).toBeGreaterThan(1.8)
    expect(order, `${errors}`).toBeLessThan(2.2)
  }
}

describe('second order of elements under Courant one with a smooth pulse, over four grids', () => {
  it('two materials: transmitted, reflected, and taken by the matched end, against the exact ratios', () => {
    const soft: Material = { ...ROUND_STEEL, density: 2000, modulus: 12.5e9 }
    const softLength = 2500 * T
    const softZ = 2000 * 2500 * 2 * AREA
    const R = (softZ - Z) / (softZ + Z)
    const errors = GRIDS.map((cells) => {
      const rig = makeRig(
        [
          makeBar('bar', [
            makeSection(2 * LENGTH, AREA),
            makeSection(2 * softLength, 2 * AREA, { material: soft }),
          ]),
        ],
        { duration: 6 * T, timeStep: T / cells },
        {
          leftEnd: { kind: 'force', pulse: pull },
          rightEnd: { kind: 'matched' },
          gauges: [
            { name: 'before', bar: 0, at: LENGTH / 2, bridge: null },
            { name: 'after', bar: 0, at: 2 * LENGTH + softLength, bridge: null },
            { name: 'at', bar: 0, at: 2 * LENGTH, bridge: null },
          ],
        },
      )
      const { line, record } = marchElementsAtCourant(rig, COURANT)
      // What comes back to the driven end goes out again turned round.
      const exact = [
        (t: number) => smooth(t - 0.5 * T) + R * smooth(t - 3.5 * T) - R * smooth(t - 4.5 * T),
        (t: number) => (1 + R) * smooth(t - 3 * T),
        (t: number) => (1 + R) * smooth(t - 2 * T),
      ]
      return Math.max(
        ...record.gauges.map(({ force }, i) => findWorst(force.map((F, k) => F - exact[i](k * line.dt)))),
      )
    })
    expect(errors[3]).toBeLessThan(1e-3)
    expectSecondOrder(errors)
  })

  it.each([
    ['cone', (s: number) => (1 + s) ** 2],
    ['exponential', (s: number) => 4 ** s],
    ['area-linear', (s: number) => 1 + 3 * s],
    ['contracting cone', (s: number) => (2 - s) ** 2],
  ])('%s, against 640 cells of the characteristics', (_name, area) => {
    const make = (cells: number) =>
      makeRig(
        [
          makeBar('bar', [
            makeSection(LENGTH, AREA * area(0)),
            makeSection(LENGTH, (s) => AREA * area(s)),
            makeSection(LENGTH, AREA * area(1)),
          ]),
        ],
        { duration: 6 * T, timeStep: T / cells },
        {
          leftEnd: { kind: 'force', pulse: pull },
          rightEnd: { kind: 'matched' },
          gauges: [0.5, 1.5, 2, 2.5].map((at) => ({ name: `${at}`, bar: 0, at: at * LENGTH, bridge: null })),
        },
      )
    const finest = marchRig(make(FINEST)).record.gauges
    const errors = GRIDS.map((cells) => {
      const { record } = marchElementsAtCourant(make(cells), COURANT)
      return Math.max(
        ...record.gauges.map(({ force }, i) => findWorst(missAt(force, cells, finest[i].force))),
      )
    })
    expectSecondOrder(errors)
  })
})

/** Distances from a reference kept at steps of T/640. */
function missAt(force: Float64Array, cells: number, reference: ArrayLike<number>): Float64Array {
  const pace = (COURANT * FINEST) / cells
  const within = force.subarray(0, Math.floor((reference.length - 1) / pace) + 1)
  return within.map((F, k) => F - reference[k * pace])
}

/** The pulse of compression runs on a node through a bar of one travel time; force there from its arrival on. */
function hitNode(cells: number, far: { joint: Joint; area: number } | { end: End }): Float64Array {
  const bars = [makeBar('bar', [makeSection(LENGTH, AREA)])]
  if ('joint' in far) bars.push(makeBar('next', [makeSection(LENGTH, far.area)]))
  const rig = makeRig(
    bars,
    { duration: 2.9 * T, timeStep: T / cells },
    {
      leftEnd: { kind: 'force', pulse: push },
      rightEnd: 'end' in far ? far.end : { kind: 'matched' },
      joints: 'joint' in far ? [far.joint] : [],
    },
  )
  const { record } = marchElementsAtCourant(rig, COURANT)
  return record.node(1)!.forceLeft
}

describe('second order of joints and ends of elements, against a Runge-Kutta reference', () => {
  const h = T / FINEST
  const count = Math.round(1.9 * FINEST)
  /** Velocity with which the bar's face would move if no force acted: 2 p/Z. */
  const arrive = (t: number) => (2 * smooth(t)) / Z
  const before = new Array<number>(FINEST).fill(0)

  function missReference(reference: number[], far: { joint: Joint; area: number } | { end: End }): number[] {
    return GRIDS.map((cells) => findWorst(missAt(hitNode(cells, far), cells, [...before, ...reference])))
  }

  it.each([
    [0, true, 0],
    [3e3, true, 0],
    [0, false, 0],
    [3e3, false, 0],
    [0, true, 0.4],
  ])('cushion with damping %d N s/m, pulling: %s, mass %d of the bar', (damping, tension, m) => {
    const K = (20 * Z) / T
    const half = (m * Z * T) / 2
    const Y = 1 / Z + 1 / (2 * Z)
    const force = (t: number, o: number) => (K * o - damping * arrive(t)) / (1 + damping * Y)
    const held = (t: number, o: number) => (tension || (o < 0 && force(t, o) < 0) ? force(t, o) : 0)
    const reference =
      half === 0
        ? solveHistory((t, [o]) => [-arrive(t) - Y * held(t, o)], [0], h, count).map(([o], k) =>
            held(k * h, o),
          )
        : // Force on the near bar's face: what arrives and what its face's velocity V1 takes from it.
          solveHistory(
            (t, [o, V1, V2]) => [
              V2 - V1,
              (Z * (arrive(t) - V1) + K * o) / half,
              (-K * o - 2 * Z * V2) / half,
            ],
            [0, 0, 0],
            h,
            count,
          ).map(([, V1], k) => -Z * (arrive(k * h) - V1))
    const joint: Joint = {
      kind: 'cushion',
      stiffness: K,
      curve: null,
      unloading: null,
      damping,
      mass: 2 * half,
      gap: 0,
      tension,
    }
    expectSecondOrder(missReference(reference, { joint, area: 2 * AREA }))
  })

  it('mass', () => {
    const mass = Z * T * 0.7
    const history = solveHistory((t, [V]) => [(Z * (arrive(t) - V)) / mass], [0], h, count)
    const reference = history.map(([V], k) => -Z * (arrive(k * h) - V))
    expectSecondOrder(
      missReference(reference, { end: { kind: 'mass', mass, velocity: 0, joint: 'bonded', gap: 0 } }),
    )
  })

  it.each([
    [0, 0],
    [0, 0.5],
    [0.4, 0],
    [0.4, 0.5],
  ])('support with mass %d and damping %d of the bar', (m, d) => {
    const [mass, damping, K] = [m * Z * T, d * Z, (3 * Z) / T]
    const velocity = (t: number, V: number, S: number) => (mass > 0 ? V : (Z * arrive(t) - S) / (Z + damping))
    const history = solveHistory(
      (t, [V, S]) => [mass > 0 ? (Z * (arrive(t) - V) - S - damping * V) / mass : 0, K * velocity(t, V, S)],
      [0, 0],
      h,
      count,
    )
    const reference = history.map(([V, S], k) => -Z * (arrive(k * h) - velocity(k * h, V, S)))
    const end: End = { kind: 'support', stiffness: K, damping, mass, joint: 'bonded', gap: 0 }
    expectSecondOrder(missReference(reference, { end }))
  })
})

describe('order of the further laws with a smooth pulse, four grids against a finer one', () => {
  /** Distances of the force at two gauges from that on the finest grid, over the peak. */
  function missFinest(
    setup: { peak: number; material?: Partial<Material>; run?: Partial<Rig['run']> },
    grids: number[],
    finest: number,
    measure: (miss: Float64Array) => number,
  ): number[] {
    const run = (cells: number) => {
      const material = { ...ROUND_STEEL, ...setup.material }
      const rig = makeRig(
        [makeBar('bar', [makeSection(2 * LENGTH, AREA, { material })])],
        { duration: 1.9 * T, timeStep: T / cells },
        {
          leftEnd: { kind: 'force', pulse: makePulse((t) => setup.peak * smooth(t)) },
          rightEnd: { kind: 'matched' },
          gauges: [0.25, 0.5].map((at) => ({ name: `${at}`, bar: 0, at: at * LENGTH, bridge: null })),
        },
      )
      const { line, record } = marchElementsAtCourant({ ...rig, run: { ...rig.run, ...setup.run } }, 1)
      return { dt: line.dt, forces: record.gauges.map(({ force }) => force) }
    }
    const reference = run(finest)
    return grids.map((cells) => {
      const { dt, forces } = run(cells)
      const misses = forces.map((force, i) => {
        const there = reference.forces[i]
        return measure(
          force.map((F, k) => {
            const at = Math.min((k * dt) / reference.dt, there.length - 1)
            const low = Math.min(Math.floor(at), there.length - 2)
            return F - there[low] - (at - low) * (there[low + 1] - there[low])
          }),
        )
      })
      return Math.max(...misses) / setup.peak
    })
  }
  const mean = (miss: Float64Array) => miss.reduce((sum, value) => sum + Math.abs(value), 0) / miss.length
  const COARSE = [12, 24, 48, 96]

  it('finite strain, compression of 5 %: second', () => {
    const setup = { peak: 0.05 * 200e9 * AREA, run: { finiteStrain: true } }
    expectSecondOrder(missFinest(setup, COARSE, 480, findWorst))
  })

  it('finite strain under tension: second', () => {
    const setup = { peak: -0.03 * 200e9 * AREA, run: { finiteStrain: true } }
    expectSecondOrder(missFinest(setup, COARSE, 480, findWorst))
  })

  it('Kelvin-Voigt: between first and second, its stress being that of half a step before', () => {
    const errors = missFinest({ peak: 1, material: { viscosity: 5e4 } }, COARSE, 480, findWorst)
    for (const order of evaluateOrders(errors)) {
      expect(order, `${errors}`).toBeGreaterThan(1.5)
      expect(order, `${errors}`).toBeLessThan(2.3)
    }
  })

  it('bulk viscosity: first, since it is a share of rho c h', () => {
    const errors = missFinest({ peak: 1, run: { bulkViscosity: true } }, COARSE, 480, findWorst)
    for (const order of evaluateOrders(errors)) {
      expect(order, `${errors}`).toBeGreaterThan(0.9)
      expect(order, `${errors}`).toBeLessThan(1.5)
    }
  })

  it.each(['isotropic', 'kinematic'] as const)(
    'plasticity, %s: about first in the mean, since the stress has a jump of slope where it yields',
    (hardeningRule) => {
      const material: Partial<Material> = { yield: 400e6, hardening: 50e9, hardeningRule }
      const errors = missFinest({ peak: 700e6 * AREA, material }, GRIDS, FINEST, mean)
      expect(errors[3]).toBeLessThan(5e-3)
      // Over all four grids: where in a cell a front stands changes from one to the next.
      const order = Math.log(errors[0] / errors[3]) / Math.log(8)
      expect(order, `${errors}`).toBeGreaterThan(0.8)
      expect(order, `${errors}`).toBeLessThan(1.5)
    },
  )
})
