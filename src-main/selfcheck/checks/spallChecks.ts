import {
  EXPONENTIAL_SPALL,
  SQUARE_SPALL,
  TRIANGLE_MOMENTUM,
  TRIANGLE_SPALLS,
} from '../../engine/exact/published/spall'
import type { Bench } from '../bench'
import type { Check } from '../check'

/** Area of the bar [m^2]. */
const AREA = 1e-4
const ONE_CELL = 'a bar comes apart at a node, up to one cell beyond the place of the closed form'

/**
 * Sends a compression pulse, its stress a formula in t, through a bar of 7850 kg/m^3 and c = 5000 m/s whose
 * strength is 300 MPa; the spalls in the order in which they leave, and the momentum of all of them.
 */
function sendPulse(bench: Bench, stress: string, length: number, cell: number, duration: number) {
  const { spalls, fragments, ends } = bench.solve({
    materials: { steel: { density: '7850 kg/m^3', modulus: '196.25 GPa', spall: '300 MPa' } },
    leftEnd: { kind: 'force', pulse: { shape: 'formula', formula: `(${stress}) * 1 cm^2` } },
    bars: [{ name: 'bar', material: 'steel', sections: [{ length: `${length} m`, area: '1 cm^2' }] }],
    run: { duration: `${duration} s`, cell: `${cell} m`, spall: true },
  })
  const flown = fragments.slice(1).reverse()
  return {
    count: spalls.length,
    thickness: (i: number) => (flown[i] ? flown[i].to - flown[i].from : NaN),
    velocity: (i: number) => flown[i]?.velocity ?? NaN,
    /** Momentum in the spalls, and put in, per area [Pa s]. */
    flown: flown.reduce((sum, { mass, velocity }) => sum + mass * velocity, 0) / AREA,
    given: ends.left.impulse / AREA,
  }
}

export const SPALL_CHECKS: Check[] = [
  {
    id: 'spall-triangle',
    title: 'Spalls of a triangular pulse',
    section: 8,
    source: TRIANGLE_SPALLS.source,
    values: [
      { what: 'number of spalls', published: TRIANGLE_SPALLS.rows.length },
      ...TRIANGLE_SPALLS.rows.flatMap(([j, thickness, velocity]) => [
        { what: `thickness of spall ${j} [m]`, published: thickness },
        { what: `velocity of spall ${j} [m/s]`, published: velocity },
      ]),
      ...TRIANGLE_MOMENTUM.columns.map((what, i) => ({ what, published: TRIANGLE_MOMENTUM.rows[0][i] })),
    ],
    tolerance: 7e-3,
    reason: `${ONE_CELL}: 0.1 mm of 15 mm`,
    compute: (bench) => {
      // 1199 cells: no node lies where the tension reaches the strength exactly.
      const stress = 't < 20 us ? 1000 MPa * (1 - t / (20 us)) : 0 MPa'
      const found = sendPulse(bench, stress, 0.12, 0.12 / 1199, 44e-6)
      return [
        found.count,
        ...TRIANGLE_SPALLS.rows.flatMap((_, i) => [found.thickness(i), found.velocity(i)]),
        found.given,
        found.flown,
      ]
    },
  },
  {
    id: 'spall-square',
    title: 'Spall of a square pulse',
    section: 8,
    source: SQUARE_SPALL.source,
    values: [
      { what: 'number of spalls', published: 1 },
      { what: 'thickness [m]', published: SQUARE_SPALL.rows[0][0] },
      { what: 'velocity [m/s]', published: SQUARE_SPALL.rows[0][1] },
    ],
    tolerance: 1e-6,
    reason: 'exact: the pulse is a whole number of steps; eight digits are published',
    compute: (bench) => {
      const found = sendPulse(bench, 't < 19.95 us ? 500 MPa : 0 MPa', 0.12, 5e-4, 46e-6)
      return [found.count, found.thickness(0), found.velocity(0)]
    },
  },
  {
    id: 'spall-exponential',
    title: 'First spall of an exponential pulse',
    section: 8,
    source: EXPONENTIAL_SPALL.source,
    values: ['thickness [m]', 'velocity [m/s]'].map((what, i) => ({
      what,
      published: EXPONENTIAL_SPALL.rows[0][i],
    })),
    tolerance: 4e-3,
    reason: `${ONE_CELL}: 0.02 mm of 5.4 mm`,
    compute: (bench) => {
      const found = sendPulse(bench, '1000 MPa * exp(-t / (6 us))', 0.04, 2e-5, 11e-6)
      return [found.thickness(0), found.velocity(0)]
    },
  },
]
