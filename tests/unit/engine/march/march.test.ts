import { describe, expect, it } from 'vitest'
import { makeMarch } from '../../../../src-main/engine/march/march'

/** A method and a recorder that write down what they are asked. */
function makeWitness(recordSteps: number[], breaksAt = Infinity) {
  const advanced: [number, number][] = []
  const recorded: [number, number][] = []
  let done = 0
  return {
    advanced,
    recorded,
    method: {
      advance(from: number, to: number) {
        advanced.push([from, to])
        done = to
      },
    },
    recorder: {
      steps: Int32Array.from(recordSteps),
      record(index: number) {
        recorded.push([index, done])
        return index < breaksAt
      },
    },
  }
}

describe('the time loop', () => {
  it('makes steps 0 to the last once each, in order, without a gap', () => {
    const { method, recorder, advanced } = makeWitness([0, 3, 10])
    const march = makeMarch(method, recorder, 10)
    expect([march.step, march.end]).toEqual([0, 11])
    march.advance(march.end)
    expect(advanced).toEqual([
      [0, 1],
      [1, 4],
      [4, 11],
    ])
    expect(march.step).toBe(11)
  })

  it('records right after the steps asked for, each once', () => {
    const { method, recorder, recorded } = makeWitness([0, 3, 4, 10])
    makeMarch(method, recorder, 10).advance(11)
    expect(recorded).toEqual([
      [0, 1],
      [1, 4],
      [2, 5],
      [3, 11],
    ])
  })

  it('goes on where it stopped, however it is sliced', () => {
    const whole = makeWitness([0, 5, 9, 20])
    makeMarch(whole.method, whole.recorder, 20).advance(21)
    for (const slice of [1, 2, 5, 7]) {
      const sliced = makeWitness([0, 5, 9, 20])
      const march = makeMarch(sliced.method, sliced.recorder, 20)
      while (march.step < march.end) {
        const before = march.step
        march.advance(before + slice)
        expect(march.step).toBe(Math.min(march.end, before + slice))
      }
      expect(sliced.recorded).toEqual(whole.recorded)
      sliced.advanced.forEach(([from], i) => expect(from).toBe(i === 0 ? 0 : sliced.advanced[i - 1][1]))
    }
  })

  it('does nothing beyond its end, nor for a step that is behind it', () => {
    const { method, recorder, advanced } = makeWitness([0, 4])
    const march = makeMarch(method, recorder, 4)
    march.advance(3)
    march.advance(2)
    expect(march.step).toBe(3)
    march.advance(1000)
    const calls = advanced.length
    march.advance(1000)
    expect([march.step, advanced.length]).toEqual([5, calls])
  })

  it('marches on to its end without anything left to record', () => {
    const { method, recorder, recorded } = makeWitness([])
    const march = makeMarch(method, recorder, 6)
    march.advance(march.end)
    expect([march.step, recorded.length]).toEqual([7, 0])
  })

  it('stops for good where the numbers are no longer finite, with what it has', () => {
    const { method, recorder, recorded, advanced } = makeWitness([0, 3, 6, 9], 2)
    const march = makeMarch(method, recorder, 9)
    march.advance(march.end)
    expect(march.broken).toBe(true)
    expect(march.step).toBe(7)
    expect(recorded).toHaveLength(3)
    march.advance(march.end)
    expect(march.step).toBe(7)
    expect(advanced[advanced.length - 1]).toEqual([4, 7])
  })
})
