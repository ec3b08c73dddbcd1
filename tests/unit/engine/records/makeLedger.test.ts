import { describe, expect, it } from 'vitest'
import type { End } from '../../../../src-main/contract/rig'
import { marchRig } from '../march'
import { makeBar, makePulse, makeRig, makeSection } from '../testRig'

const DT = 1e-6
const CELL = 5000 * DT

describe('the ledgers of energy and momentum', () => {
  it('close on a bar that stays as it is under its preload: rounding is held against the impulses at its ends', () => {
    for (const rightEnd of [{ kind: 'fixed' }, { kind: 'matched' }] as End[]) {
      const bar = makeBar('bar', [makeSection(12 * CELL, 0.983e-3)], { preload: -4999.7 })
      const { record } = marchRig(
        makeRig([bar], { duration: 500 * DT, timeStep: DT }, { leftEnd: { kind: 'matched' }, rightEnd }),
      )
      expect(record.energy.closure).toBeLessThan(1e-12)
      expect(record.energy.momentumClosure).toBeLessThan(1e-12)
    }
  })

  it('are zero where nothing ever moves', () => {
    const bar = makeBar('bar', [makeSection(12 * CELL, 1e-3)])
    const { record } = marchRig(makeRig([bar], { duration: 50 * DT, timeStep: DT }))
    expect(record.energy).toMatchObject({ closure: 0, momentumClosure: 0 })
    expect(
      [...record.energy.kinetic, ...record.energy.strain, ...record.energy.work].every((E) => E === 0),
    ).toBe(true)
  })

  it('are sampled at every step of a short run and at about 128 of a long one, first and last among them', () => {
    const rig = (steps: number) =>
      makeRig([makeBar('bar', [makeSection(12 * CELL, 1e-3)])], { duration: steps * DT, timeStep: DT })
    expect([...marchRig(rig(5)).record.energy.step]).toEqual([0, 1, 2, 3, 4, 5])
    const step = [...marchRig(rig(5000)).record.energy.step]
    expect(step.length).toBeGreaterThan(100)
    expect([step[0], step[step.length - 1]]).toEqual([0, 5000])
    const strides = step.slice(1).map((k, i) => k - step[i])
    expect(Math.max(...strides) - Math.min(...strides)).toBeLessThanOrEqual(1)
    expect(marchRig(rig(1000), true).record.energy.step).toHaveLength(1001)
  })

  it('book the work of a force, what a support keeps and what its damping takes', () => {
    const K = 5e7
    const D = 2e3
    const rightEnd: End = { kind: 'support', stiffness: K, damping: D, mass: 0.3, joint: 'bonded', gap: 0 }
    const leftEnd: End = { kind: 'force', pulse: makePulse((t) => 1e4 * Math.exp(-t / 1e-4)) }
    const bar = makeBar('bar', [makeSection(30 * CELL, 1e-3)])
    const { record } = marchRig(
      makeRig([bar], { duration: 900 * DT, timeStep: DT }, { leftEnd, rightEnd }),
      true,
    )
    const { kinetic, strain, dissipated, work, closure } = record.energy
    const [left, right] = [record.node(0)!, record.node(1)!]
    // Apart from the ledger: power of the force on the left face, velocity of the face in the support.
    let [pushed, damped, spring, S] = [0, 0, 0, 0]
    left.forceLeft.forEach((_, k) => {
      pushed += 1e4 * Math.exp((-k * DT) / 1e-4) * left.velocityLeft[k] * DT
      damped += D * right.velocityLeft[k] ** 2 * DT
      S += K * right.velocityLeft[k] * DT
      spring = (S * S) / (2 * K)
      const scale = pushed * 1e-12
      expect(Math.abs(work[k] - pushed)).toBeLessThanOrEqual(scale + 1e-15)
      expect(Math.abs(dissipated[k] - damped)).toBeLessThanOrEqual(scale)
    })
    const last = kinetic.length - 1
    expect(strain[last]).toBeGreaterThan(spring)
    expect(closure).toBeLessThan(1e-12)
    expect(dissipated.every((E, k) => k === 0 || E >= dissipated[k - 1])).toBe(true)
    expect(Math.abs(record.ends.left.work / pushed - 1)).toBeLessThan(1e-12)
    expect(Math.abs((kinetic[last] + strain[last] + damped) / pushed - 1)).toBeLessThan(1e-12)
  })
})
