import { describe, expect, it } from 'vitest'
import { listFatiguePlaces } from '../../../../../src-main/engine/answers/fatigue/listFatiguePlaces'
import { makePlainLine, STEEL } from '../makePlainLine'
import { makeShaft, makeStressEnvelope, TIRING } from './makeFatigueLine'

const choose = (line: ReturnType<typeof makeShaft>, stress: Parameters<typeof makeStressEnvelope>[1]) =>
  listFatiguePlaces(line, { envelope: makeStressEnvelope(line, stress) })

describe('places for fatigue', () => {
  it('takes the fillet with its factor where the stress is even, then the other section', () => {
    const places = choose(makeShaft(), (span) => (span === 0 ? [0, -100e6] : [0, -25e6]))
    // D/d = 2, r/d = 0.1: Kt = 1.964545 (Pilkey, round, recomputed from the coefficients).
    expect(places[0]).toMatchObject({ bar: 0, section: 0, span: 0, position: 4 })
    expect(places[0].kt).toBeCloseTo(1.964545, 6)
    // Five equal places 0..4: the middle one.
    expect(places[1]).toEqual({ bar: 0, section: 1, span: 1, position: 2, kt: null })
    expect(places).toHaveLength(2)
  })

  it('takes the largest range, not the largest peak', () => {
    // At position 1 pulled by 300 MPa alone: amplitude 150 MPa; at position 3 pulled and pushed: 250 MPa.
    const line = makeShaft({ fillet: undefined })
    const places = choose(line, (span, p) =>
      span === 1 ? [0, 0] : p === 1 ? [300e6, 0] : p === 3 ? [250e6, -250e6] : [0, 0],
    )
    expect(places[0]).toEqual({ bar: 0, section: 0, span: 0, position: 3, kt: null })
  })

  it('weighs the range by the fatigue line of each section', () => {
    const weak = { ...TIRING, fatigue: { strength: 0.2e9, exponent: -0.1 } }
    const line = makePlainLine({
      bars: [
        {
          sections: [
            { length: 0.02, diameter: 0.02, material: TIRING },
            { length: 0.02, diameter: 0.02, material: weak },
          ],
        },
      ],
    })
    const places = choose(line, (span) => (span === 0 ? [200e6, 0] : [100e6, 0]))
    expect(places.map(({ section }) => section)).toEqual([1, 0])
  })

  it('leaves out sections and bars without a fatigue line', () => {
    const line = makePlainLine({
      bars: [
        { sections: [{ length: 0.02, diameter: 0.02 }] },
        {
          sections: [
            { length: 0.02, diameter: 0.02, material: STEEL },
            { length: 0.02, diameter: 0.03, material: TIRING },
          ],
        },
      ],
    })
    expect(choose(line, () => [100e6, 0]).map(({ bar, section }) => [bar, section])).toEqual([[1, 1]])
  })

  it('keeps the four with the shortest life in each bar', () => {
    const line = makePlainLine({
      bars: [0, 1].map((b) => ({
        name: `bar ${b}`,
        sections: [1, 2, 3, 4, 5, 6].map(() => ({ length: 0.01, diameter: 0.02, material: TIRING })),
      })),
    })
    const places = choose(line, (span) => [((span * 7) % 12) * 10e6 + 10e6, 0])
    // Stresses by span: 10 80 30 100 50 120 | 70 20 90 40 110 60 MPa.
    expect(places.map(({ bar, section }) => [bar, section])).toEqual([
      [0, 5],
      [0, 3],
      [0, 1],
      [0, 4],
      [1, 4],
      [1, 2],
      [1, 0],
      [1, 5],
    ])
  })

  it('has a place for a bar without stress too', () => {
    expect(choose(makeShaft({ fillet: undefined }), () => [0, 0])).toHaveLength(2)
  })
})
