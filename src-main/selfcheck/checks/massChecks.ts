import {
  MASS_ON_FIXED_BAR,
  MASS_ON_FIXED_BAR_HISTORY,
  MASS_ON_FREE_BAR,
} from '../../engine/exact/published/massOnBar'
import { MASS_ON_METRE } from '../../engine/exact/published/workedExamples'
import { evaluateMassOnLongBar } from '../../engine/exact/evaluateMassOnLongBar'
import type { Bench, RigSetup } from '../bench'
import type { Check } from '../check'
import { ROUND_STEEL } from '../setups'

const CELLS = 400
const STRIKE = 5
/** The bar: 10 cm^2, 1 m, 8 kg, Z = 4e4 kg/s; its travel time is 200 us. */
const MASS = 8
const Z = 4e4
const TRAVEL = 200e-6
const SECOND_ORDER =
  'the mass moves by the midpoint rule, second order in the cell: under 2e-4 on 400 cells for the heaviest mass'

/** Strikes the bar with a mass m/alpha until ct/L = tau; stress over rho c v0, speed over v0, steps of L/c / 400. */
function strike(bench: Bench, alpha: number, rightEnd: RigSetup['rightEnd'], tau: number) {
  const mass = MASS / alpha
  const { line, record } = bench.march({
    materials: { steel: ROUND_STEEL },
    leftEnd: { kind: 'mass', mass: `${mass} kg`, velocity: `${STRIKE} m/s`, joint: 'contact' },
    bars: [{ name: 'bar', material: 'steel', sections: [{ length: '1 m', area: '10 cm^2' }] }],
    rightEnd,
    run: { duration: `${tau * TRAVEL} s`, timeStep: `${TRAVEL / CELLS} s` },
  })
  const struck = record.node(0)!
  const stress = struck.forceLeft.map((F) => -F / (Z * STRIKE))
  const last = stress.findIndex((value) => value === 0) - 1
  const impulse = struck.forceLeft.slice(0, last + 1).reduce((sum, F) => sum - F * line.dt, 0)
  return {
    record,
    stress,
    speed: struck.velocityLeft.map((v) => v / STRIKE),
    farStress: record.node(line.spans.length)!.forceLeft.map((F) => -F / (Z * STRIKE)),
    /** Where the force would pass zero, from the last two pressing steps. */
    contactEnds: (last + 0.5 + stress[last] / (stress[last - 1] - stress[last])) / CELLS,
    /** Of the mass once it has left for the first time. */
    leaves: 1 - impulse / (mass * STRIKE),
  }
}

/** A step's force stands for its middle: the value just after a front at step k, from the two steps that follow. */
const afterFront = (values: Float64Array, k: number) => 1.5 * values[k] - 0.5 * values[k + 1]
const between = (values: Float64Array, k: number) => (values[k - 1] + values[k]) / 2

/** The largest of the fronts that arrive every 2L/c from ct/L = tau on. */
function findLargestFront(values: Float64Array, tau: number): number {
  let best = 0
  for (let k = tau * CELLS; k + 1 < values.length; k += 2 * CELLS)
    best = Math.max(best, afterFront(values, k))
  return best
}

