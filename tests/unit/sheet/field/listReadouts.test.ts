import { describe, expect, it } from 'vitest'
import { findColumn, listReadouts } from '../../../../src-renderer/sheet/field/listReadouts'

const names = ['x', 'stress', 'force', 'velocity', 'energy', 'strain', 'rightgoing', 'leftgoing'] as const
const give = (values: Record<(typeof names)[number], number[]>) => {
  const profile = Object.fromEntries(names.map((name) => [name, Float64Array.from(values[name])])) as never
  const scale = Object.fromEntries(
    names.map((name) => [name, Math.max(...values[name].map(Math.abs))]),
  ) as never
  return { profile, scale }
}
const moment = give({
  x: [0.1, 0.3],
  stress: [-215e6, 0],
  force: [-67.5e3, 0],
  velocity: [-5.33, 1],
  energy: [7.01e4, 0],
  strain: [-1.039e-3, 0],
  rightgoing: [1e-8, 1e3],
  leftgoing: [-67.5e3, Number.NaN],
})

describe('read-outs', () => {
  it('give every quantity at the nearest place, with its unit', () => {
    const rows = listReadouts(moment, 0.12, 'si')
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

  it('give a dash where there is no bar or no moment', () => {
    expect(listReadouts(moment, 0.3, 'si').at(-1)).toMatchObject({ text: '–', unit: '' })
    expect(listReadouts(null, 0.3, 'si').every(({ text }) => text === '–')).toBe(true)
  })

  it('find the nearest column', () => {
    expect([-1, 0.19, 0.21, 9].map((place) => findColumn([0.1, 0.3], place))).toEqual([0, 0, 1, 1])
    expect(findColumn([], 1)).toBe(-1)
  })
})
