import { describe, expect, it } from 'vitest'
import { evaluateHorn } from '../../../../src-main/engine/exact/evaluateHorn'
import { evaluateSteppedRod } from '../../../../src-main/engine/exact/evaluateSteppedRod'
import { findRoots } from '../../../../src-main/engine/exact/findRoots'
import { HORN } from '../../../../src-main/engine/exact/published/examples'
import {
  FIXED_MASS_ROOTS,
  FREE_MASS_ROOTS,
  STEPPED_ROD_ROOTS,
} from '../../../../src-main/engine/exact/published/rodLoads'
import { CONE_ROOTS, EXPONENTIAL_ROOTS } from '../../../../src-main/engine/exact/published/taperTables'
import { solveBracket } from '../../../../src-main/engine/exact/solveBracket'
import { solveConeRod } from '../../../../src-main/engine/exact/solveConeRod'
import { solveExponentialRod } from '../../../../src-main/engine/exact/solveExponentialRod'
import { solveFixedMassRod } from '../../../../src-main/engine/exact/solveFixedMassRod'
import { solveFreeMassRod } from '../../../../src-main/engine/exact/solveFreeMassRod'

/** Half a unit of the eighth decimal, to which the tables are printed, and a little for its rounding. */
const PRINTED = 0.51e-8

function expectRoots(found: number[], printed: number[], tolerance = PRINTED) {
  expect(found).toHaveLength(printed.length)
  found.forEach((root, i) => expect(Math.abs(root - printed[i])).toBeLessThan(tolerance))
}

describe(`${FIXED_MASS_ROOTS.label}: ${FIXED_MASS_ROOTS.source}`, () => {
  it.each(FIXED_MASS_ROOTS.rows)('r = %d', (r, ...roots) => expectRoots(solveFixedMassRod(r, 3), roots))
})

describe(`${FREE_MASS_ROOTS.label}: ${FREE_MASS_ROOTS.source}`, () => {
  it.each(FREE_MASS_ROOTS.rows)('r = %d', (r, ...roots) => expectRoots(solveFreeMassRod(r, 3), roots))
})

describe(`${STEPPED_ROD_ROOTS.label}: ${STEPPED_ROD_ROOTS.source}`, () => {
  it.each(STEPPED_ROD_ROOTS.rows)('A2/A1 = %d', (ratio, ...roots) =>
    expectRoots(evaluateSteppedRod(ratio, 3), roots),
  )
})

describe(`${CONE_ROOTS.label}: ${CONE_ROOTS.source}`, () => {
  it.each(CONE_ROOTS.rows)('R = %d', (R, ...roots) => {
    expectRoots(solveConeRod(R, 'free', 2), roots.slice(0, 2))
    expectRoots(solveConeRod(R, 'large-fixed', 2), roots.slice(2, 4))
    expectRoots(solveConeRod(R, 'small-fixed', 2), roots.slice(4, 6))
  })
})

describe(`${EXPONENTIAL_ROOTS.label}: ${EXPONENTIAL_ROOTS.source}`, () => {
  it.each(EXPONENTIAL_ROOTS.rows)('A2/A1 = %d', (ratio, ...roots) => {
    expectRoots(solveExponentialRod(ratio, 'free', 2), roots.slice(0, 2))
    expectRoots(solveExponentialRod(ratio, 'large-fixed', 2), roots.slice(2, 4))
    expectRoots(solveExponentialRod(ratio, 'small-fixed', 2), roots.slice(4, 6))
  })
})

describe(`${HORN.label}: ${HORN.source}`, () => {
  it.each(HORN.rows)('diameter ratio %d', (ratio, kL, place, merit) => {
    const found = evaluateHorn(ratio)
    expect(Math.abs(found.kL - kL)).toBeLessThan(PRINTED)
    expect(Math.abs(found.strainPlace - place)).toBeLessThan(0.51e-9)
    expect(Math.abs(found.merit - merit)).toBeLessThan(PRINTED)
  })

  it('tends to e for a large ratio', () => {
    // The approach is slow, 1 + O(1/ln(ratio)^2): at a ratio of e^300 it is within 1e-3.
    expect(Math.abs(evaluateHorn(Math.exp(300)).merit / Math.E - 1)).toBeLessThan(1e-3)
  })
})

describe('root finding', () => {
  it('bisects down to rounding and refuses a bracket without a change of sign', () => {
    expect(solveBracket((x) => x * x - 2, 1, 2)).toBeCloseTo(Math.SQRT2, 15)
    expect(solveBracket((x) => x, 0, 1)).toBe(0)
    expect(() => solveBracket((x) => x * x + 1, 0, 1)).toThrow(RangeError)
  })

  it('finds roots in order, also one that a step hits, and gives up where there are none', () => {
    const roots = findRoots((x) => Math.cos((Math.PI / 2) * x), 0, 0.5, 3)
    roots.forEach((root, i) => expect(root).toBeCloseTo(2 * i + 1, 14))
    expect(() => findRoots(() => 1, 0, 0.1, 1)).toThrow('Too few roots')
  })
})
