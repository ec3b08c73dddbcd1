import { describe, expect, it } from 'vitest'
import type { SectionShape } from '../../../../../src-main/contract/rig'
import { readBar, readChanged } from '../readChanged'

/** Area of a circle [m^2]. */
const circle = (diameter: number) => (Math.PI / 4) * diameter ** 2

function shapeOf(section: object): SectionShape {
  return readBar([{ length: '100 mm', ...section }]).sections[0].shape
}

/** Compares to a few roundings. */
function expectArea(shape: SectionShape, s: number, area: number): void {
  expect(Math.abs(shape.area(s) - area)).toBeLessThanOrEqual(1e-14 * area)
}

describe('section forms', () => {
  it('reads a cylinder', () => {
    const shape = shapeOf({ diameter: '20 mm' })
    expect(shape).toMatchObject({ kind: 'cylinder', uniform: true, round: true })
    expectArea(shape, 0.3, circle(0.02))
    expect([shape.diameter(1), shape.bore(1)]).toEqual([0.02, 0])
  })

  it('reads a tube', () => {
    const shape = shapeOf({ diameter: '30 mm', bore: '10 mm' })
    expect(shape).toMatchObject({ kind: 'tube', uniform: true, round: true })
    expectArea(shape, 0.3, circle(0.03) - circle(0.01))
    expect([shape.diameter(1), shape.bore(1)]).toEqual([0.03, 0.01])
  })

  it('reads a cone', () => {
    const shape = shapeOf({ diameter: { from: '20 mm', to: '40 mm' } })
    expect(shape).toMatchObject({ kind: 'cone', uniform: false, round: true })
    for (const s of [0, 0.25, 0.5, 1]) expectArea(shape, s, circle(0.02 + 0.02 * s))
    expect([shape.diameter(0), shape.diameter(1)]).toEqual([0.02, 0.04])
  })

  it('reads a horn whose area is exponential', () => {
    const shape = shapeOf({ diameter: { from: '20 mm', to: '40 mm', profile: 'exponential' } })
    expect(shape).toMatchObject({ kind: 'exponential', uniform: false })
    expectArea(shape, 0, circle(0.02))
    expectArea(shape, 0.5, Math.sqrt(circle(0.02) * circle(0.04)))
    expectArea(shape, 1, circle(0.04))
  })

  it('reads a taper whose area is linear', () => {
    const shape = shapeOf({ diameter: { from: '20 mm', to: '40 mm', profile: 'area-linear' } })
    expect(shape).toMatchObject({ kind: 'area-linear', uniform: false })
    for (const s of [0, 0.25, 1]) expectArea(shape, s, circle(0.02) * (1 - s) + circle(0.04) * s)
  })

  it('reads a cylinder with a conical bore', () => {
    const shape = shapeOf({ diameter: '40 mm', bore: { from: '0 mm', to: '20 mm' } })
    expect(shape).toMatchObject({ kind: 'cone', uniform: false })
    for (const s of [0, 0.5, 1]) expectArea(shape, s, circle(0.04) - circle(0.02 * s))
  })

  it('reads formulas in s and in x, the distance from the left face of the bar', () => {
    const shape = shapeOf({ diameter: '20 mm * (1 + s^2)', bore: '5 mm' })
    expect(shape).toMatchObject({ kind: 'formula', uniform: false })
    for (const s of [0, 0.5, 1]) expectArea(shape, s, circle(0.02 * (1 + s * s)) - circle(0.005))
    const second = readBar([
      { length: '100 mm', diameter: '20 mm' },
      { length: '200 mm', diameter: '20 mm + (x - 100 mm) / 10' },
    ]).sections[1].shape
    for (const s of [0, 0.5, 1]) expect(second.diameter(s)).toBeCloseTo(0.02 + 0.02 * s, 15)
  })

  it('reads stations, linear between them', () => {
    const stations = [
      ['0 mm', '20 mm'],
      ['40 mm', '24 mm'],
      ['100 mm', '30 mm'],
    ]
    const shape = shapeOf({ stations })
    expect(shape).toMatchObject({ kind: 'stations', uniform: false, round: true })
    for (const [s, d] of [
      [0, 20],
      [0.2, 22],
      [0.4, 24],
      [0.7, 27],
      [1, 30],
    ]) {
      expect(shape.diameter(s)).toBeCloseTo(d / 1000, 15)
    }
  })

  it('takes the length of a section from its last station', () => {
    const bar = readBar([
      {
        stations: [
          ['0 mm', '20 mm'],
          ['40 mm', '24 mm'],
        ],
      },
    ])
    expect(bar.sections[0].length).toBe(0.04)
  })

  it('reads areas of sections that are not round', () => {
    const plain = shapeOf({ area: '400 mm^2' })
    expect(plain).toMatchObject({ kind: 'area', uniform: true, round: false })
    expectArea(plain, 0.5, 4e-4)
    expect(circle(plain.diameter(0.5))).toBeCloseTo(4e-4, 16)
    const taper = shapeOf({ area: '400 mm^2 * (1 + s)' })
    expect(taper).toMatchObject({ kind: 'area', uniform: false, round: false })
    expectArea(taper, 0.5, 6e-4)
  })

  it('calls a section uniform whatever its unchanging outline was given by', () => {
    expect(shapeOf({ diameter: { from: '20 mm', to: '20 mm' } })).toMatchObject({
      kind: 'cylinder',
      uniform: true,
    })
    expect(shapeOf({ diameter: '20 mm + 1 mm' })).toMatchObject({ kind: 'cylinder', uniform: true })
    expect(
      shapeOf({
        stations: [
          ['0 mm', '9 mm'],
          ['100 mm', '9 mm'],
        ],
        bore: '3 mm',
      }),
    ).toMatchObject({ kind: 'tube', uniform: true })
    expect(shapeOf({ diameter: '20 mm', bore: '0 mm' })).toMatchObject({ kind: 'cylinder', uniform: true })
  })

  it('finds a bore that breaks through between the stations only', () => {
    const stations = [
      ['0 mm', '20 mm'],
      ['33.3 mm', '9 mm'],
      ['100 mm', '20 mm'],
    ]
    const bars = [{ name: 'rod', material: 'steel', sections: [{ stations, bore: '9 mm' }] }]
    const { faults } = readChanged({ bars, joints: [], gauges: [] })
    expect(faults.map(({ code }) => code)).toEqual(['bore-too-wide'])
    expect(faults[0].message).toContain('Bore 9 mm is as wide as the bar, 9 mm at s = 0.333')
  })
})

