import { describe, expect, it } from 'vitest'
import type { Material, Rig } from '../../src-main/contract/rig'
import { evaluateTrueStress } from '../../src-main/engine/answers/evaluateTrueStress'
import { makeElementLine } from '../../src-main/engine/elements/makeElementLine'
import { makeLine } from '../../src-main/engine/line/makeLine'
import { marchElements } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../unit/engine/testRig'
import { marchElementsAtCourant } from './elementsAtCourant'
import { makeMisses } from './makeMisses'

const E = 200e9
const C = 5000
const AREA = 1e-3
const DT = 1e-6

/**
 * Strains one element between a fixed end and one that moves at level speeds: it has no waves, and the force at
 * the moving end is the element's where the speed does not change.
 *
 * @param corners strains from one to the next of which it goes in 200 steps each, from zero
 * @returns strain and nominal stress at every step but those at the corners
 */
function strainElement(corners: number[], material: Partial<Material>, run: Partial<Rig['run']> = {}) {
  const each = 200
  const length = C * DT
  let dt = DT
  const level = (k: number) => {
    const leg = Math.min(Math.floor(k / each), corners.length - 1)
    return (corners[leg] - (corners[leg - 1] ?? 0)) / each
  }
  const pulse = makePulse((t) => (level(Math.floor(t / dt + 1e-6)) * length) / dt)
  const make = (duration: number): Rig => {
    const rig = makeRig(
      [makeBar('element', [makeSection(length, AREA, { material: { ...ROUND_STEEL, ...material } })])],
      { duration, timeStep: DT },
      { leftEnd: { kind: 'fixed' }, rightEnd: { kind: 'velocity', pulse } },
    )
    return { ...rig, run: { ...rig.run, ...run } }
  }
  dt = makeElementLine(makeLine(make(DT))).dt
  const { line, record } = marchElements(make(corners.length * each * dt))
  expect(line.spans[0].cells).toBe(1)
  expect(line.steps).toBe(corners.length * each)
  const { forceLeft } = record.node(1)!
  const path: { leg: number; strain: number; stress: number }[] = []
  for (let k = 1; k < line.steps; k++) {
    if (k % each === 0) continue
    const leg = Math.floor(k / each)
    const from = corners[leg - 1] ?? 0
    path.push({ leg, strain: from + (k - leg * each) * level(k), stress: forceLeft[k] / AREA })
  }
  return { path, energy: record.energy }
}

const YIELD = 400e6
const TANGENT = 20e9

/** The loop by hand: each leg is elastic until the surface is reached, and goes on with the tangent modulus. */
function integrateLoop(corners: number[], kinematic: boolean) {
  let [e0, s0] = [0, 0]
  let [top, bottom] = [YIELD, -YIELD]
  return corners.map((corner) => {
    const [from, start, high, low] = [e0, s0, top, bottom]
    const up = corner > from
    const stressAt = (e: number) => {
      const straight = start + E * (e - from)
      const bound = up ? high : low
      if (up ? straight <= bound : straight >= bound) return straight
      return bound + TANGENT * (e - from - (bound - start) / E)
    }
    e0 = corner
    s0 = stressAt(corner)
    if (s0 > top) [top, bottom] = kinematic ? [s0, s0 - 2 * YIELD] : [s0, -s0]
    if (s0 < bottom) [top, bottom] = kinematic ? [s0 + 2 * YIELD, s0] : [-s0, s0]
    return stressAt
  })
}

const CYCLE = [0.012, -0.009, 0.006, 0.0055, 0.015, -0.015, 0]

