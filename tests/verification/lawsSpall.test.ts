import { describe, expect, it } from 'vitest'
import type { Rig } from '../../src-main/contract/rig'
import { makeWaveMethod } from '../../src-main/engine/characteristics/makeWaveMethod'
import { makeLine } from '../../src-main/engine/line/makeLine'
import { makeMarch } from '../../src-main/engine/march/march'
import { makeRecords } from '../../src-main/engine/records/makeRecords'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../unit/engine/testRig'

// Closed forms of Rinehart, J. Appl. Phys. 22 (1951) 555 and 23 (1952) 1229 (from memory), here with numbers other
// than those of the self-check.
const C = 5000
const RHO = 8000
const AREA = 1e-3
const STRENGTH = 160e6

/** A bar that the left end presses with a stress over time, its right end as given; it may come apart. */
function makePressed(
  stress: (t: number) => number,
  length: number,
  run: { duration: number; timeStep: number },
  options: Partial<Rig> = {},
  strength: number | null = STRENGTH,
): Rig {
  const rig = makeRig(
    [makeBar('bar', [makeSection(length, AREA, { material: { ...ROUND_STEEL, spall: strength } })])],
    run,
    { leftEnd: { kind: 'force', pulse: makePulse((t) => stress(t) * AREA) }, ...options },
  )
  return { ...rig, run: { ...rig.run, spall: true } }
}
function march(rig: Rig) {
  const run = makeWaveMethod(makeLine(rig))
  const records = makeRecords(run, false)
  const march = makeMarch(run, records, run.line.steps)
  march.advance(march.end)
  expect(march.broken).toBe(false)
  return { run, record: records.finish(), fragments: run.listFragments() }
}

describe('a triangular pulse at a free end', () => {
  const [PEAK, PULSE] = [700e6, 16e-6]
  const long = PULSE * C
  const triangle = (t: number) => (t < PULSE ? PEAK * (1 - t / PULSE) : 0)
  const solve = (cells: number) =>
    march(makePressed(triangle, 0.1, { duration: 37e-6, timeStep: 0.1 / C / cells }))
  const thickness = (long * STRENGTH) / (2 * PEAK)

  it('comes apart floor(sm/sF) times, in pieces of one thickness, the j-th at (2 sm - (2 j - 1) sF)/(rho c)', () => {
    const { run, record, fragments } = solve(1499)
    const count = Math.floor(PEAK / STRENGTH)
    expect(run.breaks).toHaveLength(count)
    const cell = 0.1 / 1499
    fragments
      .slice(1)
      .reverse()
      .forEach(({ from, to, mass, momentum }, j) => {
        expect(Math.abs(to - from - thickness)).toBeLessThan(1.01 * cell)
        const velocity = (2 * PEAK - (2 * j + 1) * STRENGTH) / (RHO * C)
        // Each piece may begin up to a cell off, 0.7 % of its thickness, over which the stress falls by twice the strength.
        expect(Math.abs(momentum / mass - velocity)).toBeLessThan(0.02 * (STRENGTH / (RHO * C)) * (j + 1))
      })
    // They came apart from the free end inwards, each at the strength.
    for (let i = 1; i < count; i++) {
      expect(run.breaks[i].x).toBeLessThan(run.breaks[i - 1].x)
      expect(run.breaks[i].k).toBeGreaterThan(run.breaks[i - 1].k)
    }
    for (const { force, area } of run.breaks) {
      expect(force / area).toBeGreaterThan(STRENGTH)
      expect(force / area).toBeLessThan(STRENGTH * 1.02)
    }
    // What is left of the pulse is under the strength, and all impulse is in the pieces.
    const impulse = (PEAK * PULSE * AREA) / 2
    const total = fragments.reduce((sum, { momentum }) => sum + momentum, 0)
    expect(Math.abs(total / impulse - 1)).toBeLessThan(1e-3)
    expect(record.energy.closure).toBeLessThan(1e-12)
    expect(record.energy.momentumClosure).toBeLessThan(1e-12)
  })

  it('its thickness comes nearer with the cell', () => {
    const [coarse, fine] = [149, 1499].map((cells) => {
      const { fragments } = solve(cells)
      const last = fragments[fragments.length - 1]
      return Math.abs((last.to - last.from) / thickness - 1)
    })
    expect(coarse).toBeLessThan(0.1)
    expect(fine).toBeLessThan(0.01)
  })

  it('carries no tension over the strength anywhere but the one that opens it', () => {
    const { record } = solve(499)
    const highest = Math.max(...record.envelope.tension) / AREA
    expect(highest).toBeGreaterThan(0.9 * STRENGTH)
    // A step that would bring more opens the place instead: the overshoot is the pulse's slope over a cell.
    expect(highest).toBeLessThan(STRENGTH * 1.05)
  })

  it.each([
    ['under its strength', 1.01 * PEAK],
    ['without a strength', null],
  ])('stays whole %s', (_name, strength) => {
    const rig = makePressed(triangle, 0.1, { duration: 37e-6, timeStep: 0.1 / C / 149 }, {}, strength)
    expect(march(rig).run.breaks).toHaveLength(0)
  })

  it('stays whole where it was not asked to come apart', () => {
    const rig = makePressed(triangle, 0.1, { duration: 37e-6, timeStep: 0.1 / C / 149 })
    expect(march({ ...rig, run: { ...rig.run, spall: false } }).run.breaks).toHaveLength(0)
  })
})

