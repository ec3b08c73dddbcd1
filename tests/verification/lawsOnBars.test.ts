import { describe, expect, it } from 'vitest'
import type { End, Joint, Rig } from '../../src-main/contract/rig'
import { marchElements, marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection } from '../unit/engine/testRig'

const C = 5000
const AREA = 1e-3
const Z = 4e7 * AREA
const LENGTH = 0.5
const T = LENGTH / C

const METHODS = [
  ['characteristics', marchRig],
  ['elements', marchElements],
] as const
type March = (typeof METHODS)[number][1]

const spring = (stiffness: number, options: object = {}): Joint => ({
  kind: 'cushion',
  stiffness,
  curve: null,
  unloading: null,
  damping: 0,
  mass: 0,
  gap: 0,
  tension: false,
  ...options,
})

describe.each(METHODS)('laws between and at bars, by %s', (_name, march: March) => {
  it('a soft cushion between free bars: peak v sqrt(K m_eff), and they change places as masses do', () => {
    const [v, K] = [4, 2e5]
    const [m1, m2] = [8000 * AREA * LENGTH, 8000 * 2 * AREA * LENGTH]
    const m = (m1 * m2) / (m1 + m2)
    const rig = makeRig(
      [
        makeBar('thrown', [makeSection(LENGTH, AREA)], { uniformVelocity: v }),
        makeBar('standing', [makeSection(LENGTH, 2 * AREA)]),
      ],
      { duration: 1.2 * Math.PI * Math.sqrt(m / K), timeStep: T / 8 },
      { joints: [spring(K)] },
    )
    const { record } = march(rig)
    // The bars are crossed 140 times in the contact: their ringing is under 1 %.
    expect(Math.abs(-Math.min(...record.node(1)!.forceLeft) / (v * Math.sqrt(K * m)) - 1)).toBeLessThan(0.01)
    const [thrown, standing] = record.bars.map(({ momentum, mass }) => momentum / mass)
    expect(Math.abs(thrown - (v * (m1 - m2)) / (m1 + m2))).toBeLessThan(0.01 * v)
    expect(Math.abs(standing - (2 * v * m1) / (m1 + m2))).toBeLessThan(0.01 * v)
  })

  it('a spring between two long bars: F = (Z v/2)(1 - exp(-2 K t/Z))', () => {
    const [v, K] = [10, (3 * Z) / T]
    const long = makeSection(LENGTH, AREA)
    const rig = makeRig(
      [makeBar('thrown', [long], { uniformVelocity: v }), makeBar('standing', [long])],
      { duration: 1.9 * T, timeStep: T / 200 },
      { joints: [spring(K)] },
    )
    const { line, record } = march(rig)
    const { forceLeft } = record.node(1)!
    const half = march === marchElements ? 0 : 0.5
    for (let k = 1; k < line.steps; k++) {
      const exact = ((Z * v) / 2) * (1 - Math.exp((-2 * K * (k + half) * line.dt) / Z))
      expect(Math.abs(-forceLeft[k] - exact)).toBeLessThan(2e-4 * Z * v)
    }
  })

  it('a dashpot alone in a cushion, nearly: F = v/(2/Z + 1/D)', () => {
    const [v, D] = [10, 0.4 * Z]
    const rig = makeRig(
      [
        makeBar('thrown', [makeSection(LENGTH, AREA)], { uniformVelocity: v }),
        makeBar('standing', [makeSection(LENGTH, AREA)]),
      ],
      { duration: 1.5 * T, timeStep: T / 50 },
      { joints: [spring(1, { damping: D })] },
    )
    const { line, record } = march(rig)
    const { forceLeft } = record.node(1)!
    for (let k = 1; k < line.steps; k++) {
      expect(Math.abs(-forceLeft[k] / (v / (2 / Z + 1 / D)) - 1)).toBeLessThan(1e-5)
    }
    // D x'^2 over the time, but for the spring of 1 N/m.
    const rate = v / (2 / Z + 1 / D) / D
    expect(Math.abs(record.jointLoss[0] / (D * rate * rate * (line.steps + 0.5) * line.dt) - 1)).toBeLessThan(
      0.01,
    )
  })

  it('an elastic specimen is the spring E A/L', () => {
    const [v, K] = [10, (3 * Z) / T]
    const make = (joint: Joint) =>
      march(
        makeRig(
          [
            makeBar('thrown', [makeSection(LENGTH, AREA)], { uniformVelocity: v }),
            makeBar('standing', [makeSection(LENGTH, AREA)]),
          ],
          { duration: 3.9 * T, timeStep: T / 40 },
          { joints: [joint] },
        ),
      ).record.node(1)!.forceLeft
    const [length, area] = [5e-3, 2e-4]
    const law = {
      kind: 'elastic' as const,
      modulus: (K * length) / area,
      rateSensitivity: 0,
      referenceRate: 1,
    }
    const [one, other] = [make(spring(K)), make({ kind: 'specimen', length, area, law })]
    one.forEach((F, k) => expect(Math.abs(other[k] - F)).toBeLessThan(1e-9 * Z * v))
  })

  it('ground: the peak, the work it keeps W = F^2/(2 k)(1 - 1/gamma), the rest handed back', () => {
    const [v, loading, gamma] = [6, (1.5 * Z) / T, 3]
    const rig = makeRig(
      [makeBar('bar', [makeSection(LENGTH, AREA)], { uniformVelocity: v })],
      { duration: 12 * T, timeStep: T / 100 },
      { rightEnd: { kind: 'penetration', loading, unloading: gamma * loading } },
    )
    const { record } = march(rig)
    const { forceLeft } = record.node(1)!
    // dF/dt = k (v - F/Z) until the free end unloads it at 2 T.
    const peak = Z * v * (1 - Math.exp((-loading * 2 * T) / Z))
    expect(Math.abs(-Math.min(...forceLeft) / peak - 1)).toBeLessThan(0.01)
    const { kinetic, strain, dissipated, closure } = record.energy
    const last = kinetic.length - 1
    expect(Math.abs(dissipated[last] / (((peak * peak) / (2 * loading)) * (1 - 1 / gamma)) - 1)).toBeLessThan(
      0.01,
    )
    expect(
      (kinetic[last] + strain[last] + dissipated[last]) / ((8000 * AREA * LENGTH * v * v) / 2),
    ).toBeCloseTo(1, 9)
    expect(closure).toBeLessThan(1e-12)
    // It is left behind in its set: no force any more.
    expect(Math.abs(forceLeft[forceLeft.length - 1])).toBe(0)
  })

  it('a support across a gap: nothing before v t = gap, then the same as without, later', () => {
    const [v, late, cells] = [5, 30, 40]
    const dt = T / cells
    const make = (gap: number) => {
      const support: End = {
        kind: 'support',
        stiffness: Z / T,
        damping: 0.3 * Z,
        mass: 0.2 * Z * T,
        joint: 'contact',
        gap,
      }
      const rig = makeRig(
        [makeBar('bar', [makeSection(LENGTH, AREA)], { uniformVelocity: v })],
        { duration: 8 * T + late * dt, timeStep: dt },
        { rightEnd: support },
      )
      return march(rig).record
    }
    const [near, far] = [make(0), make(v * dt * late)]
    const [one, other] = [near.node(1)!.forceLeft, far.node(1)!.forceLeft]
    // The first step of elements is half a one, in which faces already touching are brought together.
    for (let k = 0; k < late - 1; k++) expect(Math.abs(other[k])).toBeLessThan(1e-9 * Z * v)
    expect(Math.min(...one)).toBeLessThan(-0.5 * Z * v)
    for (let k = 3; k < 8 * cells; k++) expect(Math.abs(other[k + late] - one[k])).toBeLessThan(0.01 * Z * v)
    expect(far.energy.closure).toBeLessThan(1e-12)
  })
})