describe('bilinear plasticity: cycles of one element against the loop by hand', () => {
  const runs: [string, Partial<Rig['run']>][] = [
    ['in the kernel', {}],
    ['among the further laws', { lateralInertia: true }],
  ]
  it.each(
    runs.flatMap(([where, run]) => [
      { where, run, rule: 'isotropic' as const },
      { where, run, rule: 'kinematic' as const },
    ]),
  )('$rule, $where', ({ rule, run }) => {
    const material = { yield: YIELD, hardening: TANGENT, hardeningRule: rule, poisson: 0 }
    const { path, energy } = strainElement(CYCLE, material, run)
    const legs = integrateLoop(CYCLE, rule === 'kinematic')
    const misses = makeMisses()
    let work = 0
    let before = { strain: 0, stress: 0 }
    for (const { leg, strain, stress } of path) {
      misses.look(stress, legs[leg](strain), 1e-9 * YIELD, 'leg', leg, 'strain', strain)
      work += ((stress + before.stress) / 2) * (strain - before.strain)
      before = { strain, stress }
    }
    expect(misses.told).toEqual([])
    expect(misses.looked).toBe(CYCLE.length * 199)
    expect(energy.closure).toBeLessThan(1e-12)
    // The area of the loop, the corners cut, is what the ledger has taken; at the end it stands under stress.
    const volume = AREA * C * DT
    const taken = energy.dissipated[energy.dissipated.length - 1] + (before.stress ** 2 / (2 * E)) * volume
    expect(Math.abs(taken / (work * volume) - 1)).toBeLessThan(0.01)
  })

  it('the two rules differ on the way back by what they should', () => {
    const [isotropic, kinematic] = (['isotropic', 'kinematic'] as const).map((hardeningRule) =>
      strainElement([0.012, -0.009], { yield: YIELD, hardening: TANGENT, hardeningRule }),
    )
    const last = isotropic.path.length - 1
    const first = YIELD + TANGENT * (0.012 - YIELD / E)
    const difference = kinematic.path[last].stress - isotropic.path[last].stress
    // Surfaces at -s1 and s1 - 2 sy, the tangent from there on: (2 s1 - 2 sy)(1 - Et/E).
    expect(Math.abs(difference / ((2 * first - 2 * YIELD) * (1 - TANGENT / E)) - 1)).toBeLessThan(1e-9)
  })

  it('with finite strain: the same loop of Kirchhoff stress over logarithmic strain', () => {
    const corners = [0.05, -0.04, 0.03]
    const material = { yield: YIELD, hardening: TANGENT, hardeningRule: 'kinematic' as const }
    const { path } = strainElement(corners, material, { finiteStrain: true })
    const legs = integrateLoop(corners.map(Math.log1p), true)
    const misses = makeMisses()
    for (const { leg, strain, stress } of path) {
      misses.look(
        stress * (1 + strain),
        legs[leg](Math.log1p(strain)),
        1e-9 * YIELD,
        'leg',
        leg,
        'strain',
        strain,
      )
    }
    expect(misses.told).toEqual([])
  })
})

describe('finite strain: nominal and true stress of the Hencky law', () => {
  it.each([0, 0.3, 0.5])('P = E ln(l)/l and sigma = P l^(2 nu), nu = %d', (poisson) => {
    const { path } = strainElement([0.2, -0.2], { poisson }, { finiteStrain: true })
    const misses = makeMisses()
    for (const { strain, stress } of path) {
      const stretch = 1 + strain
      misses.look(stress, (E * Math.log(stretch)) / stretch, 1e-9 * E, 'nominal at', strain)
      misses.look(
        evaluateTrueStress(stress, stretch, poisson),
        E * Math.log(stretch) * stretch ** (2 * poisson - 1),
        1e-9 * E,
        'true at',
        strain,
      )
    }
    expect(misses.told).toEqual([])
    expect(misses.looked).toBe(2 * 398)
  })

  it('off by default: P is straight', () => {
    const { path } = strainElement([0.1], {})
    for (const { strain, stress } of path) expect(Math.abs(stress - E * strain)).toBeLessThan(1e-9 * E)
  })
})

/** Times at which a trace first passes levels, between steps by straight lines. */
function findPassing(trace: Float64Array, dt: number, level: number): number {
  const k = trace.findIndex((value) => value > level)
  return dt * (k - 1 + (level - trace[k - 1]) / (trace[k] - trace[k - 1]))
}

