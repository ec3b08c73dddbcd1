import { describe, expect, it } from 'vitest'
import type { Bar, End, Section } from '../../src-main/contract/rig'
import { HORN } from '../../src-main/engine/exact/published/examples'
import {
  FIXED_MASS_ROOTS,
  FREE_MASS_ROOTS,
  STEPPED_ROD_ROOTS,
} from '../../src-main/engine/exact/published/rodLoads'
import {
  AREA_LAW_ROOTS,
  CONE_ROOTS,
  EXPONENTIAL_ROOTS,
} from '../../src-main/engine/exact/published/taperTables'
import { marchRig } from '../unit/engine/march'
import { makeBar, makeRig, makeSection } from '../unit/engine/testRig'
import { expectNear } from './expectNear'
import { evaluateSpectrum, solveFrequencies } from './spectrum'

const DT = 1e-6
const CELLS = 200
const LENGTH = CELLS * 5000 * DT
const AREA = 1e-3
/** Mass of the rod, and its stiffness E A/L. */
const m = 8000 * AREA * LENGTH
const stiffness = (200e9 * AREA) / LENGTH

/** A smooth shape without symmetry, so that every mode is in it: strain eps exp(0.8 s). */
const release = (length: number): Partial<Bar> => ({
  displacement: (x) => (1e-4 * length * (Math.exp((0.8 * x) / length) - 1)) / 0.8,
})

/**
 * Lets a rod of one travel time go from a smooth shape and reads the angular frequencies, over c/L, of the
 * leftgoing wave at 0.29 L: unlike force and velocity it has no nodes.
 *
 * @param periods ct/L of the run; must tell the lowest frequency from its mirror image below zero
 */
function readFrequencies(sections: Section[], leftEnd: End, rightEnd: End, count: number, periods = 100) {
  const length = sections.reduce((sum, section) => sum + section.length, 0)
  const cells = Math.round(length / 5000 / DT)
  const rig = makeRig(
    [makeBar('rod', sections, release(length))],
    { duration: periods * cells * DT, timeStep: DT },
    { leftEnd, rightEnd, gauges: [{ name: 'G', bar: 0, at: 0.29 * length, bridge: null }] },
  )
  const { record } = marchRig(rig)
  expect(record.energy.closure).toBeLessThan(1e-12)
  return solveFrequencies(record.gauges[0].leftgoing, count).map((omega) => omega * cells)
}

const rod = () => [makeSection(LENGTH, AREA)]
const support = (k: number): End => ({
  kind: 'support',
  stiffness: k,
  damping: 0,
  mass: 0,
  joint: 'bonded',
  gap: 0,
})
const massEnd = (mass: number): End => ({ kind: 'mass', mass, velocity: 0, joint: 'bonded', gap: 0 })
const FIXED: End = { kind: 'fixed' }
const FREE: End = { kind: 'free' }

/** Midpoint rule at the mass or spring: (w dt)^2/12 of its share, under 1.3e-4 for b3 = 8 on 200 cells. */
const LUMPED = 1.5e-4
/** A straight rod is exact: what is left is the reading of the spectrum. */
const READING = 1e-6

function expectRoots(found: number[], printed: number[], tolerance: number) {
  expect(found).toHaveLength(printed.length)
  found.forEach((b, i) => expectNear(b / printed[i], 1, tolerance, `root ${i + 1}`))
}

describe('free vibration of straight rods: Blevins (1979) ch. 8; Timoshenko (from memory)', () => {
  it('free-free and fixed-fixed: b = n pi; fixed-free: b = (2n - 1) pi/2', () => {
    const whole = [Math.PI, 2 * Math.PI, 3 * Math.PI]
    expectRoots(readFrequencies(rod(), FREE, FREE, 3), whole, READING)
    expectRoots(
      readFrequencies(rod(), FIXED, FREE, 3),
      [0.5, 1.5, 2.5].map((n) => n * Math.PI),
      READING,
    )
    // Fixed at both ends the mean strain stays and is no vibration: it is taken off by the reading.
    expectRoots(readFrequencies(rod(), FIXED, FIXED, 3), whole, READING)
  })
})

describe(`free vibration, ${FIXED_MASS_ROOTS.label}: ${FIXED_MASS_ROOTS.source}`, () => {
  // A heavy mass is slow: its run has to be long enough to hold several of its periods.
  const periods = (r: number) => (r < 0.1 ? 400 : 100)

  it.each(FIXED_MASS_ROOTS.rows)('fixed-mass, m/M = %d', (r, ...roots) => {
    expectRoots(readFrequencies(rod(), FIXED, massEnd(m / r), 3, periods(r)), roots, LUMPED)
  })
  it.each(FIXED_MASS_ROOTS.rows)('free-spring, kL/EA = %d', (r, ...roots) => {
    expectRoots(readFrequencies(rod(), support(r * stiffness), FREE, 3, periods(r)), roots, LUMPED)
  })
})

