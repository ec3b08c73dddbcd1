import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { End, Joint, Material, Pulse } from '../../src-main/contract/rig'
import { marchElements, marchRig } from '../unit/engine/march'
import { makeBar, makeRig, makeSection, ROUND_STEEL } from '../unit/engine/testRig'
import { makeMisses } from './makeMisses'
import { makeStraightPulse, type StraightPulse } from './straightPulse'

// With lumped mass and h = c dt central difference carries every wave of a uniform rod without error: a node's
// velocity over a step is the mean of the exact one from t_k to t_(k+1), and the force at a node and step the mean
// of the exact one from t_(k-1) to t_(k+1), for histories whose mean the ends take.

const DT = 1e-6
const C = 5000
const AREA = 1e-3
const Z = 4e7 * AREA
const CELLS = 24
const LENGTH = CELLS * C * DT
const T = CELLS * DT
const ROUNDING = 1e-12

const everyNode = (bar: number, cells: number) =>
  Array.from({ length: cells + 1 }, (_, i) => ({ name: `${i}`, bar, at: i * C * DT, bridge: null }))

/** Wave that enters a bar at its driven end, and what its two ends send back of a force wave. */
interface DrivenBar {
  source: StraightPulse
  scale: number
  near: 1 | -1
  far: 1 | -1 | 0
}

/** d'Alembert's solution at x from the driven end, its mean from t - DT to t + DT: the waves going out and coming back [N]. */
function evaluateWaves({ source, scale, near, far }: DrivenBar, travel: number, t: number) {
  const mean = (at: number) => (scale * (source.integral(at + DT) - source.integral(at - DT))) / (2 * DT)
  let [out, back] = [0, 0]
  for (let m = 0; m < 10; m++) {
    const share = (near * far) ** m
    out += share * mean(t - 2 * m * T - travel)
    back += share * far * mean(t - 2 * (m + 1) * T + travel)
  }
  return { out, back }
}

/** Breaks off the grid, jumps among them. */
const jumping = makeStraightPulse([
  [0, 3.3 * DT, 1e4, 1e4],
  [3.3 * DT, 7.9 * DT, -2e4, 5e3],
  [12.4 * DT, 30.7 * DT, 0, 8e3],
])
const step = makeStraightPulse([[0, 1, 1e4, 1e4]])
const asVelocity = (pulse: StraightPulse): Pulse => ({ ...pulse, value: (t) => pulse.value(t) / Z })

