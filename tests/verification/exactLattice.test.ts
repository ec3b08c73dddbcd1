import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { End, Joint, Material, Rig } from '../../src-main/contract/rig'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../unit/engine/testRig'
import { findWorst } from './findWorst'
import { solveLattice } from './solveLattice'

const DT = 1e-6
/** Share of the largest force at play. */
const ROUNDING = 1e-12
/** The same where bars part and meet: each meeting multiplies the rounding before it. */
const MEETING = 1e-9
/** A force this near to the largest one is it. */
const NEAR = 1e-14

const MATERIALS: Material[] = [
  ROUND_STEEL,
  { ...ROUND_STEEL, density: 2700, modulus: 68.9e9 },
  { ...ROUND_STEEL, density: 1190, modulus: 2.7e9 },
]

/** Sections of under 8 cells are marched cell by cell, longer ones as delay lines. */
const makeSections = (fewestCells: number) =>
  fc.record({
    cells: fc.oneof(fc.integer({ min: fewestCells, max: 7 }), fc.integer({ min: 8, max: 40 })),
    area: fc.double({ min: 0.2e-3, max: 5e-3, noNaN: true }),
    material: fc.constantFrom(...MATERIALS),
  })

/** Pulses of about 10 kN or 1 m/s with and without jumps. */
const pulse = fc
  .record({
    shape: fc.constantFrom('rectangle', 'half sine', 'ramp', 'saw'),
    cells: fc.integer({ min: 1, max: 60 }),
    peak: fc.integer({ min: -100, max: 100 }).map((percent) => percent / 100),
  })
  .map(({ shape, cells, peak }) =>
    makePulse((t) => {
      const step = Math.round(t / DT)
      if (shape === 'ramp') return peak * Math.min(1, step / cells)
      if (shape === 'saw') return (peak * (step % cells)) / cells
      if (step >= cells) return 0
      return shape === 'rectangle' ? peak : peak * Math.sin((Math.PI * step) / cells)
    }),
  )

const end: fc.Arbitrary<End> = fc.oneof(
  fc.constant<End>({ kind: 'free' }),
  fc.constant<End>({ kind: 'fixed' }),
  fc.constant<End>({ kind: 'matched' }),
  pulse.map((one): End => ({ kind: 'force', pulse: { ...one, value: (t) => 1e4 * one.value(t) } })),
  pulse.map((one): End => ({ kind: 'velocity', pulse: one })),
)

const makeBars = (fewestCells: number) =>
  fc.record({
    sections: fc.array(makeSections(fewestCells), { minLength: 1, maxLength: 5 }),
    velocity: fc.constantFrom(0, 0, 1, -2, 5),
    preload: fc.constantFrom(0, 0, 8e3, -5e3),
  })

const makeRigs = (kinds: Joint[], fewestCells: number, mostSteps: number): fc.Arbitrary<Rig> =>
  fc
    .record({
      bars: fc.array(makeBars(fewestCells), { minLength: 1, maxLength: 4 }),
      joints: fc.array(fc.constantFrom(...kinds), { minLength: 3, maxLength: 3 }),
      leftEnd: end,
      rightEnd: end,
      steps: fc.integer({ min: 1, max: mostSteps }),
    })
    .map(({ bars, joints, leftEnd, rightEnd, steps }) =>
      makeRig(
        bars.map(({ sections, velocity, preload }, i) =>
          makeBar(
            `bar ${i}`,
            sections.map(({ cells, area, material }) =>
              makeSection(cells * Math.sqrt(material.modulus / material.density) * DT, area, { material }),
            ),
            { uniformVelocity: velocity, preload },
          ),
        ),
        { duration: steps * DT, timeStep: DT },
        { joints: joints.slice(0, bars.length - 1), leftEnd, rightEnd },
      ),
    )

/**
 * True where a step is the first to reach a peak: its force is the same as the peak within a share of it, and
 * no earlier step has reached the peak.
 */
function isFirst(same: number, step: number, force: (k: number) => number, peak: number): boolean {
  if (force(step) < peak * (1 - same)) return false
  for (let k = 0; k < step; k++) if (force(k) >= peak * (1 - NEAR)) return false
  return true
}

