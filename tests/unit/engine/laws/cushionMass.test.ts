import { describe, expect, it } from 'vitest'
import type { Joint } from '../../../../src-main/contract/rig'
import { marchElements, marchRig } from '../march'
import { makeBar, makeRig, makeSection } from '../testRig'

const AREA = 1e-3
const LENGTH = 0.1
const SPEED = 10
/** Mass of either bar [kg]. */
const BAR = 8000 * AREA * LENGTH
const MASS = 2
const K = 1e6

describe('the mass of a cushion goes with the bars it lies on', () => {
  const joint: Joint = {
    kind: 'cushion',
    stiffness: K,
    curve: null,
    unloading: null,
    damping: 0,
    mass: MASS,
    gap: 0,
    tension: false,
  }
  const rig = makeRig(
    [
      makeBar('thrown', [makeSection(LENGTH, AREA)], { uniformVelocity: SPEED }),
      makeBar('standing', [makeSection(LENGTH, AREA)]),
    ],
    { duration: 6e-3, timeStep: 2e-6 },
    { joints: [joint] },
  )

  it.each([
    ['characteristics', marchRig],
    ['elements', marchElements],
  ])(
    'by %s: half of it starts at the speed of the bar, and the soft impact is that of two masses',
    (_name, march) => {
      const { record } = march(rig)
      const half = BAR + MASS / 2
      const { kinetic, strain } = record.energy
      // The first sample is taken one step on.
      expect((kinetic[0] + strain[0]) / ((half * SPEED ** 2) / 2)).toBeCloseTo(1, 6)
      const [thrown, standing] = record.bars.map(({ momentum, mass }) => momentum / mass)
      // The impact lasts 150 crossings of a bar, which rings by a few parts in a thousand of the speed.
      expect(Math.abs(thrown)).toBeLessThan(0.01 * SPEED)
      expect(Math.abs(standing - SPEED)).toBeLessThan(0.01 * SPEED)
      // Force on the bar, which is the cushion's less what its mass takes: v sqrt(K m/2) times BAR/half.
      const peak = -Math.min(...record.node(1)!.forceLeft)
      expect(Math.abs(peak / (SPEED * Math.sqrt((K * half) / 2) * (BAR / half)) - 1)).toBeLessThan(0.01)
    },
  )
})
