import { describe, expect, it } from 'vitest'
import { readRig } from '../../../../src-main/engine/rig/readRig'
import type { RigDocument } from '../../../../src-renderer/stores/document/rigDocument'
import {
  addBar,
  addSection,
  canSplit,
  moveBar,
  moveSection,
  removeBar,
  splitSection,
} from '../../../../src-renderer/sheet/edit/changeBars'

const RIG: RigDocument = {
  format: 'barwright-rig/1',
  materials: { steel: { density: '7850 kg/m^3', modulus: '200 GPa' } },
  bars: [
    {
      name: 'one',
      material: 'steel',
      velocity: '5 m/s',
      sections: [{ length: '100 mm', diameter: '20 mm' }],
    },
    {
      name: 'two',
      material: 'steel',
      sections: [
        {
          name: 'head',
          length: '3 inch',
          diameter: { from: '20 mm', to: '30 mm' },
          bore: '5 mm',
          fillet: '1 mm',
        },
        { length: '2 * 100 mm', diameter: '32 mm' },
      ],
    },
    { name: 'three', material: 'steel', sections: [{ length: '50 mm', diameter: '10 mm' }] },
  ],
  joints: [{ kind: 'bonded' }, { kind: 'contact', gap: '1 mm' }],
  gauges: [
    { name: 'G1', bar: 'two', at: '10 mm' },
    { name: 'G2', bar: 'three', at: '10 mm' },
  ],
  run: { duration: '1 ms', cell: '5 mm' },
}
const middle = ({ from, to }: { from?: string; to?: string }): string => `(${from} + ${to}) / 2`

/** A changed rig is one that the reader takes. */
function read(rig: RigDocument) {
  const { rig: checked, faults } = readRig(JSON.stringify(rig))
  expect(faults).toEqual([])
  return checked!
}

describe('bars', () => {
  it('are added in contact, as thick as the one before ends', () => {
    const rig = addBar(RIG, 1)
    expect(rig.bars?.[2]).toMatchObject({ name: 'bar', sections: [{ diameter: '32 mm' }] })
    expect(rig.joints?.map(({ kind }) => kind)).toEqual(['bonded', 'contact', 'contact'])
    read(rig)
    expect(addBar(rig, 2).bars?.[3].name).toBe('bar 2')
  })

  it('leave with a joint, their gauges and loads', () => {
    expect(removeBar(RIG, 1).gauges).toEqual([RIG.gauges?.[1]])
    expect(removeBar(RIG, 1).joints).toEqual([{ kind: 'bonded' }])
    expect(removeBar(RIG, 2).joints).toEqual([{ kind: 'bonded' }])
    for (const at of [0, 1, 2]) read(removeBar(RIG, at))
  })

  it('change places while the joints stay', () => {
    const rig = moveBar(RIG, 2, -1)
    expect(rig.bars?.map(({ name }) => name)).toEqual(['one', 'three', 'two'])
    expect(rig.joints).toEqual(RIG.joints)
    expect(moveBar(RIG, 0, -1).bars).toEqual(RIG.bars)
  })

  it('leave the rig they are made from as it was', () => {
    const before = structuredClone(RIG)
    addBar(RIG, 0)
    removeBar(RIG, 0)
    splitSection(RIG, 1, 0, middle)
    expect(RIG).toEqual(before)
  })
})

describe('sections', () => {
  it('are split into halves that together are what they were', () => {
    const whole = read(RIG)
    for (const [bar, at] of [
      [1, 0],
      [1, 1],
      [0, 0],
    ]) {
      const halves = read(splitSection(RIG, bar, at, middle)).bars[bar].sections
      const { length, shape, fillet } = whole.bars[bar].sections[at]
      const [left, right] = halves.slice(at, at + 2)
      expect(left.length).toBeCloseTo(length / 2, 12)
      expect(right.length).toBeCloseTo(length / 2, 12)
      for (const s of [0, 0.3, 1]) {
        expect(left.shape.area(s)).toBeCloseTo(shape.area(s / 2), 12)
        expect(right.shape.area(s)).toBeCloseTo(shape.area((1 + s) / 2), 12)
      }
      expect([left.fillet, right.fillet]).toEqual([null, fillet])
    }
  })

  it('are not split where a formula or stations mean the whole', () => {
    expect(canSplit({ length: '1 m', diameter: '20 mm' })).toBe(true)
    expect(canSplit({ length: '1 m', diameter: '(20 + 2 * s) * 1 mm' })).toBe(false)
    expect(canSplit({ length: '1 m', diameter: { from: '1 mm', to: '2 mm', profile: 'exponential' } })).toBe(
      false,
    )
    expect(
      canSplit({
        length: '1 m',
        stations: [
          ['0 mm', '1 mm'],
          ['1 m', '2 mm'],
        ],
      }),
    ).toBe(false)
  })

  it('are added and moved within their bar', () => {
    const rig = addSection(RIG, 1, 0)
    expect(rig.bars?.[1].sections?.[1]).toEqual({ length: '50 mm', diameter: '30 mm' })
    read(rig)
    expect(moveSection(RIG, 1, 0, 1).bars?.[1].sections?.map(({ name }) => name)).toEqual([undefined, 'head'])
  })
})
