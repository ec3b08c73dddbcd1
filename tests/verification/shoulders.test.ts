import { describe, expect, it } from 'vitest'
import { SHOULDER_FACTORS } from '../../src-main/engine/exact/published/shoulderFactors'
import { expectNear } from './expectNear'
import { solveText } from './solveText'

/** Six printed decimals. */
const PRINTED = 0.51e-6

/** A tension wave of 100 MPa in the small section runs on a round shoulder and on into the large one. */
function solveShoulder(larger: number, radius: number, mirrored: boolean) {
  const sections = [
    { length: '100 mm', diameter: '10 mm', fillet: `${radius * 10} mm` },
    { length: '100 mm', diameter: `${larger * 10} mm` },
  ]
  const reversed = [
    { length: '100 mm', diameter: `${larger * 10} mm`, fillet: `${radius * 10} mm` },
    { length: '100 mm', diameter: '10 mm' },
  ]
  const F = '100 MPa * pi * (5 mm)^2'
  const load = (sign: string) => ({ kind: 'force', pulse: { shape: 'step', peak: `${sign}${F}` } })
  return solveText({
    format: 'barwright-rig/1',
    title: 'Shoulder',
    materials: {
      steel: {
        density: '8000 kg/m^3',
        modulus: '200 GPa',
        poisson: 0.3,
        allowable: { tension: '700 MPa', compression: '900 MPa' },
      },
    },
    bars: [{ name: 'shaft', material: 'steel', sections: mirrored ? reversed : sections }],
    leftEnd: mirrored ? { kind: 'matched' } : load('-'),
    rightEnd: mirrored ? load('') : { kind: 'matched' },
    margins: { factorOfSafety: 1.25 },
    run: { duration: '38 us', cell: '1 mm' },
  }).solution
}

describe(`solved from a rig file, ${SHOULDER_FACTORS.label}, round: ${SHOULDER_FACTORS.source}`, () => {
  it.each(SHOULDER_FACTORS.rows)('D/d = %d, r/d = %d', (larger, radius, kt) => {
    for (const mirrored of [false, true]) {
      const solution = solveShoulder(larger, radius, mirrored)
      const small = solution.sections[mirrored ? 1 : 0].tension
      // The step doubles the force up: 2 Z2/(Z1 + Z2) of 100 MPa in the small section.
      const nominal = (100e6 * 2 * larger ** 2) / (1 + larger ** 2)
      // D/d = 1.2 with r/d = 0.05, and 2 with 0.25, are h/r = 2, where the two fits differ by 0.3 %; rounding of
      // the drawing's numbers may choose the other one: 2.024391 and 1.541663 (recomputed from it).
      const other = radius === 0.05 && larger === 1.2 ? 2.024391 : radius === 0.25 ? 1.541663 : kt
      expect(Math.min(Math.abs(small.kt! - kt), Math.abs(small.kt! - other))).toBeLessThan(PRINTED)
      expectNear(small.peak / nominal, 1, 1e-12)
      expectNear(small.local / (small.kt! * nominal), 1, 1e-12)
      expectNear(small.margin!, 700e6 / (1.25 * small.kt! * nominal) - 1, 1e-11)
      const large = solution.sections[mirrored ? 0 : 1].tension
      expect(large.kt).toBeNull()
      expectNear(large.peak / (nominal / larger ** 2), 1, 1e-12)
      expect(solution.governing).toMatchObject({ section: mirrored ? 1 : 0, sense: 'tension' })
    }
  })
})
