import { BILINEAR_ROWS, RELEASE_MEETS_PLASTIC } from '../../engine/exact/published/bilinear'
import type { Bench } from '../bench'
import type { Check } from '../check'
import { driveRod } from '../driveRod'
import { ROUND_STEEL } from '../setups'

const MODULUS = 200e9
const BILINEAR = { ...ROUND_STEEL, yield: '400 MPa', hardening: '10 GPa' }
/**
 * Stress behind the plastic front of 60 m/s, and beyond the place where the release has met it: there an elastic
 * wave from (FULL, 60 m/s) meets a plastic one that starts from yield at 30 m/s [Pa]. Only their middle is used.
 */
const [FULL, CUT] = [847.213595e6, 701e6]

const drivePlastic = (bench: Bench, speed: number) => {
  const { stress, strain } = driveRod(bench, {
    velocity: speed,
    rise: 40e-6,
    material: BILINEAR,
    run: { bulkViscosity: true },
  })
  return { stress: -stress, strain: -strain }
}

/** How far the full plastic stress reaches in a rod of 1 m that is pushed at 60 m/s: half way to what follows. */
function findMeeting(bench: Bench, cells: number): number {
  const { record } = bench.march({
    materials: { steel: BILINEAR },
    leftEnd: { kind: 'velocity', pulse: { shape: 'step', peak: '60 m/s' } },
    bars: [{ name: 'rod', material: 'steel', sections: [{ length: '1 m', area: '1 cm^2' }] }],
    run: { duration: '400 us', cell: `${1 / cells} m`, method: 'elements' },
  })
  const level = (FULL + CUT) / 2
  const stress = record.envelope.compression.map((F) => -F / 1e-4)
  const i = stress.findIndex((value, at) => at > 0.1 * cells && value < level)
  return (i - 1 + (stress[i - 1] - level) / (stress[i - 1] - stress[i])) / cells
}

export const PLASTIC_CHECKS: Check[] = [
  {
    id: 'plastic-push',
    title: 'Elastic-plastic rod pushed: stress and strains',
    section: 13,
    source: BILINEAR_ROWS.source,
    values: BILINEAR_ROWS.rows.flatMap(([speed, stress, strain, plastic]) => [
      { what: `stress at ${speed} m/s [Pa]`, published: stress },
      { what: `strain at ${speed} m/s`, published: strain },
      { what: `plastic strain at ${speed} m/s`, published: plastic, scale: strain },
    ]),
    tolerance: 2e-5,
    reason: 'elements spread the front; the state behind it comes to the closed form',
    compute: (bench) =>
      BILINEAR_ROWS.rows.flatMap(([speed]) => {
        const { stress, strain } = drivePlastic(bench, speed)
        return [stress, strain, strain - stress / MODULUS]
      }),
  },
  {
    id: 'plastic-meets-release',
    title: 'Release meets the plastic front',
    section: 13,
    source: RELEASE_MEETS_PLASTIC.source,
    values: [{ what: 'x/L', published: RELEASE_MEETS_PLASTIC.rows[0][0] }],
    tolerance: 5e-3,
    reason:
      'a front in elements spreads as the 2/3 power of the cell (Skalak, J. Appl. Mech. 24 (1957) 59, from memory); ' +
      'extrapolated from 200 and 400 elements',
    compute: (bench) => {
      const [coarse, fine] = [200, 400].map((cells) => findMeeting(bench, cells))
      return [fine + (fine - coarse) / (2 ** (2 / 3) - 1)]
    },
  },
]
