import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { End, Rig } from '../../../src-main/contract/rig'
import { marchRig } from '../../unit/engine/march'
import { findWorst } from '../findWorst'
import { mirrorRig } from './mirrorRig'
import { canMeet, makeRigs } from './randomRigs'
import { scaleRig } from './scaleRig'

/** Bounded and the same every time. */
const runs = (numRuns: number): fc.Parameters<[Rig]> => ({ seed: 20240617, numRuns })
const check = (numRuns: number, rigs: fc.Arbitrary<Rig>, hold: (rig: Rig) => void) =>
  fc.assert(fc.property(rigs, hold), runs(numRuns))

type March = ReturnType<typeof marchRig>

/** Largest force at play: of the envelope, and of the waves that go with the velocities. */
function evaluateScale({ line, record }: March): number {
  const { tension, compression } = record.envelope
  const momentum = record.bars.map((bar) => Math.sqrt(2 * bar.kinetic * bar.mass))
  return Math.max(1, findWorst(tension), findWorst(compression), findWorst(momentum) / line.dt / 100)
}

const pressesOnly = (end: End) => end.kind === 'wall' || ('joint' in end && end.joint === 'contact')

describe('random lines', () => {
  it('never give a number that is none, and close their ledgers of energy and momentum', () => {
    check(100, makeRigs(), (rig) => {
      const { record, broken } = marchRig(rig)
      expect(broken).toBe(false)
      const { envelope, energy, field, bars, jointLoss, ends } = record
      const all = [
        ...[
          envelope.tension,
          envelope.compression,
          energy.kinetic,
          energy.strain,
          energy.dissipated,
          energy.work,
        ],
        ...field.stress,
        ...record.gauges.flatMap(({ force, velocity, rightgoing, leftgoing }) => [
          force,
          velocity,
          rightgoing,
          leftgoing,
        ]),
        bars.flatMap(({ momentum, mass, kinetic, strain }) => [momentum, mass, kinetic, strain]),
        jointLoss,
        [ends.left.impulse, ends.left.work, ends.right.impulse, ends.right.work],
      ]
      expect(all.every((values) => Number.isFinite(findWorst(values)))).toBe(true)
      expect(energy.closure).toBeLessThan(1e-12)
      expect(energy.momentumClosure).toBeLessThan(1e-12)
    })
  })

  it('gain no energy that no work has brought, and lose none without saying where', () => {
    check(60, makeRigs(), (rig) => {
      const { kinetic, strain, dissipated, work } = marchRig(rig).record.energy
      const largest = Math.max(findWorst(kinetic) + findWorst(strain), findWorst(work), 1e-9)
      const start = kinetic[0] + strain[0] + dissipated[0] - work[0]
      for (let i = 0; i < kinetic.length; i++) {
        expect(kinetic[i] + strain[i] - work[i] <= start + 1e-11 * largest).toBe(true)
        if (i > 0) expect(dissipated[i] >= dissipated[i - 1] - 1e-12 * largest).toBe(true)
      }
    })
  })

  it('change the energy of their bars only by what passes at the faces: an account apart from the ledgers', () => {
    check(60, makeRigs({ gravity: false }), (rig) => {
      const { line, record } = marchRig(rig)
      const short = marchRig({ ...rig, run: { ...rig.run, duration: line.dt } }).record
      const sum = (bars: typeof record.bars) =>
        bars.reduce((all, { kinetic, strain }) => all + kinetic + strain, 0)
      let passed = 0
      let largest = Math.max(sum(short.bars), sum(record.bars), 1e-9)
      for (let i = 0; i <= line.spans.length; i++) {
        const trace = record.node(i)
        if (trace === null) continue
        const { forceLeft, forceRight, velocityLeft, velocityRight } = trace
        for (let k = 2; k <= line.steps; k++) {
          if (i > 0) passed += forceLeft[k] * velocityLeft[k] * line.dt
          if (i < line.spans.length) passed -= forceRight[k] * velocityRight[k] * line.dt
          largest = Math.max(largest, Math.abs(passed))
        }
      }
      expect(Math.abs(sum(record.bars) - sum(short.bars) - passed)).toBeLessThan(1e-11 * largest)
    })
  })

  it('never pull over a contact, nor over a cushion that does not pull', () => {
    check(60, makeRigs(), (rig) => {
      const { line, record } = marchRig(rig)
      const pulls = (node: number) => Math.max(...record.node(node)!.forceLeft)
      rig.joints.forEach((joint, i) => {
        const presses = joint.kind === 'contact' || (joint.kind === 'cushion' && !joint.tension)
        if (presses)
          expect(pulls(line.bars[i].lastSpan + 1)).toBeLessThanOrEqual(
            evaluateScale({ line, record, broken: false }) * 1e-15,
          )
      })
      if (pressesOnly(rig.leftEnd)) expect(pulls(0)).toBeLessThanOrEqual(0)
      if (pressesOnly(rig.rightEnd)) expect(pulls(line.spans.length)).toBeLessThanOrEqual(0)
    })
  })

  it('seen in a mirror give the mirrored answer', () => {
    check(60, makeRigs({ mostSteps: 250 }), (rig) => {
      const one = marchRig(rig)
      const other = marchRig(mirrorRig(rig))
      const scale = evaluateScale(one)
      // Meetings multiply rounding; without them it only adds up.
      const near = (canMeet(rig) ? 1e-7 : 1e-11) * scale
      const last = one.record.envelope.tension.length - 1
      const [a, b] = [one.record, other.record]
      const miss = (values: ArrayLike<number>, others: (i: number) => number) =>
        findWorst(Array.from(values, (value, i) => value - others(i)))
      expect(b.envelope.tension).toHaveLength(last + 1)
      expect(miss(a.envelope.tension, (i) => b.envelope.tension[last - i])).toBeLessThan(near)
      expect(miss(a.envelope.compression, (i) => b.envelope.compression[last - i])).toBeLessThan(near)
      const [ends, mirrored] = [a.ends, b.ends]
      const impulse = near * one.line.dt * one.line.steps
      expect(Math.abs(ends.left.impulse + mirrored.right.impulse)).toBeLessThan(impulse)
      expect(Math.abs(ends.right.impulse + mirrored.left.impulse)).toBeLessThan(impulse)
      const bars = a.bars.length
      a.bars.forEach(({ momentum }, i) =>
        expect(Math.abs(momentum + b.bars[bars - 1 - i].momentum)).toBeLessThan(impulse * 10),
      )
      rig.joints.forEach((_, i) => {
        const node = one.line.bars[i].lastSpan + 1
        const across = other.line.bars[bars - 2 - i].lastSpan + 1
        expect(miss(a.node(node)!.forceLeft, (k) => b.node(across)!.forceRight[k])).toBeLessThan(near)
      })
      a.gauges.forEach((gauge, i) => {
        expect(miss(gauge.force, (k) => b.gauges[i].force[k])).toBeLessThan(near)
        expect(miss(gauge.rightgoing, (k) => b.gauges[i].leftgoing[k])).toBeLessThan(near)
      })
    })
  })

  it('twice the speeds, forces and gaps: twice the stress, to the bit', () => {
    check(40, makeRigs(), (rig) => {
      const one = marchRig(rig).record
      const two = marchRig(scaleRig(rig, { length: 1, time: 1, area: 1, force: 2, motion: 2 })).record
      expect(two.envelope.tension).toEqual(one.envelope.tension.map((F) => 2 * F))
      expect(two.envelope.compression).toEqual(one.envelope.compression.map((F) => 2 * F))
      expect(two.envelope.tensionStep).toEqual(one.envelope.tensionStep)
      expect(two.bars.map(({ momentum }) => momentum)).toEqual(one.bars.map(({ momentum }) => 2 * momentum))
      expect(two.bars.map(({ kinetic }) => kinetic)).toEqual(one.bars.map(({ kinetic }) => 4 * kinetic))
    })
  })

  it('twice as long and wide, over twice the time: the same stress at the same speeds, to the bit', () => {
    check(40, makeRigs(), (rig) => {
      const one = marchRig(rig).record
      const two = marchRig(scaleRig(rig, { length: 2, time: 2, area: 4, force: 4, motion: 2 })).record
      expect(two.envelope.tension).toEqual(one.envelope.tension.map((F) => 4 * F))
      expect(two.envelope.compression).toEqual(one.envelope.compression.map((F) => 4 * F))
      expect(two.envelope.compressionStep).toEqual(one.envelope.compressionStep)
      one.gauges.forEach(({ velocity }, i) => expect(two.gauges[i].velocity).toEqual(velocity))
      expect(two.bars.map(({ kinetic }) => kinetic)).toEqual(one.bars.map(({ kinetic }) => 8 * kinetic))
    })
  })
})
