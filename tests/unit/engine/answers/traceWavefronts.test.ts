import { describe, expect, it } from 'vitest'
import type { Wavefront } from '../../../../src-main/contract/result'
import type { End, Joint, Pulse } from '../../../../src-main/contract/rig'
import { traceWavefronts } from '../../../../src-main/engine/answers/traceWavefronts'
import { STEEL, type PlainRig } from './makePlainLine'
import { runPlain } from './runPlain'

const dt = 5e-6
const area = (Math.PI / 4) * 0.02 ** 2
const Z = 8000 * 5000 * area

const rectangle = (peak: number, from: number, to: number): Pulse => ({
  shape: 'rectangle',
  value: (t) => (t >= from - dt / 4 && t < to - dt / 4 ? peak : 0),
  rise: 0,
  breaks: [from, to],
})

/** The jumps of one directional wave at a place that the fronts foretell, by step, over the first front. */
function listJumps(fronts: Wavefront[], x: number, direction: 'right' | 'left'): Map<number, number> {
  const jumps = new Map<number, number>()
  for (const front of fronts) {
    const [low, high] = [Math.min(front.fromX, front.toX), Math.max(front.fromX, front.toX)]
    if (front.direction !== direction || x < low - 1e-9 || x > high + 1e-9) continue
    const share = (x - front.fromX) / (front.toX - front.fromX)
    const step = Math.round((front.fromT + share * (front.toT - front.fromT)) / dt)
    jumps.set(step, (jumps.get(step) ?? 0) + front.force)
  }
  return jumps
}

/** Runs a rig and holds every recorded jump at the gauges against the fronts, both ways. */
function expectFronts(
  plain: PlainRig,
  gauges: { bar: number; at: number }[],
  first: number,
  tolerance = 1e-9,
) {
  const { line, record } = runPlain({ dt, ...plain }, gauges)
  const fronts = traceWavefronts(line, record, { threshold: 1e-6 })
  for (const trace of record.gauges)
    for (const [direction, wave] of [
      ['right', trace.rightgoing],
      ['left', trace.leftgoing],
    ] as const) {
      const jumps = listJumps(fronts, trace.x, direction)
      let seen = 0
      for (let k = 1; k < wave.length; k++) {
        const recorded = (wave[k] - wave[k - 1]) / first
        if (Math.abs(recorded) > 1e-4) seen++
        expect(Math.abs(recorded - (jumps.get(k) ?? 0))).toBeLessThan(tolerance)
      }
      expect(seen).toBeGreaterThan(0)
    }
  return fronts
}

