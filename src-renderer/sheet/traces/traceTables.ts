import type { PageGauge, PageResult } from '../../../src-main/contract/bridge'
import { findFrom } from '../../plot/thinTrace'
import type { ChartTable, Column } from '../charts/chartTable'
import { readNearest } from './readNearest'
import type { JointReading } from './useJointTraces'

/** Stretch of time that is looked at [s]. */
interface Shown {
  fromT: number
  toT: number
}

const GAUGE_COLUMNS = [
  ['stress', 'stress', 'stress'],
  ['strain', 'strain', 'strain'],
  ['force', 'force', 'force'],
  ['velocity', 'velocity', 'velocity'],
  ['right-going force', 'force', 'rightgoingForce'],
  ['left-going force', 'force', 'leftgoingForce'],
  ['bridge', 'voltage', 'bridge'],
] as const

/**
 * All that a gauge has read in the time that is looked at.
 *
 * @param gauge - of the run, SI
 * @param shown - the stretch of time
 */
export function makeGaugeTable(gauge: PageGauge, shown: Shown): ChartTable {
  const given = GAUGE_COLUMNS.filter(([, , key]) => gauge[key].length > 0)
  return makeTimeTable(
    gauge.name,
    gauge.t,
    given.map(([heading, dimension, key]) => ({ heading, dimension, values: gauge[key] })),
    shown,
  )
}

/**
 * The force in a joint in the time that is looked at, a row for each pixel of its trace.
 *
 * @param joint - as it was read
 * @param shown - the stretch of time
 */
export function makeJointTable({ name, trace }: JointReading, shown: Shown): ChartTable {
  return makeTimeTable(name, trace.t, [{ heading: 'force', dimension: 'force', values: trace.force }], shown)
}

/**
 * The energy of the run in the time that is looked at.
 *
 * @param energy - of the run, SI
 * @param shown - the stretch of time
 */
export function makeEnergyTable(energy: PageResult['energy'], shown: Shown): ChartTable {
  const parts = ['kinetic', 'strain', 'dissipated', 'work'] as const
  return makeTimeTable(
    'Energy',
    energy.t,
    parts.map((part) => ({
      heading: part === 'work' ? 'work of the surroundings' : part,
      dimension: 'energy' as const,
      values: energy[part],
    })),
    shown,
  )
}

/**
 * What all traces read at one moment.
 *
 * @param result - of the run
 * @param joints - as they were read
 * @param moment - [s]
 */
export function makeMomentTable(
  result: PageResult,
  joints: readonly JointReading[],
  moment: number,
): ChartTable {
  const gauges = result.gauges
  const names = [...gauges.map(({ name }) => name), ...joints.map(({ name }) => name)]
  const columns = GAUGE_COLUMNS.filter(([, , key]) => gauges.some((gauge) => gauge[key].length > 0))
  return {
    name: 'Values at the cursor',
    rows: names.length,
    columns: [
      { heading: 'trace', dimension: null, at: (row) => names[row] },
      { heading: 'time', dimension: 'time', at: () => moment },
      ...columns.map(([heading, dimension, key]): Column => ({
        heading,
        dimension,
        at: (row) => {
          const gauge = gauges.at(row)
          if (row < gauges.length && gauge) return readNearest(gauge.t, gauge[key], moment)
          const { trace } = joints[row - gauges.length]
          return key === 'force' ? readNearest(trace.t, trace.force, moment) : null
        },
      })),
    ],
  }
}

function makeTimeTable(
  name: string,
  t: ArrayLike<number>,
  traces: { heading: string; dimension: Column['dimension']; values: ArrayLike<number> }[],
  { fromT, toT }: Shown,
): ChartTable {
  const first = findFrom(t, fromT)
  let end = findFrom(t, toT)
  // The end belongs to what is seen.
  if (end < t.length && t[end] === toT) end++
  return {
    name,
    rows: Math.max(0, end - first),
    columns: [
      { heading: 'time', dimension: 'time', at: (row) => t[first + row] },
      ...traces.map(({ heading, dimension, values }): Column => ({
        heading,
        dimension,
        at: (row) => values[first + row] ?? null,
      })),
    ],
  }
}
