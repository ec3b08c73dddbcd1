import { describe, expect, it } from 'vitest'
import { marchElements } from '../march'
import { makeBar, makePulse, makeRig, makeSection } from '../testRig'

const DT = 1e-6
const C = 5000
const AREA = 1e-3
const Z = 4e7 * AREA
const CELLS = 20
const LENGTH = CELLS * C * DT
const F = 1e4

describe('both faces of a node where sections meet, with elements at Courant one', () => {
  it('a force on the middle of a long bar pulls one half of itself and pushes the other', () => {
    const rig = makeRig(
      [makeBar('bar', [makeSection(2 * LENGTH, AREA)])],
      { duration: 40 * DT, timeStep: DT },
      {
        leftEnd: { kind: 'matched' },
        rightEnd: { kind: 'matched' },
        loads: [{ bar: 0, at: LENGTH, pulse: makePulse(() => F) }],
        gauges: [{ name: 'at it', bar: 0, at: LENGTH, bridge: null }],
      },
    )
    const { line, record } = marchElements(rig, true)
    const { start, tension, compression } = record.envelope
    const [before, after] = [start[1] - 1, start[1]]
    expect(tension[before] / F).toBeCloseTo(0.5, 12)
    expect(compression[before]).toBe(0)
    expect(tension[after]).toBe(0)
    expect(compression[after] / F).toBeCloseTo(-0.5, 12)
    // A gauge on the step lies in the right-hand span.
    const [{ force, velocity }] = record.gauges
    for (let k = 1; k <= line.steps; k++) {
      expect(force[k] / F).toBeCloseTo(-0.5, 12)
      expect((velocity[k] * 2 * Z) / F).toBeCloseTo(1, 12)
    }
    const x = record.field.x
    const last = record.field.stress[record.field.stress.length - 1]
    const at = x.findIndex((one) => Math.abs(one - LENGTH) < 1e-9)
    expect((last[at] * AREA) / F).toBeCloseTo(0.5, 12)
    expect((last[at + 1] * AREA) / F).toBeCloseTo(-0.5, 12)
  })

  it('an area step carries one force: the ramp that gets through, twice Z2/(Z1 + Z2) of it', () => {
    const slope = F / (10 * DT)
    const rig = makeRig(
      [makeBar('bar', [makeSection(LENGTH, AREA), makeSection(LENGTH, 3 * AREA)])],
      { duration: 39 * DT, timeStep: DT },
      {
        leftEnd: { kind: 'force', pulse: makePulse((t) => -slope * t) },
        rightEnd: { kind: 'matched' },
      },
    )
    const { line, record } = marchElements(rig)
    const { start, tension } = record.envelope
    const right = 1.5 * slope * (line.steps - CELLS) * DT
    expect(tension[start[1] - 1] / right).toBeCloseTo(1, 12)
    expect(tension[start[1]] / right).toBeCloseTo(1, 12)
  })
})