describe('a piece that flies off a square pulse, meets a wall and comes back', () => {
  const DT = 1e-7
  const PULSE = 80 * DT
  const PEAK = 300e6
  const LENGTH = 400 * C * DT
  const SPEED = (2 * PEAK) / (RHO * C)
  /** Time from the pulse's arrival to the wall, and what the free end travels in it. */
  const FLIGHT = 120 * DT
  const GAP = SPEED * FLIGHT
  const at = 0.5 * LENGTH
  // Half a step short, so that the last step of the pulse is its last whole one.
  const square = (t: number) => (t < PULSE - DT / 2 ? PEAK : 0)
  const piece = (PULSE * C) / 2
  // The wall sends it back within one crossing and return; its inner face turns after half of that.
  const closing = LENGTH / C + FLIGHT + PULSE / 2 + GAP / SPEED
  const solve = (duration: number) =>
    march(
      makePressed(
        square,
        LENGTH,
        { duration, timeStep: DT },
        {
          rightEnd: { kind: 'wall', gap: GAP },
          gauges: [{ name: 'G', bar: 0, at, bridge: null }],
        },
      ),
    )

  it('one piece, half as long as the pulse, takes all its momentum', () => {
    const { run, fragments } = solve(LENGTH / C + FLIGHT - 5 * DT)
    expect(run.breaks).toHaveLength(1)
    const [bar, flown] = fragments
    expect(Math.abs(flown.to - flown.from - piece)).toBeLessThan(1.01 * C * DT)
    expect(flown.momentum / flown.mass / SPEED).toBeCloseTo(1, 9)
    expect(Math.abs(bar.momentum)).toBeLessThan(1e-9 * flown.momentum)
  })

  it('it bounces off the wall with the opposite speed', () => {
    const { fragments } = solve(closing - 20 * DT)
    expect(fragments[1].momentum / fragments[1].mass / SPEED).toBeCloseTo(-1, 9)
  })

  it('and closes the crack again: half its stress for a crossing and return, and it hands its momentum on', () => {
    const { run, record, fragments } = solve(closing + (LENGTH - piece) / C - 20 * DT)
    expect(run.breaks).toHaveLength(1)
    const [bar, flown] = fragments
    expect(Math.abs(flown.momentum)).toBeLessThan(1e-6 * flown.mass * SPEED)
    expect(bar.momentum / (flown.mass * SPEED)).toBeCloseTo(-1, 6)
    const first = Math.round((closing + (LENGTH - piece - at) / C) / DT)
    const pressed = record.gauges[0].force.map((F) => -F / AREA)
    for (let k = first - 30; k < first - 2; k++) expect(Math.abs(pressed[k])).toBeLessThan(1e-6 * PEAK)
    for (let k = first + 2; k < first + 78; k++) expect(Math.abs(pressed[k] / PEAK - 1)).toBeLessThan(1e-6)
    for (let k = first + 83; k < pressed.length; k++) expect(Math.abs(pressed[k])).toBeLessThan(1e-6 * PEAK)
    expect(record.energy.closure).toBeLessThan(1e-12)
    expect(record.energy.momentumClosure).toBeLessThan(1e-12)
  })
})

describe('two pulses', () => {
  it('the second breaks what the first has left whole, and nothing is lost', () => {
    const pulse = 8e-6
    const triangle = (t: number) => (t >= 0 && t < pulse ? 250e6 * (1 - t / pulse) : 0)
    const stress = (t: number) => triangle(t) + triangle(t - 20e-6)
    const { run, record, fragments } = march(
      makePressed(stress, 0.1, { duration: 48e-6, timeStep: 0.1 / C / 499 }),
    )
    expect(run.breaks).toHaveLength(2)
    expect(run.breaks[1].x).toBeLessThan(run.breaks[0].x)
    // Both pieces are lambda sF/(2 sm): the second free face is that of the first break.
    const thickness = (pulse * C * STRENGTH) / 500e6
    for (const { from, to } of fragments.slice(1)) {
      expect(Math.abs(to - from - thickness)).toBeLessThan(1.5 * (0.1 / 499))
    }
    const total = fragments.reduce((sum, { momentum }) => sum + momentum, 0)
    expect(Math.abs(total / (250e6 * pulse * AREA) - 1)).toBeLessThan(0.01)
    expect(record.energy.closure).toBeLessThan(1e-12)
  })
})
