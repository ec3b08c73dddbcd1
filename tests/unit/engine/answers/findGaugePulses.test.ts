import { describe, expect, it } from 'vitest'
import { findGaugePulses } from '../../../../src-main/engine/answers/findGaugePulses'

const dt = 2e-6
function makeTrace(right: number[], left: number[]) {
  const [rightgoing, leftgoing] = [Float64Array.from(right), Float64Array.from(left)]
  const force = rightgoing.map((f, n) => f + leftgoing[n])
  return { x: 0, area: 1, impedance: 1, modulus: 1, force, velocity: force, rightgoing, leftgoing }
}

describe('pulses that pass a gauge', () => {
  it('finds a rectangular pulse exactly, first step above to first step below', () => {
    const trace = makeTrace([0, 0, -5, -5, -5, 0, 0], [0, 0, 0, 0, 0, 0, 0])
    expect(findGaugePulses(trace, dt)).toEqual([
      { direction: 'right', from: 2 * dt, to: 5 * dt, peakForce: -5, clear: true },
    ])
  })

  it('keeps the directions apart and says where they overlap', () => {
    const trace = makeTrace([0, 4, 4, 4, 0, 0, 0, 0], [0, 0, 0, -8, -8, 0, 3, 3])
    expect(findGaugePulses(trace, dt)).toEqual([
      { direction: 'right', from: dt, to: 4 * dt, peakForce: 4, clear: false },
      { direction: 'left', from: 3 * dt, to: 5 * dt, peakForce: -8, clear: false },
      { direction: 'left', from: 6 * dt, to: 7 * dt, peakForce: 3, clear: true },
    ])
  })

  it('splits where the sign changes and leaves out what is at or under 1 %', () => {
    const trace = makeTrace([1, 100, 60, -50, -70, 1, -1], [1, 1, 1, 1, 1, 1, 1])
    expect(findGaugePulses(trace, dt)).toEqual([
      { direction: 'right', from: dt, to: 3 * dt, peakForce: 100, clear: true },
      { direction: 'right', from: 3 * dt, to: 5 * dt, peakForce: -70, clear: true },
    ])
  })

  it('finds none where nothing passes', () => {
    expect(findGaugePulses(makeTrace([0, 0], [0, -0]), dt)).toEqual([])
  })
})
