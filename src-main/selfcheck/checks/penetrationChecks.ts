import {
  RISING_PULSE_EFFICIENCY,
  SQUARE_PULSE_BEST,
  SQUARE_PULSE_EFFICIENCY,
} from '../../engine/exact/published/penetration'
import type { Bench, RigSetup } from '../bench'
import type { Check } from '../check'
import { lengthOf, RHO_C, ROUND_STEEL, stepsOf } from '../setups'

const F = 1000
/** Impedance of the rod of 10 cm^2 [kg/s]. */
const Z = RHO_C * 1e-3
/** Steps of the square pulse. */
const PULSE = 200
/** Unloading over loading stiffness that stands for a ground that gives nothing back. */
const RIGID = 1e6
const SECOND_ORDER = 'the ground is integrated to second order in the step'

/** Drives a rod of some cells into ground by a pulse at its other end; energies as shares of that of the pulse. */
function drive(
  bench: Bench,
  pulse: Extract<RigSetup['leftEnd'], { kind: 'force' }>['pulse'],
  ground: { loading: number; ratio: number },
  cells: number,
) {
  const { record } = bench.march({
    materials: { steel: ROUND_STEEL },
    leftEnd: { kind: 'force', pulse },
    bars: [{ name: 'rod', material: 'steel', sections: [{ length: lengthOf(cells), area: '10 cm^2' }] }],
    rightEnd: {
      kind: 'penetration',
      loading: `${ground.loading} N/m`,
      unloading: `${ground.loading * ground.ratio} N/m`,
    },
    run: stepsOf(2 * cells - 1),
  })
  const pressing = record.node(1)!.forceLeft.map((force) => -force / F)
  const top = pressing.indexOf(Math.max(...pressing))
  return {
    efficiency: -record.ends.right.work / record.ends.left.work,
    /** A step's force stands for its middle: that at the end of the pulse, from its last two steps. */
    peak: 1.5 * pressing[top] - 0.5 * pressing[top - 1],
  }
}

/** A square pulse with B = k T/Z. */
function driveSquare(bench: Bench, B: number, ratio = RIGID, cells = 3 * PULSE) {
  const loading = (B * Z) / (PULSE * 1e-6)
  const pulse = { shape: 'rectangle' as const, peak: `${F} N`, duration: `${PULSE - 0.5} us` }
  return drive(bench, pulse, { loading, ratio }, cells)
}

/** A pulse that grows as exp(t/t0), t0 = 50 us, and ends at its peak after 12 t0; x = k t0/Z. */
function driveRising(bench: Bench, x: number) {
  const formula = `t < 599.5 us ? ${F} N * exp((t - 600 us) / (50 us)) : 0 N`
  return drive(bench, { shape: 'formula', formula }, { loading: (x * Z) / 50e-6, ratio: RIGID }, 1000)
}

/** B of the largest efficiency, by golden section. */
function findBest(bench: Bench): number {
  const golden = (Math.sqrt(5) - 1) / 2
  const evaluate = (B: number) => driveSquare(bench, B).efficiency
  let [low, high] = [0.5, 3]
  let [a, b] = [high - golden * (high - low), low + golden * (high - low)]
  let [ea, eb] = [evaluate(a), evaluate(b)]
  while (high - low > 1e-3) {
    if (ea > eb) {
      ;[high, b, eb] = [b, a, ea]
      a = high - golden * (high - low)
      ea = evaluate(a)
    } else {
      ;[low, a, ea] = [a, b, eb]
      b = low + golden * (high - low)
      eb = evaluate(b)
    }
  }
  return (low + high) / 2
}

const elastic = [2, 4]

export const PENETRATION_CHECKS: Check[] = [
  {
    id: 'penetration-square',
    title: 'Percussive efficiency: square pulse',
    section: 9,
    source: SQUARE_PULSE_EFFICIENCY.source,
    values: SQUARE_PULSE_EFFICIENCY.rows.map(([B, published]) => ({
      what: `efficiency at B = ${B}`,
      published,
    })),
    tolerance: 2e-5,
    reason: SECOND_ORDER,
    compute: (bench) => SQUARE_PULSE_EFFICIENCY.rows.map(([B]) => driveSquare(bench, B).efficiency),
  },
  {
    id: 'penetration-best',
    title: 'Percussive efficiency: its maximum',
    section: 9,
    source: SQUARE_PULSE_BEST.source,
    values: ['B of the maximum', 'efficiency', 'F_max/F_I'].map((what, i) => ({
      what,
      published: SQUARE_PULSE_BEST.rows[0][i],
    })),
    tolerance: 5e-4,
    reason: `${SECOND_ORDER}; the maximum is closed in on to 1e-3`,
    compute: (bench) => {
      const { efficiency, peak } = driveSquare(bench, SQUARE_PULSE_BEST.rows[0][0])
      return [findBest(bench), efficiency, peak]
    },
  },
  {
    id: 'penetration-elastic',
    title: 'Percussive efficiency: ground that gives back',
    section: 9,
    source: `${SQUARE_PULSE_EFFICIENCY.source}; times 1 - 1/gamma for an unloading gamma times as stiff`,
    values: elastic.map((gamma) => ({
      what: `efficiency at B = 1, gamma = ${gamma}`,
      published: SQUARE_PULSE_EFFICIENCY.rows[3][1] * (1 - 1 / gamma),
    })),
    tolerance: 5e-5,
    reason: SECOND_ORDER,
    compute: (bench) => elastic.map((gamma) => driveSquare(bench, 1, gamma, 6 * PULSE).efficiency),
  },
  {
    id: 'penetration-rising',
    title: 'Percussive efficiency: rising exponential pulse',
    section: 9,
    source: RISING_PULSE_EFFICIENCY.source,
    values: RISING_PULSE_EFFICIENCY.rows.map(([x, published]) => ({
      what: `efficiency at x = ${x}`,
      published,
    })),
    tolerance: 1e-4,
    reason: SECOND_ORDER,
    compute: (bench) => RISING_PULSE_EFFICIENCY.rows.map(([x]) => driveRising(bench, x).efficiency),
  },
]