export const MASS_CHECKS: Check[] = [
  {
    id: 'mass-fixed-contact',
    title: 'Mass on a held bar: end of contact, speed then',
    section: 3,
    source: MASS_ON_FIXED_BAR.source,
    values: MASS_ON_FIXED_BAR.rows.flatMap(([alpha, contactEnds, leaves]) => [
      { what: `contact ends, ct/L, m/M = ${alpha}`, published: contactEnds },
      { what: `v/v0 at parting, m/M = ${alpha}`, published: leaves },
    ]),
    tolerance: 2e-4,
    reason: SECOND_ORDER,
    compute: (bench) =>
      MASS_ON_FIXED_BAR.rows.flatMap(([alpha, ends]) => {
        const { contactEnds, leaves } = strike(bench, alpha, { kind: 'fixed' }, ends + 0.05)
        return [contactEnds, leaves]
      }),
  },
  {
    id: 'mass-fixed-peaks',
    title: 'Mass on a held bar: largest stress at both ends',
    section: 3,
    source: MASS_ON_FIXED_BAR.source,
    values: MASS_ON_FIXED_BAR.rows.flatMap(([alpha, , , struck, , far]) => [
      { what: `struck end over rho c v0, m/M = ${alpha}`, published: struck },
      { what: `fixed end over rho c v0, m/M = ${alpha}`, published: far },
    ]),
    tolerance: 2e-4,
    reason: SECOND_ORDER,
    compute: (bench) =>
      MASS_ON_FIXED_BAR.rows.flatMap(([alpha, ends, , , , , farAt]) => {
        const { stress, farStress } = strike(bench, alpha, { kind: 'fixed' }, Math.max(ends, farAt) + 0.05)
        return [findLargestFront(stress, 0), findLargestFront(farStress, 1)]
      }),
  },
  {
    id: 'mass-fixed-history',
    title: 'Mass on a held bar: stress and speed in between',
    section: 3,
    source: MASS_ON_FIXED_BAR_HISTORY.source,
    values: MASS_ON_FIXED_BAR_HISTORY.rows.flatMap(([alpha, tau, stress, speed]) => [
      { what: `stress over rho c v0, m/M = ${alpha}, ct/L = ${tau}`, published: stress, scale: 1 },
      { what: `v/v0, m/M = ${alpha}, ct/L = ${tau}`, published: speed, scale: 1 },
    ]),
    tolerance: 2e-4,
    reason: SECOND_ORDER,
    compute: (bench) =>
      MASS_ON_FIXED_BAR_HISTORY.rows.flatMap(([alpha, tau]) => {
        const { stress, speed } = strike(bench, alpha, { kind: 'fixed' }, tau + 0.01)
        const read = tau % 2 === 0 ? afterFront : between
        return [read(stress, tau * CELLS), read(speed, tau * CELLS)]
      }),
  },
  {
    id: 'mass-free',
    title: 'Mass on a free bar: speeds, restitution, energy',
    section: 3,
    source: MASS_ON_FREE_BAR.source,
    values: MASS_ON_FREE_BAR.rows.flatMap(([alpha, , leaves, barSpeed, restitution, share]) => [
      { what: `v/v0 after, m/M = ${alpha}`, published: leaves, scale: 1 },
      { what: `mean bar speed over v0, m/M = ${alpha}`, published: barSpeed },
      { what: `restitution, m/M = ${alpha}`, published: restitution },
      { what: `energy share in the bar, m/M = ${alpha}`, published: share },
    ]),
    tolerance: 2e-5,
    reason: 'the mass moves by the midpoint rule, second order in the cell',
    compute: (bench) =>
      MASS_ON_FREE_BAR.rows.flatMap(([alpha]) => {
        const { record, leaves } = strike(bench, alpha, { kind: 'free' }, 2.2)
        const [bar] = record.bars
        const barSpeed = bar.momentum / bar.mass / STRIKE
        const share = (bar.kinetic + bar.strain) / (((MASS / alpha) * STRIKE ** 2) / 2)
        return [leaves, barSpeed, barSpeed - leaves, share]
      }),
  },
  {
    id: 'mass-long',
    title: 'Mass on an endless bar: decay and impulse',
    section: 3,
    source:
      'Love, Treatise, 4th ed., art. 281 (from memory); sigma = rho c v0 exp(-Z t/M), impulse M v0; exact',
    values: [
      ...[0.5, 1, 2, 4].flatMap((tau) => [
        { what: `stress over rho c v0 at Z t/M = ${tau}`, published: evaluateMassOnLongBar(1, 1, tau) },
        { what: `v/v0 at Z t/M = ${tau}`, published: evaluateMassOnLongBar(1, 1, tau) },
      ]),
      { what: 'impulse over M v0', published: 1 },
    ],
    tolerance: 1e-5,
    reason: 'the mass moves by the midpoint rule, second order in the cell',
    compute: (bench) => {
      const { record, stress, speed } = strike(bench, 1, { kind: 'matched' }, 20)
      return [
        ...[0.5, 1, 2, 4].flatMap((tau) => [between(stress, tau * CELLS), between(speed, tau * CELLS)]),
        record.ends.left.impulse / (MASS * STRIKE),
      ]
    },
  },
  {
    id: 'mass-example',
    title: 'Mass of the weight of a 1 m bar, solved whole',
    section: 3,
    source: MASS_ON_METRE.source,
    values: ['fixed-end peak [Pa]', 'at [s]', 'mass leaves [m/s]'].map((what, i) => ({
      what,
      published: MASS_ON_METRE.rows[0][i === 2 ? 3 : i],
    })),
    tolerance: 2e-5,
    reason: 'a peak behind a front is first order low in the cell and is extrapolated from two',
    compute: (bench) => {
      const [coarse, fine] = ['2 mm', '1 mm'].map((cell) =>
        bench.solve({
          materials: { steel: ROUND_STEEL },
          leftEnd: { kind: 'mass', mass: '3.2 kg', velocity: '5 m/s', joint: 'contact' },
          bars: [{ name: 'bar', material: 'steel', sections: [{ length: '1 m', area: '4 cm^2' }] }],
          rightEnd: { kind: 'fixed' },
          run: { duration: '640 us', cell },
        }),
      )
      const peak = (2 * fine.ends.right.peakForce - coarse.ends.right.peakForce) / 4e-4
      return [-peak, fine.sections[0].compression.time, 5 - fine.ends.left.impulse / 3.2]
    },
  },
]
