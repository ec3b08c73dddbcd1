import { describe, expect, it } from 'vitest'
import type { End, Joint } from '../../src-main/contract/rig'
import { sampleNames, solveSample } from '../samples/solveSample'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection } from '../unit/engine/testRig'

const ROUNDING = 1e-12

describe('the samples, as their results print them', () => {
  it('are at least six', () => expect(sampleNames.length).toBeGreaterThanOrEqual(6))

  it.each(sampleNames)('%s: stored + dissipated - work stays, and so does the momentum', (name) => {
    const { energy, momentum, joints, bars } = solveSample(name).solution
    const account = energy.t.map(
      (_, i) => energy.kinetic[i] + energy.strain[i] + energy.dissipated[i] - energy.work[i],
    )
    const largest = Math.max(
      ...energy.t.map((_, i) => Math.max(energy.kinetic[i] + energy.strain[i], Math.abs(energy.work[i]))),
    )
    const drift = Math.max(...account) - Math.min(...account)
    expect(drift / largest).toBeLessThan(2 * ROUNDING)
    expect(energy.closure).toBeLessThan(ROUNDING)
    expect(momentum.closure).toBeLessThan(ROUNDING)
    // What the joints have taken is part of what is dissipated, none of it negative.
    const taken = joints.reduce((sum, { energyLost }) => sum + energyLost, 0)
    expect(joints.every(({ energyLost }) => energyLost >= -ROUNDING * largest)).toBe(true)
    expect(taken).toBeLessThanOrEqual(energy.dissipated[energy.dissipated.length - 1] + ROUNDING * largest)
    expect(bars.every(({ kinetic, strain }) => kinetic >= 0 && strain >= 0)).toBe(true)
  })
})

describe('every end and joint accounts for all energy and momentum', () => {
  const DT = 1e-6
  const CELL = 5000 * DT
  const pulse = makePulse((t) => Math.sin(t / 2e-5) * Math.exp(-t / 2e-4))
  const times = (by: number) => makePulse((t) => by * pulse.value(t))
  const ENDS: End[] = [
    { kind: 'free' },
    { kind: 'fixed' },
    { kind: 'matched' },
    { kind: 'force', pulse: times(2e4) },
    { kind: 'velocity', pulse: times(2) },
    { kind: 'displacement', pulse: times(1e-4) },
    { kind: 'mass', mass: 0.7, velocity: -2, joint: 'bonded', gap: 0 },
    { kind: 'mass', mass: 0.7, velocity: -2, joint: 'contact', gap: 2e-5 },
    { kind: 'support', stiffness: 1e8, damping: 0, mass: 0, joint: 'bonded', gap: 0 },
    { kind: 'support', stiffness: 1e8, damping: 4e3, mass: 0.2, joint: 'bonded', gap: 0 },
    { kind: 'support', stiffness: 1e8, damping: 4e3, mass: 0.2, joint: 'contact', gap: 1e-5 },
    { kind: 'wall', gap: 0 },
    { kind: 'wall', gap: 3e-5 },
  ]
  const cushion = { curve: null, unloading: null, mass: 0 }
  const JOINTS: Joint[] = [
    { kind: 'bonded' },
    { kind: 'contact', gap: 0 },
    { kind: 'contact', gap: 4e-5 },
    { kind: 'cushion', ...cushion, stiffness: 3e8, damping: 0, gap: 0, tension: true },
    { kind: 'cushion', ...cushion, stiffness: 3e8, damping: 0, gap: 2e-5, tension: false },
    { kind: 'cushion', ...cushion, stiffness: 3e8, damping: 3e3, gap: 0, tension: false },
  ]
  const march = (leftEnd: End, joint: Joint, rightEnd: End, gravity = 0) =>
    marchRig(
      makeRig(
        [
          makeBar('first', [makeSection(20 * CELL, 1e-3), makeSection(6 * CELL, (s) => 1e-3 * (1 + s))], {
            uniformVelocity: 3,
          }),
          makeBar('second', [makeSection(31 * CELL, 2e-3)], { preload: -1e4 }),
        ],
        { duration: 700 * DT, timeStep: DT },
        { leftEnd, rightEnd, joints: [joint], gravity },
      ),
    ).record

  it.each(ENDS.map((end) => [end.kind, 'joint' in end ? end.joint : '', end] as const))(
    'end: %s %s, on either side, with and without gravity',
    (_kind, _joint, end) => {
      for (const gravity of [0, 500])
        for (const [left, right] of [
          [end, ENDS[0]],
          [ENDS[0], end],
        ]) {
          const { energy } = march(left, JOINTS[1], right, gravity)
          expect(energy.closure).toBeLessThan(ROUNDING)
          expect(energy.momentumClosure).toBeLessThan(ROUNDING)
        }
    },
  )

  it.each(JOINTS.map((joint) => [joint.kind, joint] as const))('joint: %s', (_kind, joint) => {
    const { energy, jointLoss, bars } = march(ENDS[0], joint, ENDS[0])
    expect(energy.closure).toBeLessThan(ROUNDING)
    // Two free bars: their momentum together is what it was, whatever the joint did.
    const total = bars.reduce((sum, { momentum }) => sum + momentum, 0)
    expect(Math.abs(total / (3 * bars[0].mass) - 1)).toBeLessThan(ROUNDING)
    const last = energy.dissipated.length - 1
    expect(Math.abs(energy.dissipated[last] - jointLoss[0])).toBeLessThan(ROUNDING * energy.kinetic[0])
    const keeps = joint.kind === 'bonded' || (joint.kind === 'contact' && joint.gap === 0)
    if (keeps) expect(jointLoss[0]).toBe(0)
    else if ('damping' in joint && joint.damping === 0)
      expect(Math.abs(jointLoss[0])).toBeLessThan(ROUNDING * energy.kinetic[0])
    else expect(jointLoss[0]).toBeGreaterThan(0)
  })
})