/** Envelope, joints and ends of the march against the lattice. */
function expectLattice(one: Rig, rounding: number): void {
  const lattice = solveLattice(one)
  const { line, record } = marchRig(one)
  expect(lattice.forceLeft).toHaveLength(line.steps + 1)
  const impedances = line.spans.map((span) => span.impedance[0])
  const velocity = Math.max(...lattice.velocityLeft.map(findWorst), ...lattice.velocityRight.map(findWorst))
  const force = Math.max(1, ...lattice.forceLeft.map(findWorst))
  const scale = Math.max(force, velocity * Math.max(...impedances))
  const fastest = Math.max(velocity, force / Math.min(...impedances))
  const { envelope } = record
  const wrong: string[] = []
  let node = 0
  line.spans.forEach((span, i) => {
    for (let p = 0; p <= span.cells; p++) {
      const at = envelope.start[i] + p
      let [high, low] = [0, 0]
      for (const row of lattice.forceLeft) {
        high = Math.max(high, row[node + p])
        low = Math.min(low, row[node + p])
      }
      const say = (what: string) => wrong.push(`${what} at position ${p} of span ${i}`)
      if (!(Math.abs(envelope.tension[at] - high) <= rounding * scale)) say('tension')
      if (!(Math.abs(envelope.compression[at] - low) <= rounding * scale)) say('compression')
      // Beside waves a hundred times larger rounding may choose among equal peaks.
      if (
        high > 0.01 * scale &&
        !isFirst(10 * rounding, envelope.tensionStep[at], (k) => lattice.forceLeft[k][node + p], high)
      )
        say('tension step')
      if (
        low < -0.01 * scale &&
        !isFirst(10 * rounding, envelope.compressionStep[at], (k) => -lattice.forceLeft[k][node + p], -low)
      )
        say('compression step')
    }
    node += span.cells
  })
  expect(wrong).toEqual([])

  node = 0
  for (let i = 0; i <= line.spans.length; i++) {
    const trace = record.node(i)
    if (trace) {
      const miss = (found: Float64Array, rows: number[][]) =>
        findWorst(found.map((value, k) => value - rows[k][node]))
      expect(miss(trace.forceLeft, lattice.forceLeft)).toBeLessThan(rounding * scale)
      expect(miss(trace.forceRight, lattice.forceRight)).toBeLessThan(rounding * scale)
      // Outside an end both sides of the trace read the bar's face, as the lattice's do.
      expect(miss(trace.velocityLeft, lattice.velocityLeft)).toBeLessThan(rounding * fastest)
      expect(miss(trace.velocityRight, lattice.velocityRight)).toBeLessThan(rounding * fastest)
    }
    node += line.spans[i]?.cells ?? 0
  }
  expect(record.energy.closure).toBeLessThan(1e-12)
  expect(record.energy.momentumClosure).toBeLessThan(1e-12)
}

describe('uniform sections of whole travel times are exact: a lattice in force and velocity says the same', () => {
  it('for random bonded lines, ends and pulses', () => {
    fc.assert(
      fc.property(makeRigs([{ kind: 'bonded' }], 1, 700), (one) => expectLattice(one, ROUNDING)),
      { seed: 20240611, numRuns: 80 },
    )
  })

  it('for random lines whose bars part and meet', () => {
    fc.assert(
      fc.property(makeRigs([{ kind: 'bonded' }, { kind: 'contact', gap: 0 }], 5, 150), (one) =>
        expectLattice(one, MEETING),
      ),
      { seed: 20240611, numRuns: 80 },
    )
  })

  it('for three bars with gaps that close on a step and between two', () => {
    const cell = 5000 * DT
    const make = (cells: number, area: number, velocity: number) =>
      makeBar('bar', [makeSection(cells * cell, area)], { uniformVelocity: velocity })
    for (const gaps of [
      [12, 7],
      [0, 40],
      [33.3, 1.9],
    ])
      expectLattice(
        makeRig(
          [make(20, 1e-3, 8), make(30, 2e-3, 0), make(25, 1e-3, 0)],
          { duration: 400 * DT, timeStep: DT },
          { joints: gaps.map((steps) => ({ kind: 'contact', gap: 8 * DT * steps })) },
        ),
        MEETING,
      )
  })
})
