import { RAMP_FACTORS } from '../../engine/exact/published/rodLoads'
import { SUDDEN_LOAD } from '../../engine/exact/published/workedExamples'
import type { Bench, RigSetup } from '../bench'
import type { Check } from '../check'
import { lengthOf, RHO_C, ROUND_STEEL, stepsOf } from '../setups'

const CELLS = 40
const P = 12e3
/** P over rho c A, A being 10 cm^2 [m/s]. */
const SWAY = P / (RHO_C * 1e-3)

/** A rod of 40 cells, fixed at its left end, pulled at its right end, until ct/L = tau; forces over P. */
function pull(bench: Bench, pulse: Extract<RigSetup['rightEnd'], { kind: 'force' }>['pulse'], tau: number) {
  const { record } = bench.march({
    materials: { steel: ROUND_STEEL },
    leftEnd: { kind: 'fixed' },
    bars: [{ name: 'rod', material: 'steel', sections: [{ length: lengthOf(CELLS), area: '10 cm^2' }] }],
    rightEnd: { kind: 'force', pulse },
    gauges: [{ name: 'middle', bar: 'rod', at: lengthOf(CELLS / 2) }],
    run: stepsOf(tau * CELLS),
  })
  return {
    root: record.node(0)!.forceRight.map((F) => F / P),
    middle: record.gauges[0].force.map((F) => F / P),
    tip: record.node(1)!.velocityLeft,
  }
}

export const LOAD_CHECKS: Check[] = [
  {
    id: 'load-sudden',
    title: 'Sudden end load: forces and end displacement',
    section: 4,
    source: SUDDEN_LOAD.source,
    values: SUDDEN_LOAD.rows.flatMap(([tau, root, middle, tip]) => [
      { what: `fixed-end force over P at ct/L = ${tau}`, published: root, scale: 1 },
      { what: `mid-length force over P at ct/L = ${tau}`, published: middle, scale: 1 },
      { what: `end displacement over P L/(E A) at ct/L = ${tau}`, published: tip, scale: 1 },
    ]),
    tolerance: 1e-9,
    reason: 'exact: all times are whole numbers of steps',
    compute: (bench) => {
      const { root, middle, tip } = pull(bench, { shape: 'step', peak: `${P} N` }, 4.1)
      return SUDDEN_LOAD.rows.flatMap(([tau]) => {
        const k = tau * CELLS
        const moved = tip.slice(0, k).reduce((sum, v) => sum + v, 0) / CELLS / SWAY
        return [root[k], middle[k], moved]
      })
    },
  },
  {
    id: 'load-ramp',
    title: 'Ramp load: largest force at the fixed end',
    section: 4,
    source: RAMP_FACTORS.source,
    values: RAMP_FACTORS.rows.map(([rise, factor]) => ({
      what: `F/P at tr c/L = ${rise}`,
      published: factor,
    })),
    tolerance: 1e-9,
    reason: 'exact: the ramp is a whole number of steps',
    compute: (bench) =>
      RAMP_FACTORS.rows.map(([rise]) => {
        const pulse = { shape: 'ramp' as const, peak: `${P} N`, rise: `${rise * CELLS} us` }
        return Math.max(...pull(bench, pulse, rise + 6).root)
      }),
  },
]
