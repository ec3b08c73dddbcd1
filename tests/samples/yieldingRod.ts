import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { readGauge, solveSample } from './solveSample'

const [rho, E, Et, limit, speed, length, rise] = [8930, 117e9, 1.2e9, 70e6, 9, 0.3, 10e-6]
const [c0, c1] = [E, Et].map((slope) => Math.sqrt(slope / rho))
const yieldSpeed = limit / (rho * c0)
const stress = limit + rho * c1 * (speed - yieldSpeed)
const strain = stress / E + (stress - limit) * (1 / Et - 1 / E)

/** Holds the sample to numbers found by hand. */
export function describeYieldingRod(): void {
  describe('sample yielding-rod', () => {
    const { solution, readme } = solveSample('yielding-rod')
    const { envelope } = solution
    const at = (x: number) => envelope.compression[envelope.x.findIndex((place) => place >= x - 1e-9)]

    it('is solved by elements, which follow the yielding', () => {
      expect(solution.method).toBe('elements')
      const caution = solution.cautions.find(({ code }) => code === 'over-yield')!
      expect(caution.message).toContain('The run follows yielding')
    })

    it('carries no more than its yield stress ahead of the plastic front', () => {
      for (const x of [0.1, 0.15, 0.2]) expectClose(at(x), -limit, 1e-4)
      expectShown(readme, yieldSpeed, 'm/s')
    })

    it('carries the yield stress and rho c1 times the rest of the speed behind it', () => {
      for (const x of [0.01, 0.02, 0.03, 0.04]) expectClose(at(x), -stress, 2e-3)
      expectShown(readme, stress / 1e6, 'MPa')
      expectShown(readme, strain * 100, '%')
    })

    it('sends the two fronts at sqrt(E / rho) and sqrt(Et / rho)', () => {
      const [G1, G2] = solution.gauges
      // The middle of each part of the ramp: of the elastic one up to yield, of the plastic one after it.
      const elastic = (rise * yieldSpeed) / speed / 2
      const plastic = (rise * (1 + yieldSpeed / speed)) / 2
      const cross = (gauge: typeof G1, level: number) => gauge.t[gauge.stress.findIndex((s) => s < -level)]
      expect(Math.abs(cross(G2, limit / 2) - elastic - 0.15 / c0)).toBeLessThan(2 * solution.run.timeStep)
      // The plastic front is spread over some elements: 1 % of its time.
      expectClose(cross(G1, (limit + stress) / 2) - plastic, 0.03 / c1, 0.01)
      expectShown(readme, c0, 'm/s')
      expectShown(readme, c1, 'm/s')
      expectShown(readme, (0.03 / c1) * 1e6, 'us')
      expectClose(readGauge(G1, 120e-6).stress, -stress, 5e-3)
    })

    it('stops the plastic front where the release from the far end meets it', () => {
      const meeting = (2 * length * c1) / (c0 + c1)
      const found = envelope.x[envelope.compression.findIndex((s) => s > -(0.7 * stress + 0.3 * limit))]
      // The ramp starts the plastic front 6.2 us late: c1 times that, 2.3 mm, is the reason for the tolerance.
      const late = (c1 * rise * (1 + yieldSpeed / speed)) / 2
      expect(found).toBeLessThan(meeting)
      expect(found).toBeGreaterThan(meeting - 1.5 * late)
      expectShown(readme, meeting * 1e3, 'mm')
    })

    it('loses the plastic work', () => {
      const { dissipated } = solution.energy
      expect(dissipated[dissipated.length - 1]).toBeGreaterThan(0)
      expect(solution.energy.closure).toBeLessThan(1e-6)
    })
  })
}
