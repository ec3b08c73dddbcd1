import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { readRig } from '../../../../src-main/engine/rig/readRig'
import { findFieldFaults, findPartOf } from '../../../../src-renderer/sheet/edit/findFaults'
import type { FieldSpec } from '../../../../src-renderer/sheet/edit/forms/fieldSpec'
import { makePartForm } from '../../../../src-renderer/sheet/edit/forms/makePartForm'
import { MATERIAL_LIBRARY } from '../../../../src-renderer/sheet/edit/materials/library'
import { readPairs, writePairs } from '../../../../src-renderer/sheet/edit/pairsText'
import { makeStartRig } from '../../../../src-renderer/stores/document/makeStartRig'
import type { RigDocument } from '../../../../src-renderer/stores/document/rigDocument'

const faultsOf = (rig: RigDocument) => readRig(JSON.stringify(rig)).faults
const fieldsOf = (rig: RigDocument, path: string): FieldSpec[] => {
  const form = makePartForm(rig, path)
  return [...(form?.rows.flat() ?? []), ...(form?.beside ?? [])]
}
const find = (rig: RigDocument, path: string, label: string): FieldSpec =>
  fieldsOf(rig, path).find((spec) => spec.label === label)!
const choose = (rig: RigDocument, path: string, label: string, value: string): RigDocument =>
  find(rig, path, label).set!(rig, value)

describe('choices of a part', () => {
  it.each(find(makeStartRig(), 'joints[0]', 'Joint').choices!.map(({ value }) => value))(
    'a joint of kind %s is one that the reader takes',
    (kind) => {
      expect(faultsOf(choose(makeStartRig(), 'joints[0]', 'Joint', kind))).toEqual([])
    },
  )

  it.each(find(makeStartRig(), 'leftEnd', 'End').choices!.map(({ value }) => value))(
    'an end of kind %s is one that the reader takes, from whichever it comes',
    (kind) => {
      const kinds = find(makeStartRig(), 'leftEnd', 'End').choices!.map(({ value }) => value)
      for (const before of kinds) {
        const rig = choose(choose(makeStartRig(), 'leftEnd', 'End', before), 'leftEnd', 'End', kind)
        // A displacement that jumps is refused for good reason, and its shape is kept.
        expect(faultsOf(rig)).toEqual([])
      }
    },
  )

  it.each([
    'rectangle',
    'half-sine',
    'haversine',
    'triangle',
    'trapezoid',
    'step',
    'ramp',
    'formula',
    'table',
  ])('a force pulse of shape %s is one that the reader takes', (shape) => {
    const rig = choose(makeStartRig(), 'leftEnd', 'End', 'force')
    expect(faultsOf(choose(rig, 'leftEnd', 'Pulse', shape))).toEqual([])
  })

  it.each(['round', 'taper', 'stations', 'area'])('a section of form %s keeps its length', (form) => {
    const path = 'bars[1].sections[0]'
    for (const before of ['round', 'taper', 'stations', 'area']) {
      const rig = choose(choose(makeStartRig(), path, 'Form', before), path, 'Form', form)
      const { rig: checked, faults } = readRig(JSON.stringify(rig))
      expect(faults).toEqual([])
      expect(checked?.bars[1].sections[0].length).toBeCloseTo(0.8, 12)
    }
  })

  it.each(['elastic', 'bilinear', 'power', 'curve'])(
    'a specimen of law %s is one that the reader takes',
    (law) => {
      const rig = choose(makeStartRig(), 'joints[0]', 'Joint', 'specimen')
      expect(faultsOf(choose(rig, 'joints[0]', 'Law', law))).toEqual([])
    },
  )

  it('a cushion goes from a stiffness to a curve and back', () => {
    const cushion = choose(makeStartRig(), 'joints[0]', 'Joint', 'cushion')
    const curved = choose(cushion, 'joints[0]', 'Given by', 'curve')
    expect(faultsOf(curved)).toEqual([])
    expect(faultsOf(choose(curved, 'joints[0]', 'Given by', 'stiffness'))).toEqual([])
  })

  it('a run goes by cell or by time step', () => {
    const stepped = choose(makeStartRig(), 'run', 'Fineness by', 'timeStep')
    expect([stepped.run?.cell, stepped.run?.timeStep]).toEqual([undefined, '0.4 us'])
    expect(faultsOf(stepped)).toEqual([])
  })

  it('a joint that was left out is written out with those before it', () => {
    const rig = { ...makeStartRig(), joints: undefined }
    expect(choose(rig, 'joints[0]', 'Joint', 'bonded').joints).toEqual([{ kind: 'bonded' }])
  })
})

