import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Bar, End, Joint, Material, Pulse, Rig, Section } from '../../src-main/contract/rig'
import { marchElements } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../unit/engine/testRig'
import { makeMisses } from './makeMisses'

const DT = 1e-6
const STEPS = 160

const material: fc.Arbitrary<Material> = fc
  .record({
    base: fc.constantFrom(
      { density: 8000, modulus: 200e9 },
      { density: 2700, modulus: 68.9e9 },
      { density: 1190, modulus: 2.7e9 },
    ),
    yields: fc.boolean(),
    hardeningRule: fc.constantFrom('isotropic' as const, 'kinematic' as const),
    viscous: fc.boolean(),
  })
  .map(({ base, yields, hardeningRule, viscous }) => ({
    ...ROUND_STEEL,
    ...base,
    yield: yields ? base.modulus / 2000 : null,
    hardening: yields ? base.modulus / 15 : null,
    hardeningRule,
    viscosity: viscous ? base.modulus * 2e-7 : null,
  }))

const section: fc.Arbitrary<Section> = fc
  .record({
    material,
    cells: fc.integer({ min: 1, max: 15 }),
    from: fc.double({ min: 0.01, max: 0.06, noNaN: true }),
    to: fc.option(fc.double({ min: 0.01, max: 0.06, noNaN: true })),
  })
  .map(({ material, cells, from, to }) => {
    const diameter = (s: number) => from + s * ((to ?? from) - from)
    const area = (s: number) => (Math.PI / 4) * diameter(s) ** 2
    const length = cells * DT * Math.sqrt(material.modulus / material.density)
    return makeSection(length, area(0), {
      material,
      shape: { kind: 'cone', uniform: to === null, round: true, area, diameter, bore: () => 0 },
    })
  })

const bar: fc.Arbitrary<Bar> = fc
  .record({
    sections: fc.array(section, { minLength: 1, maxLength: 3 }),
    uniformVelocity: fc.constantFrom(0, 0, 2, -5, 12),
    preload: fc.constantFrom(0, 0, 5e3, -8e3),
  })
  .map(({ sections, ...state }) => makeBar('bar', sections, state))

const gap = fc.constantFrom(0, 0, 3.3e-5)
const stiffness = fc.double({ min: 1e7, max: 1e10, noNaN: true })
const joint: fc.Arbitrary<Joint> = fc.oneof(
  fc.constant<Joint>({ kind: 'bonded' }),
  gap.map((one): Joint => ({ kind: 'contact', gap: one })),
  fc
    .record({
      stiffness,
      unloads: fc.boolean(),
      damping: fc.constantFrom(0, 1e4),
      mass: fc.constantFrom(0, 0.05),
      gap,
    })
    .map(({ stiffness, unloads, damping, mass, gap }): Joint => ({
      kind: 'cushion',
      stiffness,
      curve: null,
      unloading: unloads ? 3 * stiffness : null,
      damping,
      mass,
      gap,
      tension: false,
    })),
  fc.constant<Joint>({
    kind: 'specimen',
    length: 4e-3,
    area: 2e-4,
    law: { kind: 'power', strength: 500e6, exponent: 0.3, rateSensitivity: 0.02, referenceRate: 100 },
  }),
)

/** Ends that give no energy: a mass at rest, and what holds still. A matched end gives that of the bar beyond it. */
const quietEnd: fc.Arbitrary<End> = fc.oneof(
  fc.constantFrom<End>({ kind: 'free' }, { kind: 'fixed' }, { kind: 'wall', gap: 2e-5 }),
  gap.map((one): End => ({ kind: 'mass', mass: 0.3, velocity: 0, joint: 'contact', gap: one })),
  fc
    .record({ stiffness, damping: fc.constantFrom(0, 1e4), mass: fc.constantFrom(0, 0.2), gap })
    .map((one): End => ({ kind: 'support', ...one, joint: 'contact' })),
  stiffness.map((one): End => ({ kind: 'penetration', loading: one, unloading: 2 * one })),
)
const pulse: fc.Arbitrary<Pulse> = fc
  .record({ cells: fc.integer({ min: 2, max: 60 }), peak: fc.integer({ min: -100, max: 100 }) })
  .map(({ cells, peak }) =>
    makePulse((t) => (t < cells * DT ? (peak / 100) * Math.sin((Math.PI * t) / (cells * DT)) : 0)),
  )
const scale = (one: Pulse, by: number): Pulse => ({ ...one, value: (t) => by * one.value(t) })
const drivenEnd: fc.Arbitrary<End> = fc.oneof(
  quietEnd,
  fc.constant<End>({ kind: 'matched' }),
  pulse.map((one): End => ({ kind: 'force', pulse: scale(one, 1e5) })),
  pulse.map((one): End => ({ kind: 'velocity', pulse: scale(one, 5) })),
)

const run: fc.Arbitrary<Partial<Rig['run']>> = fc.record({
  lateralInertia: fc.boolean(),
  bulkViscosity: fc.boolean(),
})

