import { describe, expect, it } from 'vitest'
import type { Joint } from '../../../../src-main/contract/rig'
import { marchElements, marchRig } from '../march'
import { makeBar, makeRig, makeSection } from '../testRig'

const LENGTH = 0.5
const AREA = 1e-3
const SPEED = 20
const Z = 4e7 * AREA
/** Level force of the specimen: below Z v/2, so that it is pressed throughout. */
const FORCE = Z * SPEED * 0.25

/** A bar that drives a specimen of one stress into a bar that is matched at its far end. */
function makePressed(strain: number[], stress: number[]) {
  const joint: Joint = {
    kind: 'specimen',
    length: 5e-3,
    area: 1e-4,
    law: { kind: 'curve', strain, stress, rateSensitivity: 0, referenceRate: 1 },
  }
  return makeRig(
    [
      makeBar('driver', [makeSection(LENGTH, AREA)], { uniformVelocity: SPEED }),
      makeBar('driven', [makeSection(LENGTH, AREA)]),
    ],
    { duration: 190e-6, timeStep: 1e-6 },
    { rightEnd: { kind: 'matched' }, joints: [joint] },
  )
}

describe('a specimen of one stress', () => {
  const level = makePressed([0, 1], [FORCE / 1e-4, FORCE / 1e-4])

  it('holds that stress at every step while it is pressed, by both methods', () => {
    for (const { record } of [marchRig(level), marchElements(level)]) {
      const { forceLeft } = record.node(1)!
      expect(forceLeft.length).toBeGreaterThan(180)
      for (const F of forceLeft) expect(Math.abs(F / -FORCE - 1)).toBeLessThan(1e-9)
    }
  })

  it('and its faces move at v - F/Z and F/Z', () => {
    const { velocityLeft, velocityRight } = marchRig(level).record.node(1)!
    for (const v of velocityLeft) expect(Math.abs(v - (SPEED - FORCE / Z))).toBeLessThan(1e-9)
    for (const v of velocityRight) expect(Math.abs(v - FORCE / Z)).toBeLessThan(1e-9)
  })
})