describe('names', () => {
  it('of a bar go to its gauges', () => {
    const rig = find(makeStartRig(), 'bars[1]', 'Name').set!(makeStartRig(), 'shaft')
    expect(rig.gauges?.[0].bar).toBe('shaft')
    expect(faultsOf(rig)).toEqual([])
  })

  it('of a material go to what is made of it, and no other material is lost', () => {
    const rig = find(makeStartRig(), 'materials.steel', 'Name').set!(makeStartRig(), 'tool steel')
    expect(Object.keys(rig.materials ?? {})).toEqual(['tool steel'])
    expect(faultsOf(rig)).toEqual([])
    const two = { ...rig, materials: { ...rig.materials, other: rig.materials!['tool steel'] } }
    expect(find(two, 'materials.other', 'Name').set!(two, 'tool steel')).toBe(two)
  })
})

describe('actions of a part', () => {
  it.each(['bars[0]', 'bars[1].sections[0]', 'materials.steel', 'gauges[0]'])(
    'of %s leave a rig that the reader takes',
    (path) => {
      const rig = makeStartRig()
      for (const { change, not, word } of makePartForm(rig, path)!.actions) {
        if (change && not === undefined) expect([word, faultsOf(change(rig))]).toEqual([word, []])
      }
    },
  )

  it('say why they cannot be done', () => {
    const remove = makePartForm(makeStartRig(), 'materials.steel')!.actions.find(
      ({ word }) => word === 'Remove',
    )
    expect(remove?.not).toBe('2 parts are made of it')
  })
})

describe('faults', () => {
  const fault = (path: string) => ({ code: 'out-of-range' as const, path, message: '' })

  it('stand under their field, those of a part of it as well', () => {
    const faults = [
      fault('bars[0].sections[0].diameter.to'),
      fault('bars[0].sections[0]'),
      fault('bars[0].sections[0].diameterOther'),
    ]
    const spec = (path: string, kind: FieldSpec['kind']): FieldSpec => ({ path, label: '', kind })
    expect(findFieldFaults(faults, spec('bars[0].sections[0].diameter', 'value'))).toEqual([faults[0]])
    expect(findFieldFaults(faults, spec('bars[0].sections[0]', 'choice'))).toEqual([faults[1]])
  })

  it.each([
    ['bars[0].sections[1].length', 'bars[0].sections[1]'],
    ['bars[2].name', 'bars[2]'],
    ['materials["a b"].density', 'materials["a b"]'],
    ['materials.steel.allowable.tension', 'materials.steel'],
    ['leftEnd.pulse.peak', 'leftEnd'],
    ['joints[0].gap', 'joints[0]'],
    ['run.duration', 'run'],
    ['variables.drop', 'variables'],
    ['margins.factorOfSafety', 'rig'],
    ['', 'rig'],
  ])('of %s are mended at %s', (path, part) => {
    expect(findPartOf(path)).toBe(part)
  })
})

describe('rows in one line', () => {
  it('are written and read back', () => {
    const rows = [
      ['0 mm', 'max(1 mm, 2 mm)'],
      ['40 mm', '24 mm'],
    ]
    expect(writePairs(rows)).toBe('0 mm, max(1 mm, 2 mm); 40 mm, 24 mm')
    expect(readPairs(writePairs(rows))).toEqual(rows)
    expect(readPairs('0, 0 MPa; 0.05, 250 MPa;', true)).toEqual([
      [0, '0 MPa'],
      [0.05, '250 MPa'],
    ])
    expect(writePairs('nonsense')).toBe('')
  })
})

describe('the library of materials', () => {
  it.each(MATERIAL_LIBRARY.map(({ name, material }) => [name, material] as const))(
    '%s is read, says where its numbers come from and gives no allowable',
    (name, material) => {
      const rig = makeStartRig()
      rig.materials = { ...rig.materials, [name]: material }
      expect(faultsOf(rig)).toEqual([])
      expect(material.source).toMatch(
        /from memory|Callister|Dowling|Aluminum Association|textbook|data sheet/,
      )
      expect(material.allowable).toBeUndefined()
    },
  )
})

it('the samples are those of the reader, so that every part of theirs has fields', () => {
  const text = readFileSync(
    join(import.meta.dirname, '../../../../samples/cushioned-ram/cushioned-ram.rig.json'),
    'utf8',
  )
  const rig = JSON.parse(text) as RigDocument
  for (const path of ['joints[0]', 'rightEnd', 'bars[0]', 'bars[0].sections[0]', 'run', 'rig', 'gauges[0]']) {
    expect(fieldsOf(rig, path).length).toBeGreaterThan(0)
  }
})
