import { describe, expect, it } from 'vitest'
import type { End } from '../../../../src-main/contract/rig'
import { marchRig } from '../march'
import { makeBar, makePulse, makeRig, makeSection } from '../testRig'

const DT = 1e-6
const CELL = 5000 * DT
/** Envelopes keep a peak within this share of the largest force. */
const ROUNDING = 1e-12

/** Two delay lines between ends that keep the waves in, long enough for several windows of the pruned search. */
function marchPulse(value: (t: number) => number, steps: number, leftEnd?: End) {
  return marchRig(
    makeRig(
      [makeBar('bar', [makeSection(37 * CELL, 1e-3), makeSection(22 * CELL, 2.3e-3)])],
      { duration: steps * DT, timeStep: DT },
      {
        leftEnd: leftEnd ?? { kind: 'force', pulse: makePulse(value) },
        rightEnd: { kind: 'support', stiffness: 4e7, damping: 3e3, mass: 0.2, joint: 'contact', gap: 1e-6 },
      },
    ),
    true,
  )
}

/** Fixed numbers in -1..1 without pattern. */
function makeNoise() {
  let state = 12345
  return () => {
    state = (state * 1103515245 + 12345) % 2147483648
    return state / 1073741824 - 1
  }
}

const noise = makeNoise()
const noises = Array.from({ length: 20_000 }, noise)

const PULSES: [string, (t: number) => number][] = [
  ['rectangle', (t) => (t < 19.5 * DT ? 1000 : 0)],
  ['half sine', (t) => (t < 25 * DT ? 1000 * Math.sin((Math.PI * t) / (25 * DT)) : 0)],
  ['triangle', (t) => 1000 * Math.max(0, 1 - Math.abs(t / (12 * DT) - 1))],
  ['step', () => 1000],
  ['rising ramp', (t) => 1e6 * t],
  ['decay', (t) => 1000 * Math.exp(-t / (400 * DT))],
  ['long sine', (t) => 1000 * Math.sin((2 * Math.PI * t) / (731.3 * DT))],
  ['noise', (t) => 1000 * noises[Math.round(t / DT)]],
  ['late single step', (t) => (Math.abs(t - 4321 * DT) < DT / 2 ? -1000 : 0)],
]

describe('the pruned envelope of a delay line', () => {
  it.each(PULSES)('has the values and the first steps of a search over every value: %s', (_name, value) => {
    const { line, record } = marchPulse(value, 6000)
    const { envelope, field } = record
    const scale = Math.max(...field.stress.map((row) => Math.max(...row.map(Math.abs)))) * 1e-3
    const wrong: string[] = []
    let column = 0
    line.spans.forEach((span, i) => {
      for (let p = 0; p <= span.cells; p++, column++) {
        const at = envelope.start[i] + p
        const force = field.stress.map((row) => row[column] * span.area[p])
        const [high, low] = [Math.max(0, ...force), Math.min(0, ...force)]
        const where = `position ${p} of span ${i}`
        if (!(Math.abs(envelope.tension[at] - high) <= ROUNDING * scale)) wrong.push(`tension, ${where}`)
        if (!(Math.abs(envelope.compression[at] - low) <= ROUNDING * scale))
          wrong.push(`compression, ${where}`)
        // A force within 1e-13 of the peak counts as the peak; those far under the waves that meet are left out.
        const first = (peak: number) =>
          force.findIndex((F) => F * Math.sign(peak) >= Math.abs(peak) * (1 - 1.01e-13))
        if (high > 0.01 * scale && envelope.tensionStep[at] !== first(high))
          wrong.push(`step of tension, ${where}`)
        if (low < -0.01 * scale && envelope.compressionStep[at] !== first(low))
          wrong.push(`step of compression, ${where}`)
      }
    })
    expect(column).toBe(field.x.length)
    expect(wrong).toEqual([])
  })

  it('takes the first of steps that differ by rounding alone', () => {
    // A bar under way and under tension: f and g are far larger than their sum, which rounding moves.
    const moved: number[] = []
    for (let i = 0; i < 12; i++) {
      const area = (0.9 + 0.0173 * i) * 1e-3
      const bars = [makeBar('bar', [makeSection(8 * CELL, area)], { uniformVelocity: 5, preload: 8000 })]
      const { record } = marchRig(
        makeRig(
          bars,
          { duration: 15 * DT, timeStep: DT },
          { leftEnd: { kind: 'matched' }, rightEnd: { kind: 'matched' } },
        ),
        true,
      )
      const { stress } = record.field
      for (let p = 0; p <= 8; p++) moved.push(Math.max(...stress.map((row) => row[p])) - stress[0][p])
      expect([...record.envelope.tensionStep].every((step) => step === 0)).toBe(true)
      expect(Math.max(...record.envelope.tension.map((F) => Math.abs(F / 8000 - 1)))).toBeLessThan(1e-13)
    }
    expect(moved.some((more) => more > 0)).toBe(true)
  })
})
