import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { evaluateArea, solveSample } from './solveSample'

const c = Math.sqrt(207e9 / 7850)
const length = 0.6
const area = evaluateArea(0.025)
const speed = Math.sqrt(2 * 9.80665 * 0.3)
/** First stress of the blow: rho c v. */
const s0 = Math.sqrt(207e9 * 7850) * speed
/** Mass of the bar over mass of the hammer. */
const a = 0.5
const hammer = (7850 * area * length) / a

/** Outgoing stress over s0 just after the first return, tau = 2 + x: (1 + exp(-2a) - 2a x) exp(-a x). */
const afterReturn = (x: number) => (1 + Math.exp(-2 * a) - 2 * a * x) * Math.exp(-a * x)

/** Holds the sample to numbers found by hand. */
export function describeHammerAgainstWall(): void {
  describe('sample hammer-against-wall', () => {
    const { solution, readme } = solveSample('hammer-against-wall')
    const [chisel] = solution.sections
    /** Half a step in L/c: a front is read in the middle of the step after it. */
    const half = (solution.run.timeStep * c) / length / 2

    it('presses the wall with 2 rho c v (1 + exp(-2 m/M)) when the second wave arrives', () => {
      const peak = 2 * s0 * (1 + Math.exp(-2 * a))
      // The front is read half a step late, which costs 0.1 % at 600 cells.
      expectClose(chisel.compression.peak, -peak, 2e-3)
      // With that half step counted, only the second order of the step is left.
      expectClose(chisel.compression.peak, -2 * s0 * afterReturn(half), 1e-5)
      expect(chisel.compression.at).toBeCloseTo(length, 12)
      expect(Math.abs(chisel.compression.time - (3 * length) / c)).toBeLessThan(2 * solution.run.timeStep)
      expectShown(readme, speed, 'm/s')
      expectShown(readme, s0 / 1e6, 'MPa')
      expectShown(readme, peak / 1e6, 'MPa')
      expectShown(readme, ((3 * length) / c) * 1e6, 'us')
    })

    it('presses the struck end with rho c v (2 + exp(-2 m/M)) at 2 L / c', () => {
      const peak = s0 * (2 + Math.exp(-2 * a))
      const late = s0 * (afterReturn(half) + Math.exp(-a * half))
      expectClose(solution.ends.left.peakForce / area, -peak, 2e-3)
      expectClose(solution.ends.left.peakForce / area, -late, 1e-5)
      expectShown(readme, peak / 1e6, 'MPa')
    })

    it('throws the hammer back as Saint-Venant found', () => {
      // Contact ends at 4 + x where p_2(x) exp(-a x) + p_1(x) exp(-a x) = 0, with m/M = 1/2 (Love, art. 281).
      const e = Math.exp(-2 * a)
      const p1 = (x: number) => 1 + e - 2 * a * x
      const p2 = (x: number) => 1 + e + e ** 2 - 4 * a * e - 2 * a * (2 + e) * x + 2 * a ** 2 * x ** 2
      let [low, high] = [0, 2]
      for (let i = 0; i < 60; i++) {
        const middle = (low + high) / 2
        if (p2(middle) + p1(middle) > 0) low = middle
        else high = middle
      }
      const parting = Math.exp(-a * low) * (p2(low) - p1(low))
      const rebound = speed * parting
      const computed = speed - solution.ends.left.impulse / hammer
      // The step is second order here: 1e-6 of the speed.
      expectClose(computed, rebound, 1e-5)
      expectShown(readme, -rebound, 'm/s')
      expectShown(readme, ((4 + low) * length * 1e6) / c, 'us')
    })

    it('names the speed at which the margin is used up', () => {
      const margin = 800e6 / (2 * Math.abs(chisel.compression.peak)) - 1
      expectClose(solution.governing!.margin, margin)
      expectClose(solution.striker!.safeSpeed!, speed * (1 + margin))
      expect(solution.striker!.pulseLength).toBeNull()
      expectShown(readme, solution.striker!.safeSpeed!, 'm/s')
    })
  })
}
