import { describe, expect, it } from 'vitest'
import { readChanged, readGood } from '../readChanged'

describe('ends', () => {
  it('are free where left out', () => {
    const rig = readGood({ leftEnd: undefined, rightEnd: undefined })
    expect([rig.leftEnd, rig.rightEnd]).toEqual([{ kind: 'free' }, { kind: 'free' }])
  })

  it.each([
    [{ kind: 'matched' }, { kind: 'matched' }],
    [{ kind: 'wall' }, { kind: 'wall', gap: 0 }],
    [
      { kind: 'wall', gap: '2 mm' },
      { kind: 'wall', gap: 0.002 },
    ],
    [
      { kind: 'mass', mass: '3 kg' },
      { kind: 'mass', mass: 3, velocity: 0, joint: 'contact', gap: 0 },
    ],
    [
      { kind: 'mass', mass: '3 kg', velocity: '-4 m/s', joint: 'bonded' },
      { kind: 'mass', mass: 3, velocity: -4, joint: 'bonded', gap: 0 },
    ],
    [
      { kind: 'support', stiffness: '5 kN/mm' },
      { kind: 'support', stiffness: 5e6, damping: 0, mass: 0, joint: 'bonded', gap: 0 },
    ],
    [
      { kind: 'penetration', loading: '5 kN/mm', unloading: '20 kN/mm' },
      { kind: 'penetration', loading: 5e6, unloading: 20e6 },
    ],
    [
      { kind: 'support', damping: '5 N s/m', mass: '1 kg', gap: '1 mm' },
      { kind: 'support', stiffness: 0, damping: 5, mass: 1, joint: 'contact', gap: 0.001 },
    ],
  ])('read %j', (raw, end) => {
    expect(readGood({ rightEnd: raw }).rightEnd).toEqual(end)
  })

  it('prescribe forces, velocities and displacements, each in its own units', () => {
    for (const [kind, peak, value] of [
      ['force', '2 kN', 2000],
      ['velocity', '3 m/s', 3],
      ['displacement', '4 mm', 0.004],
    ] as const) {
      const { leftEnd } = readGood({ leftEnd: { kind, pulse: { shape: 'ramp', peak, rise: '1 us' } } })
      expect(leftEnd.kind).toBe(kind)
      expect('pulse' in leftEnd && leftEnd.pulse.value(1)).toBe(value)
    }
  })
})

describe('joints', () => {
  it('are contacts without gap where left out', () => {
    expect(readGood({ joints: undefined }).joints).toEqual([{ kind: 'contact', gap: 0 }])
  })

  it('read a linear cushion', () => {
    const joint = { kind: 'cushion', stiffness: '5 kN/mm', damping: '10 N s/m', mass: '9 g', tension: true }
    expect(readGood({ joints: [joint] }).joints).toEqual([
      {
        kind: 'cushion',
        stiffness: 5e6,
        curve: null,
        unloading: null,
        damping: 10,
        mass: 0.009,
        gap: 0,
        tension: true,
      },
    ])
  })

  it('read a cushion with a curve that unloads as steeply as it loads at most', () => {
    const curve = [
      ['0 mm', '0 kN'],
      ['1 mm', '5 kN'],
      ['3 mm', '5 kN'],
    ]
    const joint = { kind: 'cushion', curve, unloading: '5 kN/mm', gap: '1 mm' }
    expect(readGood({ joints: [joint] }).joints).toEqual([
      {
        kind: 'cushion',
        stiffness: null,
        curve: { closing: [0, 0.001, 0.003], force: [0, 5000, 5000] },
        unloading: 5e6,
        damping: 0,
        mass: 0,
        gap: 0.001,
        tension: false,
      },
    ])
  })
})

describe('specimens', () => {
  const specimen = (law: object, more: object = { area: '50 mm^2' }) =>
    readChanged({ joints: [{ kind: 'specimen', length: '5 mm', law, ...more }] }).faults.map(
      ({ code, path }) => `${code} ${path}`,
    )

  it.each([
    { kind: 'elastic', modulus: '3 GPa' },
    { kind: 'elastic', modulus: '3 GPa', rateSensitivity: 0.01, referenceRate: '1 / s' },
    { kind: 'bilinear', modulus: '70 GPa', yield: '200 MPa', hardening: '1 GPa' },
    { kind: 'power', strength: '500 MPa', exponent: 0.2 },
    {
      kind: 'curve',
      curve: [
        [0, '0 MPa'],
        [0.01, '200 MPa'],
        ['0.2', '300 MPa'],
      ],
    },
  ])('are read with the law %j', (law) => {
    expect(specimen(law)).toEqual([])
  })

  it.each([
    [{ kind: 'plastic' }, 'wrong-choice joints[0].law.kind'],
    [{ kind: 'elastic', modulus: '3 mm' }, 'wrong-dimension joints[0].law.modulus'],
    [
      { kind: 'bilinear', modulus: '1 GPa', yield: '200 MPa', hardening: '2 GPa' },
      'out-of-range joints[0].law.hardening',
    ],
    [{ kind: 'power', strength: '500 MPa', exponent: '2 mm' }, 'wrong-dimension joints[0].law.exponent'],
    [{ kind: 'elastic', modulus: '3 GPa', rateSensitivity: 0.01 }, 'missing joints[0].law.referenceRate'],
    [
      {
        kind: 'curve',
        curve: [
          [0, '0 MPa'],
          [0, '200 MPa'],
        ],
      },
      'out-of-range joints[0].law.curve[1][0]',
    ],
  ])('are refused with the law %j', (law, fault) => {
    expect(specimen(law)).toEqual([fault])
  })

  it('need either a diameter or an area', () => {
    const law = { kind: 'elastic', modulus: '3 GPa' }
    expect(specimen(law, {})).toEqual(['missing joints[0].diameter'])
    expect(specimen(law, { area: '50 mm^2', diameter: '8 mm' })).toEqual(['conflict joints[0]'])
  })
})

describe('loads, gravity and gauges', () => {
  it('are read with their places', () => {
    const rig = readGood({
      gravity: '-9.81 m/s^2',
      loads: [{ bar: 'shaft', at: '100 mm', pulse: { shape: 'step', peak: '1 kN' } }],
      gauges: [
        { name: 'a', bar: 'striker', at: '0 mm' },
        {
          name: 'b',
          bar: 'shaft',
          at: '1360 mm',
          bridge: { factor: 2.1, arms: 4, excitation: '5 V', gain: 100, poisson: 0.3 },
        },
        { name: 'c', bar: 'shaft', at: '1 mm', bridge: { factor: '2', excitation: '5 V' } },
      ],
    })
    expect(rig.gravity).toBe(-9.81)
    expect(rig.loads.map(({ bar, at }) => [bar, at])).toEqual([[1, 0.1]])
    expect(rig.gauges).toEqual([
      { name: 'a', bar: 0, at: 0, bridge: null },
      {
        name: 'b',
        bar: 1,
        at: 1.36,
        bridge: { factor: 2.1, arms: 4, excitation: 5, gain: 100, poisson: 0.3 },
      },
      { name: 'c', bar: 1, at: 0.001, bridge: { factor: 2, arms: 1, excitation: 5, gain: 1, poisson: null } },
    ])
  })
})