describe('what a section does not say itself', () => {
  const materials = {
    steel: {
      density: '7850 kg/m^3',
      modulus: '207 GPa',
      allowable: { tension: '700 MPa', compression: '900 MPa' },
    },
    brass: { density: '8500 kg/m^3', modulus: '100 GPa' },
  }

  it('comes from its bar, and then from its material, each sense by itself', () => {
    const sections = [
      { length: '1 m', diameter: '9 mm' },
      { length: '1 m', diameter: '9 mm', allowable: { tension: '300 MPa' } },
      { length: '1 m', diameter: '9 mm', material: 'brass' },
    ]
    const bars = [{ name: 'rod', material: 'steel', allowable: { tension: '500 MPa' }, sections }]
    const { rig } = readChanged({ materials, bars, joints: [], gauges: [] })
    expect(rig?.bars[0].sections.map(({ material, allowable }) => [material.name, allowable])).toEqual([
      ['steel', { tension: 500e6, compression: 900e6 }],
      ['steel', { tension: 300e6, compression: 900e6 }],
      ['brass', { tension: 500e6, compression: null }],
    ])
  })

  it('needs no material of the bar where each section names one', () => {
    const bars = [{ name: 'rod', sections: [{ length: '1 m', diameter: '9 mm', material: 'brass' }] }]
    expect(readChanged({ materials, bars, joints: [], gauges: [] }).faults).toEqual([])
  })
})

describe('the state of a bar at the start', () => {
  it('is at rest where nothing is given', () => {
    const bar = readBar([{ length: '1 m', diameter: '9 mm' }])
    expect([bar.velocity(0.5, 0.5), bar.uniformVelocity, bar.displacement, bar.preload]).toEqual([
      0,
      0,
      null,
      0,
    ])
  })

  it('may be a velocity that changes along it, a displacement or a preload', () => {
    const sections = [{ length: '2 m', diameter: '9 mm' }]
    const moving = readBar(sections, { velocity: '10 m/s * (1 - s) + 1 m/s * x / (1 m)' })
    expect(moving.uniformVelocity).toBeNull()
    expect(moving.velocity(2, 1)).toBe(2)
    const strained = readBar(sections, { displacement: '1e-3 * x' })
    expect(strained.displacement?.(2, 1)).toBe(2e-3)
    expect(readBar(sections, { preload: '-5 kN' }).preload).toBe(-5000)
    expect(readBar(sections, { velocity: '-5 m/s' }).uniformVelocity).toBe(-5)
  })
})
