import { describe, expect, it } from 'vitest'
import type { Quantity } from '../../../../../src-main/contract/bridge'
import type { Rig } from '../../../../../src-main/contract/rig'
import { makeSolve, type RunField, type Solution } from '../../../../../src-main/engine/solveRig'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../../testRig'

/** A bar of 1 m: 0.6 m of 4e-4 m^2 and 0.4 m of 2e-4 m^2, hit by a mass; 200 cells, 0.6 ms. */
function makeStepped(
  { cell = 5e-3, duration = 0.6e-3, method = 'characteristics' as Rig['run']['method'] } = {},
  sections = [makeSection(0.6, 4e-4), makeSection(0.4, 2e-4)],
): Rig {
  const rig = makeRig(
    [makeBar('pin', sections)],
    { duration, cell },
    {
      leftEnd: { kind: 'mass', mass: 2, velocity: 3, joint: 'bonded', gap: 0 },
      rightEnd: { kind: 'fixed' },
    },
  )
  return { ...rig, run: { ...rig.run, method } }
}

const makeTapered = (): Rig =>
  makeStepped({}, [makeSection(0.4, 4e-4), makeSection(0.6, (s) => 4e-4 * (1 - s) + 1e-4 * s)])

/** The pulse of a short striker turns into tension at the free end and breaks a bar of 100 MPa. */
function makeSpalling(): Rig {
  const material = { ...ROUND_STEEL, spall: 100e6 }
  const bars = [
    makeBar('striker', [makeSection(0.2, 4e-4)], { velocity: () => 8, uniformVelocity: 8 }),
    makeBar('rod', [makeSection(0.8, 4e-4, { material })]),
  ]
  const rig = makeRig(bars, { duration: 0.5e-3, cell: 5e-3 })
  return { ...rig, run: { ...rig.run, spall: true } }
}

function solve(rig: Rig, full = true): { field: RunField; solution: Solution; dt: number; steps: number } {
  const solve = makeSolve(rig, { full, field: true })
  solve.advance(solve.steps)
  return { field: solve.field!, solution: solve.finish(), dt: solve.line.dt, steps: solve.line.steps }
}

/** A window of the smallest size around a place. */
const around = (quantity: Quantity, x: number, t: number) => ({
  quantity,
  fromX: x - 1e-9,
  toX: x + 1e-9,
  fromT: t - 1e-12,
  toT: t + 1e-12,
  columns: 1,
  rows: 1,
})

