import { describe, expect, it } from 'vitest'
import { makeBarSide, type Port } from '../../../../src-main/engine/laws/barSide'
import { makeBond, makeBonded } from '../../../../src-main/engine/laws/bonded'
import { Outside } from '../../../../src-main/engine/laws/outside'
import { makePrescribedForce } from '../../../../src-main/engine/laws/prescribedForce'
import { makeBeat } from '../../../../src-main/engine/laws/side'

const DT = 1e-6
const beat = makeBeat(DT, 0, 'characteristics')
const [Z1, Z2] = [4e4, 1e4]
const port = (impedance: number, arriving: number[]): Port => ({
  impedance,
  arriving: Float64Array.from(arriving),
  leaving: new Float64Array(arriving.length + 2),
  leavingOffset: 2,
})
/** Force and velocity at a face: F = f + g, v = (g - f)/Z. */
const read = ({ impedance, arriving, leaving }: Port, hand: 1 | -1, k: number) => ({
  force: arriving[k] + leaving[k + 2],
  velocity: (hand * (leaving[k + 2] - arriving[k])) / impedance,
})

describe('two bonded bars', () => {
  it('scatter a wave from the left: R = (Z2 - Z1)/(Z2 + Z1) comes back, T = 2 Z2/(Z1 + Z2) passes', () => {
    const [left, right] = [port(Z1, [100, 0, -7]), port(Z2, [0, 0, 3])]
    makeBonded(left, right, null).advance(0, 3)
    expect(left.leaving[2] / 100).toBeCloseTo(-0.6, 15)
    expect(right.leaving[2] / 100).toBeCloseTo(0.4, 15)
    expect([left.leaving[3], right.leaving[3]]).toEqual([0, 0])
    for (const k of [0, 1, 2]) {
      const [a, b] = [read(left, 1, k), read(right, -1, k)]
      expect(a.force).toBeCloseTo(b.force, 12)
      expect(a.velocity).toBeCloseTo(b.velocity, 15)
    }
    // Leaves alone what lies before its offset.
    expect([left.leaving[0], left.leaving[1]]).toEqual([0, 0])
  })

  it('keep the energy of the waves to rounding', () => {
    const [left, right] = [port(Z1, [123.4]), port(Z2, [-77.7])]
    makeBonded(left, right, null).advance(0, 1)
    const before = 123.4 ** 2 / Z1 + 77.7 ** 2 / Z2
    const after = left.leaving[2] ** 2 / Z1 + right.leaving[2] ** 2 / Z2
    expect(after / before).toBeCloseTo(1, 14)
  })

  it('under a load move at (2 g - 2 f + Q)/(Z1 + Z2), the force jumping by Q', () => {
    const [left, right] = [port(Z1, [100, 0]), port(Z2, [30, 0])]
    const outside = new Outside(beat)
    makeBonded(left, right, { force: (k) => (k === 0 ? 500 : 0), outside }).advance(0, 2)
    const [a, b] = [read(left, 1, 0), read(right, -1, 0)]
    const v = (60 - 200 + 500) / (Z1 + Z2)
    expect(a.velocity).toBeCloseTo(v, 15)
    expect(b.velocity).toBeCloseTo(v, 15)
    expect(a.force - b.force).toBeCloseTo(500, 10)
    expect(outside.impulse).toBeCloseTo(500 * DT, 18)
    expect(outside.work).toBeCloseTo(500 * v * DT, 18)
  })

  it('as sides of a bond do the same as by their waves', () => {
    const waves = [
      [100, -3, 8],
      [5, 0, -1],
    ]
    const [left, right] = [port(Z1, waves[0]), port(Z2, waves[1])]
    const [other, next] = [port(Z1, waves[0]), port(Z2, waves[1])]
    makeBonded(left, right, null).advance(0, 3)
    const law = makeBond(makeBarSide(other, 1, 0), makeBarSide(next, -1, 0), beat)
    law.advance(0, 3)
    for (let k = 2; k < 5; k++) {
      expect(other.leaving[k]).toBeCloseTo(left.leaving[k], 11)
      expect(next.leaving[k]).toBeCloseTo(right.leaving[k], 11)
    }
    expect([law.strain(), law.dissipated()]).toEqual([0, 0])
  })
})

describe('a prescribed force at an end', () => {
  it.each([1, -1] as const)('n F = T, hand %d; impulse and work are booked', (hand) => {
    const face = port(Z1, [40, -15])
    const outside = new Outside(beat)
    const law = makePrescribedForce(makeBarSide(face, hand, 0), hand, (k) => [600, 0][k], beat, outside)
    law.advance(0, 2)
    const [loaded, free] = [read(face, hand, 0), read(face, hand, 1)]
    expect(loaded.force).toBeCloseTo(hand * 600, 10)
    expect(free.force).toBeCloseTo(0, 12)
    // A free end doubles the velocity of the wave and turns its force round.
    expect(face.leaving[3]).toBeCloseTo(15, 12)
    expect(outside.impulse).toBeCloseTo(600 * DT, 18)
    expect(outside.work).toBeCloseTo(600 * loaded.velocity * DT, 16)
    expect([law.strain(), law.dissipated()]).toEqual([0, 0])
  })
})
