import { describe, expect, it } from 'vitest'
import { makeElementLine } from '../../../../src-main/engine/elements/makeElementLine'
import { makeLine } from '../../../../src-main/engine/line/makeLine'
import { estimateSize } from '../../../../src-main/engine/rig/estimateSize'
import { readRig } from '../../../../src-main/engine/rig/readRig'
import { EXAMPLE_RIG } from './exampleRig'
import { readChanged, readGood } from './readChanged'

describe('readRig', () => {
  it('reads a whole rig into SI', () => {
    const { rig, faults } = readRig(JSON.stringify(EXAMPLE_RIG))
    expect(faults).toEqual([])
    expect(rig).toMatchObject({
      title: 'Drop striker on a stepped shaft',
      notes: '',
      bars: [
        {
          name: 'striker',
          uniformVelocity: Math.sqrt(2 * 9.80665 * 1.5),
          displacement: null,
          preload: 0,
          sections: [{ length: 0.3, fillet: null }],
        },
        {
          name: 'shaft',
          uniformVelocity: 0,
          sections: [
            { length: 0.8, fillet: 0.002, shape: { kind: 'cylinder' } },
            { length: 0.06, shape: { kind: 'cone' } },
            { length: 0.5, shape: { kind: 'tube' } },
          ],
        },
      ],
      joints: [{ kind: 'contact', gap: 0 }],
      leftEnd: { kind: 'free' },
      rightEnd: { kind: 'fixed' },
      loads: [],
      gravity: 0,
      gauges: [{ name: 'G1', bar: 1, at: 0.4, bridge: null }],
      factorOfSafety: 1.5,
      run: {
        duration: 0.0012,
        cell: 0.002,
        timeStep: null,
        method: 'characteristics',
        finiteStrain: false,
        lateralInertia: false,
        bulkViscosity: false,
        spall: false,
      },
    })
    expect(rig?.bars[0].sections[0].material).toEqual({
      name: 'steel',
      density: 7850,
      modulus: 207e9,
      poisson: 0.29,
      allowable: { tension: 700e6, compression: 900e6 },
      yield: null,
      hardening: null,
      hardeningRule: 'isotropic',
      viscosity: null,
      spall: null,
      fatigue: null,
      source: '',
    })
  })

  it('reads it the same with a byte-order mark, spaces and Windows line ends', () => {
    const spaced = `\uFEFF${JSON.stringify(EXAMPLE_RIG, null, 2).replaceAll('\n', '\r\n')}\r\n`
    expect(JSON.stringify(readRig(spaced))).toBe(JSON.stringify(readRig(JSON.stringify(EXAMPLE_RIG))))
  })

  it('keeps what a material says beyond a linear run', () => {
    const steel = {
      ...EXAMPLE_RIG.materials.steel,
      yield: '800 MPa',
      hardening: '2 GPa',
      hardeningRule: 'kinematic',
      viscosity: '0 Pa s',
      spall: '3 GPa',
      fatigue: { strength: '1.2 GPa', exponent: -0.09 },
      source: 'measured',
    }
    expect(readGood({ materials: { steel } }).bars[0].sections[0].material).toMatchObject({
      yield: 800e6,
      hardening: 2e9,
      hardeningRule: 'kinematic',
      viscosity: 0,
      spall: 3e9,
      fatigue: { strength: 1.2e9, exponent: -0.09 },
      source: 'measured',
    })
  })

  it('finds every fault of a file in one go, in its order', () => {
    const { faults } = readChanged({
      title: 5,
      variables: { drop: '1.5 mm + 1 s', a: 'b', b: 'a' },
      materials: {
        steel: { density: 7850, modulus: '207 GPa' },
        brass: { density: '8500 kg/m^3', modulus: '100 GPa', colour: 'yellow' },
      },
      leftEnd: { kind: 'displacement', pulse: { shape: 'step', peak: '1 mm' } },
      bars: [
        {
          name: 'striker',
          material: 'brass',
          velocity: 'drop * 3',
          sections: [{ length: '300 MPa', diameter: '20 mm' }],
        },
        {
          name: 'striker',
          material: 'brass',
          sections: [{ length: '1 m', diameter: '20 mm', bore: '25 mm' }, { length: '1 m' }],
        },
      ],
      joints: [],
      rightEnd: { kind: 'wall', gap: '-1 mm' },
      gauges: [{ name: 'G1', bar: 'stricker', at: '4 m' }],
      margins: { factorOfSafety: 'two' },
      run: { duration: '1.2 ms', cell: '2 mm', finiteStrain: true },
      colour: 'red',
    })
    expect(faults.map(({ code, path }) => `${code} ${path}`)).toEqual([
      'wrong-type title',
      'wrong-dimension variables.drop',
      'variable-cycle variables.a',
      'needs-unit materials.steel.density',
      'unknown-key materials.brass.colour',
      'conflict leftEnd.pulse',
      'wrong-dimension bars[0].sections[0].length',
      'duplicate-name bars[1].name',
      'bore-too-wide bars[1].sections[0].bore',
      'missing bars[1].sections[1]',
      'wrong-count joints',
      'out-of-range rightEnd.gap',
      'unknown-bar gauges[0].bar',
      'formula-unknown-name margins.factorOfSafety',
      'conflict run.finiteStrain',
      'unknown-key colour',
    ])
  })

  it('lets a caller ask for another method than the file', () => {
    expect(readGood({}, { method: 'elements' }).run.method).toBe('elements')
    const finite = { ...EXAMPLE_RIG.run, method: 'elements', finiteStrain: true }
    expect(readGood({ run: finite }).run.finiteStrain).toBe(true)
    const { faults } = readChanged({ run: finite }, { method: 'characteristics' })
    expect(faults.map(({ code, path }) => `${code} ${path}`)).toEqual(['conflict run.finiteStrain'])
    const run = { ...EXAMPLE_RIG.run, method: 'elements' }
    expect(readGood({ run }, { method: 'characteristics' }).run.method).toBe('characteristics')
  })

  it('takes variables in any order, and plain numbers among them', () => {
    const variables = { drop: 'half * 2', half: 'ratio * 1 m', ratio: 0.75, h: '3 mm', L: '1 m', A: '4 mm^2' }
    expect(readGood({ variables }).bars[0].uniformVelocity).toBe(Math.sqrt(2 * 9.80665 * 1.5))
  })

  it('bounds the work that the formulas of one file can ask for', () => {
    const long = Array.from({ length: 35 }, () => 'sqrt(1 mm^2)').join(' + ')
    const sections = Array.from({ length: 400 }, (_, i) => ({
      length: '1 mm',
      diameter: `${i + 20} mm + ${long}`,
    }))
    const { faults } = readChanged({
      bars: [{ name: 'shaft', material: 'steel', sections }],
      joints: [],
      gauges: [],
    })
    expect(faults.map(({ code, path }) => `${code} ${path}`)).toEqual(['too-large '])
    expect(faults[0].message).toContain('200000 characters')
  })

  it('bounds the count of each part', () => {
    const gauges = Array.from({ length: 1001 }, (_, i) => ({ name: `G${i}`, bar: 'shaft', at: '1 mm' }))
    expect(readChanged({ gauges }).faults.map(({ code, path }) => `${code} ${path}`)).toEqual([
      'too-large gauges',
    ])
  })

  it('takes studies that are right', () => {
    const studies = [
      { kind: 'sweep', name: 'drop', variable: 'drop', from: '1 m', to: '2 m', count: 5 },
      {
        kind: 'tolerance',
        variables: { drop: { spread: 'normal', deviation: '1 cm' } },
        samples: 100,
        seed: 7,
      },
      {
        kind: 'seek',
        variable: 'drop',
        between: ['1 m', '3 m'],
        until: { result: 'governing.margin', value: 0 },
      },
      {
        kind: 'tune',
        variables: { drop: { from: '1 m', to: '2 m' } },
        minimise: 'governing.margin',
        subjectTo: [{ result: 'governing.margin', atLeast: 0 }],
      },
    ]
    expect(readChanged({ studies }).faults).toEqual([])
  })

  it('takes a time step in place of a cell', () => {
    expect(readGood({ run: { duration: '1 ms', timeStep: '1 us' } }).run).toMatchObject({
      cell: null,
      timeStep: 1e-6,
    })
  })
})

