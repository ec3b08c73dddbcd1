import { describe, expect, it } from 'vitest'
import { listFatigue } from '../../../../../src-main/engine/answers/fatigue/listFatigue'
import { listFatigueCautions } from '../../../../../src-main/engine/answers/fatigue/listFatigueCautions'
import { makeShaft, TIRING } from './makeFatigueLine'

const judge = (history: number[], line = makeShaft()) => {
  const place = { bar: 0, section: 0, span: 0, position: 2, kt: null }
  return listFatigueCautions(
    line,
    listFatigue(line, [place], () => Float64Array.from(history)),
  )
}
const codes = (history: number[], line?: ReturnType<typeof makeShaft>) =>
  judge(history, line).map(({ code }) => code)

describe('cautions on fatigue', () => {
  it('are none without an answer', () => {
    expect(listFatigueCautions(makeShaft(), [])).toEqual([])
  })

  it('always tell what the number stands on', () => {
    // Amplitude 0.25 GPa: 524288 cycles, within the line's range.
    const [basis, ...rest] = judge([0, -0.5e9, 0, 0, 0])
    expect(rest).toEqual([])
    expect(basis).toMatchObject({ code: 'fatigue-basis', where: 'shaft, section 1' })
    for (const words of [
      'Mean stress is not counted',
      'elastic',
      'Surface',
      'corrosion',
      'fatigue line of the rig file',
    ])
      expect(basis.message).toContain(words)
    expect(basis.message).toContain('only the 100 µs of the run')
    expect(basis.message).not.toContain('still growing')
    expect(basis.message).not.toContain('Corners without')
    expect(basis.message).not.toContain('no fatigue line')
  })

  it('tell that the damage grows with the run', () => {
    const [basis] = judge([0, -0.5e9, 0, 0, -0.5e9, 0, 0])
    expect(basis.message).toContain(
      'The first half of the run alone gives 50 % of the damage in shaft, section 1',
    )
  })

  it('name corners without a factor and sections without a line', () => {
    const line = makeShaft({ fillet: undefined })
    line.rig.bars[0].sections[1].material = { ...TIRING, fatigue: null }
    const { message } = judge([0, -0.5e9, 0, 0, 0], line)[0]
    expect(message).toContain('Corners without a fillet factor count with their nominal stress')
    expect(message).toContain('(shaft, section 1)')
    expect(message).toContain('no fatigue line are not looked at (shaft, section 2)')
  })

  it('tell each way out of the range of the line', () => {
    const range = (history: number[], line?: ReturnType<typeof makeShaft>) => judge(history, line)[0].message
    expect(range([0, -2e9, 0])).toContain('1000 MPa, is not under the strength coefficient, 1000 MPa')
    expect(range([0, -1e9, 0])).toContain('the largest range alone lasts 512 cycles; under about 1000')
    expect(range([0, -0.2e9, 0])).toContain('lasts 5.0e+9 cycles')
    const soft = makeShaft({ material: { ...TIRING, yield: 300e6 } })
    expect(range([0, -0.5e9, 0], soft)).toContain('reaches 500 MPa, over the yield stress of 300 MPa')
  })

  it('tell the worst of several places of one kind once', () => {
    const shaft = makeShaft()
    const one = { bar: 0, section: 0, span: 0, position: 2, kt: null }
    const [slight] = listFatigue(shaft, [one], () => Float64Array.of(0, -0.02e9, 0))
    const [mild] = listFatigue(shaft, [{ ...one, section: 1, span: 1 }], () => Float64Array.of(0, -0.2e9, 0))
    const [range] = listFatigueCautions(shaft, [slight, mild])
    expect(range.where).toBe('shaft, section 2; shaft, section 1')
    expect(range.message.match(/lasts/g)).toHaveLength(1)
    expect(range.message).toContain('lasts 5.0e+9 cycles')
  })

  it('do not cry where the life is within 1e3 and 1e7 cycles, or nothing moves', () => {
    // 1e3 cycles: 0.5 x^-10 = 1e3 at amplitude 0.4676 GPa; 1e7: 0.1862 GPa.
    expect(codes([0, -0.93e9, 0, 0, 0])).toEqual(['fatigue-basis'])
    expect(codes([0, -0.94e9, 0, 0, 0])).toEqual(['fatigue-range', 'fatigue-basis'])
    expect(codes([0, -0.374e9, 0, 0, 0])).toEqual(['fatigue-basis'])
    expect(codes([0, -0.37e9, 0, 0, 0])).toEqual(['fatigue-range', 'fatigue-basis'])
    expect(codes([0, 0, 0])).toEqual(['fatigue-basis'])
  })
})
