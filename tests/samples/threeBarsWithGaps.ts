import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { evaluateArea, solveSample } from './solveSample'

const [rho, E, speed] = [8530, 110e9, 4]
const c = Math.sqrt(E / rho)
const sigma = (Math.sqrt(rho * E) * speed) / 2
const [pusher, transfer, work] = [0.18, 0.27, 0.36]
const area = evaluateArea(0.016)
const [firstGap, secondGap] = [0.3e-3, 0.55e-3]
const firstMeeting = firstGap / speed
/** The far face of the transfer pin moves at v for 2 L1/c, then waits until its wave comes back. */
const secondMeeting = firstMeeting + (3 * transfer) / c + (secondGap - (speed * 2 * pusher) / c) / speed

/** Holds the sample to numbers found by hand. */
export function describeThreeBarsWithGaps(): void {
  describe('sample three-bars-with-gaps', () => {
    const { solution, readme } = solveSample('three-bars-with-gaps')
    const { timeStep } = solution.run

    it('gives every pin the stress of like bars, rho c v / 2, whatever the gap', () => {
      for (const { compression } of solution.sections) expectClose(compression.peak, -sigma)
      for (const { peakForce } of solution.joints) expectClose(peakForce, -sigma * area)
      expectShown(readme, sigma / 1e6, 'MPa')
      expectShown(readme, (sigma * area) / 1e3, 'kN')
    })

    it('closes the gaps when the faces have moved that far', () => {
      ;[firstMeeting, secondMeeting].forEach((time, i) => {
        // A gap closes inside a step: the force is known from that step or the next one on.
        expect(Math.abs(solution.joints[i].closedFrom! - time)).toBeLessThan(2 * timeStep)
        expectShown(readme, time * 1e6, 'us')
      })
    })

    it('hands all momentum on to the last pin', () => {
      const velocity = (speed * pusher) / work
      expectClose(solution.bars[2].velocity, velocity)
      // Roundings of a speed of 4 m/s.
      for (const { velocity: left } of solution.bars.slice(0, 2)) expect(Math.abs(left)).toBeLessThan(1e-12)
      expectShown(readme, velocity, 'm/s')
      for (const { impulse } of solution.joints) expectClose(impulse, -rho * area * pusher * speed)
      expectShown(readme, rho * area * pusher * speed, 'N s')
    })

    it('presses each joint for 2 L / c of the first pin in all', () => {
      for (const { contactTime } of solution.joints) {
        // One step more at each of up to two closings.
        expect(Math.abs(contactTime - (2 * pusher) / c)).toBeLessThan(2.5 * timeStep)
      }
      expectShown(readme, ((2 * pusher) / c) * 1e6, 'us')
    })

    it('loses at the closing gaps no more than the cell explains', () => {
      const losses = solution.joints.reduce((sum, { energyLost }) => sum + energyLost, 0)
      // First order: at most half the momentum of one cell's share at each of the three closings.
      expect(losses / (0.5 * rho * area * pusher * speed ** 2)).toBeLessThan(0.005)
      expect(solution.striker!.safeSpeed).toBeNull()
    })
  })
}
