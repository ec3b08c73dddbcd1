import { describe, expect, it } from 'vitest'
import { COLLISION_SOURCE, COLLISIONS } from '../../../../src-main/engine/exact/published/collisions'
import { solveCollision } from '../../../../src-main/engine/exact/solveCollision'

const ROUNDING = 1e-13

describe(`collision of two bars: ${COLLISION_SOURCE}`, () => {
  it('has the 18 tabulated rows', () => expect(COLLISIONS).toHaveLength(18))

  for (const row of COLLISIONS) {
    const { impedanceRatio, cells1, cells2, unit } = row
    it(`Z1/Z2 = ${impedanceRatio}, T1 = ${cells1 * unit}, T2 = ${cells2 * unit}`, () => {
      const found = solveCollision(impedanceRatio, cells1, cells2)
      expect(found.forceSteps).toHaveLength(row.forceSteps.length)
      found.forceSteps.forEach((force, i) =>
        expect(Math.abs(force - row.forceSteps[i])).toBeLessThan(ROUNDING),
      )
      expect(found.forceEnds * unit).toBe(row.forceEnds)
      expect(found.part * unit).toBe(row.part)
      expect(Math.abs(found.V1 - row.V1)).toBeLessThan(ROUNDING)
      expect(Math.abs(found.V2 - row.V2)).toBeLessThan(ROUNDING)
      expect(Math.abs(found.restitution - row.restitution)).toBeLessThan(ROUNDING)
    })
  }

  it('gives the same on a finer lattice', () => {
    const [coarse, fine] = [solveCollision(2, 1, 3), solveCollision(2, 7, 21)]
    expect(fine.part).toBe(7 * coarse.part)
    expect(fine.forceEnds).toBe(7 * coarse.forceEnds)
    expect(fine.V1).toBeCloseTo(coarse.V1, 13)
    expect(fine.forceSteps).toHaveLength(3)
  })

  it('keeps the closed restitution for Z1 <= Z2, T1 <= T2: (Z2 - Z1 + 2 Z1 T1/T2)/(Z1 + Z2)', () => {
    for (const ratio of [0.1, 0.37, 0.8, 1])
      for (const [n1, n2] of [
        [1, 1],
        [3, 4],
        [2, 9],
      ] as const)
        expect(solveCollision(ratio, n1, n2).restitution).toBeCloseTo(
          (1 - ratio + (2 * ratio * n1) / n2) / (ratio + 1),
          12,
        )
  })

  it('is elastic whenever the travel times are equal', () => {
    for (const ratio of [0.2, 1, 3.3]) expect(solveCollision(ratio, 5, 5).restitution).toBeCloseTo(1, 12)
  })
})
