import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { evaluateArea, readGauge, solveSample } from './solveSample'

const c = Math.sqrt(207e9 / 7850)
const speed = 12
const Z = Math.sqrt(207e9 * 7850) * evaluateArea(0.016)
const duration = (2 * 0.25) / c
const incident = (Z * speed) / 2

/** The disc: elastic to its yield force, then hardening, each a stiffness. */
const [length, area] = [0.005, evaluateArea(0.01)]
const [modulus, limit, hardening] = [117e9, 120e6, 500e6]
const [elastic, plastic] = [modulus, hardening].map((slope) => (slope * area) / length)
const yieldForce = limit * area
const yieldTime = (-Z / (2 * elastic)) * Math.log(1 - yieldForce / incident)

/** Force through the disc a time after the pulse has reached it, compression positive. */
function evaluateForce(t: number): number {
  if (t < yieldTime) return incident * (1 - Math.exp((-2 * elastic * t) / Z))
  return incident - (incident - yieldForce) * Math.exp((-2 * plastic * (t - yieldTime)) / Z)
}
const evaluateStrain = (force: number) =>
  limit / modulus + (force - yieldForce) / (plastic * length)

/** Holds the sample to numbers found by hand. */
export function describeSplitBarSpecimen(): void {
  describe('sample split-bar-specimen', () => {
    const { solution, readme } = solveSample('split-bar-specimen')
    const { timeStep } = solution.run
    const [G1, G2] = solution.gauges
    const toDisc = 1.5 / c
    const sent = (t: number) => readGauge(G2, toDisc + t + 0.4 / c)

    it('sends rho c v / 2 into the input bar for 2 L / c', () => {
      expectClose(G1.pulses[0].peakForce, -incident)
      expect(Math.abs(G1.pulses[0].to - G1.pulses[0].from - duration)).toBeLessThan(1e-9 * duration)
      expectShown(readme, incident / 1e3, 'kN')
      expectShown(readme, duration * 1e6, 'us')
    })

    it('lets the force through the disc grow as the closed form says', () => {
      for (const t of [20e-6, 50e-6, 90e-6]) {
        const { t: read, rightgoing } = sent(t)
        // A wave of step k stands for the step's middle; the jump at the start is second order after it.
        expectClose(rightgoing, -evaluateForce(read - toDisc - 0.4 / c + timeStep / 2), 1e-4)
        expectShown(readme, evaluateForce(t) / 1e3, 'kN')
      }
    })

    it('gives the law of the disc back from the gauges, as a laboratory reduces them', () => {
      let closing = 0
      const last = Math.round(duration / timeStep) - 1
      for (let k = 0; k <= last; k++) {
        const t = toDisc + (k + 0.5) * timeStep
        const reflected = readGauge(G1, t + 0.75 / c - 0.5 * timeStep).leftgoing
        closing += (2 * reflected * timeStep) / Z
      }
      const force = -sent(duration - timeStep).rightgoing
      const strain = closing / length
      // The sums of the reflected wave end half a step after the force: 1e-3 of the strain is 0.1 us.
      expectClose(strain, evaluateStrain(force), 2e-3)
      expectClose(strain, evaluateStrain(evaluateForce(duration)), 2e-3)
      expectShown(readme, strain * 100, '%')
      expectShown(readme, (force / area) * 1e-6, 'MPa')
    })

    it('loses in the disc what deforming it has taken', () => {
      // Up to the first push alone: later ones come back from the ends.
      const [, disc] = solveSample('split-bar-specimen', {
        edit: (text) => text.replace('"1.2 ms"', '"0.6 ms"'),
      }).solution.joints
      const end = evaluateForce(duration)
      const closed = (end - yieldForce) / plastic
      const work = ((yieldForce + end) / 2) * closed + yieldForce ** 2 / (2 * elastic)
      const given = end ** 2 / (2 * elastic)
      expectClose(disc.energyLost, work - given, 2e-3)
      expect(disc.kind).toBe('specimen')
      expectShown(readme, work, 'J')
    })
  })
}
