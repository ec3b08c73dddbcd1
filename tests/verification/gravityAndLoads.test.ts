import { describe, expect, it } from 'vitest'
import type { Bar, End, PointLoad, Rig } from '../../src-main/contract/rig'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection } from '../unit/engine/testRig'
import { expectNear } from './expectNear'
import { findWorst } from './findWorst'

const ROUNDING = 1e-12
const G = 9.80665
const CELLS = 50
const DT = 1e-6
const CELL = 5000 * DT
const LENGTH = CELLS * CELL
const AREA = 1e-3
const Z = 4e7 * AREA
const WEIGHT = 8000 * AREA * LENGTH * G
/** Travel time L/c [s]. */
const T = CELLS * DT

/** A vertical bar, x down: its left end is the top. Marched until ct/L = tau. */
function march(bar: Partial<Bar>, leftEnd: End, rightEnd: End, tau: number, options: Partial<Rig> = {}) {
  const rig = makeRig(
    [makeBar('bar', [makeSection(LENGTH, AREA)], bar)],
    { duration: tau * T, timeStep: DT },
    {
      leftEnd,
      rightEnd,
      gravity: G,
      gauges: [{ name: 'G', bar: 0, at: 0.3 * LENGTH, bridge: null }],
      ...options,
    },
  )
  const { record } = marchRig(rig)
  expect(record.energy.closure).toBeLessThan(ROUNDING)
  expect(record.energy.momentumClosure).toBeLessThan(ROUNDING)
  return { record, top: record.node(0)!, bottom: record.node(1)!, gauge: record.gauges[0] }
}

const FREE: End = { kind: 'free' }
const FIXED: End = { kind: 'fixed' }
/** The stretch of a bar that hangs at rest from its top: F = rho g A (L - x). */
const hung = { displacement: (x: number) => ((8000 * G) / 200e9) * (LENGTH * x - x ** 2 / 2) }

describe('gravity along the line', () => {
  it('a bar in free fall: v = g t everywhere and no stress', () => {
    const { record, top, bottom, gauge } = march({}, FREE, FREE, 20)
    for (const trace of [top.velocityLeft, bottom.velocityLeft, gauge.velocity])
      expectNear(findWorst(trace.map((v, k) => v - G * k * DT)), 0, G * 20 * T * ROUNDING)
    expectNear(findWorst(gauge.force), 0, WEIGHT * ROUNDING)
    const [bar] = record.bars
    expectNear(bar.momentum / (WEIGHT * 20 * T), 1, ROUNDING)
    expectNear(bar.kinetic / ((WEIGHT / G) * (G * 20 * T) ** 2 * 0.5), 1, ROUNDING)
    expectNear(record.energy.work[record.energy.work.length - 1] / bar.kinetic, 1, ROUNDING)
  })

  it('a hanging bar stays at rest under rho g A (L - x)', () => {
    const { top, gauge, bottom } = march(hung, FIXED, FREE, 20)
    // The strain is taken from the displacement by differences over a thousandth of the length.
    const differences = 1e-10
    expectNear(findWorst(gauge.force.map((F) => F / (0.7 * WEIGHT) - 1)), 0, differences)
    expectNear(findWorst(top.forceRight.map((F) => F / WEIGHT - 1)), 0, differences)
    expectNear(findWorst(bottom.velocityLeft), 0, (WEIGHT / Z) * differences)
  })

  it('a bar hung up suddenly: its top carries a triangle from 0 to twice the weight, period 4L/c', () => {
    const { top } = march({}, FIXED, FREE, 11)
    const miss = top.forceRight.map((F, k) => {
      const phase = (k / CELLS) % 4
      return F / WEIGHT - (phase <= 2 ? phase : 4 - phase)
    })
    expectNear(findWorst(miss), 0, ROUNDING * 100)
    expectNear(Math.max(...top.forceRight) / WEIGHT, 2, ROUNDING * 100)
  })

  it('a hanging bar let go: its top falls at once with g L/c, its bottom hangs still until L/c', () => {
    const { record, top, bottom } = march(hung, FREE, FREE, 1.6)
    const speed = (G * LENGTH) / 5000
    const before = (k: number) => k < CELLS
    const miss = (trace: Float64Array, expected: number) =>
      findWorst(trace.filter((_, k) => before(k)).map((v) => (v - expected) / speed))
    expectNear(miss(top.velocityLeft, speed), 0, 1e-10)
    expectNear(miss(bottom.velocityLeft, 0), 0, 1e-10)
    // The momentum is that of the weight all the same; the waves of a cell stand for the middle of a step.
    expectNear(record.bars[0].momentum / (WEIGHT * (1.6 * T + DT / 2)), 1, 1e-10)
    // Then the bottom is overtaken: its velocity jumps by twice that of the stress released, 2 g L/c.
    expectNear(bottom.velocityLeft[CELLS] / (2 * speed), 1, 1e-10)
  })

  it('a bar dropped on a wall meets it at sqrt(2 g h) with rho c v', () => {
    const [g, h] = [2000, 5e-3]
    const speed = Math.sqrt(2 * g * h)
    const { bottom } = march({}, FREE, { kind: 'wall', gap: h }, 51, { gravity: g })
    const first = bottom.forceLeft.findIndex((F) => F < 0)
    expectNear(first * DT, Math.sqrt((2 * h) / g), 2 * DT)
    // The gap closes inside a step, which costs first order in that step alone; gravity adds g t in the next ones.
    expectNear(bottom.forceLeft[first + 2] / (-Z * speed), 1, 2e-3)
    expect(Math.max(...bottom.forceLeft)).toBeLessThanOrEqual(0)
  })

  it('gives the same motion to a rig with a support, a mass, a contact and a cushion: momentum by hand', () => {
    const bars = [
      makeBar('upper', [makeSection(20 * CELL, AREA)], { uniformVelocity: 1 }),
      makeBar('lower', [makeSection(30 * CELL, 2 * AREA)]),
      makeBar('last', [makeSection(10 * CELL, AREA), makeSection(5 * CELL, (s) => AREA * (1 + s))]),
    ]
    const rig = makeRig(
      bars,
      { duration: 900 * DT, timeStep: DT },
      {
        gravity: -700,
        leftEnd: { kind: 'mass', mass: 0.8, velocity: 2, joint: 'contact', gap: 1e-5 },
        rightEnd: { kind: 'support', stiffness: 3e8, damping: 5e3, mass: 0.4, joint: 'bonded', gap: 0 },
        joints: [
          { kind: 'contact', gap: 2e-5 },
          {
            kind: 'cushion',
            stiffness: 1e8,
            curve: null,
            unloading: null,
            damping: 1e3,
            mass: 0,
            gap: 0,
            tension: false,
          },
        ],
      },
    )
    const { line, record } = marchRig(rig)
    expect(record.energy.closure).toBeLessThan(ROUNDING)
    expect(record.energy.momentumClosure).toBeLessThan(ROUNDING)
    // Each bar by itself: forces at its ends and its weight make its momentum.
    const started = bars.map(({ uniformVelocity }, i) => record.bars[i].mass * uniformVelocity!)
    const impulse = (values: Float64Array) => values.reduce((sum, F) => sum + F * DT, 0)
    const nodes = [0, line.bars[1].firstSpan, line.bars[2].firstSpan, line.spans.length].map((node) =>
      record.node(node)!,
    )
    record.bars.forEach(({ momentum, mass }, i) => {
      const forces = impulse(nodes[i + 1].forceLeft) - impulse(nodes[i].forceRight)
      // Gravity has acted on the steps between the first closure and the last.
      const expected = started[i] + forces + mass * -700 * line.steps * DT
      expectNear(momentum, expected, 3 * ROUNDING * mass * 700 * 900 * DT + 1e-12)
    })
  })
})

