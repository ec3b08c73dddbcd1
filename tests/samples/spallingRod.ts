import { describe, expect, it } from 'vitest'
import { expectClose, expectShown } from './expectClose'
import { solveSample } from './solveSample'

const [rho, E] = [2400, 35e9]
const c = Math.sqrt(E / rho)
const [peak, strength, pulse, length] = [21e6, 8e6, 150e-6, 1.2]
const thickness = (c * pulse * strength) / (2 * peak)
const count = Math.floor(peak / strength)
/** Velocity of the j-th piece, from 1. */
const evaluateVelocity = (j: number) => (2 * peak - (2 * j - 1) * strength) / (rho * c)

/** Holds the sample to numbers found by hand. */
export function describeSpallingRod(): void {
  describe('sample spalling-rod', () => {
    const { solution, readme } = solveSample('spalling-rod')

    it('throws off as many pieces as the strength goes into the peak', () => {
      expect(solution.spalls).toHaveLength(count)
      expect(solution.fragments).toHaveLength(count + 1)
      expect(readme).toContain(`| ${count} `)
    })

    it('throws off pieces of one thickness, when the tension has grown to the strength', () => {
      // A piece ends at a cell: 0.5 mm of 109 mm.
      solution.spalls.forEach(({ x, time, stress }, i) => {
        expect(Math.abs(x - (length - (i + 1) * thickness))).toBeLessThan((i + 1) * 0.5e-3)
        // The front comes back to that place, each time from the face that the piece before has left.
        const back = length / c + ((i + 1) * thickness) / c
        expect(Math.abs(time - back)).toBeLessThan(3 * (i + 1) * solution.run.timeStep)
        // The tension passes the strength inside a step, in which it grows by 0.7 % of the peak.
        expect(stress).toBeGreaterThan(strength)
        expectClose(stress, strength, 8e-3)
      })
      expectShown(readme, thickness * 1e3, 'mm')
    })

    it('throws each piece off with the momentum trapped in it', () => {
      const pieces = [...solution.fragments].reverse().slice(0, count)
      pieces.forEach(({ velocity }, i) => {
        // The cell by which a piece is too thick carries little: 0.05 % of the first, 0.4 % of the second.
        expectClose(velocity, evaluateVelocity(i + 1), 5e-3)
        expectShown(readme, evaluateVelocity(i + 1), 'm/s')
      })
      const momentum = solution.fragments.reduce((sum, { mass, velocity }) => sum + mass * velocity, 0)
      expectClose(momentum, solution.ends.left.impulse, 1e-10)
    })

    it('comes closer with a finer cell', () => {
      const finer = solveSample('spalling-rod', { edit: (text) => text.replace('"0.5 mm"', '"0.25 mm"') })
      const miss = ({ fragments }: typeof solution) =>
        Math.abs(fragments[1].velocity / evaluateVelocity(2) - 1)
      expect(miss(finer.solution)).toBeLessThan(0.7 * miss(solution))
    })

    it('stays whole where the peak is under the strength', () => {
      const weak = solveSample('spalling-rod', { edit: (text) => text.replace('"peak": "21 MPa"', '"peak": "7.9 MPa"') })
      expect(weak.solution.spalls).toEqual([])
      expect(weak.solution.fragments).toEqual([])
    })
  })
}