describe(`free vibration, ${FREE_MASS_ROOTS.label}: ${FREE_MASS_ROOTS.source}`, () => {
  it.each(FREE_MASS_ROOTS.rows)('free-mass, m/M = %d', (r, ...roots) => {
    expectRoots(readFrequencies(rod(), massEnd(m / r), FREE, 3), roots, LUMPED)
  })
  it.each(FREE_MASS_ROOTS.rows)('fixed-spring, kL/EA = %d', (r, ...roots) => {
    expectRoots(readFrequencies(rod(), FIXED, support(r * stiffness), 3), roots, LUMPED)
  })
})

describe(`free vibration, ${STEPPED_ROD_ROOTS.label}: ${STEPPED_ROD_ROOTS.source}`, () => {
  it.each(STEPPED_ROD_ROOTS.rows)('A2/A1 = %d', (ratio, ...roots) => {
    const sections = [makeSection(LENGTH / 2, AREA), makeSection(LENGTH / 2, ratio * AREA)]
    expectRoots(readFrequencies(sections, FIXED, FREE, 3), roots, READING)
  })
})

describe('free vibration of tapered rods', () => {
  /** The first two roots for each holding, extrapolated from two grids; what is left is under 1e-5. */
  const TAPERED = 1e-5
  const ends: Record<string, [End, End]> = {
    free: [FREE, FREE],
    large: [FREE, FIXED],
    small: [FIXED, FREE],
    fixed: [FIXED, FIXED],
  }
  function expectTapered(area: (s: number) => number, held: string, printed: number[], tolerance = TAPERED) {
    const [coarse, fine] = [40, 80].map((cells) =>
      readFrequencies([makeSection(cells * 5000 * DT, (s) => AREA * area(s))], ...ends[held], 2),
    )
    expectRoots(
      fine.map((b, i) => b + (b - coarse[i]) / 3),
      printed,
      tolerance,
    )
  }

  describe(`${CONE_ROOTS.label}: ${CONE_ROOTS.source}`, () => {
    it.each(CONE_ROOTS.rows)('R = %d', (R, ...roots) => {
      const area = (s: number) => (1 + (R - 1) * s) ** 2
      expectTapered(area, 'free', roots.slice(0, 2))
      expectTapered(area, 'large', roots.slice(2, 4))
      expectTapered(area, 'small', roots.slice(4, 6))
    })
  })

  describe(`${AREA_LAW_ROOTS.label}: ${AREA_LAW_ROOTS.source}`, () => {
    it.each(AREA_LAW_ROOTS.rows)('n = %d, x2/x1 = %d', (n, ratio, ...roots) => {
      const area = (s: number) => (1 + (ratio - 1) * s) ** n
      expectTapered(area, 'free', roots.slice(0, 2))
      expectTapered(area, 'large', roots.slice(2, 4))
      expectTapered(area, 'small', roots.slice(4, 6))
      expectTapered(area, 'fixed', roots.slice(6, 8))
    })
  })

  describe(`${EXPONENTIAL_ROOTS.label}: ${EXPONENTIAL_ROOTS.source}`, () => {
    it.each(EXPONENTIAL_ROOTS.rows)('A2/A1 = %d', (ratio, ...roots) => {
      const area = (s: number) => ratio ** s
      expectTapered(area, 'free', roots.slice(0, 2))
      expectTapered(area, 'large', roots.slice(2, 4))
      expectTapered(area, 'small', roots.slice(4, 6))
      expectTapered(area, 'fixed', roots.slice(0, 2))
    })
  })

  it.each(HORN.rows)(`${HORN.label}, diameter ratio %d: ${HORN.source}`, (ratio, kL, place, merit) => {
    const cells = 100
    const section = makeSection(cells * 5000 * DT, (s) => AREA * ratio ** (2 * s))
    const rig = makeRig(
      [makeBar('horn', [section], release(section.length))],
      { duration: 60 * cells * DT, timeStep: DT },
      { gauges: [{ name: 'tip', bar: 0, at: 0, bridge: null }] },
    )
    const { record } = marchRig(rig, true)
    const [omega] = solveFrequencies(record.gauges[0].velocity, 1)
    // Second order on 100 cells: up to 2e-4 of the frequency and of the figure of merit.
    expectNear((omega * cells) / kL, 1, 3e-4)
    const tip = evaluateSpectrum(record.gauges[0].velocity, omega)
    const strain = Array.from(record.field.x, (_, i) =>
      evaluateSpectrum(
        record.field.stress.map((row) => row[i] / 200e9),
        omega,
      ),
    )
    const i = strain.indexOf(Math.max(...strain))
    const [a, b, c] = [strain[i - 1], strain[i], strain[i + 1]]
    // The top of the parabola through the largest amplitude and its neighbours.
    const shift = (a - c) / (2 * (a - 2 * b + c))
    expectNear((i + shift) / cells, place, 1e-4)
    expectNear(tip / (5000 * (b - ((a - c) * shift) / 4)) / merit, 1, 3e-4)
  })
})
