import { evaluateTrueStress } from '../../engine/answers/evaluateTrueStress'
import {
  HENCKY_FAN,
  HENCKY_MEETING,
  HENCKY_SHOCK,
  LINEAR_NOMINAL,
} from '../../engine/exact/published/finiteStrain'
import type { Bench } from '../bench'
import type { Check } from '../check'
import { driveRod } from '../driveRod'
import { ROUND_STEEL, SPEED } from '../setups'

const MODULUS = 200e9
const INCOMPRESSIBLE = { poisson: 0.5 }

/** Stretch, nominal and true stress over E of an incompressible Hencky rod whose end moves away or in. */
function driveHencky(bench: Bench, speed: number, rise: number) {
  const { stress, strain } = driveRod(bench, {
    velocity: speed * SPEED,
    rise,
    material: INCOMPRESSIBLE,
    run: { finiteStrain: true, bulkViscosity: rise === 0 },
  })
  const stretch = 1 + strain
  return { stretch, nominal: stress / MODULUS, true: evaluateTrueStress(stress, stretch, 0.5) / MODULUS }
}

/** Stretch behind the shocks of two like bars that meet, each at a speed. */
function meet(bench: Bench, speed: number): number {
  const sections = [{ length: '0.3 m', area: '1 cm^2' }]
  const { line, record } = bench.march({
    materials: { steel: { ...ROUND_STEEL, ...INCOMPRESSIBLE } },
    bars: [
      { name: 'left', material: 'steel', velocity: `${speed * SPEED} m/s`, sections },
      { name: 'right', material: 'steel', velocity: `${-speed * SPEED} m/s`, sections },
    ],
    gauges: [
      { name: 'near', bar: 'right', at: '30 mm' },
      { name: 'far', bar: 'right', at: '60 mm' },
    ],
    run: { duration: '50 us', cell: '1.5 mm', method: 'elements', finiteStrain: true, bulkViscosity: true },
  })
  const [near, far] = record.gauges
  const closing = near.velocity.reduce((sum, v, k) => sum + far.velocity[k] - v, 0) * line.dt
  return 1 + closing / (far.x - near.x)
}

const SHOCK =
  'elements spread a shock over some cells by bulk viscosity; the jump over it is that of the closed form'

export const FINITE_STRAIN_CHECKS: Check[] = [
  {
    id: 'finite-linear',
    title: 'Linear in nominal stress: strain, true stress',
    section: 14,
    source: LINEAR_NOMINAL.source,
    values: LINEAR_NOMINAL.rows.flatMap(([nu, strain, ratio]) => [
      { what: `nominal strain, nu = ${nu}`, published: strain },
      { what: `true stress over E at ${strain}, nu = ${nu}`, published: ratio * strain },
    ]),
    tolerance: 5e-9,
    reason: 'exact: one element per step; eight digits are published',
    compute: (bench) =>
      LINEAR_NOMINAL.rows.flatMap(([nu, published]) => {
        const material = { poisson: nu }
        const { stress, strain } = driveRod(bench, { velocity: -published * SPEED, rise: 0, material })
        return [strain, evaluateTrueStress(stress, 1 + strain, nu) / MODULUS]
      }),
  },
  {
    id: 'finite-fan',
    title: 'Hencky rod pulled: stretch and stresses',
    section: 14,
    source: HENCKY_FAN.source,
    values: HENCKY_FAN.rows.flatMap(([stretch, speed]) => [
      { what: `lambda at v/c0 = ${speed}`, published: stretch },
      { what: `nominal stress over E at lambda = ${stretch}`, published: Math.log(stretch) / stretch },
      { what: `true stress over E at lambda = ${stretch}`, published: Math.log(stretch) },
    ]),
    tolerance: 1e-4,
    reason: 'elements are second order in the cell behind a smooth fan',
    compute: (bench) =>
      HENCKY_FAN.rows.flatMap(([, speed]) => {
        const found = driveHencky(bench, -speed, 20e-6)
        return [found.stretch, found.nominal, found.true]
      }),
  },
  {
    id: 'finite-shock',
    title: 'Hencky rod pressed: stretch and stresses',
    section: 14,
    source: HENCKY_SHOCK.source,
    values: HENCKY_SHOCK.rows.flatMap(([stretch, speed]) => [
      { what: `lambda at v/c0 = ${speed}`, published: stretch },
      { what: `nominal stress over E at lambda = ${stretch}`, published: Math.log(stretch) / stretch },
      { what: `true stress over E at lambda = ${stretch}`, published: Math.log(stretch) },
    ]),
    tolerance: 1e-4,
    reason: SHOCK,
    compute: (bench) =>
      HENCKY_SHOCK.rows.flatMap(([, speed]) => {
        const found = driveHencky(bench, speed, 0)
        return [found.stretch, found.nominal, found.true]
      }),
  },
  {
    id: 'finite-meeting',
    title: 'Hencky bars that meet: stretch',
    section: 14,
    source: HENCKY_MEETING.source,
    values: HENCKY_MEETING.rows.map(([speed, published]) => ({
      what: `lambda at v/c0 = ${speed}`,
      published,
    })),
    tolerance: 1e-4,
    reason: SHOCK,
    compute: (bench) => HENCKY_MEETING.rows.map(([speed]) => meet(bench, speed)),
  },
]
