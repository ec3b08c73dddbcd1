import type { GaugeTable } from '../contract/result'
import { writeCsv } from './writeCsv'

type TraceKey =
  'stress' | 'trueStress' | 'strain' | 'force' | 'velocity' | 'rightgoingForce' | 'leftgoingForce' | 'bridge'

const TRACES: readonly [TraceKey, string][] = [
  ['stress', 'stress [Pa]'],
  ['trueStress', 'true stress [Pa]'],
  ['strain', 'strain [1]'],
  ['force', 'force [N]'],
  ['velocity', 'velocity [m/s]'],
  ['rightgoingForce', 'rightgoing force [N]'],
  ['leftgoingForce', 'leftgoing force [N]'],
  ['bridge', 'bridge [V]'],
]

/** Traces that a gauge may be without. */
const OPTIONAL: readonly TraceKey[] = ['trueStress', 'bridge']

/**
 * Writes all gauge traces as one CSV: the time, then the columns of each gauge under its name.
 *
 * @param gauges - traces that share their times, SI; bridge and true stress only where a gauge has them
 * @returns the text of `gauges.csv` in parts; traces of different length throw: it would be a fault of the program
 */
export function writeGaugesCsv(gauges: GaugeTable[]): Generator<string> {
  const times = gauges.length === 0 ? [] : gauges[0].t
  const headings = ['time [s]']
  const columns: ArrayLike<number>[] = [times]
  for (const gauge of gauges) {
    for (const [key, heading] of TRACES) {
      if (OPTIONAL.includes(key) && gauge[key].length === 0) continue
      if (gauge[key].length !== times.length) throw new Error(`gauge "${gauge.name}": ${key} misses times`)
      headings.push(`${gauge.name} ${heading}`)
      columns.push(gauge[key])
    }
  }
  return writeCsv(headings, times.length, (i) => columns.map((column) => column[i]))
}
