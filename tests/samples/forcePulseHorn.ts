import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { evaluateArea, readGauge, samplesFolder, solveSample } from './solveSample'

const [inch, lbf, lbm, psi] = [0.0254, 4.4482216152605, 0.45359237, 6894.757293168362]
const rho = (0.16 * lbm) / inch ** 3
const E = 16.5e6 * psi
const c = Math.sqrt(E / rho)
const [head, horn, needle] = [4, 8, 16].map((length) => length * inch)
const [wide, thin] = [0.75 * inch, 0.25 * inch].map(evaluateArea)
/** Diameter ratio. */
const R = 3

/** The record as it lies beside the rig: [s] and [N]. */
const rows = readFileSync(join(samplesFolder, 'force-pulse-horn', 'load-cell.csv'), 'utf8')
  .trim()
  .split('\n')
  .slice(1)
  .map((line) => line.split(',').map(Number))
const times = rows.map(([t]) => t * 1e-6)
const forces = rows.map(([, F]) => F * lbf)
const peak = Math.max(...forces)
const impulse = forces
  .slice(1)
  .reduce((sum, F, i) => sum + ((F + forces[i]) / 2) * (times[i + 1] - times[i]), 0)

/**
 * Force wave in the needle for a harmonic force exp(iwt) on the head: the field u of the horn,
 * exp(g x) [a cos Kx + b sin Kx] with g = ln(R)/L and K^2 = k^2 - g^2, taken from its small end, where
 * u = 1 and u' = -ik, back through the head.
 */
function evaluateTransfer(w: number): { re: number; im: number } {
  const k = w / c
  const g = Math.log(R) / horn
  const square = k ** 2 - g ** 2
  const K = Math.sqrt(Math.abs(square))
  const cos = square > 0 ? Math.cos(K * horn) : Math.cosh(K * horn)
  const sin = (square > 0 ? Math.sin(K * horn) : Math.sinh(K * horn)) / K
  const shrink = Math.exp(-g * horn)
  function goBack(u: number, slope: number): { u: number; slope: number } {
    const b = slope - g * u
    const u0 = shrink * (u * cos - b * sin)
    const slope0 = shrink * (square * u * sin + b * cos) + g * u0
    const [C, S] = [Math.cos(k * head), Math.sin(k * head)]
    return { u: u0 * C - (slope0 / k) * S, slope: slope0 * C + k * u0 * S }
  }
  const re = goBack(1, 0).slope
  const im = goBack(0, -k).slope
  // H = A3 (-ik) / (A1 u'), u' = re + i im
  const size = (wide / thin) * (re ** 2 + im ** 2)
  return { re: (-k * im) / size, im: (-k * re) / size }
}

/** The first wave in the needle at times [s], by the Fourier sum of the record and the transfer above. */
function sumWave(at: number[]): number[] {
  const period = 8e-3
  const wave = at.map(() => impulse / period)
  for (let n = 1; n < 25_600; n++) {
    const w = (2 * Math.PI * n) / period
    const H = evaluateTransfer(w)
    // The integral of exp(-iwt) over straight rows, exact: slopes change at the rows.
    let [re, im] = [0, 0]
    for (let i = 1; i < times.length; i++) {
      const slope = (forces[i] - forces[i - 1]) / (times[i] - times[i - 1])
      re += (slope * (Math.cos(w * times[i]) - Math.cos(w * times[i - 1]))) / w ** 2
      im -= (slope * (Math.sin(w * times[i]) - Math.sin(w * times[i - 1]))) / w ** 2
    }
    const [a, b] = [re * H.re - im * H.im, re * H.im + im * H.re]
    at.forEach((t, j) => (wave[j] += (2 / period) * (a * Math.cos(w * t) - b * Math.sin(w * t))))
  }
  return wave
}

/** Holds the sample to numbers found by hand. */
export function describeForcePulseHorn(): void {
  describe('sample force-pulse-horn', () => {
    const { solution, readme } = solveSample('force-pulse-horn')
    const [G1, G2] = solution.gauges
    const [, , needlePeaks] = solution.sections

    it('reads its record in pounds and microseconds', () => {
      // The march sums the force at its steps, the rows are 2 us apart: second order of the step.
      expectClose(solution.ends.left.impulse, impulse, 1e-4)
      rows.forEach((_, i) => {
        // From 48 us on, the wave that the horn sent back passes too.
        const { t, rightgoing } = readGauge(G1, times[i] + (2 * inch) / c)
        if (t > 48e-6) return
        // Half a step at the steepest rise of the record, 125 lbf in 1 us: 0.5 % of the peak.
        expect(Math.abs(rightgoing + forces[i]) / peak).toBeLessThan(5e-3)
      })
      expectShown(readme, peak / lbf, 'lbf')
      expectShown(readme, impulse / lbf, 'lbf s')
      expectShown(readme, peak / wide / 1e6, 'MPa')
    })

    it('has the horn pass 1/R of a short pulse and 2/(1 + R^2) of a long one', () => {
      const [taper] = solution.tapers
      expectClose(taper.shortPulse.transmittedForce, 1 / R)
      expectClose(taper.longPulse.transmittedForce, 2 / (1 + R ** 2))
      const cutOff = (Math.log(R) * c) / horn / (2 * Math.PI)
      expectShown(readme, cutOff / 1e3, 'kHz')
      expectShown(readme, c, 'm/s')
    })

    it('sends the wave into the needle that the Fourier sum over the horn gives', () => {
      const delay = (20 * inch - head - horn) / c
      // Until what the needle's end sends back stands at the horn.
      const until = (head + horn + 2 * needle) / c
      const at = G2.t.filter((t, k) => t > 100e-6 && t - delay < until - delay && k % 8 === 0)
      const expected = sumWave(at.map((t) => t - delay))
      const largest = Math.max(...expected.map(Math.abs))
      const computed = at.map((t) => G2.rightgoingForce[G2.t.indexOf(t)])
      const worst = Math.max(...computed.map((F, i) => Math.abs(F + expected[i])))
      // The sum stops at 3.2 MHz, which rounds the corner at the foot of the wave: 3e-4. The cells make 1e-5.
      expect(worst / largest).toBeLessThan(5e-4)
      expectShown(readme, largest / lbf, 'lbf')
    })

    it('turns compression into tension at the bare end of the needle', () => {
      const first = Math.max(...G2.rightgoingForce.map(Math.abs).filter((_, k) => G2.t[k] < 230e-6))
      const back = Math.max(...G2.leftgoingForce.filter((_, k) => G2.t[k] < 300e-6))
      expectClose(back, first, 1e-9)
      expect(needlePeaks.tension.peak).toBeGreaterThan(first / thin)
    })
  })
}