describe("elements at Courant one are d'Alembert's solution to rounding, at every node and step", () => {
  const farEnds: [string, End, 1 | -1 | 0][] = [
    ['free', { kind: 'free' }, -1],
    ['fixed', { kind: 'fixed' }, 1],
    ['matched', { kind: 'matched' }, 0],
  ]
  const pulses: [string, StraightPulse][] = [
    ['a step', step],
    ['jumps off the grid', jumping],
  ]
  const cases = farEnds.flatMap(([name, end, far]) =>
    pulses.map(([what, pulse]) => ({ name, end, far, what, pulse })),
  )

  it.each(cases)('force: $what, far end $name', ({ end, far, pulse }) => {
    expectWaves({ kind: 'force', pulse }, end, { source: pulse, scale: -1, near: -1, far })
  })

  it.each(cases)('velocity: $what, far end $name', ({ end, far, pulse }) => {
    expectWaves({ kind: 'velocity', pulse: asVelocity(pulse) }, end, {
      source: pulse,
      scale: -1,
      near: 1,
      far,
    })
  })

  function expectWaves(leftEnd: End, rightEnd: End, driven: DrivenBar): void {
    const rig = makeRig(
      [makeBar('bar', [makeSection(LENGTH, AREA)])],
      { duration: 5 * T, timeStep: DT },
      { leftEnd, rightEnd, gauges: everyNode(0, CELLS) },
    )
    const { line, record } = marchElements(rig)
    expect(line.steps).toBe(5 * CELLS)
    const misses = makeMisses()
    record.gauges.forEach(({ force, velocity }, node) => {
      for (let k = 1; k < line.steps; k++) {
        const { out, back } = evaluateWaves(driven, node * DT, k * DT)
        misses.look(force[k], out + back, ROUNDING * 2e4, 'force at node', node, 'step', k)
        misses.look(velocity[k], (back - out) / Z, (ROUNDING * 2e4) / Z, 'velocity at node', node, 'step', k)
      }
    })
    expect(misses.told).toEqual([])
    expect(record.energy.closure).toBeLessThan(ROUNDING)
    expect(record.energy.momentumClosure).toBeLessThan(ROUNDING)
  }

  it('a striker that hits a bar twice as long, flat on: both faces, waves and parting', () => {
    const SPEED = 10
    const rig = makeRig(
      [
        makeBar('striker', [makeSection(LENGTH / 2, AREA)], { uniformVelocity: SPEED }),
        makeBar('target', [makeSection(LENGTH, AREA)]),
      ],
      { duration: 5 * T, timeStep: DT },
      { gauges: [...everyNode(0, CELLS / 2), ...everyNode(1, CELLS)] },
    )
    const { line, record } = marchElements(rig)
    const push = makeStraightPulse([[0, T, (Z * SPEED) / 2, (Z * SPEED) / 2]])
    const driven: DrivenBar = { source: push, scale: -1, near: -1, far: -1 }
    const striker = record.gauges.slice(0, CELLS / 2 + 1).reverse()
    const target = record.gauges.slice(CELLS / 2 + 1)
    const tolerance = ROUNDING * Z * SPEED
    const misses = makeMisses()
    for (let k = 1; k < line.steps; k++) {
      target.forEach(({ force, velocity }, node) => {
        const { out, back } = evaluateWaves(driven, node * DT, k * DT)
        misses.look(force[k], out + back, tolerance, 'target, node', node, 'step', k)
        misses.look(velocity[k], (back - out) / Z, tolerance / Z, 'target, node', node, 'step', k)
      })
      // The striker is unloaded by what comes back from its free end at 2 L/c = T, and stands still.
      striker.forEach(({ force, velocity }, node) => {
        const out = evaluateWaves({ ...driven, far: 0 }, node * DT, k * DT).out
        const back = -evaluateWaves({ ...driven, far: 0 }, T - node * DT, k * DT).out
        const [F, v] = k < CELLS ? [out + back, SPEED + (out - back) / Z] : [0, 0]
        if (k === CELLS) return // the moment of parting, half of either state
        misses.look(force[k], F, tolerance, 'striker, node from the face', node, 'step', k)
        misses.look(velocity[k], v, tolerance / Z, 'striker, node from the face', node, 'step', k)
      })
    }
    expect(misses.told).toEqual([])
  })

  it('a bar let hang: F = Z g t grows at the fixed end to twice its weight, and falls again', () => {
    const g = 9.81
    const rig = makeRig(
      [makeBar('bar', [makeSection(LENGTH, AREA)])],
      { duration: 6 * T, timeStep: DT },
      { leftEnd: { kind: 'fixed' }, gravity: g },
    )
    const { line, record } = marchElements(rig)
    const weight = 8000 * AREA * LENGTH * g
    const { forceLeft } = record.node(0)!
    const misses = makeMisses()
    for (let k = 1; k < line.steps; k++) {
      const phase = (k / CELLS) % 4
      if (phase % 2 === 0) continue // the mean over two steps rounds the corners
      misses.look(forceLeft[k], weight * (phase < 2 ? phase : 4 - phase), ROUNDING * weight, 'step', k)
    }
    expect(misses.told).toEqual([])
    expect(record.energy.closure).toBeLessThan(ROUNDING)
    expect(record.energy.momentumClosure).toBeLessThan(ROUNDING)
  })

  it('a bar let fall: no stress, and g t everywhere', () => {
    const g = -9.81
    const rig = makeRig(
      [makeBar('bar', [makeSection(LENGTH, (s) => AREA * (1 + s))], { uniformVelocity: 2 })],
      { duration: 3 * T, timeStep: DT },
      { gravity: g, gauges: [{ name: 'G', bar: 0, at: LENGTH / 3, bridge: null }] },
    )
    const { line, record } = marchElements(rig)
    const [{ force, velocity }] = record.gauges
    const misses = makeMisses()
    for (let k = 0; k <= line.steps; k++) {
      misses.look(force[k], 0, ROUNDING * Z * 2, 'force at step', k)
      misses.look(velocity[k], 2 + g * k * DT, ROUNDING, 'velocity at step', k)
    }
    expect(misses.told).toEqual([])
    expect(record.energy.closure).toBeLessThan(ROUNDING)
    expect(record.energy.momentumClosure).toBeLessThan(ROUNDING)
  })
})

