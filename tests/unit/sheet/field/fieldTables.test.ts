import { describe, expect, it } from 'vitest'
import { makeFieldTable } from '../../../../src-renderer/sheet/field/makeFieldTable'
import { listBarWords } from '../../../../src-renderer/sheet/field/writeLimit'
import { writeCsvTable } from '../../../../src-renderer/sheet/charts/writeTable'

describe('the field as a table', () => {
  it('gives the extremes of each cell, in the reader’s units', () => {
    const picture = {
      columns: 2,
      rows: 1,
      values: Float32Array.of(-2e6, 1e6, Number.NaN, Number.NaN),
      request: { quantity: 'stress', fromX: 0, toX: 1, fromT: 0, toT: 1e-3 },
    } as never
    expect(writeCsvTable(makeFieldTable(picture), 'si').split('\n')).toEqual([
      't from [ms],t to [ms],x from [mm],x to [mm],smallest stress [MPa],largest stress [MPa]',
      '0,1,0,500,-2,1',
      '0,1,500,1000,,',
      '',
    ])
  })

  it('gathers many pixels into one cell and passes over those without a bar', () => {
    const values = new Float32Array(2 * 320).fill(1)
    values[2 * 7] = -5
    values.fill(Number.NaN, 2 * 318, 2 * 320)
    const picture = {
      columns: 320,
      rows: 1,
      values,
      request: { quantity: 'velocity', fromX: 0, toX: 3.2, fromT: 0, toT: 1 },
    } as never
    const { columns, rows } = makeFieldTable(picture)
    expect(rows).toBe(160)
    expect([columns[4].at(3), columns[5].at(3), columns[4].at(2), columns[4].at(159)]).toEqual([
      -5,
      1,
      1,
      null,
    ])
  })
})

describe('words of the colour bar', () => {
  it('name both signs, or none', () => {
    expect(listBarWords('stress', 350e6, 'si')).toEqual([
      '+350 MPa',
      'tension',
      '0',
      'compression',
      '−350 MPa',
    ])
    expect(listBarWords('energy', 2e5, 'si')).toEqual(['200 kJ/m³', '0'])
  })
})