describe('axial forces at points of a bar', () => {
  const load = (at: number, value: (t: number) => number): PointLoad => ({
    bar: 0,
    at,
    pulse: makePulse(value),
  })
  const MATCHED: End = { kind: 'matched' }
  const smooth = (t: number) => 1000 * Math.sin(t / 17e-6) ** 2

  it('send Q/2 both ways: pull behind, push ahead, velocity Q/2Z', () => {
    const { gauge } = march({}, MATCHED, MATCHED, 3, {
      gravity: 0,
      loads: [load(0.7 * LENGTH, smooth)],
    })
    // The gauge at 0.3 L hears it 0.4 L/c later.
    const exact = gauge.force.map((_, k) => (k < 0.4 * CELLS ? 0 : smooth((k - 0.4 * CELLS) * DT) / 2))
    expectNear(findWorst(gauge.force.map((F, k) => F - exact[k])), 0, 1000 * ROUNDING)
    expectNear(findWorst(gauge.velocity.map((v, k) => v - exact[k] / Z)), 0, (1000 / Z) * ROUNDING)
    expectNear(findWorst(gauge.rightgoing), 0, 1000 * ROUNDING)
  })

  it('superpose, also two in one section and two at one point', () => {
    const places = [0.1, 0.5, 0.5, 0.9]
    const alone = places.map(
      (place, i) =>
        march({}, FREE, FIXED, 6, {
          gravity: 0,
          loads: [load(place * LENGTH, (t) => (i + 1) * smooth(t + i * 3e-6))],
        }).gauge.force,
    )
    const together = march({}, FREE, FIXED, 6, {
      gravity: 0,
      loads: places.map((place, i) => load(place * LENGTH, (t) => (i + 1) * smooth(t + i * 3e-6))),
    }).gauge.force
    const miss = together.map((F, k) => F - alone.reduce((sum, force) => sum + force[k], 0))
    expectNear(findWorst(miss), 0, 1e4 * ROUNDING)
  })

  it('give a free bar Q t of momentum', () => {
    const { record } = march({}, FREE, FREE, 9, { gravity: 0, loads: [load(0.2 * LENGTH, () => 500)] })
    // The force works in every one of the steps 0..9 L/c, the last included.
    expectNear(record.bars[0].momentum / (500 * (9 * CELLS + 1) * DT), 1, ROUNDING)
  })

  it('at a step between two sections: v = Q/(Z1 + Z2)', () => {
    const rig = makeRig(
      [makeBar('bar', [makeSection(20 * CELL, AREA), makeSection(20 * CELL, 3 * AREA)])],
      { duration: 10 * DT, timeStep: DT },
      {
        loads: [load(20 * CELL, () => 1000)],
        gauges: [{ name: 'G', bar: 0, at: 16 * CELL, bridge: null }],
      },
    )
    const { line, record } = marchRig(rig)
    // A load acts at the nearest cell boundary inside a section: here one cell into the second one.
    const at = line.nodes.findIndex(({ loads }) => loads.length > 0)
    expectNear(line.nodes[at].x, 20 * CELL, CELL * (1 + 1e-9))
    const { force } = record.gauges[0]
    // What comes over the step from behind: T of the half that the load sends to the left.
    expectNear(force[9], (500 * 2) / 4, 1000 * ROUNDING)
  })
})
