import { COLLISION_SOURCE, COLLISIONS, type CollisionRow } from '../../engine/exact/published/collisions'
import { LIKE_BARS } from '../../engine/exact/published/workedExamples'
import type { Bench } from '../bench'
import type { Check } from '../check'
import { lengthOf, RHO_C, ROUND_STEEL, stepsOf } from '../setups'

/** Cells of the march for each of the row's. */
const FINER = 4
const STRIKER = 10
const ROUNDING = 1e-12
const EXACT = 'travel times are whole numbers of steps; the rows are exact fractions'

/** Marches one row until just after the faces have parted; times in the row's unit, forces over Z1 v, speeds over v. */
function collide(bench: Bench, { impedanceRatio, cells1, cells2, unit, part }: CollisionRow) {
  const { record } = bench.march({
    materials: { steel: ROUND_STEEL },
    bars: [
      {
        name: 'striker',
        material: 'steel',
        velocity: `${STRIKER} m/s`,
        sections: [{ length: lengthOf(cells1 * FINER), area: `${10 * impedanceRatio} cm^2` }],
      },
      {
        name: 'target',
        material: 'steel',
        sections: [{ length: lengthOf(cells2 * FINER), area: '10 cm^2' }],
      },
    ],
    run: stepsOf((part / unit + 1) * FINER),
  })
  const { forceLeft, velocityLeft, velocityRight } = record.node(1)!
  const force = Array.from(forceLeft, (F) => -F / (RHO_C * 1e-3 * impedanceRatio * STRIKER))
  const steps = force.filter((F, k) => F > ROUNDING && (k === 0 || Math.abs(F - force[k - 1]) > ROUNDING))
  let gap = 0
  const parts = velocityLeft.findIndex((v, k) => (gap += velocityRight[k] - v) > 1e-9 * STRIKER)
  const [V1, V2] = record.bars.map(({ momentum, mass }) => momentum / mass / STRIKER)
  return {
    steps,
    forceEnds: ((force.findLastIndex((F) => F > ROUNDING) + 1) * unit) / FINER,
    parts: (parts * unit) / FINER,
    V1,
    V2,
  }
}

const name = ({ impedanceRatio, cells1, cells2, unit }: CollisionRow) =>
  `Z1/Z2 = ${impedanceRatio}, T = ${cells1 * unit} and ${cells2 * unit}`

export const COLLISION_CHECKS: Check[] = [
  {
    id: 'collision-forces',
    title: 'Colliding bars: every step of the contact force',
    section: 2,
    source: COLLISION_SOURCE,
    values: COLLISIONS.flatMap((row) => [
      { what: `number of steps, ${name(row)}`, published: row.forceSteps.length },
      ...row.forceSteps.map((published, i) => ({
        what: `F/(Z1 v), step ${i + 1}, ${name(row)}`,
        published,
      })),
    ]),
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) =>
      COLLISIONS.flatMap((row) => {
        const { steps } = collide(bench, row)
        return [steps.length, ...row.forceSteps.map((_, i) => steps[i] ?? NaN)]
      }),
  },
  {
    id: 'collision-times',
    title: 'Colliding bars: force ends, faces part',
    section: 2,
    source: COLLISION_SOURCE,
    values: COLLISIONS.flatMap((row) => [
      { what: `force ends, ${name(row)}`, published: row.forceEnds },
      { what: `faces part, ${name(row)}`, published: row.part },
    ]),
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) =>
      COLLISIONS.flatMap((row) => {
        const { forceEnds, parts } = collide(bench, row)
        return [forceEnds, parts]
      }),
  },
  {
    id: 'collision-speeds',
    title: 'Colliding bars: speeds and restitution',
    section: 2,
    source: COLLISION_SOURCE,
    values: COLLISIONS.flatMap((row) => [
      { what: `V1/v, ${name(row)}`, published: row.V1, scale: 1 },
      { what: `V2/v, ${name(row)}`, published: row.V2, scale: 1 },
      { what: `e, ${name(row)}`, published: row.restitution, scale: 1 },
    ]),
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) =>
      COLLISIONS.flatMap((row) => {
        const { V1, V2 } = collide(bench, row)
        return [V1, V2, V2 - V1]
      }),
  },
  {
    id: 'collision-example',
    title: 'Like bars, 0.3 m on 0.9 m, solved whole',
    section: 2,
    source: LIKE_BARS.source,
    values: ['stress [Pa]', 'contact [s]', 'faces part [s]', 'V1 [m/s]', 'V2 [m/s]', 'restitution'].map(
      (what, i) => ({
        what,
        published: LIKE_BARS.rows[0][i],
        scale: what.startsWith('V') ? STRIKER : undefined,
      }),
    ),
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) => {
      const { joints, bars, gauges } = bench.solve({
        materials: { steel: ROUND_STEEL },
        bars: [
          {
            name: 'striker',
            material: 'steel',
            velocity: `${STRIKER} m/s`,
            sections: [{ length: '0.3 m', area: '3 cm^2' }],
          },
          { name: 'target', material: 'steel', sections: [{ length: '0.9 m', area: '3 cm^2' }] },
        ],
        gauges: [
          { name: 'left face', bar: 'striker', at: '0.3 m' },
          { name: 'right face', bar: 'target', at: '0 m' },
        ],
        run: { duration: '380 us', cell: '5 mm' },
      })
      const [left, right] = gauges
      let gap = 0
      const parts = left.t.find((_, k) => (gap += right.velocity[k] - left.velocity[k]) > 1e-9 * STRIKER)
      const [V1, V2] = bars.map(({ velocity }) => velocity)
      return [-joints[0].peakForce / 3e-4, joints[0].contactTime, parts ?? NaN, V1, V2, (V2 - V1) / STRIKER]
    },
  },
]
