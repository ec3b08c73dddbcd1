import { FIXED_MASS_ROOTS, FREE_MASS_ROOTS, STEPPED_ROD_ROOTS } from '../../engine/exact/published/rodLoads'
import { HORN } from '../../engine/exact/published/examples'
import { CONE_ROOTS } from '../../engine/exact/published/taperTables'
import type { Bench, Marched, RigSetup } from '../bench'
import type { Check } from '../check'
import { readFrequency } from '../readFrequency'
import { lengthOf, ROUND_STEEL, stepsOf } from '../setups'

const CELLS = 100
/** Mass of the rod of 10 cm^2 [kg], and its stiffness E A/L [N/m]. */
const MASS = 8000 * 1e-3 * CELLS * 5e-3
const STIFFNESS = (200e9 * 1e-3) / (CELLS * 5e-3)
const PLACE = 0.29
const PERIODS = 8
const LUMPED = 'midpoint rule at the mass or the spring, second order in the cell: (w dt)^2/12 of its share'
const TAPERED = 'tapers are cut into cells with their middle impedance, second order in the cell'

type Parts = Pick<RigSetup, 'leftEnd' | 'rightEnd'> & { sections: RigSetup['bars'][number]['sections'] }

/** Starts a rod in one mode, its velocity a formula in s, for eight periods. */
function swing(bench: Bench, shape: string, b: number, parts: Parts): Marched & { b: number } {
  const { sections, ...ends } = parts
  const quarter = Math.round((Math.PI * CELLS) / (2 * b))
  const marched = bench.march({
    materials: { steel: ROUND_STEEL },
    ...ends,
    bars: [{ name: 'rod', material: 'steel', velocity: `1 m/s * (${shape})`, sections }],
    gauges: [
      { name: 'watched', bar: 'rod', at: lengthOf(PLACE * CELLS) },
      { name: 'left end', bar: 'rod', at: '0 m' },
    ],
    run: stepsOf(PERIODS * 4 * quarter),
  })
  // Unlike force and velocity, one of the two waves has no nodes.
  return { ...marched, b: readFrequency(marched.record.gauges[0].leftgoing, quarter) * CELLS }
}

const rod: Parts['sections'] = [{ length: lengthOf(CELLS), area: '10 cm^2' }]
const massEnd = (r: number, v: number): RigSetup['rightEnd'] => ({
  kind: 'mass',
  mass: `${MASS / r} kg`,
  velocity: `${v} m/s`,
  joint: 'bonded',
})
const springEnd = (r: number): RigSetup['rightEnd'] => ({
  kind: 'support',
  stiffness: `${STIFFNESS * r} N/m`,
})

const named = (rows: number[][], of: string, count: number) =>
  rows.flatMap(([r, ...roots]) =>
    roots.slice(0, count).map((published, i) => ({ what: `b${i + 1} at ${of} = ${r}`, published })),
  )
const pick = (rows: number[][], wanted: number[]) => rows.filter(([r]) => wanted.includes(r))
const fixedMass = pick(FIXED_MASS_ROOTS.rows, [0.1, 1, 10])
const freeSpring = pick(FIXED_MASS_ROOTS.rows, [0.2, 2, 20])
const freeMass = pick(FREE_MASS_ROOTS.rows, [0.25, 1, 4])
const fixedSpring = pick(FREE_MASS_ROOTS.rows, [0.5, 2, 10])

function solveRoots(
  bench: Bench,
  rows: number[][],
  shape: (b: number) => string,
  ends: (r: number, b: number) => Pick<RigSetup, 'leftEnd' | 'rightEnd'>,
): number[] {
  return rows.flatMap(([r, ...roots]) =>
    roots.map((b) => swing(bench, shape(b), b, { sections: rod, ...ends(r, b) }).b),
  )
}

/** Shape of a mode of the stepped rod: sin from the fixed end, and the cosine from the free end that meets it. */
function steppedShape(k: number): string {
  const match = Math.sin(k / 2) / Math.cos(k / 2)
  return `s < 0.5 ? sin(${k} * s) : ${match} * cos(${k} * (1 - s))`
}

/** Shape of a mode of a free cone, s from its small end: sin(k s + phi)/(x1 + s) with tan phi = k x1. */
function coneShape(R: number, k: number): string {
  const x1 = 1 / (R - 1)
  return `sin(${k} * s + ${Math.atan(k * x1)}) / (${x1} + s)`
}

