import { describe, expect, it } from 'vitest'
import type { End, Section } from '../../src-main/contract/rig'
import { marchRig } from '../unit/engine/march'
import { makeBar, makeRig, makeSection } from '../unit/engine/testRig'

const DT = 1e-6
const CELL = 5000 * DT
const MATCHED: End = { kind: 'matched' }
/** Smallest normal double: numbers under it are held with fewer digits and slow the machine down. */
const SMALLEST_NORMAL = 2 ** -1022

/** A section under way between ends that let everything out, until nothing is left. */
function marchDecay(sections: Section[], leftEnd: End, steps: number) {
  const length = sections.reduce((sum, section) => sum + section.length, 0)
  const gauges = [0, 0.3, 0.5, 0.95].map((share, i) => ({
    name: `G${i}`,
    bar: 0,
    at: share * length,
    bridge: null,
  }))
  const bars = [makeBar('bar', sections, { preload: 1000 })]
  return marchRig(
    makeRig(bars, { duration: steps * DT, timeStep: DT }, { leftEnd, rightEnd: { kind: 'free' }, gauges }),
  ).record
}

const steps = (cells: number) => [
  makeSection(cells * CELL, 1e-3),
  makeSection(cells * CELL, 4e-3),
  makeSection(cells * CELL, 1e-3),
]
const LEAK: End = { kind: 'support', stiffness: 0, damping: 2e4, mass: 0, joint: 'bonded', gap: 0 }
const HEAVY_LEAK: End = { kind: 'support', stiffness: 4e8, damping: 3e4, mass: 4e-4, joint: 'bonded', gap: 0 }

describe('a wave that dies out', () => {
  it.each([
    ['in delay lines', steps(10), LEAK],
    ['in short sections', steps(3), LEAK],
    ['in a taper', [makeSection(20 * CELL, (s) => 1e-3 * (1 + s) ** 2)], LEAK],
    ['on a spring, a mass and a dashpot', [makeSection(20 * CELL, 1e-3)], HEAVY_LEAK],
  ])('%s ends as exact zeros, without passing through subnormal numbers', (_name, sections, leak) => {
    const { gauges, field, node, energy } = marchDecay(sections, leak, 60_000)
    const traces = gauges.flatMap(({ force, velocity, rightgoing, leftgoing }) => [
      force,
      velocity,
      rightgoing,
      leftgoing,
    ])
    traces.push(node(0)!.forceLeft, node(0)!.velocityLeft)
    for (const trace of traces) {
      expect(trace.some((value) => Math.abs(value) > 1e-3)).toBe(true)
      expect(trace.every((value) => value === 0 || Math.abs(value) >= SMALLEST_NORMAL)).toBe(true)
      expect(trace.slice(-6000).every((value) => value === 0)).toBe(true)
    }
    expect(field.stress[field.stress.length - 1].every((value) => value === 0)).toBe(true)
    expect(energy.kinetic[energy.kinetic.length - 1]).toBe(0)
    expect(energy.closure).toBeLessThan(1e-12)
  })

  it('on a struck mass before a bar without end', () => {
    const bar = makeBar('bar', [makeSection(20 * CELL, 1e-3)])
    for (const joint of ['bonded', 'contact'] as const) {
      const leftEnd: End = { kind: 'mass', mass: 0.4, velocity: 3, joint, gap: 0 }
      const { record } = marchRig(
        makeRig([bar], { duration: 20_000 * DT, timeStep: DT }, { leftEnd, rightEnd: MATCHED }),
      )
      const { forceLeft, velocityLeft } = record.node(0)!
      for (const trace of [forceLeft, velocityLeft]) {
        expect(trace.every((value) => value === 0 || Math.abs(value) >= SMALLEST_NORMAL)).toBe(true)
        expect(trace.slice(-2000).every((value) => value === 0)).toBe(true)
      }
    }
  })
})
