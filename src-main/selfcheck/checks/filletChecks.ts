import { SHOULDER_FACTORS } from '../../engine/exact/published/shoulderFactors'
import type { Check } from '../check'
import { ROUND_STEEL } from '../setups'

/** Without h/r = 2, where the two fits meet with a jump of 0.3 % and rounding of the drawing chooses one. */
const rows = SHOULDER_FACTORS.rows.filter(([D, r]) => Math.abs((D - 1) / 2 / r - 2) > 1e-9)

export const FILLET_CHECKS: Check[] = [
  {
    id: 'fillet-factors',
    title: 'Shoulder fillets of round bars in tension',
    section: 10,
    source: SHOULDER_FACTORS.source,
    values: rows.map(([D, r, published]) => ({ what: `Kt at D/d = ${D}, r/d = ${r}`, published })),
    tolerance: 1e-6,
    reason: 'seven digits are published',
    compute: (bench) =>
      rows.map(([D, r]) => {
        const { sections } = bench.solve({
          materials: { steel: ROUND_STEEL },
          leftEnd: { kind: 'matched' },
          bars: [
            {
              name: 'shaft',
              material: 'steel',
              sections: [
                { length: '60 mm', diameter: '20 mm', fillet: `${20 * r} mm` },
                { length: '60 mm', diameter: `${20 * D} mm` },
              ],
            },
          ],
          rightEnd: { kind: 'force', pulse: { shape: 'step', peak: '30 kN' } },
          run: { duration: '30 us', cell: '1 mm' },
        })
        return sections[0].tension.kt ?? NaN
      }),
  },
]
