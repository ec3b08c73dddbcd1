import { LATERAL_INERTIA } from '../../engine/exact/published/dispersion'
import type { Bench } from '../bench'
import type { Check } from '../check'
import { readFrequency } from '../readFrequency'
import { ROUND_STEEL, SPEED } from '../setups'

const RADIUS = 0.01
/** Half waves along the bar, and cells of each. */
const HALVES = 4
const CELLS = 50
const PERIODS = 4

/** Phase velocity over c0 of a wave of length Lambda, from a mode of a free bar of two such lengths. */
function measureSpeed(bench: Bench, ratio: number): number {
  const half = RADIUS / ratio / 2
  const length = HALVES * half
  const { line, record } = bench.march({
    materials: { steel: { ...ROUND_STEEL, poisson: 0.29 } },
    bars: [
      {
        name: 'bar',
        material: 'steel',
        velocity: `1 m/s * cos(${HALVES} * pi * s)`,
        sections: [{ length: `${length} m`, diameter: `${2 * RADIUS} m` }],
      },
    ],
    gauges: [{ name: 'end', bar: 'bar', at: '0 m' }],
    run: {
      duration: `${(2 * PERIODS * half) / SPEED} s`,
      cell: `${half / CELLS} m`,
      method: 'elements',
      lateralInertia: true,
    },
  })
  const w = readFrequency(record.gauges[0].velocity, Math.round(CELLS / 2)) / line.dt
  return (w * half) / Math.PI / SPEED
}

const love = LATERAL_INERTIA.rows.filter(([ratio]) => [0.05, 0.1, 0.2, 0.3].includes(ratio))
const exact = LATERAL_INERTIA.rows.filter(([ratio]) => ratio <= 0.1)

export const DISPERSION_CHECKS: Check[] = [
  {
    id: 'lateral-love',
    title: "Lateral inertia: phase velocity, Love's law",
    section: 6,
    source: LATERAL_INERTIA.source,
    values: love.map(([ratio, , published]) => ({ what: `c/c0 at a/Lambda = ${ratio}`, published })),
    tolerance: 2e-6,
    reason: 'six decimals are published; one element per step disperses little of its own',
    compute: (bench) => love.map(([ratio]) => measureSpeed(bench, ratio)),
  },
  {
    id: 'lateral-exact',
    title: 'Lateral inertia: phase velocity, exact theory',
    section: 6,
    source: LATERAL_INERTIA.source,
    values: exact.map(([ratio, published]) => ({ what: `c/c0 at a/Lambda = ${ratio}`, published })),
    tolerance: 1e-3,
    reason: "Love's law is within 1e-3 of the exact theory for a/Lambda under about 0.11",
    compute: (bench) => exact.map(([ratio]) => measureSpeed(bench, ratio)),
  },
]