describe('one law under both methods', () => {
  const push = makePulse((t) => (t > 0 && t < 1.2 * T ? 5e4 * Math.sin((Math.PI * t) / (1.2 * T)) ** 4 : 0))
  const K = (6 * Z) / T
  const joints: [string, Joint][] = [
    ['a spring', spring(K)],
    ['a spring that gives little back', spring(K, { unloading: 5 * K })],
    ['a curve', spring(0, { stiffness: null, curve: { closing: [0, 1e-5, 1e-4], force: [0, 1e4, 8e4] } })],
    ['a dashpot and a spring', spring(K, { damping: 0.3 * Z })],
    ['a mass on a spring', spring(K, { mass: 0.3 * Z * T, tension: true })],
    ['a spring across a gap', spring(K, { gap: 4e-6 })],
    [
      'a bilinear specimen',
      {
        kind: 'specimen',
        length: 5e-3,
        area: AREA / 2,
        law: {
          kind: 'bilinear',
          modulus: 20e9,
          yield: 40e6,
          hardening: 2e9,
          rateSensitivity: 0,
          referenceRate: 1,
        },
      },
    ],
    [
      'a specimen that minds the rate',
      {
        kind: 'specimen',
        length: 5e-3,
        area: AREA / 2,
        law: {
          kind: 'bilinear',
          modulus: 20e9,
          yield: 40e6,
          hardening: 2e9,
          rateSensitivity: 0.05,
          referenceRate: 10,
        },
      },
    ],
    [
      'a power specimen',
      {
        kind: 'specimen',
        length: 5e-3,
        area: AREA / 2,
        law: { kind: 'power', strength: 300e6, exponent: 0.3, rateSensitivity: 0, referenceRate: 1 },
      },
    ],
  ]
  const make = (joint: Joint, cells: number): Rig =>
    makeRig(
      [makeBar('bar', [makeSection(LENGTH, AREA)]), makeBar('next', [makeSection(LENGTH, 1.5 * AREA)])],
      { duration: 2.9 * T, timeStep: T / cells },
      { leftEnd: { kind: 'force', pulse: push }, rightEnd: { kind: 'matched' }, joints: [joint] },
    )

  it.each(joints)('%s: peak, impulse and loss are the same within the cell', (_name, joint) => {
    const compare = (cells: number) => {
      const [waves, elements] = [marchRig, marchElements].map((march) => {
        const { line, record } = march(make(joint, cells))
        const { forceLeft } = record.node(1)!
        return {
          peak: -Math.min(...forceLeft),
          impulse: forceLeft.reduce((sum, F) => sum - F * line.dt, 0),
          loss: record.jointLoss[0],
          energy: record.energy.work[record.energy.work.length - 1],
        }
      })
      expect(waves.peak).toBeGreaterThan(1e4)
      return Math.max(
        Math.abs(elements.peak / waves.peak - 1),
        Math.abs(elements.impulse / waves.impulse - 1),
        Math.abs(elements.loss - waves.loss) / waves.energy,
      )
    }
    const [coarse, fine] = [compare(25), compare(100)]
    expect(fine).toBeLessThan(2e-3)
    expect(fine).toBeLessThan(coarse / 2)
  })
})