describe('elements at Courant one are the characteristics, smoothed 1-2-1 over the steps, to rounding', () => {
  const MATERIALS: Material[] = [
    ROUND_STEEL,
    { ...ROUND_STEEL, density: 2700, modulus: 68.9e9 },
    { ...ROUND_STEEL, density: 1190, modulus: 2.7e9 },
  ]
  const makeBars = fc.array(
    fc.array(
      fc.record({
        cells: fc.integer({ min: 1, max: 12 }),
        area: fc.double({ min: 0.2e-3, max: 5e-3, noNaN: true }),
        material: fc.constantFrom(...MATERIALS),
      }),
      { minLength: 1, maxLength: 4 },
    ),
    { minLength: 1, maxLength: 3 },
  )
  /** Straight from step to step, from zero. */
  const makeHistory = fc
    .array(fc.integer({ min: -100, max: 100 }), { minLength: 2, maxLength: 12 })
    .map((levels): Pulse => {
      const at = (k: number) => (k <= 0 ? 0 : levels[Math.min(k, levels.length) - 1] / 100)
      const value = (t: number) => {
        const k = Math.floor(t / DT)
        return at(k) + (t / DT - k) * (at(k + 1) - at(k))
      }
      return { shape: 'table', value, rise: null, breaks: levels.map((_, k) => (k + 1) * DT) }
    })
  const makeEnds: fc.Arbitrary<End> = fc.oneof(
    fc.constantFrom<End>({ kind: 'free' }, { kind: 'fixed' }, { kind: 'matched' }),
    makeHistory.map((pulse): End => ({
      kind: 'force',
      pulse: { ...pulse, value: (t) => 1e4 * pulse.value(t) },
    })),
    makeHistory.map((pulse): End => ({ kind: 'velocity', pulse })),
  )

  it('random stepped lines of several materials, bonded', () => {
    let moved = 0
    fc.assert(
      fc.property(makeBars, makeEnds, makeEnds, (bars, leftEnd, rightEnd) => {
        const joints: Joint[] = bars.slice(1).map(() => ({ kind: 'bonded' }))
        const built = bars.map((sections, i) =>
          makeBar(
            `bar ${i}`,
            sections.map(({ cells, area, material }) =>
              makeSection(cells * DT * Math.sqrt(material.modulus / material.density), area, { material }),
            ),
          ),
        )
        const gauges = built.flatMap((bar, i) =>
          [0.3, 0.8].map((share) => ({
            name: `${i} ${share}`,
            bar: i,
            at: Math.round(share * bars[i][0].cells) * (bar.sections[0].length / bars[i][0].cells),
            bridge: null,
          })),
        )
        const rig = makeRig(built, { duration: 90 * DT, timeStep: DT }, { joints, leftEnd, rightEnd, gauges })
        const waves = marchRig(rig).record
        const { line, record } = marchElements(rig)
        expect(Math.abs(line.dt / DT - 1)).toBeLessThan(1e-14)
        const misses = makeMisses()
        const pairs = [
          ...waves.gauges.map((one, i) => [one.force, record.gauges[i].force] as const),
          [waves.node(0)!.forceLeft, record.node(0)!.forceLeft] as const,
          [waves.node(line.spans.length)!.forceLeft, record.node(line.spans.length)!.forceLeft] as const,
        ]
        const scale = Math.max(1, ...pairs.map(([one]) => Math.max(...one.map(Math.abs))))
        moved += scale > 1 ? 1 : 0
        for (const [wave, element] of pairs) {
          for (let k = 1; k < line.steps; k++) {
            const smoothed = (wave[k - 1] + 2 * wave[k] + wave[k + 1]) / 4
            misses.look(element[k], smoothed, 1e-11 * scale, 'step', k)
          }
        }
        expect(misses.told).toEqual([])
        expect(record.energy.closure).toBeLessThan(1e-12)
        expect(record.energy.momentumClosure).toBeLessThan(1e-12)
      }),
      { seed: 20250309, numRuns: 40 },
    )
    expect(moved).toBeGreaterThan(15)
  })
})
