import { describe, expect, it } from 'vitest'
import type { Joint, Rig } from '../../src-main/contract/rig'
import { compareMethods } from '../../src-main/engine/answers/compareMethods'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../unit/engine/testRig'
import { marchElementsAtCourant } from './elementsAtCourant'
import { evaluateOrders } from './evaluateOrders'

const C = 5000
const AREA = 1e-3
const Z = 4e7 * AREA
/** Travel time of a section [s]. */
const T = 1e-4
const LENGTH = C * T

/** 1.2 travel times long, of 10 kN. */
const push = makePulse((t) => (t > 0 && t < 1.2 * T ? 1e4 * Math.sin((Math.PI * t) / (1.2 * T)) ** 4 : 0))
const SHORT = 0.875 * LENGTH
const aluminium = { ...ROUND_STEEL, density: 2700, modulus: 67.5e9 }

const cushion: Joint = {
  kind: 'cushion',
  stiffness: (10 * Z) / T,
  curve: null,
  unloading: null,
  damping: 0.1 * Z,
  mass: 0.05 * Z * T,
  gap: 0,
  tension: true,
}
const spring: Joint = { ...cushion, damping: 0, mass: 0, tension: false }
const softening: Joint = {
  ...spring,
  stiffness: null,
  curve: { closing: [0, 2e-5, 2e-4], force: [0, 6e3, 1e4] },
  unloading: 6e8,
}

const gauge = (at: number) => ({ name: `at ${at}`, bar: 0, at, bridge: null })
const run = (cells: number, times: number) => ({ duration: times * T, timeStep: T / cells })

const rigs: [string, (cells: number) => Rig][] = [
  [
    'steps of two materials between a force and a fixed end',
    (cells) =>
      makeRig(
        [
          makeBar('bar', [
            makeSection(LENGTH, AREA),
            makeSection(SHORT, 2 * AREA, { material: aluminium }),
            makeSection(LENGTH / 2, AREA / 2),
          ]),
        ],
        run(cells, 9),
        {
          leftEnd: { kind: 'force', pulse: push },
          rightEnd: { kind: 'fixed' },
          gauges: [gauge(LENGTH), gauge(0.4 * LENGTH)],
        },
      ),
  ],
  [
    'a cone between a force and a free end',
    (cells) =>
      makeRig(
        [
          makeBar('bar', [
            makeSection(LENGTH, AREA),
            makeSection(SHORT, (s) => AREA * (1 + s) ** 2),
            makeSection(LENGTH / 2, 4 * AREA),
          ]),
        ],
        run(cells, 8),
        { leftEnd: { kind: 'force', pulse: push }, gauges: [gauge(1.2 * LENGTH)] },
      ),
  ],
  [
    'a cushion with damping and mass, and a mass at the end',
    (cells) =>
      makeRig(
        [makeBar('bar', [makeSection(SHORT, AREA)]), makeBar('next', [makeSection(LENGTH, 2 * AREA)])],
        run(cells, 8),
        {
          leftEnd: { kind: 'force', pulse: push },
          rightEnd: { kind: 'mass', mass: 0.5 * Z * T, velocity: 0, joint: 'bonded', gap: 0 },
          joints: [cushion],
          gauges: [gauge(LENGTH / 2)],
        },
      ),
  ],
  [
    'bars that a load in the middle presses on a sprung support',
    (cells) =>
      makeRig(
        [makeBar('bar', [makeSection(LENGTH, AREA)]), makeBar('next', [makeSection(SHORT, AREA)])],
        run(cells, 6),
        {
          loads: [{ bar: 0, at: LENGTH / 2, pulse: push }],
          joints: [spring],
          leftEnd: { kind: 'matched' },
          rightEnd: {
            kind: 'support',
            stiffness: Z / T,
            damping: 0.3 * Z,
            mass: 0.2 * Z * T,
            joint: 'bonded',
            gap: 0,
          },
        },
      ),
  ],
  [
    'a bar thrown on a softening cushion that gives little back',
    (cells) =>
      makeRig(
        [
          makeBar('thrown', [makeSection(LENGTH, AREA)], { uniformVelocity: 1 }),
          makeBar('standing', [makeSection(SHORT, AREA)]),
        ],
        run(cells, 8),
        { joints: [softening] },
      ),
  ],
  [
    'a smooth motion of the end against ground that is driven in',
    (cells) =>
      makeRig([makeBar('bar', [makeSection(SHORT, AREA), makeSection(LENGTH, 1.5 * AREA)])], run(cells, 8), {
        leftEnd: {
          kind: 'displacement',
          pulse: makePulse((t) => 1e-5 * (t < T ? Math.sin((Math.PI * t) / (2 * T)) ** 4 : 1)),
        },
        rightEnd: { kind: 'penetration', loading: (5 * Z) / T, unloading: (15 * Z) / T },
      }),
  ],
]

/** The rigs whose forces stay smooth throughout; in the others a face lets go and closes again with a kink or a jump. */
const smoothRigs = rigs.slice(0, 3)
const kinkedRigs = rigs.slice(3)

/** Differences over four grids, elements at a share of their time step. */
function compareOnGrids(make: (cells: number) => Rig, courant: number) {
  return [24, 48, 96, 192].map((cells) => {
    const rig = make(cells)
    return compareMethods(marchRig(rig), marchElementsAtCourant(rig, courant))
  })
}

describe('both methods on one rig', () => {
  it.each(smoothRigs)('%s: envelopes within a hundredth, second order in the cell', (_name, make) => {
    const found = compareOnGrids(make, 0.8)
    expect(found[1].envelope).toBeLessThan(0.01)
    const measures = [found.map(({ envelope }) => envelope)]
    found[0].gauges.forEach((_, i) => measures.push(found.map(({ gauges }) => gauges[i].largest)))
    for (const measure of measures) {
      for (const order of evaluateOrders(measure)) {
        expect(order, `${measure}`).toBeGreaterThan(1.8)
        expect(order, `${measure}`).toBeLessThan(2.2)
      }
    }
  })

  it.each(kinkedRigs)(
    '%s: envelopes within a hundredth at Courant one, nearer with a finer cell at 0.8',
    (_name, make) => {
      const atOne = compareOnGrids(make, 1)
      expect(atOne[2].envelope).toBeLessThan(0.01)
      expect(atOne[3].envelope).toBeLessThan(atOne[1].envelope / 1.8)
      // Under Courant one elements ring behind a jump; the ringing falls with the cell as well.
      const [coarse, , , fine] = compareOnGrids(make, 0.8)
      expect(fine.envelope).toBeLessThan(0.03)
      expect(fine.envelope).toBeLessThan(coarse.envelope / 2)
    },
  )
})
