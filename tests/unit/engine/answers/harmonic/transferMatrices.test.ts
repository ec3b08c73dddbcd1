import { describe, expect, it } from 'vitest'
import type { Section } from '../../../../../src-main/contract/rig'
import { evaluateChain } from '../../../../../src-main/engine/answers/harmonic/evaluateChain'
import { evaluateConeMatrix } from '../../../../../src-main/engine/answers/harmonic/evaluateConeMatrix'
import { evaluateExponentialMatrix } from '../../../../../src-main/engine/answers/harmonic/evaluateExponentialMatrix'
import { evaluateHarmonicRatios } from '../../../../../src-main/engine/answers/harmonic/evaluateHarmonicRatios'
import { evaluateUniformMatrix } from '../../../../../src-main/engine/answers/harmonic/evaluateUniformMatrix'
import { findAreaLaw } from '../../../../../src-main/engine/answers/harmonic/findAreaLaw'
import { solveSectionMatrices } from '../../../../../src-main/engine/answers/harmonic/solveSectionMatrices'
import {
  AREA_LAW_ROOTS,
  CONE_ROOTS,
  CONE_TRANSMISSION,
  EXPONENTIAL_ROOTS,
} from '../../../../../src-main/engine/exact/published/taperTables'
import { makePlainRig } from '../makePlainLine'

function makeSection(area: (s: number) => number): Section {
  return makePlainRig({ bars: [{ sections: [{ length: 1, area }] }] }).bars[0].sections[0]
}

describe(`${CONE_TRANSMISSION.label}: ${CONE_TRANSMISSION.source}`, () => {
  it.each(CONE_TRANSMISSION.rows)('kL = %d', (phase, ...printed) => {
    ;[Math.SQRT2, 2, 3].forEach((R, i) => {
      const found = evaluateHarmonicRatios(evaluateConeMatrix(7, R, phase), 7, 7 * R * R)
      expect(Math.abs(found.transmittedForce - printed[2 * i])).toBeLessThan(0.51e-7)
      expect(Math.abs(found.transmittedEnergy - printed[2 * i + 1])).toBeLessThan(0.51e-7)
      const back = evaluateHarmonicRatios(evaluateConeMatrix(7 * R * R, 1 / R, phase), 7 * R * R, 7)
      expect(back.transmittedForce).toBeCloseTo(found.transmittedForce / R ** 2, 9)
      expect(back.transmittedEnergy).toBeCloseTo(found.transmittedEnergy, 9)
    })
  })
})

describe('the conditions of free and fixed ends, entries of the matrix that vanish at natural frequencies', () => {
  // Free-free: b = 0; fixed-fixed: c = 0; left fixed, right free: a = 0; left free, right fixed: d = 0.
  // The entry changes by order 1 per unit of kL, so 1e-7 of it is the printed digits and a little more.
  const near = 1.5e-7

  it.each(CONE_ROOTS.rows)('cone, R = %d', (R, ...roots) => {
    const at = (phase: number) => evaluateConeMatrix(1, R, phase)
    for (const root of roots.slice(0, 2)) expect(Math.abs(at(root).b) / R ** 2).toBeLessThan(near)
    for (const root of roots.slice(2, 4)) expect(Math.abs(at(root).d)).toBeLessThan(near)
    for (const root of roots.slice(4, 6)) expect(Math.abs(at(root).a)).toBeLessThan(near)
  })

  it.each(EXPONENTIAL_ROOTS.rows)('exponential, A2/A1 = %d', (ratio, ...roots) => {
    const at = (phase: number) => evaluateExponentialMatrix(1, Math.log(ratio) / 2, phase)
    for (const root of roots.slice(0, 2)) {
      expect(Math.abs(at(root).b) / ratio).toBeLessThan(near)
      expect(Math.abs(at(root).c)).toBeLessThan(near)
    }
    for (const root of roots.slice(2, 4)) expect(Math.abs(at(root).d)).toBeLessThan(near)
    for (const root of roots.slice(4, 6)) expect(Math.abs(at(root).a)).toBeLessThan(near)
  })

  it.each(AREA_LAW_ROOTS.rows)(
    'A ~ x^%d, x2/x1 = %d, in pieces unless it is a cone',
    (n, ratio, ...roots) => {
      const section = makeSection((s) => (1 + (ratio - 1) * s) ** n)
      expect(findAreaLaw(section.shape)).toBe(n === 2 ? 'cone' : 'other')
      const at = (phase: number) => solveSectionMatrices(section, [phase])[0]
      const Z = 8000 * 5000
      const growth = ratio ** (n / 2)
      // Pieces end when nothing changes by more than 1e-7 of Z; what is left is under a third of that.
      for (const root of roots.slice(0, 2)) expect(Math.abs(at(root).b) / Z / growth).toBeLessThan(near)
      for (const root of roots.slice(2, 4)) expect(Math.abs(at(root).d)).toBeLessThan(near)
      for (const root of roots.slice(4, 6)) expect(Math.abs(at(root).a) / growth).toBeLessThan(near)
      for (const root of roots.slice(6, 8)) expect(Math.abs(at(root).c) * Z).toBeLessThan(near)
    },
  )
})

