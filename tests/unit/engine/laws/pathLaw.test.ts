import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  makePowerCurve,
  makeStraightCurve,
  makeTableCurve,
} from '../../../../src-main/engine/laws/loadingCurves'
import { type LoadingCurve, makePathLaw, type PathLaw } from '../../../../src-main/engine/laws/pathLaw'

const K = 2e8
const straight = makeStraightCurve(K)

/** Moves a law and gives the work done on it. */
function move(law: PathLaw, to: number): number {
  const work = law.mean(to) * (to - law.closing)
  law.moveTo(to)
  return work
}
/** The force where it stands. */
const forceOf = (law: PathLaw) => law.mean(law.closing)

describe('a law that unloads as it loads', () => {
  it('presses with K x, stores K x^2/2, and lets go below zero', () => {
    const law = makePathLaw(straight, null, 0)
    expect(move(law, 1e-3)).toBeCloseTo((K * 1e-6) / 2, 9)
    expect(forceOf(law)).toBe(K * 1e-3)
    expect(law.stored()).toBeCloseTo((K * 1e-6) / 2, 9)
    expect(move(law, -1e-3)).toBeCloseTo((-K * 1e-6) / 2, 9)
    expect(forceOf(law)).toBe(0)
    expect(law.stored()).toBe(0)
    expect(law.rest).toBe(0)
  })

  it('pulls where it may, with the curve turned about zero', () => {
    const law = makePathLaw(makePowerCurve(K, 2), null, 0, true)
    expect(move(law, -1e-2)).toBeCloseTo((K * 1e-6) / 3, 9)
    expect(forceOf(law)).toBeCloseTo(-K * 1e-4, 9)
    expect(law.stored()).toBeCloseTo((K * 1e-6) / 3, 9)
  })

  it('does nothing within its gap', () => {
    const law = makePathLaw(straight, null, -5e-4)
    expect(law.mean(0)).toBe(0)
    expect(law.mean(5e-4)).toBeCloseTo((K * 25e-8) / 2 / 1e-3, 9)
    expect(move(law, 1e-3)).toBeCloseTo((K * 1e-6) / 2, 9)
  })
})

describe('a law with an unloading line of its own', () => {
  const Ku = 4 * K

  it('unloads along the line to its set, loads again along it, and goes on along the curve', () => {
    const law = makePathLaw(straight, Ku, 0)
    move(law, 1e-3)
    expect(law.loads(1.1e-3)).toBe(true)
    move(law, 0.9e-3)
    expect(forceOf(law)).toBeCloseTo(K * 1e-3 - Ku * 1e-4, 6)
    expect(law.rest).toBeCloseTo(0.75e-3, 12)
    expect(law.loads(0.95e-3)).toBe(false)
    move(law, 0.7e-3)
    expect(forceOf(law)).toBe(0)
    move(law, 0.8e-3)
    expect(forceOf(law)).toBeCloseTo(Ku * 0.05e-3, 6)
    move(law, 1e-3)
    expect(forceOf(law)).toBeCloseTo(K * 1e-3, 6)
    move(law, 1.5e-3)
    expect(forceOf(law)).toBeCloseTo(K * 1.5e-3, 6)
    expect(law.rest).toBeCloseTo(1.5e-3 * 0.75, 12)
  })

  it('stores F^2/(2 Ku) and keeps the rest, W (1 - K/Ku)', () => {
    const law = makePathLaw(straight, Ku, 0)
    const work = move(law, 1e-3)
    expect(law.stored()).toBeCloseTo((K * 1e-3) ** 2 / (2 * Ku), 9)
    const back = -move(law, 0)
    expect((work - back) / work).toBeCloseTo(1 - K / Ku, 12)
  })

  it('that is rigid gives nothing back, and presses again from where it was left', () => {
    const law = makePathLaw(straight, Infinity, 0)
    const work = move(law, 1e-3)
    expect(law.stored()).toBe(0)
    expect(law.rest).toBe(1e-3)
    expect(move(law, 0.5e-3)).toBeCloseTo(0, 12)
    expect(forceOf(law)).toBe(0)
    expect(move(law, 1e-3)).toBe(0)
    expect(work + move(law, 2e-3)).toBeCloseTo((K * 4e-6) / 2, 9)
  })
})

describe('loading curves', () => {
  it('a table goes through its points, between them by straight lines, and on with its last slope', () => {
    const curve = makeTableCurve([0, 1e-3, 3e-3], [0, 1e5, 2e5])
    expect([5e-4, 1e-3, 2e-3, 3e-3, 5e-3].map((x) => Math.round(curve.force(x)))).toEqual([
      5e4, 1e5, 1.5e5, 2e5, 3e5,
    ])
    expect(curve.work(1e-3)).toBeCloseTo(50, 9)
    expect(curve.work(3e-3)).toBeCloseTo(350, 9)
    expect(curve.work(5e-3)).toBeCloseTo(850, 9)
  })

  it('a table may rise at once', () => {
    const curve = makeTableCurve([0, 1e-3], [4e4, 6e4])
    expect(curve.force(0)).toBe(4e4)
    expect(curve.work(5e-4)).toBeCloseTo(22.5, 9)
  })

  it.each<[string, LoadingCurve]>([
    ['straight', straight],
    ['a table', makeTableCurve([0, 1e-3, 3e-3], [2e4, 1e5, 1.2e5])],
    ['a power', makePowerCurve(1e7, 0.4)],
  ])('%s: its work is the integral of its force', (_name, curve) => {
    // The middle of 4000 stretches: second order, but at the start of the power, h^1.4.
    const [top, count] = [4e-3, 4000]
    let sum = 0
    for (let i = 0; i < count; i++) sum += (curve.force(((i + 0.5) / count) * top) * top) / count
    expect(Math.abs(curve.work(top) / sum - 1)).toBeLessThan(1e-4)
  })
})

describe('whatever the path', () => {
  const curves: [string, LoadingCurve, number][] = [
    ['straight', straight, 3 * K],
    ['table', makeTableCurve([0, 1e-3, 3e-3], [0, 2e5, 3e5]), 2.5e8],
    ['power', makePowerCurve(1e7, 0.4), Infinity],
  ]
  it.each(curves)(
    '%s: work is stored or lost, nothing is given back that was not stored, and steps do not matter',
    (_n, curve, Ku) => {
      fc.assert(
        fc.property(
          fc.array(fc.integer({ min: -1000, max: 4000 }), { minLength: 1, maxLength: 12 }),
          fc.integer({ min: 2, max: 9 }),
          fc.boolean(),
          (stops, parts, own) => {
            const make = () => makePathLaw(curve, own ? Ku : null, 0)
            const [whole, fine] = [make(), make()]
            const scale = curve.work(4e-3)
            let [lost, work, fineWork] = [0, 0, 0]
            for (const stop of stops) {
              const to = stop * 1e-6
              const from = fine.closing
              work += move(whole, to)
              for (let i = 1; i <= parts; i++)
                fineWork += move(fine, i === parts ? to : from + ((to - from) * i) / parts)
              const now = work - whole.stored()
              expect(now).toBeGreaterThanOrEqual(lost - 1e-12 * scale)
              lost = now
              expect(whole.stored()).toBeGreaterThanOrEqual(0)
            }
            expect(Math.abs(work - fineWork)).toBeLessThan(1e-11 * scale)
            expect(Math.abs(whole.stored() - fine.stored())).toBeLessThan(1e-11 * scale)
            if (!own) expect(Math.abs(lost)).toBeLessThan(1e-11 * scale)
          },
        ),
        { seed: 20250314, numRuns: 100 },
      )
    },
  )
})
