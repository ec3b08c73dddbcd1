import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { evaluateArea, readGauge, solveSample } from './solveSample'

const [rho, E, speed] = [8080, 200e9, 30]
const c = Math.sqrt(E / rho)
/** Stress of the impact of like bars: rho c v / 2. */
const sigma = (Math.sqrt(rho * E) * speed) / 2
const [thin, thick] = [0.02, 0.03].map(evaluateArea)
/** Radius ratio of the cone. */
const R = 1.5
const duration = (2 * 0.2) / c

/** What a step leaves behind a cone: R [R exp(-s1 tau) + exp(s2 tau)] / (R + 1), 0 < tau = ct/L < 2. */
function evaluateCone(t: number): number {
  const tau = (c * t) / 0.3
  return (R * (R * Math.exp((-(R - 1) / 2) * tau) + Math.exp(((R - 1) / (2 * R)) * tau))) / (R + 1)
}

/** Holds the sample to numbers found by hand. */
export function describeGasGunStriker(): void {
  describe('sample gas-gun-striker', () => {
    const { solution, readme } = solveSample('gas-gun-striker')
    const [G1, G2] = solution.gauges
    const arrival = 1.5 / c

    it('presses striker and head with rho c v / 2 for 2 L / c', () => {
      expectClose(solution.joints[0].peakForce, -sigma * thin)
      expectClose(solution.sections[0].compression.peak, -sigma)
      expectClose(solution.striker!.pulseDuration!, duration)
      expectClose(solution.striker!.pulseLength!, 0.4)
      expectShown(readme, sigma / 1e6, 'MPa')
      expectShown(readme, duration * 1e6, 'us')
    })

    it('brings a front of R times the force through the cone, which then falls as the closed form says', () => {
      // A front jumps between cells of a cut cone: short by ln(A2/A1)^2 / (8 N), 2.7e-4 at 300 cells.
      expectClose(readGauge(G1, arrival + 2e-7).rightgoing, -R * sigma * thin, 1e-3)
      for (const t of [20e-6, 40e-6, 60e-6, 79e-6]) {
        // Half a step of the front's place, and the cells: 1e-3 at most.
        expectClose(readGauge(G1, arrival + t).rightgoing, -sigma * thin * evaluateCone(t), 1e-3)
      }
      expectShown(readme, (R * sigma * thin) / 1e3, 'kN')
      expectShown(readme, (R * sigma * thin) / thick / 1e6, 'MPa')
      expectShown(readme, evaluateCone(79e-6))
    })

    it('knows the cone between a short and a long pulse', () => {
      const [taper] = solution.tapers
      expectClose(taper.shortPulse.transmittedForce, R)
      expectClose(taper.longPulse.transmittedForce, (2 * R ** 2) / (1 + R ** 2))
      expectShown(readme, (2 * R ** 2) / (1 + R ** 2))
    })

    it('shows each gauge its main pulse clear, from x / c for 2 L / c', () => {
      for (const [gauge, x] of [
        [G1, 1.5],
        [G2, 2.9],
      ] as const) {
        const [pulse] = gauge.pulses
        expect(pulse).toMatchObject({ direction: 'right', clear: true })
        // Two steps of 0.2 us each.
        expect(Math.abs(pulse.from - x / c)).toBeLessThan(4e-7)
        expect(Math.abs(pulse.to - pulse.from - duration)).toBeLessThan(4e-7)
        expectShown(readme, (x / c) * 1e6, 'us')
      }
      expect(G2.pulses.slice(1, 4).map(({ clear }) => clear)).toEqual([false, false, false])
    })

    it('reads the pulse in volts', () => {
      const k = G1.bridge.findIndex((_, i) => G1.t[i] > arrival + 1e-6)
      // Two arms along the bar: V = excitation gain factor strain 2 / 4.
      expectClose(G1.bridge[k], (5 * 100 * 2.1 * (G1.stress[k] / E) * 2) / 4)
      expectShown(readme, ((5 * 100 * 2.1 * 2) / 4) * ((R * sigma * thin) / thick / E), 'V')
    })

    it('catches the main pulse in the trap', () => {
      const [, , measuring] = solution.sections.filter(({ bar }) => bar === 'bar')
      const trap = solution.sections[solution.sections.length - 1]
      expectClose(trap.tension.peak, -trap.compression.peak)
      expect(measuring.tension.peak).toBeLessThan(0.2 * trap.tension.peak)
      // All of the pulse's impulse stays in the trap: the joint never closes again.
      const { momentum } = solution.bars[2]
      expectClose(momentum, -solution.joints[1].impulse)
      // Its contact lasts as long as the pulse, to one step.
      expect(Math.abs(solution.joints[1].contactTime - duration)).toBeLessThan(4e-7)
    })

    it('names the speed at which the margin is used up', () => {
      const { margin } = solution.governing!
      expectClose(solution.striker!.safeSpeed!, speed * (1 + margin))
      expectShown(readme, solution.striker!.safeSpeed!, 'm/s')
    })
  })
}
