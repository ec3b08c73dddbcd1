import { describe, expect, it } from 'vitest'
import { readRig } from '../../../src-main/engine/rig/readRig'
import { drawLine } from '../../../src-main/workers/drawLine'
import { PIN_RIG } from './pinRig'

const [pin] = PIN_RIG.bars
const tool = {
  name: 'tool',
  material: 'steel',
  velocity: '-2 m/s',
  sections: [
    { name: 'neck', length: '100 mm', diameter: '20 mm', bore: '5 mm', fillet: '3 mm' },
    { length: '50 mm', diameter: { from: '20 mm', to: '10 mm' } },
  ],
}

function draw(changes: object) {
  const { rig, faults } = readRig(JSON.stringify({ ...PIN_RIG, ...changes }))
  if (rig === null) throw new Error(JSON.stringify(faults))
  return drawLine(rig)
}

describe('drawLine', () => {
  const line = draw({
    bars: [pin, tool],
    joints: [{ kind: 'contact', gap: '0.5 mm' }],
    gauges: [{ name: 'G1', bar: 'tool', at: '30 mm' }],
    loads: [{ bar: 'pin', at: '120 mm', pulse: { shape: 'rectangle', peak: '1 kN', duration: '0.1 ms' } }],
  })

  it('sets the bars face to face, with each part under its path in the file', () => {
    expect(line.bars.map(({ name, path }) => [name, path])).toEqual([
      ['pin', 'bars[0]'],
      ['tool', 'bars[1]'],
    ])
    const [, second] = line.bars
    expect(second.from).toBeCloseTo(0.4, 12)
    expect(second.to).toBeCloseTo(0.55, 12)
    expect(second.velocity).toBe(-2)
    expect(second.sections[0]).toMatchObject({ index: 0, name: 'neck', material: 'steel', fillet: 3e-3 })
    expect(second.sections[1].path).toBe('bars[1].sections[1]')
  })

  it('outlines a cylinder by its two faces and a taper by many points', () => {
    const [neck, cone] = line.bars[1].sections
    expect(neck.outline).toHaveLength(2)
    expect(neck.outline[0].slice(1)).toEqual([20e-3, 5e-3])
    expect(cone.outline.length).toBeGreaterThan(10)
    const [x, diameter, bore] = cone.outline[cone.outline.length / 2 - 0.5]
    expect([x, diameter, bore]).toEqual([expect.closeTo(0.525, 12), expect.closeTo(15e-3, 12), 0])
    expect(cone.outline.at(-1)).toEqual([expect.closeTo(0.55, 12), expect.closeTo(10e-3, 12), 0])
  })

  it('places joints, ends, gauges and loads along the line', () => {
    expect(line.joints).toEqual([
      { kind: 'contact', x: expect.closeTo(0.4, 12), gap: 0.5e-3, path: 'joints[0]' },
    ])
    expect(line.ends).toEqual([
      { kind: 'mass', x: 0, label: 'mass', path: 'leftEnd' },
      { kind: 'fixed', x: expect.closeTo(0.55, 12), label: 'fixed', path: 'rightEnd' },
    ])
    expect(line.gauges).toEqual([{ name: 'G1', x: expect.closeTo(0.43, 12), path: 'gauges[0]' }])
    expect(line.loads).toEqual([{ x: 0.12, path: 'loads[0]' }])
  })
})
