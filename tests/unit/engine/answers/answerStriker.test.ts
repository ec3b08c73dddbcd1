import { describe, expect, it } from 'vitest'
import type { Rig } from '../../../../src-main/contract/rig'
import { answerStriker } from '../../../../src-main/engine/answers/answerStriker'
import { makePlainLine, STEEL, type PlainRig } from './makePlainLine'

const light = { ...STEEL, density: 2700, modulus: 70e9 }
const plain = (speed: number): PlainRig => ({
  bars: [
    { name: 'striker', velocity: speed, sections: [{ length: 0.3, diameter: 0.02 }] },
    { name: 'shaft', sections: [{ length: 0.9, diameter: 0.02, material: light }] },
  ],
})
const governing = (margin: number) => ({ bar: 'shaft', section: 0, sense: 'compression' as const, margin })

describe('what the striker sends', () => {
  it('gives the pulse: 2L/c of the striker, long in the struck bar at its own speed', () => {
    const answer = answerStriker(makePlainLine(plain(10)), governing(0.5))!
    expect(answer).toMatchObject({ name: 'striker', speed: 10 })
    // L = 0.3 m, c = 5000 m/s: 120 us (de Saint-Venant; the exercise of check section 2).
    expect(answer.pulseDuration).toBeCloseTo(120e-6, 15)
    expect(answer.pulseLength).toBeCloseTo(120e-6 * Math.sqrt(70e9 / 2700), 12)
    expect(answer.safeSpeed).toBeCloseTo(15, 14)
  })

  it('gives the same safe speed at twice the speed, where margin + 1 is half', () => {
    const slow = answerStriker(makePlainLine(plain(10)), governing(0.5))!
    const fast = answerStriker(makePlainLine(plain(20)), governing(1.5 / 2 - 1))!
    expect(fast.safeSpeed).toBeCloseTo(slow.safeSpeed!, 13)
  })

  it('keeps the sense of travel: to the left it strikes the bar on its left', () => {
    const { bars } = plain(0)
    const line = makePlainLine({ bars: [bars[1], { ...bars[0], velocity: -4 }] })
    expect(answerStriker(line, governing(1))).toMatchObject({ speed: -4, safeSpeed: -8 })
    expect(answerStriker(line, governing(1))!.pulseLength).toBeCloseTo(120e-6 * Math.sqrt(70e9 / 2700), 12)
  })

  it('has no pulse for a rigid mass and none in a bar that is not there', () => {
    const hammer = makePlainLine({
      bars: plain(0).bars,
      leftEnd: { kind: 'mass', mass: 3, velocity: 5, joint: 'contact', gap: 0 },
    })
    expect(answerStriker(hammer, governing(0))).toEqual({
      name: 'mass at the left end',
      speed: 5,
      pulseLength: null,
      pulseDuration: null,
      safeSpeed: 5,
    })
    const thrown = makePlainLine({ bars: plain(6).bars.slice(0, 1), rightEnd: { kind: 'wall', gap: 0 } })
    expect(answerStriker(thrown, governing(0))).toMatchObject({ pulseLength: null, safeSpeed: 6 })
  })

  it('is null where nothing moves, several things do, or a bar moves unevenly', () => {
    expect(answerStriker(makePlainLine(plain(0)), governing(1))).toBeNull()
    const line = makePlainLine(plain(3))
    line.rig.bars[1].uniformVelocity = -3
    expect(answerStriker(line, governing(1))).toBeNull()
    line.rig.bars[1].uniformVelocity = null
    expect(answerStriker(line, governing(1))).toBeNull()
  })

  it('gives no safe speed where stress is not proportional to speed, or no margin is known', () => {
    const safe = (change: (rig: Rig) => void) => {
      const line = makePlainLine(plain(10))
      change(line.rig)
      return answerStriker(line, governing(0.5))!.safeSpeed
    }
    const cushion = {
      kind: 'cushion',
      stiffness: 1e8,
      curve: null,
      unloading: null,
      damping: 0,
      mass: 0,
      gap: 0,
      tension: false,
    } as const
    const pulse = { shape: 'step', value: () => 1, rise: 0, breaks: [0] } as const
    expect(safe(() => {})).toBeCloseTo(15, 14)
    expect(safe((rig) => (rig.joints = [cushion]))).toBeCloseTo(15, 14)
    expect(safe((rig) => (rig.joints = [{ ...cushion, gap: 1e-3 }]))).toBeNull()
    expect(safe((rig) => (rig.joints = [{ kind: 'contact', gap: 1e-6 }]))).toBeNull()
    expect(safe((rig) => (rig.rightEnd = { kind: 'wall', gap: 1e-3 }))).toBeNull()
    expect(safe((rig) => (rig.rightEnd = { kind: 'force', pulse: { ...pulse, breaks: [0] } }))).toBeNull()
    expect(safe((rig) => (rig.gravity = 9.8))).toBeNull()
    expect(safe((rig) => (rig.bars[1].preload = 10))).toBeNull()
    expect(safe((rig) => (rig.bars[1].displacement = () => 0))).toBeNull()
    expect(safe((rig) => (rig.loads = [{ bar: 0, at: 0.1, pulse: { ...pulse, breaks: [0] } }]))).toBeNull()
    expect(answerStriker(makePlainLine(plain(10)), null)!.safeSpeed).toBeNull()
  })
})