describe('the field of a run', () => {
  it.each([
    ['uniform sections', makeStepped()],
    ['a taper', makeTapered()],
    ['elements', makeStepped({ method: 'elements' })],
    ['a bar that comes apart', makeSpalling()],
  ])('has the values of the full record at each place and step: %s', (_, rig) => {
    const { field, solution, dt } = solve(rig)
    const { x, t, stress } = solution.field
    expect(solution.spalls.length > 0).toBe(rig.run.spall)
    for (let k = 1; k < t.length; k += 7) {
      // Faces stand twice in the record, and a pixel shows both.
      for (let i = 1; i < x.length - 1; i += 11) {
        if (x[i] === x[i - 1] || x[i] === x[i + 1]) continue
        const [low, high] = field.readTile(around('stress', x[i], k * dt))
        // Single precision, taken twice where a force is sampled: 2 x 2^-24.
        expect(Math.abs(low - stress[k][i])).toBeLessThanOrEqual(1.2e-7 * Math.abs(stress[k][i]))
        expect(high).toBe(low)
      }
    }
  })

  it('has the velocity that a gauge on a taper has', () => {
    const rig = { ...makeTapered(), gauges: [{ name: 'G', bar: 0, at: 0.7, bridge: null }] }
    const { field, solution, dt } = solve(rig)
    const [gauge] = solution.gauges
    for (let k = 1; k < gauge.t.length; k += 9) {
      const [low] = field.readTile(around('velocity', gauge.x, k * dt))
      expect(Math.abs(low - gauge.velocity[k])).toBeLessThanOrEqual(
        1.2e-7 * Math.abs(gauge.velocity[k]) + 1e-12,
      )
    }
  })

  it('shows the peaks of the envelope in one pixel of the whole line and run', () => {
    for (const rig of [makeStepped(), makeTapered()]) {
      const { field, solution, dt, steps } = solve(rig)
      const whole = { fromX: 0, toX: 1, fromT: 0, toT: dt * steps, columns: 1, rows: 1 }
      const [low, high] = field.readTile({ ...whole, quantity: 'stress' })
      expect(low).toBe(Math.fround(Math.min(...solution.envelope.compression)))
      expect(high).toBe(Math.fround(Math.max(...solution.envelope.tension)))
    }
  })

  it('loses no peak when seen from afar: its largest pixel is the largest of the record', () => {
    const { field, solution, dt, steps } = solve(makeStepped({ cell: 0.5e-3, duration: 2e-3 }), false)
    const tile = field.readTile({
      quantity: 'stress',
      fromX: 0,
      toX: 1,
      fromT: 0,
      toT: dt * steps,
      columns: 100,
      rows: 80,
    })
    const lows = tile.filter((_, i) => i % 2 === 0)
    expect(Math.min(...lows)).toBe(Math.fround(Math.min(...solution.envelope.compression)))
    expect(tile.some(Number.isNaN)).toBe(false)
  })

  it('shows in each pixel what is well inside it and only what is within half a pixel of it, and loses none', () => {
    const { field, solution, dt, steps } = solve(makeStepped({ cell: 1e-3, duration: 1e-3 }))
    const { x, stress } = solution.field
    const [columns, rows] = [40, 40]
    const end = dt * steps
    const window = { fromX: 0, toX: 1, fromT: 0, toT: end, columns, rows }
    const tile = field.readTile({ ...window, quantity: 'stress' })
    const size = { x: 1 / columns, t: end / rows }
    /** Extremes of the record in a pixel that is widened (or narrowed) by a share of its size. */
    const search = (row: number, column: number, share: number) => {
      let [low, high] = [Infinity, -Infinity]
      for (let k = 0; k <= steps; k++) {
        if (k * dt < (row - share) * size.t || k * dt > (row + 1 + share) * size.t) continue
        x.forEach((place, i) => {
          if (place < (column - share) * size.x || place > (column + 1 + share) * size.x) return
          low = Math.min(low, stress[k][i])
          high = Math.max(high, stress[k][i])
        })
      }
      return { low: Math.fround(low), high: Math.fround(high) }
    }
    for (let row = 0; row < rows; row += 5) {
      for (let column = 0; column < columns; column += 5) {
        const at = 2 * (row * columns + column)
        const inner = search(row, column, -0.2)
        const outer = search(row, column, 0.55)
        expect(tile[at]).toBeLessThanOrEqual(inner.low)
        expect(tile[at]).toBeGreaterThanOrEqual(outer.low)
        expect(tile[at + 1]).toBeGreaterThanOrEqual(inner.high)
        expect(tile[at + 1]).toBeLessThanOrEqual(outer.high)
      }
    }
  })

  it('has nothing beside the line and outside the run', () => {
    const { field } = solve(makeStepped())
    const window = {
      quantity: 'stress' as const,
      fromX: -1,
      toX: 2,
      fromT: -1e-3,
      toT: 2e-3,
      columns: 3,
      rows: 3,
    }
    const tile = field.readTile(window)
    const empty = Array.from({ length: 9 }, (_, i) => Number.isNaN(tile[2 * i]))
    expect(empty).toEqual([true, true, true, true, false, true, true, true, true])
    expect(field.readProfile(1, 4).stress).toEqual(new Float64Array(4).fill(NaN))
  })

  it('turns force and velocity into each quantity', () => {
    // v = 3 m/s behind the first front, F = -Z v: stress -rho c v, energy rho v^2 (half kinetic, half strain).
    const rig = makeRig(
      [makeBar('pin', [makeSection(1, 4e-4)])],
      { duration: 0.1e-3, cell: 1e-2 },
      {
        leftEnd: { kind: 'velocity', pulse: makePulse(() => 3) },
      },
    )
    const { field } = solve(rig)
    const at = (quantity: Quantity) => field.readTile(around(quantity, 0.155, 0.08e-3))[1]
    const { density } = ROUND_STEEL
    expect(at('velocity')).toBeCloseTo(3, 6)
    expect(at('stress')).toBeCloseTo(-4e7 * 3, -2)
    expect(at('force')).toBeCloseTo(-4e7 * 3 * 4e-4, 1)
    expect(at('energy')).toBeCloseTo(density * 9, 1)
  })

  it('counts the fall into velocity and energy', () => {
    // A free bar that falls has no stress, and v = g t everywhere.
    const bar = makeBar('pin', [makeSection(1, 4e-4), makeSection(0.5, (s) => 4e-4 + 1e-4 * s)])
    const rig = makeRig([bar], { duration: 1e-3, cell: 1e-2 }, { gravity: 9.81 })
    const { field } = solve(rig)
    for (const x of [0.5, 1.25]) {
      expect(field.readTile(around('velocity', x, 0.5e-3))[0]).toBeCloseTo(9.81 * 0.5e-3, 6)
      expect(field.readTile(around('energy', x, 0.5e-3))[0]).toBeCloseTo((8000 * (9.81 * 0.5e-3) ** 2) / 2, 4)
    }
    expect(field.readProfile(0.5e-3, 3).velocity[1]).toBeCloseTo(9.81 * 0.5e-3, 12)
  })

  it('reads the profile at one time as the record has it', () => {
    for (const rig of [makeStepped(), makeTapered(), makeStepped({ method: 'elements' })]) {
      const { field, solution, dt } = solve(rig)
      const profile = field.readProfile(40 * dt, 1000)
      profile.x.forEach((x, i) => {
        const near = solution.field.x.findIndex((place) => Math.abs(place - x) < 0.3e-3)
        if (near < 0 || Math.abs(x - 0.6) < 1e-3 || Math.abs(x - 0.4) < 1e-3) return
        expect(profile.stress[i]).toBeCloseTo(solution.field.stress[40][near], -2)
        expect(profile.rightgoing[i] + profile.leftgoing[i]).toBeCloseTo(profile.force[i], 6)
      })
    }
  })
})
