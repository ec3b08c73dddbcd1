import type { GaugeTable } from '../contract/result'
import { writeCsv } from './writeCsv'

type TraceKey = 'stress' | 'strain' | 'force' | 'velocity' | 'rightgoingForce' | 'leftgoingForce' | 'bridge'

const TRACES: readonly [TraceKey, string][] = [
  ['stress', 'stress [Pa]'],
  ['strain', 'strain [1]'],
  ['force', 'force [N]'],
  ['velocity', 'velocity [m/s]'],
  ['rightgoingForce', 'rightgoing force [N]'],
  ['leftgoingForce', 'leftgoing force [N]'],
  ['bridge', 'bridge [V]'],
]

/**
 * Writes all gauge traces as one CSV: the time, then the columns of each gauge under its name.
 *
 * @param gauges - traces that share their times, SI; a gauge without a bridge has no bridge column
 * @returns the text of `gauges.csv` in parts; traces of different length throw: it would be a fault of the program
 */
export function writeGaugesCsv(gauges: GaugeTable[]): Generator<string> {
  const times = gauges.length === 0 ? [] : gauges[0].t
  const headings = ['time [s]']
  const columns: ArrayLike<number>[] = [times]
  for (const gauge of gauges) {
    for (const [key, heading] of TRACES) {
      if (key === 'bridge' && gauge.bridge.length === 0) continue
      if (gauge[key].length !== times.length) throw new Error(`gauge "${gauge.name}": ${key} misses times`)
      headings.push(`${gauge.name} ${heading}`)
      columns.push(gauge[key])
    }
  }
  return writeCsv(headings, times.length, (i) => columns.map((column) => column[i]))
}
