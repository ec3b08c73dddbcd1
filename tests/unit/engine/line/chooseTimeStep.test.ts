import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { chooseTimeStep, countCells } from '../../../../src-main/engine/line/chooseTimeStep'

const evaluateError = (taus: number[], dt: number) =>
  taus.reduce((sum, tau) => sum + Math.abs(countCells(tau, dt) * dt - tau), 0)
const sum = (taus: number[]) => taus.reduce((all, tau) => all + tau, 0)

describe('the time step', () => {
  it.each([
    [[60e-6, 100e-6, 140e-6], 1.1e-6],
    [[60e-6, 100e-6, 140e-6], 25e-6],
    [[0.3 / 5000, 0.9 / 5000], 3e-3 / 5000],
    [[1 / 7, 2 / 7, 5 / 7], 0.01],
    [Array.from({ length: 40 }, (_, i) => (i + 1) * 1.3e-6), 1.3e-6],
  ])('leaves no rounding where the travel times have a common part: %j, wanted %d', (taus, wanted) => {
    const dt = chooseTimeStep(taus, wanted)
    for (const tau of taus) expect(Math.abs(tau / dt - Math.round(tau / dt))).toBeLessThan(1e-9)
    expect(dt).toBeLessThanOrEqual(wanted * (1 + 1e-12))
    expect(dt).toBeGreaterThan(0.69 * wanted)
  })

  it('takes the coarser of two that leave the same', () => {
    expect(chooseTimeStep([100e-6], 10e-6)).toBeCloseTo(10e-6, 15)
    expect(chooseTimeStep([100e-6], 9.9e-6)).toBeCloseTo(100e-6 / 11, 15)
  })

  it('keeps to the wanted step where every section is shorter than that: each then gets one cell', () => {
    expect(chooseTimeStep([1e-6, 2e-6], 10e-6)).toBe(10e-6)
    expect(countCells(1e-6, 10e-6)).toBe(1)
    expect(countCells(14.9e-6, 10e-6)).toBe(1)
    expect(countCells(15.1e-6, 10e-6)).toBe(2)
  })

  it('is never coarser than wanted nor finer than 0.7 of it, and no whole part of any travel time is better', () => {
    const tau = fc.integer({ min: 20, max: 5000 }).map((i) => i * 1.17e-7 * (1 + 1e-3 * Math.sin(i)))
    const wanted = fc.integer({ min: 10, max: 100 }).map((i) => i * 1e-7)
    fc.assert(
      fc.property(fc.array(tau, { minLength: 1, maxLength: 12 }), wanted, (taus, want) => {
        const dt = chooseTimeStep(taus, want)
        expect(dt).toBeLessThanOrEqual(want * (1 + 1e-9))
        expect(dt).toBeGreaterThanOrEqual(0.7 * want * (1 - 1e-9))
        const error = evaluateError(taus, dt)
        expect(error).toBeLessThanOrEqual(evaluateError(taus, want) + 1e-12 * sum(taus))
        for (const one of taus)
          for (let n = Math.ceil(one / want); one / n >= 0.7 * want; n++)
            expect(error).toBeLessThanOrEqual(evaluateError(taus, one / n) + 2e-12 * sum(taus))
      }),
      { seed: 7, numRuns: 60 },
    )
  })

  it('counts a travel time that comes often as often', () => {
    // Forty sections of 10 steps against one of 10.5: the forty decide.
    const taus = [...Array.from({ length: 40 }, () => 100e-6), 105e-6]
    const dt = chooseTimeStep(taus, 10e-6)
    expect(Math.abs(100e-6 / dt - Math.round(100e-6 / dt))).toBeLessThan(1e-9)
  })
})