describe('matrices', () => {
  const determinant = (m: { a: number; b: number; c: number; d: number }) => m.a * m.d + m.b * m.c

  it('keep the energy: a d + b c = 1, at low and high frequency, under and over the cut-off', () => {
    for (const phase of [0.01, 0.7, 1.0986, 5, 20])
      for (const R of [0.3, 1.2, 3]) {
        expect(determinant(evaluateConeMatrix(2, R, phase))).toBeCloseTo(1, 9)
        expect(determinant(evaluateExponentialMatrix(2, Math.log(R), phase))).toBeCloseTo(1, 12)
        expect(determinant(evaluateUniformMatrix(2, phase))).toBeCloseTo(1, 14)
      }
  })

  it('of two halves make that of the whole', () => {
    const whole = evaluateConeMatrix(3, 2, 1.3)
    const halves = evaluateChain(
      evaluateConeMatrix(3, 1.5, 0.65),
      evaluateConeMatrix(3 * 1.5 ** 2, 4 / 3, 0.65),
    )
    for (const key of ['a', 'b', 'c', 'd'] as const) expect(halves[key]).toBeCloseTo(whole[key], 12)
    const horn = evaluateExponentialMatrix(3, 0.8, 0.5)
    const parts = evaluateChain(
      evaluateExponentialMatrix(3, 0.4, 0.25),
      evaluateExponentialMatrix(3 * Math.exp(0.8), 0.4, 0.25),
    )
    for (const key of ['a', 'b', 'c', 'd'] as const) expect(parts[key]).toBeCloseTo(horn[key], 12)
  })

  it('of an even stretch between its likes reflect nothing', () => {
    const found = evaluateHarmonicRatios(evaluateUniformMatrix(4, 1.1), 4, 4)
    expect(found.reflectedForce).toBeLessThan(1e-15)
    expect(found.transmittedForce).toBeCloseTo(1, 15)
  })

  it('pass the cut-off without a jump', () => {
    const at = (phase: number) => evaluateExponentialMatrix(1, 0.5, phase)
    for (const key of ['a', 'b', 'c', 'd'] as const) {
      expect(at(0.5 * (1 + 1e-12))[key]).toBeCloseTo(at(0.5 * (1 - 1e-12))[key], 9)
      expect(at(0.5)[key]).toBeCloseTo(at(0.5 * (1 - 1e-12))[key], 9)
    }
  })
})

describe('the law of the area', () => {
  it('is told from the area itself', () => {
    expect(findAreaLaw(makeSection(() => 2).shape)).toBe('uniform')
    expect(findAreaLaw(makeSection((s) => (3 - s) ** 2).shape)).toBe('cone')
    expect(findAreaLaw(makeSection((s) => Math.exp(-2 * s)).shape)).toBe('exponential')
    expect(findAreaLaw(makeSection((s) => 1 + s).shape)).toBe('other')
    expect(findAreaLaw(makeSection((s) => 1 + 0.1 * Math.sin(2 * Math.PI * s)).shape)).toBe('other')
  })

  it('in pieces comes back to the exact cone where it is one but for a touch', () => {
    const cone = makeSection((s) => (1 + s) ** 2)
    const touched = makeSection((s) => (1 + s) ** 2 * (1 + 1e-9 * Math.sin(7 * s)))
    const phases = [0.05, 1, 7, 20]
    const [exact, pieces] = [solveSectionMatrices(cone, phases), solveSectionMatrices(touched, phases)]
    expect(findAreaLaw(touched.shape)).toBe('other')
    exact.forEach((matrix, i) => {
      expect(Math.abs(pieces[i].a - matrix.a)).toBeLessThan(2e-7)
      expect(Math.abs(pieces[i].b - matrix.b) / 4e7).toBeLessThan(2e-7)
      expect(Math.abs(pieces[i].d - matrix.d)).toBeLessThan(2e-7)
    })
  })
})
