import { describe, expect, it } from 'vitest'
import { makeInspection } from '../../../../src-main/engine/rig/makeInspection'
import { readRig } from '../../../../src-main/engine/rig/readRig'

const RIG = {
  format: 'barwright-rig/1',
  variables: { drop: '0.2 m', twice: '2 * drop', share: 0.5 },
  materials: { steel: { density: '7850 kg/m^3', modulus: '200 GPa' } },
  leftEnd: {
    kind: 'force',
    pulse: { shape: 'rectangle', peak: '-10 kN', duration: '40 us', start: '10 us' },
  },
  bars: [
    {
      name: 'bar',
      material: 'steel',
      sections: [
        { length: 'twice / 4', diameter: { from: '1.5 * 20 mm', to: '1 inch' }, bore: '5 mm' },
        { length: '10 mm', diameter: '(20 + 2 * s) * 1 mm' },
      ],
    },
  ],
  run: { duration: '100 us', cell: '1 mm' },
}

function inspect(rig: object) {
  const { notes, inspection } = makeInspection()
  const { faults } = readRig(JSON.stringify(rig), { notes })
  const valueAt = (path: string) => inspection.values.find((one) => one.path === path)
  return { faults, inspection, valueAt }
}

describe('what the values of a rig are worth', () => {
  it('is told by path, in SI, with what they are', () => {
    const { faults, valueAt } = inspect(RIG)
    expect(faults).toEqual([])
    expect(valueAt('variables.twice')).toMatchObject({ value: 0.4, dimension: 'length' })
    expect(valueAt('variables.share')).toMatchObject({ value: 0.5, dimension: 'number' })
    expect(valueAt('bars[0].sections[0].length')).toMatchObject({ value: 0.1, dimension: 'length' })
    // An inch is 25.4 mm by definition.
    expect(valueAt('bars[0].sections[0].diameter.to')).toMatchObject({ value: 0.0254 })
    expect(valueAt('bars[0].sections[0].diameter.from')).toMatchObject({ value: 0.03 })
    expect(valueAt('materials.steel.modulus')).toMatchObject({ value: 200e9, dimension: 'stress' })
    expect(valueAt('bars[0].sections[1].diameter')).toBeUndefined()
  })

  it('is told of a refused rig as well, faulty values left out', () => {
    const broken = structuredClone(RIG)
    broken.bars[0].sections[0].bore = '32 mm'
    broken.bars[0].sections[1].length = '10 MPa'
    const { faults, valueAt } = inspect(broken)
    expect(faults.map(({ path }) => path)).toEqual(['bars[0].sections[0].bore', 'bars[0].sections[1].length'])
    expect(valueAt('bars[0].sections[0].bore')).toMatchObject({ value: 0.032 })
    expect(valueAt('bars[0].sections[1].length')).toBeUndefined()
  })

  it('draws pulses over the run, with both sides of a jump', () => {
    const [pulse] = inspect(RIG).inspection.pulses
    expect([pulse.path, pulse.dimension]).toEqual(['leftEnd.pulse', 'force'])
    expect([pulse.t[0], pulse.t[pulse.t.length - 1]]).toEqual([0, 1e-4])
    for (const jump of [10e-6, 50e-6]) {
      const after = pulse.t.findIndex((t) => Math.abs(t - jump) < 1e-15)
      const sides = [pulse.value[after - 1], pulse.value[after]].sort((a, b) => a - b)
      expect(sides).toEqual([-10e3, 0])
      expect(pulse.t[after] - pulse.t[after - 1]).toBeLessThan(1e-12)
    }
    expect(pulse.t).toEqual([...pulse.t].sort((a, b) => a - b))
  })
})
