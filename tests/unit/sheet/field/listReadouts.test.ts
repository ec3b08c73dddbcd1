import { describe, expect, it } from 'vitest'
import { findColumn, listReadouts } from '../../../../src-renderer/sheet/field/listReadouts'

const names = ['x', 'stress', 'force', 'velocity', 'energy', 'strain', 'rightgoing', 'leftgoing'] as const
type Values = Record<(typeof names)[number], number>
const values: Values = {
  x: 0.1,
  stress: -215e6,
  force: -67.5e3,
  velocity: -5.33,
  energy: 7.01e4,
  strain: -1.039e-3,
  rightgoing: 1e-8,
  leftgoing: -67.5e3,
}
const give = (some: Partial<Values>) =>
  Object.fromEntries(names.map((name) => [name, Float64Array.of({ ...values, ...some }[name])])) as never
const scale = { ...values, stress: 3e8, rightgoing: 1e3 }

describe('read-outs', () => {
  it('give every quantity with its unit, and zero for what is rounding beside the rest of the run', () => {
    const rows = listReadouts(give({}), scale, 'si')
    expect(rows.map(({ name, text, unit }) => `${name} ${text} ${unit}`)).toEqual([
      'Stress −215.0 MPa',
      'Force −67.50 kN',
      'Velocity −5.330 m/s',
      'Energy 70.10 kJ/m³',
      'Strain −1039 µm/m',
      'Right-going 0 kN',
      'Left-going −67.50 kN',
    ])
    expect(rows.filter(({ quantity }) => quantity).map(({ quantity }) => quantity)).toEqual([
      'stress',
      'force',
      'velocity',
      'energy',
    ])
  })

  it('give a dash where there is no bar or no answer', () => {
    expect(listReadouts(give({ leftgoing: Number.NaN }), scale, 'si').at(-1)).toMatchObject({
      text: '–',
      unit: '',
    })
    expect(listReadouts(null, null, 'si').every(({ text }) => text === '–')).toBe(true)
  })

  it('find the nearest column', () => {
    expect([-1, 0.19, 0.21, 9].map((place) => findColumn([0.1, 0.3], place))).toEqual([0, 0, 1, 1])
    expect(findColumn([], 1)).toBe(-1)
  })
})
