import { describe, expect, it } from 'vitest'
import { makeContact } from '../../../../src-main/engine/laws/contact'
import { makeBeat } from '../../../../src-main/engine/laws/side'
import { makePlainSide } from './makePlainSide'

const DT = 1e-6
const beat = makeBeat(DT, 0, 'characteristics')

function meet(left: (k: number) => number, right: (k: number) => number, gap: number, steps: number) {
  const sides = [makePlainSide(left, 2e-5, 1), makePlainSide(right, 3e-5, -1)] as const
  const law = makeContact(...sides, gap, beat)
  law.advance(0, steps)
  return { left: sides[0], right: sides[1], law }
}

describe('a contact', () => {
  it('presses with (v_left - v_right)/(Y_left + Y_right) from the first step, and loses nothing', () => {
    const { left, right, law } = meet(
      () => 4,
      () => 1,
      0,
      3,
    )
    expect(left.forces.every((F) => Math.abs(F / (-3 / 5e-5) - 1) < 1e-14)).toBe(true)
    expect(right.forces).toEqual(left.forces)
    left.velocities.forEach((v, k) => expect(v).toBeCloseTo(right.velocities[k], 12))
    expect(law.dissipated()).toBe(0)
    expect(law.strain()).toBe(0)
  })

  it('never pulls: faces that would part go free', () => {
    const { left, right } = meet(
      () => -1,
      () => 2,
      0,
      4,
    )
    expect([...left.forces, ...right.forces].every((F) => F === 0)).toBe(true)
    expect(left.velocities).toEqual([-1, -1, -1, -1])
  })

  it('opens, keeps the gap in mind and closes again when it is used up', () => {
    // Two steps apart at 3 m/s make a gap of 6 dt; coming back at 2 m/s closes it in three steps.
    const right = (k: number) => (k < 2 ? 3 : -2)
    const { left } = meet(() => 0, right, 0, 8)
    expect(left.forces.slice(0, 4).every((F) => F === 0)).toBe(true)
    expect(left.forces.slice(5).every((F) => Math.abs(F / (-2 / 5e-5) - 1) < 1e-9)).toBe(true)
    // The third step of closing leaves nothing, or rounding.
    expect(Math.abs(left.forces[4])).toBeLessThan(1e-9)
  })

  it('that closes inside a step is stopped for the rest of it only, and books F (v_right - v_left) dt', () => {
    // The gap of 2.5 steps: in the third step half a step is open, half is pressed.
    const { left, right, law } = meet(
      () => 4,
      () => 0,
      2.5 * 4 * DT,
      4,
    )
    const full = -4 / 5e-5
    expect(left.forces[0]).toBe(0)
    expect(left.forces[1]).toBe(0)
    expect(left.forces[2] / full).toBeCloseTo(0.5, 9)
    expect(left.forces[3] / full).toBeCloseTo(1, 9)
    const loss = left.forces[2] * (right.velocities[2] - left.velocities[2]) * DT
    expect(law.dissipated() / loss).toBeCloseTo(1, 9)
    expect(loss).toBeGreaterThan(0)
  })

  it('does the same in one go and step by step', () => {
    const wave = (k: number) => Math.sin(k / 3)
    const one = meet(wave, (k) => Math.cos(k / 5), 1e-6, 60)
    const sides = [makePlainSide(wave, 2e-5, 1), makePlainSide((k) => Math.cos(k / 5), 3e-5, -1)] as const
    const law = makeContact(...sides, 1e-6, beat)
    for (let k = 0; k < 60; k++) law.advance(k, k + 1)
    expect(sides[0].forces).toEqual(one.left.forces)
    expect(law.dissipated()).toBe(one.law.dissipated())
    expect(Math.max(...one.left.forces)).toBeLessThanOrEqual(0)
    expect(Math.min(...one.left.forces)).toBeLessThan(-100)
  })
})
