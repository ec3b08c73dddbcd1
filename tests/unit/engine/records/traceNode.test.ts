import { describe, expect, it } from 'vitest'
import { sumEnd } from '../../../../src-main/engine/records/traceNode'
import { marchRig } from '../march'
import { makeBar, makePulse, makeRig, makeSection } from '../testRig'

const DT = 1e-6
const CELL = 5000 * DT

describe('the trace at a node', () => {
  const { record, line } = marchRig(
    makeRig(
      [
        makeBar('first', [makeSection(10 * CELL, 1e-3), makeSection(12 * CELL, 2e-3)], {
          uniformVelocity: 6,
        }),
        makeBar('second', [makeSection(3 * CELL, 1e-3), makeSection(2 * CELL, 2e-3)]),
      ],
      { duration: 100 * DT, timeStep: DT },
      { joints: [{ kind: 'contact', gap: 60e-6 }], rightEnd: { kind: 'fixed' } },
    ),
  )

  it('has one force and, while a contact is open, two velocities', () => {
    const joint = record.node(2)!
    expect(joint.forceLeft).toHaveLength(line.steps + 1)
    expect([...joint.forceLeft.slice(0, 10)]).toEqual(Array.from({ length: 10 }, () => 0))
    expect(joint.velocityLeft[3]).toBeCloseTo(6, 12)
    expect(joint.velocityRight[3]).toBeCloseTo(0, 12)
    expect(joint.forceLeft[10]).toBeLessThan(-1e4)
    expect(joint.velocityLeft[10]).toBeCloseTo(joint.velocityRight[10], 12)
    joint.forceLeft.forEach((F, k) => expect(Math.abs(F - joint.forceRight[k])).toBeLessThan(1e-8))
  })

  it('reads the face of the bar on both sides at an end', () => {
    const end = record.node(4)!
    expect(end.forceRight).toEqual(end.forceLeft)
    expect(end.velocityRight).toEqual(end.velocityLeft)
    expect(Math.max(...end.velocityLeft.map(Math.abs))).toBeLessThan(1e-12)
    expect(Math.max(...record.node(0)!.forceLeft.map(Math.abs))).toBeLessThan(1e-9)
  })

  it('is there at a step between two long sections, and not at one inside a block of short ones', () => {
    expect(record.node(1)).not.toBeNull()
    expect(record.node(3)).toBeNull()
  })

  it('sums what the surroundings did to the bar: impulse n F dt, work n F v dt', () => {
    const trace = {
      forceLeft: new Float64Array(2),
      reaction: Float64Array.of(2, -3),
      velocityLeft: Float64Array.of(5, 7),
      forceRight: new Float64Array(2),
      velocityRight: new Float64Array(2),
    }
    const at = (n: 1 | -1) => sumEnd(trace, n, 0.5)
    expect(at(1)).toEqual({ impulse: -0.5, work: (10 - 21) * 0.5 })
    expect(at(-1)).toEqual({ impulse: 0.5, work: 5.5 })
  })

  it('gives the ends the impulse and work that the prescribed force has done', () => {
    const pulse = makePulse((t) => 1e3 * Math.exp(-t / 3e-5))
    const found = marchRig(
      makeRig(
        [makeBar('bar', [makeSection(10 * CELL, 1e-3)])],
        { duration: 60 * DT, timeStep: DT },
        { rightEnd: { kind: 'force', pulse } },
      ),
    ).record
    let [impulse, work] = [0, 0]
    found.node(1)!.velocityLeft.forEach((v, k) => {
      impulse += pulse.value(k * DT) * DT
      work += pulse.value(k * DT) * v * DT
    })
    expect(found.ends.right.impulse / impulse).toBeCloseTo(1, 12)
    expect(found.ends.right.work / work).toBeCloseTo(1, 12)
    expect(found.ends.left).toMatchObject({ impulse: 0, work: 0 })
  })
})
