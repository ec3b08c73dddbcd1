import { describe, expect, it } from 'vitest'
import { EXAMPLE_RIG } from './exampleRig'
import { readChanged } from './readChanged'

const read = (fatigue: object) =>
  readChanged({ materials: { steel: { ...EXAMPLE_RIG.materials.steel, fatigue } } })

describe('the fatigue line of a material', () => {
  it('takes a negative exponent, also as a formula', () => {
    for (const [exponent, value] of [
      [-0.09, -0.09],
      [-1, -1],
      [-0.01, -0.01],
      ['-1/5', -0.2],
    ] as const) {
      const { rig, faults } = read({ strength: '1.2 GPa', exponent })
      expect(faults).toEqual([])
      expect(rig?.bars[0].sections[0].material.fatigue).toEqual({ strength: 1.2e9, exponent: value })
    }
  })

  it('refuses an exponent of the wrong sign or size, and says which way round it is meant', () => {
    for (const exponent of [0.09, 0, 11, -11, -1.001, -0.0099, '1/11']) {
      const { faults } = read({ strength: '1.2 GPa', exponent })
      expect(faults).toHaveLength(1)
      expect(faults[0]).toMatchObject({ code: 'out-of-range', path: 'materials.steel.fatigue.exponent' })
      expect(faults[0].message).toContain('it must lie between -1 and -0.01')
      expect(faults[0].message).toContain('amplitude = strength (2 N)^b')
    }
    expect(read({ strength: '1.2 GPa', exponent: 0.09 }).faults[0].message).toMatch(/^got 0\.09; /)
  })

  it('refuses a strength that is not positive or no stress', () => {
    expect(read({ strength: '-1 GPa', exponent: -0.1 }).faults).toMatchObject([{ code: 'out-of-range' }])
    expect(read({ strength: '1 m', exponent: -0.1 }).faults).toMatchObject([{ code: 'wrong-dimension' }])
    expect(read({ strength: '1 GPa' }).faults).toMatchObject([{ code: 'missing' }])
  })
})
