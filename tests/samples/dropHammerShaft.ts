import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { evaluateArea, readGauge, solveSample } from './solveSample'

const c = Math.sqrt(207e9 / 7850)
const rhoC = Math.sqrt(207e9 * 7850)
const speed = Math.sqrt(2 * 9.80665 * 0.6)
const [hammer, spline, seat, body, tail] = [0.05, 0.04, 0.06, 0.045, 0.036].map(evaluateArea)
/** Force of the first wave in the spline: Z1 Z2 v / (Z1 + Z2). */
const first = (rhoC * hammer * spline * speed) / (hammer + spline)
const passed = (from: number, to: number) => (2 * to) / (from + to)

/** Holds the sample to numbers found by hand. */
export function describeDropHammerShaft(): void {
  describe('sample drop-hammer-shaft', () => {
    const { solution, readme } = solveSample('drop-hammer-shaft')
    const [G1, G2] = solution.gauges
    const [, , , bodyPeaks, tailPeaks] = solution.sections

    it('sends Z1 Z2 v / (Z1 + Z2) into the spline', () => {
      expectClose(readGauge(G1, 0.12 / c + 5e-6).rightgoing, -first)
      expectClose(readGauge(G1, 0.12 / c + 5e-6).stress, -first / spline)
      expectShown(readme, speed, 'm/s')
      expectShown(readme, first / 1e3, 'kN')
      expectShown(readme, first / spline / 1e6, 'MPa')
    })

    it('has the ratios of its shoulders', () => {
      const ratios = solution.interfaces.slice(1).map(({ fromLeft }) => fromLeft)
      const steps = [
        [spline, seat],
        [seat, body],
        [body, tail],
      ] as const
      steps.forEach(([from, to], i) => {
        expectClose(ratios[i].transmittedForce, passed(from, to))
        expectClose(ratios[i].transmittedStress, (passed(from, to) * from) / to)
        expectShown(readme, passed(from, to))
      })
    })

    it('brings the first front through two shoulders into the body', () => {
      const arrival = 0.6 / c
      const force = first * passed(spline, seat) * passed(seat, body)
      expect(readGauge(G2, arrival - 2e-6).rightgoing).toBe(0)
      expectClose(readGauge(G2, arrival + 2e-6).rightgoing, -force)
      expectShown(readme, arrival * 1e6, 'us')
      expectShown(readme, force / 1e3, 'kN')
    })

    it('presses the wall first with twice what arrives', () => {
      const force = 2 * first * passed(spline, seat) * passed(seat, body) * passed(body, tail)
      const { x, t, stress } = solution.field
      const row = t.findIndex((time) => time > 1 / c + 4e-6)
      // The next front follows the first one at the earliest after two crossings of the seat, 46.7 us.
      expect(t[row]).toBeLessThan(1 / c + 40e-6)
      expect(x[x.length - 1]).toBeCloseTo(1.4, 12)
      expectClose(stress[row][x.length - 1] * tail, -force)
      expectShown(readme, force / tail / 1e6, 'MPa')
    })

    it('takes the corner of the tail as governing, with the factor of its fillet', () => {
      const [h, r, D] = [(45 - 36) / 2, 3, 45]
      const q = h / r
      const w = (2 * h) / D
      // Pilkey, Peterson's Stress Concentration Factors: round shoulder in tension, 0.1 <= h/r <= 2.
      const kt =
        0.926 +
        1.157 * Math.sqrt(q) -
        0.099 * q +
        (0.012 - 3.036 * Math.sqrt(q) + 0.961 * q) * w +
        (-0.302 + 3.977 * Math.sqrt(q) - 1.744 * q) * w ** 2 +
        (0.365 - 2.098 * Math.sqrt(q) + 0.878 * q) * w ** 3
      expectClose(tailPeaks.compression.kt!, kt)
      expectShown(readme, kt)
      expect(solution.governing).toMatchObject({ bar: 'shaft', section: 3, sense: 'compression' })
      const margin = 700e6 / (1.5 * Math.abs(tailPeaks.compression.local)) - 1
      expectClose(solution.governing!.margin, margin)
      expectClose(solution.striker!.safeSpeed!, speed * (1 + margin))
      expectShown(readme, solution.striker!.safeSpeed!, 'm/s')
      expect(bodyPeaks.compression.margin!).toBeGreaterThan(margin)
    })

    it('uses up its margin at the safe speed, which a drop of v^2 / 2g gives', () => {
      const drop = solution.striker!.safeSpeed! ** 2 / (2 * 9.80665)
      expectShown(readme, drop, 'm')
      const at = solveSample('drop-hammer-shaft', { edit: (text) => text.replace('"0.6 m"', `"${drop} m"`) })
      expect(Math.abs(at.solution.governing!.margin)).toBeLessThan(1e-12)
      const higher = solveSample('drop-hammer-shaft', { edit: (text) => text.replace('"0.6 m"', '"1.2 m"') })
      expect(higher.solution.cautions.map(({ code }) => code)).toContain('negative-margin')
      expectClose(higher.solution.governing!.margin, (solution.governing!.margin + 1) / Math.SQRT2 - 1)
    })
  })
}
