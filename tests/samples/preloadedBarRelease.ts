import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { evaluateArea, readGauge, solveSample } from './solveSample'

const [rho, E] = [2810, 71e9]
const c = Math.sqrt(E / rho)
const Z = Math.sqrt(rho * E) * evaluateArea(0.025)
const pull = 80e3
const [stored, measuring] = [0.6, 2.4]
const duration = (2 * stored) / c

/** Holds the sample to numbers found by hand. */
export function describePreloadedBarRelease(): void {
  describe('sample preloaded-bar-release', () => {
    const { solution, readme } = solveSample('preloaded-bar-release')
    const [G1, G2] = solution.gauges
    const arrival = 1.2 / c

    it('sends half the preload into the measuring length for 2 Lp / c', () => {
      const during = readGauge(G2, arrival + duration / 2)
      expectClose(during.rightgoing, pull / 2)
      // The particle velocity of a tension wave that runs to the right is to the left.
      expectClose(during.velocity, -pull / 2 / Z)
      expect(readGauge(G2, arrival - 2e-6).rightgoing).toBe(0)
      expect(Math.abs(readGauge(G2, arrival + duration + 2e-6).rightgoing) / pull).toBeLessThan(1e-13)
      const [pulse] = G2.pulses
      expect(pulse.clear).toBe(true)
      // One step of 0.4 us at each edge.
      expect(Math.abs(pulse.to - pulse.from - duration)).toBeLessThan(9e-7)
      expectShown(readme, pull / 2 / 1e3, 'kN')
      expectShown(readme, pull / 2 / Z, 'm/s')
      expectShown(readme, duration * 1e6, 'us')
      expectShown(readme, arrival * 1e6, 'us')
    })

    it('drops the stored length to half, then to nothing', () => {
      const at = (time: number) => readGauge(G1, time).rightgoing + readGauge(G1, time).leftgoing
      expectClose(at(0.1 / c), pull)
      expectClose(at(0.6 / c), pull / 2)
      expect(Math.abs(at(1.2 / c)) / pull).toBeLessThan(1e-13)
    })

    it('turns the pulse into compression at the free end', () => {
      const back = readGauge(G2, (2 * measuring - 1.2) / c + duration / 2)
      expectClose(back.leftgoing, -pull / 2)
      expectShown(readme, ((2 * measuring - 1.2) / c) * 1e6, 'us')
    })

    it('begins with the strain energy of the preload and keeps it', () => {
      const energy = (pull ** 2 * stored) / (2 * E * evaluateArea(0.025))
      const last = solution.energy.t.length - 1
      expectClose(solution.energy.kinetic[last] + solution.energy.strain[last], energy)
      expectShown(readme, energy, 'J')
    })

    it('reads the pulse in volts', () => {
      const strain = pull / 2 / (E * evaluateArea(0.025))
      // A full bridge with half its arms across the bar: V = excitation gain factor strain (1 + nu) / 2.
      const volts = (5 * 100 * 2.08 * strain * 1.33) / 2
      expectClose(readGauge(G2, arrival + duration / 2).bridge, volts)
      expectShown(readme, volts, 'V')
    })

    it('is governed by the preload itself', () => {
      const stress = pull / evaluateArea(0.025)
      expectClose(solution.governing!.margin, 380e6 / (1.5 * stress) - 1)
      expectShown(readme, stress / 1e6, 'MPa')
    })
  })
}
