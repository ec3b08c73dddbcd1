import { describe, expect, it } from 'vitest'
import type { SpecimenLaw } from '../../../../src-main/contract/rig'
import { makeMass } from '../../../../src-main/engine/laws/bodies'
import { makePathJoint } from '../../../../src-main/engine/laws/pathJoint'
import { makeBeat } from '../../../../src-main/engine/laws/side'
import { makeSpecimen } from '../../../../src-main/engine/laws/specimenLaw'

const LENGTH = 8e-3
const AREA = 5e-5
const steady = { rateSensitivity: 0, referenceRate: 1 }

/** Nominal stress at each strain of a path, compression positive. */
function press(law: SpecimenLaw, strains: number[]): number[] {
  const specimen = makeSpecimen({ length: LENGTH, area: AREA, law })
  return strains.map((strain) => {
    specimen.law.moveTo(strain * LENGTH)
    return specimen.law.mean(specimen.law.closing) / AREA
  })
}
function expectPath(law: SpecimenLaw, path: [number, number][]): void {
  const found = press(
    law,
    path.map(([strain]) => strain),
  )
  path.forEach(([, stress], i) => expect(Math.abs(found[i] - stress)).toBeLessThan(1e-9 * 1e9))
}

describe('specimens: stress over strain, loading, unloading and loading again', () => {
  it('elastic', () => {
    expectPath({ kind: 'elastic', modulus: 70e9, ...steady }, [
      [0.002, 140e6],
      [0.005, 350e6],
      [0.001, 70e6],
      [-0.001, 0],
    ])
  })

  it('bilinear: E to the yield, H beyond, E on the way back', () => {
    expectPath({ kind: 'bilinear', modulus: 70e9, yield: 210e6, hardening: 2e9, ...steady }, [
      [0.002, 140e6],
      [0.003, 210e6],
      [0.053, 310e6],
      [0.051, 170e6],
      [0.048, 0],
      [0.0516, 212e6],
      [0.103, 410e6],
      [1.5, 210e6 + 2e9 * 1.497],
    ])
  })

  it('power: K e^n, rigid on the way back', () => {
    expectPath({ kind: 'power', strength: 400e6, exponent: 0.25, ...steady }, [
      [0.0001, 40e6],
      [0.0625, 200e6],
      [0.0624, 0],
      [0.0625, 200e6],
      [0.2401, 280e6],
    ])
  })

  it('curve: its points, straight between, from nothing, with its steepest slope back', () => {
    const law: SpecimenLaw = {
      kind: 'curve',
      strain: [0.01, 0.03, 0.1],
      stress: [100e6, 140e6, 150e6],
      ...steady,
    }
    expectPath(law, [
      [0.005, 50e6],
      [0.01, 100e6],
      [0.02, 120e6],
      [0.065, 145e6],
      [0.06, 95e6],
      [0.04, 0],
      [0.1, 150e6],
      [0.24, 170e6],
    ])
  })

  it('it never pulls', () => {
    for (const kind of [
      { kind: 'elastic', modulus: 70e9, ...steady },
      { kind: 'power', strength: 400e6, exponent: 0.25, ...steady },
    ] as SpecimenLaw[]) {
      expect(press(kind, [-0.01])).toEqual([0])
      expect(makeSpecimen({ length: LENGTH, area: AREA, law: kind }).options.pulls).toBe(false)
    }
  })
})

describe('a specimen that minds the rate', () => {
  const law: SpecimenLaw = {
    kind: 'bilinear',
    modulus: 70e9,
    yield: 200e6,
    hardening: 0.5e9,
    rateSensitivity: 0.03,
    referenceRate: 10,
  }

  it('raises the stress by (rate/reference)^m, and not under the reference', () => {
    const { options } = makeSpecimen({ length: LENGTH, area: AREA, law })
    expect(options.hurry!(1000 * LENGTH)).toBeCloseTo(100 ** 0.03, 12)
    expect(options.hurry!(3 * LENGTH)).toBe(1)
    expect(
      makeSpecimen({ length: LENGTH, area: AREA, law: { ...law, rateSensitivity: 0 } }).options.hurry,
    ).toBeUndefined()
  })

  it.each(['characteristics', 'elements'] as const)('between heavy bodies at 1500 /s, by %s', (method) => {
    // The bodies lose 0.1 % of their speed; the closing is taken from them, step by step.
    const [mass, speed, dt] = [400, 1500 * LENGTH, 1e-7]
    const beat = makeBeat(dt, 0, method)
    const [left, right] = [makeMass(mass, speed, beat), makeMass(mass, 0, beat)]
    const forces: number[] = []
    const watched = {
      ...right,
      take: (k: number, F: number, v: number) => (forces.push(-F), right.take(k, F, v)),
    }
    const { law: path, options } = makeSpecimen({ length: LENGTH, area: AREA, law })
    const joint = makePathJoint(left, watched, path, options, beat)
    joint.advance(0, 400)
    const strain = path.closing / LENGTH
    expect(strain).toBeGreaterThan(0.055)
    const factor = (1500 / 10) ** 0.03
    const expected = (200e6 + 0.5e9 * (strain - 200e6 / 70e9)) * factor
    expect(Math.abs(forces[399] / AREA / expected - 1)).toBeLessThan(2e-3)
  })
})
