import { describe, expect, it } from 'vitest'
import { answerTapers } from '../../../../src-main/engine/answers/answerTapers'
import { evaluateEqualSteps } from '../../../../src-main/engine/exact/evaluateEqualSteps'
import { EQUAL_STEPS } from '../../../../src-main/engine/exact/published/taperTables'
import { makePlainLine, type PlainSection } from './makePlainLine'

const taper = (...sections: PlainSection[]) =>
  answerTapers(makePlainLine({ dt: 1e-5, bars: [{ name: 'horn', sections }] }))
const straight = (diameter: number, length = 1): PlainSection => ({ length, diameter })

describe('a taper between two straight sections', () => {
  const [cone, ...rest] = taper(straight(0.02), { length: 0.1, diameter: [0.02, 0.04] }, straight(0.04))

  it('is one answer with its name, place and travel time', () => {
    expect(rest).toEqual([])
    expect(cone).toMatchObject({ name: 'horn 2', from: 1 })
    expect(cone.to).toBeCloseTo(1.1, 14)
    expect(cone.travelTime).toBeCloseTo(0.1 / 5000, 16)
  })

  it('passes sqrt(A2/A1) of a short pulse without reflection, 2A2/(A1 + A2) of a long one', () => {
    expect(cone.shortPulse.transmittedForce).toBeCloseTo(2, 13)
    expect(Math.abs(cone.shortPulse.reflectedForce)).toBeLessThan(1e-14)
    expect(cone.longPulse.transmittedForce).toBeCloseTo(1.6, 13)
    expect(cone.longPulse.reflectedForce).toBeCloseTo(0.6, 13)
  })

  it('covers kL from 0.05 to 20 in ascending order and shares the energy whole', () => {
    expect(cone.frequency).toHaveLength(60)
    expect(cone.frequency[0] * 2 * Math.PI * cone.travelTime).toBeCloseTo(0.05, 13)
    expect(cone.frequency[59] * 2 * Math.PI * cone.travelTime).toBeCloseTo(20, 12)
    cone.frequency.forEach((frequency, i) => {
      if (i > 0) expect(frequency).toBeGreaterThan(cone.frequency[i - 1])
      expect(cone.reflectedForce[i] ** 2 + cone.transmittedEnergy[i]).toBeCloseTo(1, 10)
    })
    // kL = 1 is the 15th point: 1.6879229 and 0.7122709 for R = 2 (cone between two bars, recomputed).
    expect(cone.transmittedForce[14]).toBeCloseTo(1.6879229, 7)
    expect(cone.transmittedEnergy[14]).toBeCloseTo(0.7122709, 7)
    expect(cone.transmittedForce[59]).toBeCloseTo(1.9988085, 7)
  })

  it('turned round passes the same energy and the force divided by A2/A1', () => {
    const [back] = taper(straight(0.04), { length: 0.1, diameter: [0.04, 0.02] }, straight(0.02))
    cone.frequency.forEach((_, i) => {
      expect(back.transmittedEnergy[i]).toBeCloseTo(cone.transmittedEnergy[i], 10)
      expect(back.transmittedForce[i]).toBeCloseTo(cone.transmittedForce[i] / 4, 10)
    })
  })

  it('counts a jump at a face as a step', () => {
    const [found] = taper(straight(0.02), { length: 0.1, diameter: [0.04, 0.08] }, straight(0.08))
    expect(found.shortPulse.transmittedForce).toBeCloseTo(1.6 * 2, 12)
    expect(found.shortPulse.reflectedForce).toBeCloseTo(0.6, 13)
    expect(found.longPulse.transmittedForce).toBeCloseTo(32 / 17, 13)
  })

  it('at the end of a bar goes by its own end', () => {
    const [found] = taper(straight(0.02), { length: 0.1, diameter: [0.02, 0.04] })
    expect(found.longPulse.transmittedForce).toBeCloseTo(1.6, 13)
  })

  it('takes a tube of conical outline for what it is, not for a cone', () => {
    const [solid] = taper(straight(0.02), { length: 0.1, diameter: [0.02, 0.04] }, straight(0.04))
    const [tube] = taper(
      { ...straight(0.02), bore: 0.01 },
      { length: 0.1, diameter: [0.02, 0.04], bore: 0.01 },
      { ...straight(0.04), bore: 0.01 },
    )
    expect(tube.longPulse.transmittedForce).toBeCloseTo((2 * 15) / (3 + 15), 13)
    expect(tube.shortPulse.transmittedForce).toBeCloseTo(Math.sqrt(5), 13)
    expect(Math.abs(tube.transmittedForce[20] - solid.transmittedForce[20])).toBeGreaterThan(0.01)
    // The tube is solved in pieces, to 1e-7 of its matrix.
    tube.frequency.forEach((_, i) =>
      expect(Math.abs(tube.reflectedForce[i] ** 2 + tube.transmittedEnergy[i] - 1)).toBeLessThan(1e-7),
    )
  })
})

describe('a run of small steps', () => {
  const stepped = (ratio: number, steps: number) => {
    const area = (n: number) => 1e-4 * ratio ** (n / steps)
    const layers = Array.from({ length: steps - 1 }, (_, i) => ({ length: 0.01, area: () => area(i + 1) }))
    return taper({ length: 1, area: () => area(0) }, ...layers, { length: 1, area: () => area(steps) })
  }

  describe(`short pulse: ${EQUAL_STEPS.source}`, () => {
    const small = EQUAL_STEPS.rows.filter(
      ([ratio, steps]) => steps > 1 && ratio ** (1 / steps) <= 2 * (1 + 1e-12),
    )
    it.each(small)('A2/A1 = %d in %d steps', (ratio, steps, front) => {
      const [run, ...rest] = stepped(ratio, steps)
      expect(rest).toEqual([])
      expect(Math.abs(run.shortPulse.transmittedForce - front)).toBeLessThan(0.51e-8)
      expect(run.longPulse.transmittedForce).toBeCloseTo((2 * ratio) / (1 + ratio), 12)
      expect(run.name).toBe(steps === 2 ? 'horn 2' : `horn 2 to ${steps}`)
      expect(run.travelTime).toBeCloseTo((0.01 * (steps - 1)) / 5000, 15)
      const q = ratio ** (1 / steps)
      expect(run.shortPulse.reflectedForce).toBeCloseTo((q - 1) / (q + 1), 12)
    })
  })

  it('lets a low frequency see the plain step, and repeats where each layer is half a wave long', () => {
    const [run] = stepped(4, 4)
    expect(run.transmittedForce[0]).toBeCloseTo(1.6, 2)
    expect(evaluateEqualSteps(4, 4)).toBeCloseTo(run.shortPulse.transmittedForce, 12)
  })

  it('is not seen in a single step, in large steps, in long layers, or where the way turns', () => {
    expect(stepped(4, 1)).toEqual([])
    expect(stepped(9, 2)).toEqual([])
    const layer = (area: number, length = 0.01): PlainSection => ({ length, area: () => area })
    expect(taper(layer(1, 1), layer(1.5, 0.5), layer(2, 1))).toEqual([])
    expect(taper(layer(1, 1), layer(1.5), layer(1.2, 1))).toEqual([])
    expect(
      taper(layer(1, 1), layer(1.5), layer(2), layer(1.5), layer(1, 1)).map((each) => each.name),
    ).toEqual(['horn 2', 'horn 4'])
  })
})
