import type { PageResult } from '../../../src-main/contract/bridge'
import type { SensePeak } from '../../../src-main/contract/result'
import { findFrom } from '../../plot/thinTrace'
import type { ChartTable, Column } from '../charts/chartTable'

/**
 * The peaks and margins of each section, one row for each sense.
 *
 * @param sections - of the result, SI
 */
export function makeSectionsTable(sections: PageResult['sections']): ChartTable {
  const rows = sections.flatMap(({ bar, section, tension, compression }) => [
    { name: `${bar} ${section + 1}`, sense: 'tension', peak: tension },
    { name: `${bar} ${section + 1}`, sense: 'compression', peak: compression },
  ])
  const of = (
    heading: string,
    dimension: Column['dimension'],
    read: (peak: SensePeak) => number | string | null,
  ): Column => ({ heading, dimension, at: (row) => read(rows[row].peak) })
  return {
    name: 'Peaks and margins of each section',
    rows: rows.length,
    columns: [
      { heading: 'section', dimension: null, at: (row) => rows[row].name },
      { heading: 'sense', dimension: null, at: (row) => rows[row].sense },
      of('margin', 'ratio', ({ margin }) => margin),
      of('peak', 'stress', ({ peak }) => peak),
      of('at x', 'length', ({ at }) => at),
      of('at t', 'time', ({ time }) => time),
      of('Kt', 'ratio', ({ kt }) => kt),
      of('local', 'stress', ({ local }) => local),
      of('local at x', 'length', ({ localAt }) => localAt),
      of('local at t', 'time', ({ localTime }) => localTime),
      of('allowable', 'stress', ({ allowable }) => allowable),
    ],
  }
}

/**
 * The largest stresses along the line where it is looked at.
 *
 * @param envelope - of the result, SI
 * @param fromX - [m]
 * @param toX - [m]
 */
export function makeEnvelopeTable(envelope: PageResult['envelope'], fromX: number, toX: number): ChartTable {
  const first = findFrom(envelope.x, fromX - 1e-12)
  const end = findFrom(envelope.x, toX + 1e-12)
  const of = (heading: string, dimension: Column['dimension'], values: ArrayLike<number>): Column => ({
    heading,
    dimension,
    at: (row) => values[first + row],
  })
  return {
    name: 'Largest stresses along the line',
    rows: end - first,
    columns: [
      of('x', 'length', envelope.x),
      of('tension', 'stress', envelope.tension),
      of('tension at t', 'time', envelope.tensionTime),
      of('compression', 'stress', envelope.compression),
      of('compression at t', 'time', envelope.compressionTime),
    ],
  }
}

/** Both faces of a place: their largest stresses [Pa] and when they are reached [s]. */
export interface PeakHere {
  tension: number
  tensionTime: number
  compression: number
  compressionTime: number
}

/**
 * Reads the envelope at the sample nearest to a place; at a step, the face with the larger stress.
 *
 * @param envelope - of the result, SI
 * @param x - [m]
 * @returns null without an envelope
 */
export function readPeak(envelope: PageResult['envelope'], x: number): PeakHere | null {
  const count = envelope.x.length
  if (count === 0) return null
  const after = Math.min(count - 1, findFrom(envelope.x, x))
  const before = Math.max(0, after - 1)
  const place = x - envelope.x[before] < envelope.x[after] - x ? envelope.x[before] : envelope.x[after]
  let [high, low] = [-1, -1]
  for (let i = findFrom(envelope.x, place); i < count && envelope.x[i] === place; i++) {
    if (high < 0 || envelope.tension[i] > envelope.tension[high]) high = i
    if (low < 0 || envelope.compression[i] < envelope.compression[low]) low = i
  }
  return {
    tension: envelope.tension[high],
    tensionTime: envelope.tensionTime[high],
    compression: envelope.compression[low],
    compressionTime: envelope.compressionTime[low],
  }
}
