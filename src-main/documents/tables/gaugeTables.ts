import type { GaugePulse, GaugeTable } from '../../contract/result'
import { findExtremes } from './findExtremes'
import { makeTable, type Table } from './table'

/**
 * Lists the gauges with the largest stresses that each has read.
 *
 * @param gauges - in the rig's order, SI
 * @returns place and extremes of each
 */
export function makeGaugesTable(gauges: GaugeTable[]): Table {
  const rows = gauges.map((gauge) => ({
    gauge,
    stress: findExtremes(gauge.stress),
    velocity: findExtremes(gauge.velocity),
  }))
  return makeTable<(typeof rows)[number]>(
    [
      { heading: 'gauge', measures: 'text', value: ({ gauge }) => gauge.name },
      { heading: 'at', measures: 'length', value: ({ gauge }) => gauge.x },
      {
        heading: 'highest stress',
        measures: 'stress',
        value: ({ gauge, stress }) => gauge.stress[stress.highest],
      },
      { heading: 'time', measures: 'time', value: ({ gauge, stress }) => gauge.t[stress.highest] },
      {
        heading: 'lowest stress',
        measures: 'stress',
        value: ({ gauge, stress }) => gauge.stress[stress.lowest],
      },
      { heading: 'time', measures: 'time', value: ({ gauge, stress }) => gauge.t[stress.lowest] },
      {
        heading: 'highest velocity',
        measures: 'velocity',
        value: (row) => row.gauge.velocity[row.velocity.highest],
      },
      {
        heading: 'lowest velocity',
        measures: 'velocity',
        value: (row) => row.gauge.velocity[row.velocity.lowest],
      },
    ],
    rows,
  )
}

interface PulseRow {
  gauge: GaugeTable
  pulse: GaugePulse
}

/**
 * Lists the pulses that pass the gauges, in order of time at each.
 *
 * @param gauges - in the rig's order, SI
 * @param perGauge - how many pulses of each gauge are listed
 * @returns a row for each pulse; a pulse is clear when no opposite wave passes within it
 */
export function makePulsesTable(gauges: GaugeTable[], perGauge = Infinity): Table {
  const rows = gauges.flatMap((gauge): PulseRow[] =>
    gauge.pulses.slice(0, perGauge).map((pulse) => ({ gauge, pulse })),
  )
  return makeTable<PulseRow>(
    [
      { heading: 'gauge', measures: 'text', value: ({ gauge }) => gauge.name },
      { heading: 'at', measures: 'length', value: ({ gauge }) => gauge.x },
      { heading: 'pulse going', measures: 'text', value: ({ pulse }) => pulse.direction },
      { heading: 'from', measures: 'time', value: ({ pulse }) => pulse.from },
      { heading: 'to', measures: 'time', value: ({ pulse }) => pulse.to },
      { heading: 'peak force', measures: 'force', value: ({ pulse }) => pulse.peakForce },
      { heading: 'overlap', measures: 'text', value: ({ pulse }) => (pulse.clear ? 'clear' : 'OVERLAPPED') },
    ],
    rows,
  )
}