export const VIBRATION_CHECKS: Check[] = [
  {
    id: 'vibration-mass',
    title: 'Natural frequencies: rod with a mass',
    section: 4,
    source: FIXED_MASS_ROOTS.source,
    values: [...named(fixedMass, 'm/M, other end held,', 3), ...named(freeMass, 'm/M, other end free,', 3)],
    tolerance: 1e-4,
    reason: LUMPED,
    compute: (bench) => [
      ...solveRoots(
        bench,
        fixedMass,
        (b) => `sin(${b} * s)`,
        (r, b) => ({ leftEnd: { kind: 'fixed' }, rightEnd: massEnd(r, Math.sin(b)) }),
      ),
      ...solveRoots(
        bench,
        freeMass,
        (b) => `cos(${b} * s)`,
        (r, b) => ({ rightEnd: massEnd(r, Math.cos(b)) }),
      ),
    ],
  },
  {
    id: 'vibration-spring',
    title: 'Natural frequencies: rod on a spring',
    section: 4,
    source: FREE_MASS_ROOTS.source,
    values: [
      ...named(freeSpring, 'kL/(EA), other end free,', 3),
      ...named(fixedSpring, 'kL/(EA), other end held,', 3),
    ],
    tolerance: 1e-4,
    reason: LUMPED,
    compute: (bench) => [
      ...solveRoots(
        bench,
        freeSpring,
        (b) => `cos(${b} * s)`,
        (r) => ({ rightEnd: springEnd(r) }),
      ),
      ...solveRoots(
        bench,
        fixedSpring,
        (b) => `sin(${b} * s)`,
        (r) => ({ leftEnd: { kind: 'fixed' }, rightEnd: springEnd(r) }),
      ),
    ],
  },
  {
    id: 'vibration-stepped',
    title: 'Natural frequencies: stepped rod',
    section: 4,
    source: STEPPED_ROD_ROOTS.source,
    values: named(STEPPED_ROD_ROOTS.rows, 'A2/A1', 3),
    tolerance: 5e-9,
    reason: 'the line is exact; nine digits are published',
    compute: (bench) =>
      STEPPED_ROD_ROOTS.rows.flatMap(([ratio, ...roots]) =>
        roots.map(
          (k) =>
            swing(bench, steppedShape(k), k, {
              leftEnd: { kind: 'fixed' },
              sections: [
                { length: lengthOf(CELLS / 2), area: '10 cm^2' },
                { length: lengthOf(CELLS / 2), area: `${10 * ratio} cm^2` },
              ],
            }).b,
        ),
      ),
  },
  {
    id: 'vibration-cone',
    title: 'Natural frequencies: free cone',
    section: 5,
    source: CONE_ROOTS.source,
    values: CONE_ROOTS.rows.flatMap(([R, ...roots]) =>
      roots.slice(0, 2).map((published, i) => ({ what: `kL ${i + 1} at R = ${R}`, published })),
    ),
    tolerance: 4e-4,
    reason: TAPERED,
    compute: (bench) =>
      CONE_ROOTS.rows.flatMap(([R, ...roots]) =>
        roots.slice(0, 2).map(
          (k) =>
            swing(bench, coneShape(R, k), k, {
              sections: [{ length: lengthOf(CELLS), diameter: { from: '10 mm', to: `${10 * R} mm` } }],
            }).b,
        ),
      ),
  },
  {
    id: 'vibration-horn',
    title: 'Exponential horn: first mode, strain, merit',
    section: 5,
    source: HORN.source,
    values: ['kL', 'place of the largest strain over L', 'v_tip/(c largest strain)'].map((what, i) => ({
      what,
      published: HORN.rows[0][i + 1],
    })),
    tolerance: 4e-4,
    reason: TAPERED,
    compute: (bench) => {
      const [[ratio, kL]] = HORN.rows
      const g = Math.log(ratio)
      const { b, line, record } = swing(
        bench,
        `exp(-${g} * s) * (cos(pi * s) + ${g / Math.PI} * sin(pi * s))`,
        kL,
        {
          sections: [
            {
              length: lengthOf(CELLS),
              diameter: { from: '10 mm', to: `${10 * ratio} mm`, profile: 'exponential' },
            },
          ],
        },
      )
      // In a pure mode every place swings between its two peaks.
      const strain = record.envelope.tension.map((F, i) => F / (200e9 * line.spans[0].area[i]))
      const top = strain.indexOf(Math.max(...strain))
      const [low, high, next] = strain.slice(top - 1, top + 2)
      const shift = (low - next) / (2 * (low - 2 * high + next))
      const largest = high - ((low - next) * shift) / 4
      const tip = Math.max(...record.gauges[1].velocity.map(Math.abs))
      return [b, (top + shift) / CELLS, tip / (5000 * largest)]
    },
  },
]
