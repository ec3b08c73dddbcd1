import fc from 'fast-check'
import type { Bar, End, Joint, Material, Pulse, Rig, Section } from '../../../src-main/contract/rig'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../../unit/engine/testRig'

const MATERIALS: Material[] = [
  ROUND_STEEL,
  { ...ROUND_STEEL, density: 2700, modulus: 68.9e9 },
  { ...ROUND_STEEL, density: 1190, modulus: 2.7e9 },
  { ...ROUND_STEEL, density: 4430, modulus: 114e9 },
]

/** A number in a range, on a grid of 997 parts: no subnormal and no special values. */
const between = (from: number, to: number) =>
  fc.integer({ min: 0, max: 997 }).map((i) => from + ((to - from) * i) / 997)

const section: fc.Arbitrary<Section> = fc
  .record({
    length: between(0.01, 0.2),
    area: between(2e-4, 3e-3),
    ratio: between(0.3, 3),
    form: fc.constantFrom('uniform', 'uniform', 'cone', 'exponential', 'waved'),
    material: fc.constantFrom(...MATERIALS),
  })
  .map(({ length, area, ratio, form, material }) => {
    const profiles: Record<string, number | ((s: number) => number)> = {
      uniform: area,
      cone: (s) => area * (1 + (Math.sqrt(ratio) - 1) * s) ** 2,
      exponential: (s) => area * ratio ** s,
      waved: (s) => area * (1 + 0.4 * Math.sin(2 + 5 * s)),
    }
    return makeSection(length, profiles[form], { material })
  })

const pulse: fc.Arbitrary<Pulse> = fc
  .record({ size: between(-1, 1), time: between(5e-6, 2e-4), form: fc.constantFrom('jump', 'sine', 'bump') })
  .map(({ size, time, form }) =>
    makePulse((t) => {
      if (form === 'jump') return t < time ? size : 0
      if (form === 'sine') return size * Math.sin((2 * Math.PI * t) / time)
      return t < time ? size * Math.sin((Math.PI * t) / time) ** 2 : 0
    }),
  )
const scaled = (by: number) => pulse.map((one): Pulse => ({ ...one, value: (t) => by * one.value(t) }))

/** Gaps that a bar of a few m/s closes within a run. */
const gap = fc.oneof(fc.constant(0), between(0, 3e-4))
const joined = { joint: fc.constantFrom<'bonded' | 'contact'>('bonded', 'contact'), gap }

const end: fc.Arbitrary<End> = fc.oneof(
  fc.constantFrom<End>({ kind: 'free' }, { kind: 'fixed' }, { kind: 'matched' }),
  scaled(2e4).map((one): End => ({ kind: 'force', pulse: one })),
  scaled(3).map((one): End => ({ kind: 'velocity', pulse: one })),
  scaled(2e-4).map((one): End => ({ kind: 'displacement', pulse: one })),
  fc
    .record({ mass: between(0.05, 3), velocity: between(-5, 5), ...joined })
    .map((one): End => ({ kind: 'mass', ...one })),
  fc
    .record({ stiffness: between(1e6, 5e8), damping: between(0, 2e4), mass: between(0, 1), ...joined })
    .map((one): End => ({ kind: 'support', ...one })),
  gap.map((one): End => ({ kind: 'wall', gap: one })),
)

const joint: fc.Arbitrary<Joint> = fc.oneof(
  fc.constant<Joint>({ kind: 'bonded' }),
  gap.map((one): Joint => ({ kind: 'contact', gap: one })),
  fc
    .record({ stiffness: between(1e7, 1e9), damping: between(0, 1e4), tension: fc.boolean(), gap })
    .map((one): Joint => ({
      kind: 'cushion',
      curve: null,
      unloading: null,
      mass: 0,
      ...one,
      gap: one.tension ? 0 : one.gap,
    })),
)

const bar: fc.Arbitrary<Bar> = fc
  .record({
    sections: fc.oneof(
      { weight: 9, arbitrary: fc.array(section, { minLength: 1, maxLength: 6 }) },
      { weight: 1, arbitrary: fc.array(section, { minLength: 20, maxLength: 40 }) },
    ),
    start: fc.constantFrom('rest', 'rest', 'moving', 'spinning up', 'stretched', 'preloaded'),
    size: between(-1, 1),
  })
  .map(({ sections, start, size }) => {
    const length = sections.reduce((sum, one) => sum + one.length, 0)
    const states: Record<string, Partial<Bar>> = {
      rest: {},
      moving: { uniformVelocity: 6 * size },
      'spinning up': { velocity: (_x, s) => 5 * size * (0.2 + s ** 2), uniformVelocity: null },
      stretched: { displacement: (x) => 3e-4 * size * length * Math.sin((2 * x) / length) },
      preloaded: { preload: 3e4 * size },
    }
    return makeBar('bar', sections, states[start])
  })

/**
 * Rigs of 1 to 4 bars with 1 to 40 sections each and every end and joint that both hold energy exactly.
 *
 * @param options gravity false: always level
 */
export function makeRigs(options: { gravity?: boolean; mostSteps?: number } = {}): fc.Arbitrary<Rig> {
  const { gravity = true, mostSteps = 400 } = options
  return fc
    .record({
      bars: fc.array(bar, { minLength: 1, maxLength: 4 }),
      joints: fc.array(joint, { minLength: 3, maxLength: 3 }),
      leftEnd: end,
      rightEnd: end,
      loads: fc.array(fc.record({ bar: fc.nat(3), share: between(0.0313, 0.9517), pulse: scaled(2e4) }), {
        maxLength: 2,
      }),
      gauges: fc.array(fc.record({ bar: fc.nat(3), share: between(0.0127, 0.9831) }), { maxLength: 2 }),
      pull: gravity ? fc.constantFrom(0, 0, 9.80665, -2000) : fc.constant(0),
      timeStep: between(1e-6, 4e-6),
      steps: fc.integer({ min: 2, max: mostSteps }),
    })
    .map(({ bars, joints, leftEnd, rightEnd, loads, gauges, pull, timeStep, steps }) => {
      const named = bars.map((one, i) => ({ ...one, name: `bar ${i}` }))
      const place = ({ bar: index, share }: { bar: number; share: number }) => {
        const at = index % bars.length
        return { bar: at, at: share * bars[at].sections.reduce((sum, one) => sum + one.length, 0) }
      }
      return makeRig(
        named,
        { duration: steps * timeStep, timeStep },
        {
          joints: joints.slice(0, bars.length - 1),
          leftEnd,
          rightEnd,
          gravity: pull,
          loads: loads.map((load) => ({ ...place(load), pulse: load.pulse })),
          gauges: gauges.map((gauge, i) => ({ ...place(gauge), name: `G${i}`, bridge: null })),
        },
      )
    })
}

/** True where faces can meet: rounding then grows at every meeting. */
export function canMeet(rig: Rig): boolean {
  const ends = [rig.leftEnd, rig.rightEnd].some(
    (one) => one.kind === 'wall' || ('joint' in one && one.joint === 'contact'),
  )
  return ends || rig.joints.some((one) => one.kind === 'contact' || (one.kind === 'cushion' && !one.tension))
}