describe('fronts of a bilinear rod', () => {
  it('run at sqrt(E/rho) and sqrt(Et/rho), with the stress sy + rho c1 (v - vy) behind the second', () => {
    const hardening = E / 9
    const material = { ...ROUND_STEEL, yield: YIELD, hardening }
    const [x1, x2] = [0.1, 0.3]
    const rig = makeRig(
      [makeBar('rod', [makeSection(1, AREA, { material })])],
      { duration: 2.5e-4, cell: 2e-3 },
      {
        leftEnd: { kind: 'velocity', pulse: makePulse(() => 25) },
        gauges: [x1, x2].map((at) => ({ name: `${at}`, bar: 0, at, bridge: null })),
      },
    )
    const { line, record } = marchElementsAtCourant(rig, 0.9)
    const pressing = record.gauges.map(({ force }) => force.map((F) => -F / AREA))
    const behind = YIELD + 8000 * (C / 3) * (25 - YIELD / (8000 * C))
    const speed = (level: number) => {
      const [t1, t2] = pressing.map((trace) => findPassing(trace, line.dt, level))
      return (x2 - x1) / (t2 - t1)
    }
    expect(Math.abs(speed(YIELD / 2) / C - 1)).toBeLessThan(5e-3)
    expect(Math.abs(speed((YIELD + behind) / 2) / (C / 3) - 1)).toBeLessThan(1e-2)
    const last = pressing[0].slice(-20)
    expect(Math.abs(last.reduce((sum, one) => sum + one, 0) / last.length / behind - 1)).toBeLessThan(1e-2)
  })
})

describe('Kelvin-Voigt', () => {
  it('a mode rings down as v = exp(-d t)(cos w t - d/w sin w t), d = eta w0^2/(2 E)', () => {
    const eta = 2e5
    const length = 0.5
    const cells = 60
    const material = { ...ROUND_STEEL, viscosity: eta }
    const rig = makeRig(
      [
        makeBar('bar', [makeSection(length, AREA, { material })], {
          velocity: (_x, s) => Math.cos(Math.PI * s),
          uniformVelocity: null,
        }),
      ],
      { duration: 8e-4, timeStep: length / C / cells },
      { gauges: [{ name: 'end', bar: 0, at: 0, bridge: null }] },
    )
    const { line, record } = marchElements(rig)
    const w0 = (Math.PI * C) / length
    const d = (eta * w0 * w0) / (2 * E)
    const w = Math.sqrt(w0 * w0 - d * d)
    expect(d * rig.run.duration).toBeGreaterThan(0.3)
    const misses = makeMisses()
    record.gauges[0].velocity.forEach((v, k) => {
      const t = k * line.dt
      misses.look(v, Math.exp(-d * t) * (Math.cos(w * t) - (d / w) * Math.sin(w * t)), 3e-3, 'step', k)
    })
    expect(misses.told).toEqual([])
  })

  it('a long wave that travels is damped by exp(-eta w^2 x/(2 rho c^3))', () => {
    const eta = 1e5
    const period = 1e-4
    const w = (2 * Math.PI) / period
    const material = { ...ROUND_STEEL, viscosity: eta }
    const [x1, x2] = [0.5, 1.5]
    const rig = makeRig(
      [makeBar('bar', [makeSection(4, AREA, { material })])],
      { duration: 1.2e-3, cell: 1e-2 },
      {
        leftEnd: {
          kind: 'velocity',
          pulse: makePulse(
            (t) => Math.sin(w * t) * (t < 3 * period ? Math.sin((Math.PI * t) / (6 * period)) ** 2 : 1),
          ),
        },
        gauges: [x1, x2].map((at) => ({ name: `${at}`, bar: 0, at, bridge: null })),
      },
    )
    const { line, record } = marchElements(rig)
    // Over the last three periods, before anything is back from the far end.
    const from = Math.round(9e-4 / line.dt)
    const count = Math.round((3 * period) / line.dt)
    const [a1, a2] = record.gauges.map(({ velocity }) => {
      let [sine, cosine] = [0, 0]
      for (let k = from; k < from + count; k++) {
        sine += velocity[k] * Math.sin(w * k * line.dt)
        cosine += velocity[k] * Math.cos(w * k * line.dt)
      }
      return (2 * Math.hypot(sine, cosine)) / count
    })
    const found = Math.log(a1 / a2) / (x2 - x1)
    expect(Math.abs(found / ((eta * w * w) / (2 * 8000 * C ** 3)) - 1)).toBeLessThan(1e-2)
  })
})

