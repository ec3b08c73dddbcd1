import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { evaluateArea, readGauge, solveSample } from './solveSample'

const c = Math.sqrt(200e9 / 7850)
const rhoC = Math.sqrt(200e9 * 7850)
const speed = 3
const [Z1, Z2] = [0.05, 0.04].map((diameter) => rhoC * evaluateArea(diameter))
const stiffness = (2.7e9 * evaluateArea(0.04)) / 0.008
const damping = 3e3
/** Sum of the admittances of both bars. */
const Y = 1 / Z1 + 1 / Z2
const rise = (1 + damping * Y) / (stiffness * Y)
const duration = (2 * 0.5) / c

/** Force through the pad until the ram's own wave comes back, compression positive. */
function evaluateForce(t: number): number {
  return (speed / Y) * (1 - Math.exp(-t / rise) / (1 + damping * Y))
}

/** Holds the sample to numbers found by hand. */
export function describeCushionedRam(): void {
  describe('sample cushioned-ram', () => {
    const { solution, readme } = solveSample('cushioned-ram')
    const [G1] = solution.gauges

    it('lets the force rise over (1 + D Y) / (K Y)', () => {
      for (const t of [20e-6, 60e-6, 120e-6]) {
        // A wave of step k stands for the step's middle; the pad's law is second order: 1e-3 of the rise's end.
        const [before, after] = [t - 0.5 * solution.run.timeStep, t + 0.5 * solution.run.timeStep]
        const { t: read, rightgoing } = readGauge(G1, 0.45 / c + t)
        const since = read - 0.45 / c
        expect(since).toBeGreaterThan(before)
        expect(since).toBeLessThan(after)
        expectClose(rightgoing, -evaluateForce(since + 0.5 * solution.run.timeStep), 1e-4)
      }
      expectShown(readme, stiffness / 1e6, 'kN/mm')
      expectShown(readme, rise * 1e6, 'us')
    })

    it('peaks when the wave of the ram comes back, after 2 L / c', () => {
      // The last step before it: the force still grows by 4e-4 of itself in a step.
      expectClose(solution.joints[0].peakForce, -evaluateForce(duration), 5e-4)
      expectShown(readme, duration * 1e6, 'us')
      expectShown(readme, speed / Y / 1e3, 'kN')
      expectShown(readme, evaluateForce(duration) / 1e3, 'kN')
      expectShown(readme, evaluateForce(duration) / evaluateArea(0.04) / 1e6, 'MPa')
    })

    it('loses energy in the pad and in the table only', () => {
      const { dissipated, kinetic, strain } = solution.energy
      const last = dissipated.length - 1
      const energy = 0.5 * 7850 * evaluateArea(0.05) * 0.5 * speed ** 2
      expect(solution.joints[0].energyLost).toBeGreaterThan(0.01 * energy)
      expect(dissipated[last]).toBeGreaterThan(solution.joints[0].energyLost)
      expectClose(kinetic[last] + strain[last] + dissipated[last], energy)
      for (let i = 1; i <= last; i++) expect(dissipated[i]).toBeGreaterThanOrEqual(dissipated[i - 1])
      expectShown(readme, energy, 'J')
    })

    it('feels nothing of the pad across an open gap', () => {
      const gap = 0.6e-3
      const withGap = solveSample('cushioned-ram', {
        edit: (text) => text.replace('"damping": "3 kN s/m"', '"damping": "3 kN s/m", "gap": "0.6 mm"'),
      })
      const { timeStep } = withGap.solution.run
      expect(Math.abs(withGap.solution.joints[0].closedFrom! - gap / speed)).toBeLessThan(2 * timeStep)
      // The pad presses as before, only later: the force of one step is what the closing inside a step costs.
      expectClose(withGap.solution.joints[0].peakForce, -evaluateForce(duration), 5e-3)
    })

    it('keeps its margin in proportion to the speed', () => {
      const { margin } = solution.governing!
      expectClose(solution.striker!.safeSpeed!, speed * (1 + margin))
      const faster = solveSample('cushioned-ram', { edit: (text) => text.replace('"3 m/s"', '"6 m/s"') })
      expectClose(faster.solution.governing!.margin + 1, (margin + 1) / 2, 1e-10)
      expectShown(readme, solution.striker!.safeSpeed!, 'm/s')
    })
  })
}