describe('estimateSize', () => {
  it('estimates cells and steps from the wanted cell', () => {
    // one material: 1660 mm of line and a wave that runs c * 1.2 ms, both in cells of 2 mm
    const { cells, steps } = estimateSize(readGood({}))
    expect(cells).toBeCloseTo(830, 6)
    expect(steps).toBeCloseTo((Math.sqrt(207e9 / 7850) * 1.2e-3) / 2e-3, 6)
  })

  it('gives every section at least one cell', () => {
    const { cells } = estimateSize(readGood({ run: { duration: '1 ms', cell: '5 m' } }))
    expect(cells).toBe(4)
  })

  it.each([
    ['plain', {}, {}],
    ['with viscosity', {}, { viscosity: '200 kPa s' }],
    ['with finite strain', { finiteStrain: true }, {}],
    ['with bulk viscosity', { bulkViscosity: true }, {}],
  ])('estimates the steps of elements %s', (_name, more, of) => {
    const run = { ...EXAMPLE_RIG.run, method: 'elements', ...more }
    const rig = readGood({ run, materials: { steel: { ...EXAMPLE_RIG.materials.steel, ...of } } })
    const line = makeElementLine(makeLine(rig))
    // The cells that are cut may be up to 30 % finer than those wanted.
    expect(line.steps / estimateSize(rig).steps).toBeGreaterThan(0.99)
    expect(line.steps / estimateSize(rig).steps).toBeLessThan(1.45)
  })

  it('keeps room for every run of a solve', () => {
    const memory = (run: object, of: object = {}) => {
      const steel = { ...EXAMPLE_RIG.materials.steel, ...of }
      return estimateSize(readGood({ run: { ...EXAMPLE_RIG.run, ...run }, materials: { steel } })).memory
    }
    const [waves, elements, both] = [{}, { method: 'elements' }, { method: 'both' }].map((run) => memory(run))
    expect(both).toBeCloseTo(waves + elements, 0)
    expect(memory({}, { fatigue: { strength: '1 GPa', exponent: -0.1 } })).toBeGreaterThan(2 * waves)
    expect(memory({ spall: true }, { spall: '1 GPa' })).toBeGreaterThan(waves)
  })
})