describe('fronts against the recorded run: every jump at a gauge is a front, and every front a jump', () => {
  it('like bars: one pulse of 2L/c passes whole into the target', () => {
    const fronts = expectFronts(
      {
        duration: 600e-6,
        bars: [
          { velocity: 10, sections: [{ length: 0.3, diameter: 0.02 }] },
          { sections: [{ length: 0.9, diameter: 0.02 }] },
        ],
      },
      [
        { bar: 1, at: 0.2 },
        { bar: 1, at: 0.7 },
      ],
      (-Z * 10) / 2,
    )
    expect(fronts.slice(0, 4)).toMatchObject([
      { direction: 'left', fromX: 0.3, fromT: 0, toX: 0, force: 1 },
      { direction: 'right', fromX: 0.3, fromT: 0, toX: 1.2, force: 1 },
      { direction: 'right', fromX: 0, toX: 0.3, force: -1 },
      { direction: 'right', fromX: 0.3, toX: 1.2, force: -1 },
    ])
    expect(fronts[3].fromT).toBeCloseTo(120e-6, 12)
  })

  it('a striker of twice the impedance: the tail steps down and nothing comes back over the open contact', () => {
    const first = (-Z * 10 * 2 * 1) / 3
    expectFronts(
      {
        duration: 900e-6,
        bars: [
          { velocity: 10, sections: [{ length: 0.3, area: () => 2 * area }] },
          { sections: [{ length: 0.9, area: () => area }] },
        ],
      },
      [
        { bar: 0, at: 0.1 },
        { bar: 1, at: 0.2 },
      ],
      first,
    )
  })

  it('a stepped shaft of two materials on a fixed end, with a rectangular pulse', () => {
    const light = { ...STEEL, density: 2000, modulus: 50e9 }
    const fronts = expectFronts(
      {
        duration: 800e-6,
        leftEnd: { kind: 'force', pulse: rectangle(-8e3, 20e-6, 60e-6) },
        rightEnd: { kind: 'fixed' },
        bars: [
          {
            sections: [
              { length: 0.3, diameter: 0.02 },
              { length: 0.2, diameter: 0.03 },
              { length: 0.25, diameter: 0.015, material: light },
            ],
          },
        ],
      },
      [
        { bar: 0, at: 0.1 },
        { bar: 0, at: 0.4 },
        { bar: 0, at: 0.6 },
      ],
      8e3,
    )
    expect(fronts[0]).toMatchObject({ direction: 'right', fromX: 0, force: 1, spread: false })
    expect(fronts[0].fromT).toBeCloseTo(20e-6, 12)
    expect(fronts.find((front) => front.fromX === 0 && front.fromT > 50e-6)).toMatchObject({ force: -1 })
  })

  it('ends that move, take all, carry a mass or a dashpot', () => {
    const bar = {
      sections: [
        { length: 0.3, diameter: 0.02 },
        { length: 0.3, diameter: 0.03 },
      ],
    }
    const support = {
      kind: 'support',
      stiffness: 0,
      damping: 0.4 * Z,
      mass: 0,
      joint: 'bonded',
      gap: 0,
    } as const
    const gauges = [
      { bar: 0, at: 0.1 },
      { bar: 0, at: 0.5 },
    ]
    const duration = 700e-6
    const pulse = rectangle(3, 0, 50e-6)
    expectFronts(
      { duration, bars: [bar], leftEnd: { kind: 'velocity', pulse }, rightEnd: support },
      gauges,
      -3 * Z,
    )
    expectFronts(
      { duration, bars: [bar], leftEnd: support, rightEnd: { kind: 'velocity', pulse } },
      gauges,
      3 * Z * 2.25,
    )
    const push: Pulse = { ...pulse, value: (t) => 1e-5 * Math.min(1, Math.max(0, (t + dt / 2) / 50e-6)) }
    expectFronts({ duration, bars: [bar], leftEnd: { kind: 'displacement', pulse: push } }, gauges, -Z * 0.2)
    const passed = expectFronts(
      {
        duration,
        bars: [bar, bar],
        joints: [{ kind: 'bonded' }],
        leftEnd: { kind: 'force', pulse },
        rightEnd: { kind: 'matched' },
      },
      [{ bar: 1, at: 0.1 }],
      -3,
    )
    expect(passed.some((front) => front.direction === 'left' && front.fromX > 1.19)).toBe(false)
  })

  it('a point load sends both ways, a release of preload from each free end', () => {
    const step: Pulse = {
      shape: 'step',
      value: (t) => (t >= 30e-6 - dt / 4 ? 1e4 : 0),
      rise: 0,
      breaks: [30e-6],
    }
    const loaded = expectFronts(
      {
        duration: 500e-6,
        bars: [{ sections: [{ length: 0.5, diameter: 0.02 }] }],
        loads: [{ bar: 0, at: 0.2, pulse: step }],
      },
      [
        { bar: 0, at: 0.1 },
        { bar: 0, at: 0.4 },
      ],
      -5e3,
    )
    expect(loaded.slice(0, 2)).toMatchObject([
      { direction: 'left', force: -1 },
      { direction: 'right', force: 1 },
    ])
    expectFronts(
      {
        duration: 500e-6,
        bars: [{ preload: 6e3, sections: [{ length: 0.5, diameter: 0.02 }] }],
        leftEnd: { kind: 'fixed' },
      },
      [
        { bar: 0, at: 0.1 },
        { bar: 0, at: 0.4 },
      ],
      -6e3,
    )
  })

  it('a wall struck: the bar comes to rest, turns round and leaves', () => {
    const fronts = expectFronts(
      {
        duration: 500e-6,
        bars: [{ velocity: 4, sections: [{ length: 0.5, diameter: 0.02 }] }],
        rightEnd: { kind: 'wall', gap: 0 },
      },
      [{ bar: 0, at: 0.1 }],
      -4 * Z,
    )
    expect(fronts).toHaveLength(2)
  })
})