const makeRigs = (ends: fc.Arbitrary<End>) =>
  fc
    .record({
      bars: fc.array(bar, { minLength: 1, maxLength: 3 }),
      joints: fc.array(joint, { minLength: 2, maxLength: 2 }),
      leftEnd: ends,
      rightEnd: ends,
      run,
    })
    .map(({ bars, joints, leftEnd, rightEnd, run }) => {
      const rig = makeRig(
        run.lateralInertia ? bars.map(makeSlender) : bars,
        { duration: STEPS * DT, timeStep: DT },
        { joints: joints.slice(0, bars.length - 1), leftEnd, rightEnd },
      )
      return { ...rig, run: { ...rig.run, ...run } }
    })

/**
 * Makes a bar fit for lateral inertia: 80 more cells, and a Poisson ratio with which a force on one end is not felt at
 * the other, exp(-L/l) with l = nu D/sqrt(8).
 */
function makeSlender(one: Bar): Bar {
  const last = one.sections[one.sections.length - 1]
  const more = makeSection(80 * DT * Math.sqrt(last.material.modulus / last.material.density), 1e-4, {
    material: last.material,
    shape: {
      ...last.shape,
      kind: 'cylinder',
      uniform: true,
      area: () => last.shape.area(1),
      diameter: () => last.shape.diameter(1),
    },
  })
  const sections = [...one.sections, more]
  const length = sections.reduce((sum, part) => sum + part.length, 0)
  const thickest = Math.max(...sections.flatMap(({ shape }) => [shape.diameter(0), shape.diameter(1)]))
  const poisson = Math.min(0.45, ((length / 35) * Math.sqrt(8)) / thickest)
  return { ...one, sections: sections.map((part) => ({ ...part, material: { ...part.material, poisson } })) }
}

describe('whatever the rig, elements', () => {
  it('give finite numbers, and both ledgers close', () => {
    fc.assert(
      fc.property(makeRigs(drivenEnd), fc.constantFrom(0, 9.81), (rig, gravity) => {
        const { line, record, broken } = marchElements({ ...rig, gravity })
        expect(broken).toBe(false)
        for (const key of ['tension', 'compression'] as const)
          expect(record.envelope[key].every(Number.isFinite)).toBe(true)
        for (let node = 0; node <= line.spans.length; node++) {
          expect(record.node(node)?.forceLeft.every(Number.isFinite) ?? true).toBe(true)
        }
        expect(record.energy.closure).toBeLessThan(1e-9)
        expect(record.energy.momentumClosure).toBeLessThan(1e-12)
      }),
      { seed: 20250311, numRuns: 35 },
    )
  })

  it('never hold more energy than they started with, where nothing works on them', () => {
    let started = 0
    fc.assert(
      fc.property(makeRigs(quietEnd), (rig) => {
        const { kinetic, strain, dissipated, work } = marchElements(rig).record.energy
        const start = kinetic[0] + strain[0] + dissipated[0] - work[0]
        if (start > 0) started++
        for (let i = 0; i < kinetic.length; i++) {
          expect(kinetic[i] + strain[i]).toBeLessThanOrEqual(start * (1 + 1e-9))
          expect(dissipated[i]).toBeGreaterThanOrEqual(-1e-9 * start)
          expect(work[i]).toBeLessThanOrEqual(1e-9 * start)
        }
      }),
      { seed: 20250312, numRuns: 35 },
    )
    expect(started).toBeGreaterThan(15)
  })

  it('give the mirrored answer to the mirrored rig', () => {
    let moved = 0
    fc.assert(
      fc.property(makeRigs(drivenEnd), (rig) => {
        const one = marchElements(rig)
        const other = marchElements(mirrorRig(rig))
        const misses = makeMisses()
        const last = one.line.spans.length
        const ends = Array.from(
          { length: last + 1 },
          (_, i) => [one.record.node(i), other.record.node(last - i)] as const,
        )
        const largest = Math.max(1, ...ends.map(([a]) => (a ? Math.max(...a.forceLeft.map(Math.abs)) : 0)))
        if (largest > 1) moved++
        ends.forEach(([a, b], node) => {
          a?.forceLeft.forEach((F, k) =>
            misses.look(b!.forceRight[k], F, 1e-9 * largest, 'node', node, 'step', k),
          )
        })
        expect(misses.told).toEqual([])
        expect(other.record.energy.dissipated.length).toBe(one.record.energy.dissipated.length)
      }),
      { seed: 20250313, numRuns: 30 },
    )
    expect(moved).toBeGreaterThan(15)
  })
})

/** The rig seen from behind: what lay left lies right, and runs the other way. */
function mirrorRig(rig: Rig): Rig {
  const turn = (end: End): End =>
    end.kind === 'force' || end.kind === 'velocity' ? { ...end, pulse: scale(end.pulse, -1) } : end
  return {
    ...rig,
    bars: [...rig.bars].reverse().map((one) =>
      makeBar(
        one.name,
        [...one.sections].reverse().map((part) => ({
          ...part,
          shape: {
            ...part.shape,
            area: (s: number) => part.shape.area(1 - s),
            diameter: (s: number) => part.shape.diameter(1 - s),
          },
        })),
        { uniformVelocity: -one.uniformVelocity!, preload: one.preload },
      ),
    ),
    joints: [...rig.joints].reverse(),
    leftEnd: turn(rig.rightEnd),
    rightEnd: turn(rig.leftEnd),
  }
}
