import {
  CONE_STEP,
  CONE_STEP_LATE,
  CONE_TRANSMISSION,
  EQUAL_STEPS,
} from '../../engine/exact/published/taperTables'
import type { Bench, RigSetup } from '../bench'
import type { Check } from '../check'
import { lengthOf, RHO_C, ROUND_STEEL, stepsOf } from '../setups'

type Sections = RigSetup['bars'][number]['sections']

const RADII = [Math.SQRT2, 2, 3]
const AREA = 1e-4
const END = 10

/**
 * Sends a unit step that lasts for ever (a bar under way that is matched to one without end) through a
 * middle part into a bar without end.
 *
 * @param sections the middle part, its first area 1 cm^2, and the bar after it
 * @param cells of the middle part
 * @returns force over the incident one behind the middle part, from the step at which the front leaves it
 */
function sendStep(bench: Bench, sections: Sections, cells: number, steps: number): Float64Array {
  const { record } = bench.march({
    materials: { steel: ROUND_STEEL },
    leftEnd: { kind: 'matched' },
    bars: [
      {
        name: 'before',
        material: 'steel',
        velocity: '1 m/s',
        preload: `${-RHO_C * AREA} N`,
        sections: [{ length: lengthOf(END), area: `${AREA} m^2` }],
      },
      { name: 'after', material: 'steel', sections },
    ],
    joints: [{ kind: 'bonded' }],
    rightEnd: { kind: 'matched' },
    gauges: [{ name: 'behind', bar: 'after', at: lengthOf(cells + END / 2) }],
    run: stepsOf(cells + END / 2 + steps),
  })
  return record.gauges[0].force.map((F) => F / (-RHO_C * AREA)).slice(cells + END / 2)
}

function sendThroughCone(bench: Bench, R: number, cells: number, tau: number): Float64Array {
  const diameter = Math.sqrt((4 * AREA) / Math.PI)
  const sections: Sections = [
    { length: lengthOf(cells), diameter: { from: `${diameter} m`, to: `${R * diameter} m` } },
    { length: lengthOf(END), diameter: `${R * diameter} m` },
  ]
  return sendStep(bench, sections, cells, tau * cells)
}

/**
 * Behind a taper the force changes every second step and stands for the odd one in between, where it is exact to
 * second order; elsewhere by the line through two of them.
 */
function readAt(force: Float64Array, step: number): number {
  const i = 2 * Math.min(Math.floor(force.length / 2) - 2, Math.max(0, Math.floor((step - 1) / 2)))
  return force[i] + ((force[i + 2] - force[i]) * (step - (i + 1))) / 2
}

/** kL of the table that are among those the answers are given for. */
const transmission = CONE_TRANSMISSION.rows.filter(([phase]) => phase === 1 || phase === 20)

export const TAPER_CHECKS: Check[] = [
  {
    id: 'cone-step',
    title: 'Step behind a cone until 2L/c',
    section: 5,
    source: CONE_STEP.source,
    values: CONE_STEP.rows.flatMap(([tau, ...shares]) =>
      shares.map((published, i) => ({
        what: `F_T/F_I at R = ${RADII[i].toFixed(4)}, tau = ${tau}`,
        published,
      })),
    ),
    tolerance: 5e-5,
    reason: 'second order in the cell: under 3e-5 at the front for R = 3 on 200 cells',
    compute: (bench) => {
      const cells = 200
      const behind = RADII.map((R) => sendThroughCone(bench, R, cells, 2 - 1 / cells))
      return CONE_STEP.rows.flatMap(([tau]) => behind.map((force) => readAt(force, tau * cells)))
    },
  },
  {
    id: 'cone-step-late',
    title: 'Step behind a cone after 2L/c',
    section: 5,
    source: CONE_STEP_LATE.source,
    values: CONE_STEP_LATE.rows.map(([R, tau, published]) => ({
      what: `F_T/F_I at R = ${R}, tau = ${tau}`,
      published,
    })),
    tolerance: 5e-5,
    reason: 'six digits are published; second order in the cell',
    compute: (bench) => {
      const cells = 100
      const behind = new Map([2, 3].map((R) => [R, sendThroughCone(bench, R, cells, 10.1)]))
      return CONE_STEP_LATE.rows.map(([R, tau]) => readAt(behind.get(R)!, tau * cells))
    },
  },
  {
    id: 'cone-transmission',
    title: 'Harmonic force and energy through a cone',
    section: 5,
    source: CONE_TRANSMISSION.source,
    values: transmission.flatMap(([phase, ...shares]) =>
      shares.map((published, i) => ({
        what: `${i % 2 === 0 ? 'F_T/F_I' : 'E_T'} at kL = ${phase}, R = ${RADII[Math.floor(i / 2)].toFixed(4)}`,
        published,
      })),
    ),
    tolerance: 2e-7,
    reason: 'transfer matrices are exact for cones; seven decimals are published',
    compute: (bench) => {
      const answers = RADII.map((R) => {
        const [taper] = bench.solve({
          materials: { steel: ROUND_STEEL },
          bars: [
            {
              name: 'bar',
              material: 'steel',
              sections: [
                { length: '50 mm', diameter: '20 mm' },
                { length: '100 mm', diameter: { from: '20 mm', to: `${20 * R} mm` } },
                { length: '50 mm', diameter: `${20 * R} mm` },
              ],
            },
          ],
          run: { duration: '1 us', cell: '5 mm' },
        }).tapers
        return taper
      })
      return transmission.flatMap(([phase]) =>
        answers.flatMap((taper) => {
          const i = taper.frequency.findIndex((f) => Math.abs(2 * Math.PI * f * 20e-6 - phase) < 1e-9)
          return [taper.transmittedForce[i], taper.transmittedEnergy[i]]
        }),
      )
    },
  },
  {
    id: 'equal-steps',
    title: 'Front through N equal steps',
    section: 5,
    source: EQUAL_STEPS.source,
    values: EQUAL_STEPS.rows.map(([ratio, steps, published]) => ({
      what: `F_T/F_I at A2/A1 = ${ratio}, N = ${steps}`,
      published,
    })),
    tolerance: 5e-9,
    reason: 'exact at every step; nine digits are published',
    compute: (bench) =>
      EQUAL_STEPS.rows.map(([ratio, steps]) => {
        // The first section is the bar before the steps, the last one the bar after them.
        const sections: Sections = Array.from({ length: steps + 1 }, (_, i) => ({
          length: lengthOf(i < steps ? 1 : END),
          area: `${AREA * ratio ** (i / steps)} m^2`,
        }))
        return sendStep(bench, sections, steps, 1)[0]
      }),
  },
]