describe('fronts where the trace is by its own rules', () => {
  it('begins anew where a gap closes', () => {
    const { line, record } = runPlain({
      dt,
      duration: 400e-6,
      bars: [
        { velocity: 10, sections: [{ length: 0.3, diameter: 0.02 }] },
        { sections: [{ length: 0.2, diameter: 0.02 }] },
        { sections: [{ length: 0.3, diameter: 0.02 }] },
      ],
      joints: [
        { kind: 'contact', gap: 1e-4 },
        { kind: 'contact', gap: 2e-4 },
      ],
    })
    const fronts = traceWavefronts(line, record)
    // 0.1 mm at 10 m/s: 10 us; then L/c = 40 us, and 0.2 mm at the free face's 10 m/s: 70 us.
    expect(fronts[0].fromT).toBeCloseTo(10e-6, 12)
    const second = fronts.filter(
      (front) => front.fromX === 0.5 && front.force === 1 && front.direction === 'right',
    )
    expect(second[0].fromT).toBeCloseTo(70e-6, 12)
  })

  it('takes a wall that is never reached for a free end, whatever the rounding of its force', () => {
    const plain: PlainRig = {
      duration: 900e-6,
      leftEnd: { kind: 'force', pulse: rectangle(7e3, 15e-6, 65e-6) },
      bars: [
        {
          sections: [
            { length: 0.3, diameter: 0.02 },
            { length: 0.2, diameter: 0.0233 },
          ],
        },
      ],
    }
    const gauges = [{ bar: 0, at: 0.1 }]
    const free = expectFronts(plain, gauges, -7e3)
    expect(expectFronts({ ...plain, rightEnd: { kind: 'wall', gap: 1 } }, gauges, -7e3)).toEqual(free)
  })

  it('runs through a taper as one line that grows by sqrt(Z2/Z1) and is spread from there on', () => {
    const { line, record } = runPlain({
      dt,
      duration: 200e-6,
      leftEnd: { kind: 'force', pulse: rectangle(-1e4, 0, 1) },
      bars: [
        {
          sections: [
            { length: 0.3, diameter: 0.02 },
            { length: 0.1, diameter: [0.02, 0.04] },
            { length: 0.2, diameter: 0.04 },
          ],
        },
      ],
    })
    const fronts = traceWavefronts(line, record)
    expect(fronts.slice(0, 3)).toMatchObject([
      { spread: false, force: 1 },
      { spread: true },
      { spread: true },
    ])
    expect(fronts[1].force).toBeCloseTo(2, 13)
    expect(fronts[2].force).toBeCloseTo(2, 13)
    expect(fronts[3]).toMatchObject({ direction: 'left', spread: true })
    expect(fronts[3].fromX).toBeCloseTo(0.6, 13)
  })

  it('drops what is under the threshold and stops at the count', () => {
    const plain: PlainRig = {
      dt,
      duration: 3e-3,
      leftEnd: { kind: 'force', pulse: rectangle(-1e4, 0, 1) },
      bars: [
        {
          sections: Array.from({ length: 20 }, (_, i) => ({
            length: 0.05,
            diameter: i % 2 === 0 ? 0.02 : 0.021,
          })),
        },
      ],
    }
    const { line, record } = runPlain(plain)
    const fronts = traceWavefronts(line, record)
    expect(Math.min(...fronts.map(({ force }) => Math.abs(force)))).toBeGreaterThan(0.0199)
    expect(traceWavefronts(line, record, { threshold: 0, most: 100 })).toHaveLength(100)
    expect(traceWavefronts(line, record, { threshold: 0.5 }).length).toBeLessThan(fronts.length)
  })

  it('draws nothing where nothing happens', () => {
    const { line, record } = runPlain({
      dt,
      bars: [{ velocity: 3, sections: [{ length: 0.2, diameter: 0.02 }] }],
    })
    expect(traceWavefronts(line, record)).toEqual([])
  })

  it.each<[string, End, number]>([
    ['free', { kind: 'free' }, -1],
    ['a force that stays', { kind: 'force', pulse: rectangle(0, 0, 1) }, -1],
    ['fixed', { kind: 'fixed' }, 1],
    ['a mass', { kind: 'mass', mass: 2, velocity: 0, joint: 'bonded', gap: 0 }, 1],
    ['a spring', { kind: 'support', stiffness: 1e8, damping: 0, mass: 0, joint: 'bonded', gap: 0 }, -1],
    [
      'a mass on a spring',
      { kind: 'support', stiffness: 1e8, damping: 9, mass: 1, joint: 'bonded', gap: 0 },
      1,
    ],
    [
      'a dashpot of 3 Z',
      { kind: 'support', stiffness: 0, damping: 3 * Z, mass: 0, joint: 'bonded', gap: 0 },
      0.5,
    ],
  ])('turns back from %s as (D - Z)/(D + Z)', (_, rightEnd, expected) => {
    const leftEnd = { kind: 'force', pulse: rectangle(-1e4, 0, 1) } as const
    const { line, record } = runPlain({
      dt,
      leftEnd,
      rightEnd,
      bars: [{ sections: [{ length: 0.3, diameter: 0.02 }] }],
    })
    const back = traceWavefronts(line, record)[1]
    expect(back).toMatchObject({ direction: 'left', fromX: 0.3 })
    expect(back.force).toBeCloseTo(expected, 13)
  })

  it.each<[string, Partial<Extract<Joint, { kind: 'cushion' }>>, number, number]>([
    ['a spring', {}, -1, 0],
    ['a dashpot of Z', { damping: Z }, -1 / 3, 2 / 3],
    ['a mass on each face', { mass: 1 }, 1, 0],
  ])('meets in a cushion with %s what moves at once', (_, change, back, through) => {
    const cushion: Joint = {
      kind: 'cushion',
      stiffness: 1e8,
      curve: null,
      unloading: null,
      damping: 0,
      mass: 0,
      gap: 0,
      tension: true,
      ...change,
    }
    const bar = { sections: [{ length: 0.3, diameter: 0.02 }] }
    const leftEnd = { kind: 'force', pulse: rectangle(-1e4, 0, 1) } as const
    const { line, record } = runPlain({ dt, leftEnd, bars: [bar, bar], joints: [cushion] })
    const fronts = traceWavefronts(line, record)
    const after = fronts.filter((front) => front.fromX === 0.3 && front.fromT < 70e-6)
    expect(after.find((front) => front.direction === 'left')!.force).toBeCloseTo(back, 13)
    expect(after.find((front) => front.direction === 'right')?.force ?? 0).toBeCloseTo(through, 13)
  })

  it("starts a hammer's blow and ends it where the front comes back from the free end", () => {
    const leftEnd = { kind: 'mass', mass: 0.5, velocity: 6, joint: 'contact', gap: 0 } as const
    const { line, record } = runPlain({
      dt,
      leftEnd,
      bars: [{ sections: [{ length: 0.3, diameter: 0.02 }] }],
    })
    const fronts = traceWavefronts(line, record)
    expect(fronts.map(({ force }) => force).slice(0, 2)).toEqual([1, -1])
    // Far end free: the force, s0 exp(-Z t/M) by then, drops to zero at 2L/c (Love, art. 281, from memory).
    const third = fronts[2]
    expect(third.fromT).toBeCloseTo(120e-6, 12)
    // Recorded force one step of 5 us before, by the midpoint rule: within 0.5 % of the first front.
    expect(third.force).toBeCloseTo(1 - Math.exp((-Z * 120e-6) / 0.5), 2)
  })

  it('begins a smooth pulse at its onset', () => {
    const pulse: Pulse = {
      shape: 'half-sine',
      value: (t) => (t > 50e-6 && t < 150e-6 ? -1e4 * Math.sin((Math.PI * (t - 50e-6)) / 100e-6) : 0),
      rise: 30e-6,
      breaks: [50e-6, 150e-6],
    }
    const { line, record } = runPlain({
      dt,
      leftEnd: { kind: 'force', pulse },
      bars: [{ sections: [{ length: 0.3, diameter: 0.02 }] }],
    })
    const [first] = traceWavefronts(line, record)
    expect(first.force).toBe(1)
    expect(first.fromT).toBeCloseTo(50e-6, 12)
  })
})