describe('lateral inertia', () => {
  // Love's rod, w^2 = c^2 k^2 / (1 + nu^2 K^2 k^2), K^2 = (D^2 + d^2)/8 for a tube.
  const [D, d, nu] = [0.02, 0.012, 0.3]
  const K2 = (D * D + d * d) / 8
  const tube = {
    kind: 'tube' as const,
    uniform: true,
    round: true,
    area: () => (Math.PI / 4) * (D * D - d * d),
    diameter: () => D,
    bore: () => d,
  }

  /** Speed of a standing wave over that of a thin rod, from its end velocity. */
  function measureSpeed(wave: number, cells: number, courant: number, lateralInertia = true): number {
    const length = 2 * wave
    const rig = makeRig(
      [
        makeBar(
          'tube',
          [makeSection(length, 0, { shape: tube, material: { ...ROUND_STEEL, poisson: nu } })],
          {
            velocity: (_x, s) => Math.cos(4 * Math.PI * s),
            uniformVelocity: null,
          },
        ),
      ],
      { duration: (6 * wave) / C, timeStep: wave / C / cells },
      { gauges: [{ name: 'end', bar: 0, at: 0, bridge: null }] },
    )
    const { line, record } = marchElementsAtCourant({ ...rig, run: { ...rig.run, lateralInertia } }, courant)
    const { velocity } = record.gauges[0]
    // A mode repeats itself: v(t + dt) + v(t - dt) = 2 cos(w dt) v(t).
    let [sum, squares] = [0, 0]
    for (let k = 2; k < line.steps; k++) {
      sum += velocity[k] * (velocity[k + 1] + velocity[k - 1])
      squares += velocity[k] ** 2
    }
    const w = Math.acos(sum / (2 * squares)) / line.dt
    return (w * wave) / (2 * Math.PI) / C
  }

  it.each([0.12, 0.05])('a wave of %d m in a tube of 20 mm runs at the speed of Love', (wave) => {
    const k = (2 * Math.PI) / wave
    const love = 1 / Math.sqrt(1 + nu * nu * K2 * k * k)
    expect(1 - love).toBeGreaterThan(5e-3)
    const miss = (cells: number, courant: number) => Math.abs(measureSpeed(wave, cells, courant) / love - 1)
    expect(miss(48, 0.8)).toBeLessThan(3e-4)
    // Second order; at Courant one the errors of space and time cancel, and it is fourth.
    const [second, fourth] = [0.8, 1].map((courant) => Math.log2(miss(24, courant) / miss(48, courant)))
    expect(Math.abs(second - 2)).toBeLessThan(0.2)
    expect(Math.abs(fourth - 4)).toBeLessThan(0.4)
    expect(Math.abs(measureSpeed(wave, 24, 1, false) - 1)).toBeLessThan(1e-9)
  })
})

describe('bulk viscosity', () => {
  const push = (bulkViscosity: boolean) => {
    const rig = makeRig(
      [makeBar('bar', [makeSection(1, AREA)])],
      { duration: 1.8e-4, timeStep: 1e-6 },
      {
        leftEnd: { kind: 'velocity', pulse: makePulse(() => 10) },
        gauges: [{ name: 'middle', bar: 0, at: 0.5, bridge: null }],
      },
    )
    const { line, record } = marchElementsAtCourant({ ...rig, run: { ...rig.run, bulkViscosity } }, 0.8)
    const stress = record.gauges[0].force.map((F) => -F / AREA / (8000 * C * 10))
    const last = record.energy.work.length - 1
    const late = stress.slice(Math.round(1.4e-4 / line.dt))
    return {
      overshoot: Math.max(...stress) - 1,
      late: late.reduce((sum, one) => sum + one, 0) / late.length,
      // After the first step, in which the end is brought to its speed at a loss.
      share: (record.energy.dissipated[last] - record.energy.dissipated[0]) / record.energy.work[last],
    }
  }
  const [without, smoothed] = [push(false), push(true)]

  it('calms the ringing behind a front and leaves the state behind it', () => {
    expect(without.overshoot).toBeGreaterThan(0.1)
    expect(smoothed.overshoot).toBeLessThan(without.overshoot / 2)
    expect(Math.abs(smoothed.late - 1)).toBeLessThan(2e-3)
  })

  it('takes energy for it, and none where it is off', () => {
    expect(smoothed.share).toBeGreaterThan(1e-3)
    expect(without.share).toBeLessThan(1e-12)
  })
})
