import { RELEASE } from '../../engine/exact/published/examples'
import { RELEASED_WAVE } from '../../engine/exact/published/workedExamples'
import type { Bench, RigSetup } from '../bench'
import type { Check } from '../check'
import { lengthOf, RHO_C, ROUND_STEEL, stepsOf } from '../setups'

const CELLS = 40
const F0 = 80e3
/** Area of the rod [m^2]. */
const AREA = 1e-3
const EXACT = 'exact: all times are whole numbers of steps'

const rod: RigSetup['bars'][number] = {
  name: 'rod',
  material: 'steel',
  preload: `${F0} N`,
  sections: [{ length: lengthOf(CELLS), area: '10 cm^2' }],
}

/** Lets a rod under tension go, its left end held or let go as well; forces over the first one. */
function letGo(bench: Bench, leftEnd: RigSetup['leftEnd'], tau: number) {
  const { line, record } = bench.march({
    materials: { steel: ROUND_STEEL },
    leftEnd,
    bars: [rod],
    gauges: [{ name: 'middle', bar: 'rod', at: lengthOf(CELLS / 2) }],
    run: { duration: `${tau * CELLS} us`, cell: lengthOf(1) },
  })
  return {
    /** A step in L/c of the rod as it should be. */
    step: line.dt / (CELLS * 1e-6),
    root: record.node(0)!.forceRight.map((F) => F / F0),
    middle: record.gauges[0].force.map((F) => F / F0),
    tip: record.node(1)!.velocityLeft,
  }
}

/** Lets it go into a bar of another impedance; the wave that passes the middle of that bar. */
function letGoInto(bench: Bench, ratio: number) {
  const { record } = bench.march({
    materials: { steel: ROUND_STEEL },
    leftEnd: { kind: 'fixed' },
    bars: [
      rod,
      {
        name: 'bar',
        material: 'steel',
        sections: [{ length: lengthOf(CELLS), area: `${10 * ratio} cm^2` }],
      },
    ],
    joints: [{ kind: 'bonded' }],
    rightEnd: { kind: 'matched' },
    gauges: [{ name: 'middle', bar: 'bar', at: lengthOf(CELLS / 2) }],
    run: stepsOf(4 * CELLS),
  })
  return record.gauges[0]
}

/** The middle of each interval of the published table, ct/L. */
const middles = RELEASE.rows.map(([from, to]) => (from + to) / 2)
/** When the stress in the middle of a rod that is let go at both ends changes its sign, ct/L. */
const turns = [0.5, 1.5, 2.5]

export const RELEASE_CHECKS: Check[] = [
  {
    id: 'release-held',
    title: 'Tension rod let go at one end',
    section: 11,
    source: RELEASE.source,
    values: [
      ...RELEASE.rows.map(([from, to, published]) => ({
        what: `stress at the held end over the first, ct/L from ${from} to ${to}`,
        published,
      })),
      { what: 'speed of the free end over sigma/(rho c)', published: 1 },
    ],
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) => {
      const { root, tip } = letGo(bench, { kind: 'fixed' }, 5)
      return [...middles.map((tau) => root[tau * CELLS]), -tip[0] / (F0 / AREA / RHO_C)]
    },
  },
  {
    id: 'release-both',
    title: 'Tension rod let go at both ends',
    section: 11,
    source: RELEASE.source,
    values: [
      ...[1, -1, 1, -1].map((published, i) => ({
        what: `stress in the middle over the first, ct/L from ${i === 0 ? 0 : turns[i - 1]}`,
        published,
      })),
      ...turns.map((published, i) => ({ what: `turn ${i + 1} of that stress, ct/L`, published })),
    ],
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) => {
      const { middle, step } = letGo(bench, { kind: 'free' }, 3.1)
      const changes = Array.from(middle.keys()).filter((k) => k > 0 && middle[k] * middle[k - 1] < 0)
      return [
        ...[0, 1, 2, 3].map((tau) => middle[tau * CELLS]),
        ...turns.map((_, i) => (changes[i] ?? NaN) * step),
      ]
    },
  },
  {
    id: 'release-wave',
    title: 'Preloaded length let go into a bar',
    section: 11,
    source: RELEASED_WAVE.source,
    values: [
      ...RELEASED_WAVE.rows.map(([ratio, published]) => ({ what: `F/F0 at Z2/Z1 = ${ratio}`, published })),
      { what: 'duration of the wave in an equal bar, c t/Lp', published: 2 },
    ],
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) => [
      ...RELEASED_WAVE.rows.map(([ratio]) => letGoInto(bench, ratio).force[CELLS] / F0),
      letGoInto(bench, 1).force.filter((F) => Math.abs(F) > 1e-9 * F0).length / CELLS,
    ],
  },
]
