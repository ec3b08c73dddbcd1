import type { PageGauge, PageResult } from '../../../src-main/contract/bridge'
import { formatQuantity } from '../../format/formatQuantity'
import { describeWindow, writeDuration } from './describeWindow'
import { evaluateEnergyShares, type EnergyShares } from './energyShares'
import { makeContactSpec, type JointTrace } from './makeContactSpec'
import { makeEnergySpec } from './makeEnergySpec'
import { makeGaugeSpec } from './makeGaugeSpec'
import { findPulseWindow } from './pulseWindow'
import { readNearest } from './readNearest'
import type { TraceFrame } from './traceFrame'
import type { TraceItem } from './traceItem'
import type { TraceQuantity } from './traceQuantity'
import { makeEnergyTable, makeGaugeTable, makeJointTable } from './traceTables'
import type { JointReading } from './useJointTraces'

/** Share of the largest value under which another one is rounding. */
const ROUNDING = 1e-12

/** What the traces of one run share. */
export interface Shared {
  frame: TraceFrame
  /** That gauges show. */
  quantity: TraceQuantity
  /** End of their axis, SI. */
  limit: number
  /** A run laid under; null for none. */
  frozen: PageResult | null
}

/**
 * Describes the trace of a gauge.
 *
 * @param gauge - of the run
 * @param result - of the run
 * @param shared - by all traces
 */
export function makeGaugeItem(
  gauge: PageGauge,
  result: PageResult,
  { frame, quantity, limit, frozen: run }: Shared,
): TraceItem {
  const bar = result.line.bars.find(({ from, to }) => gauge.x >= from - 1e-9 && gauge.x <= to + 1e-9)
  const local = formatQuantity(gauge.x - (bar?.from ?? 0), 'length', frame.units, { trim: true })
  const frozen = run?.gauges.find((it) => it.name === gauge.name) ?? null
  const pulse = findPulseWindow(gauge.pulses)
  const note = describeWindow(pulse, result.run.duration)
  const arrival = pulse === null ? '' : `from ${writeDuration(pulse.from)}`
  return {
    key: `gauge ${gauge.name}`,
    name: gauge.name,
    where: `${bar?.name ?? ''} ${local.text}`,
    x: gauge.x,
    dimension: quantity,
    note,
    arrival,
    at: (moment) => {
      const value = readNearest(gauge.t, gauge[quantity], moment)
      // What rounding leaves beside the values of this run reads 0.
      return value !== null && Math.abs(value) < ROUNDING * limit ? 0 : value
    },
    summary: `${quantity} over time at ${local.text} ${local.unit} on ${bar?.name ?? 'the line'}; first pulse ${arrival}, ${note.text}`,
    table: () => makeGaugeTable(gauge, frame),
    claim: { wanted: 126, least: 92 },
    chart: (width) => makeGaugeSpec(gauge, quantity, limit, frame, width, frozen),
  }
}

/**
 * Describes the trace of a joint.
 *
 * @param reading - of its force
 * @param x - where it is [m]; null where that is not known
 * @param current - true where the reading is of the run that is shown
 * @param alone - true where no other joint is shown, so that its kind names it
 * @param under - the same joint of a run laid under; null for none
 * @param frame - shared by all traces
 */
export function makeJointItem(
  reading: JointReading,
  x: number | null,
  current: boolean,
  alone: boolean,
  under: JointTrace | null,
  frame: TraceFrame,
): TraceItem {
  const { name, kind, trace, contacts, whole } = reading
  const lasts = whole ? writeDuration(whole.to - whole.from) : ''
  const isFirst = whole !== null && frame.fromT <= 0 && whole.from < contacts[0].to
  const rest = contacts.length > 0 ? 'none whole in view' : 'none in view'
  const said = whole
    ? `${isFirst ? 'first ' : 'lasts '}${lasts}`
    : reading.peak === 0
      ? 'carries nothing'
      : rest
  const text = current ? said : 'being read'
  const kindName = kind[0].toUpperCase() + kind.slice(1)
  return {
    key: `joint ${name}`,
    name: alone ? kindName : name,
    where: alone ? name : kind,
    x,
    dimension: 'force',
    note: { text, short: text, alarm: false },
    arrival: '',
    at: (moment) => readNearest(trace.t, trace.force, moment),
    summary: `force over time in the ${kind} ${name}; ${text}`,
    table: () => makeJointTable(reading, frame),
    claim: { wanted: 88, least: 64 },
    chart: (width) => makeContactSpec(trace, whole, reading.peak, frame, width, under),
  }
}

/**
 * Describes the trace of the energy.
 *
 * @param result - of the run
 * @param shares - of its energy
 * @param shared - by all traces
 */
export function makeEnergyItem(
  result: PageResult,
  shares: EnergyShares,
  { frame, frozen }: Shared,
): TraceItem {
  const { energy } = result
  const under = frozen && evaluateEnergyShares(frozen.energy)
  const total = formatQuantity(shares.total, 'energy', frame.units, { digits: 3 })
  return {
    key: 'energy',
    name: 'Energy',
    where: '',
    x: null,
    dimension: 'energy',
    note: { text: `of ${total.text} ${total.unit}`, short: `of ${total.text}`, alarm: false },
    arrival: '',
    at: (moment) => {
      const kinetic = readNearest(energy.t, energy.kinetic, moment)
      const strain = readNearest(energy.t, energy.strain, moment)
      return kinetic === null || strain === null ? null : kinetic + strain
    },
    summary:
      `shares of all energy over time: ${shares.bands.map(({ name }) => name).join(', ')}; ` +
      `their sum is straight to ${energy.closure.toExponential(1)}`,
    table: () => makeEnergyTable(energy, frame),
    claim: { wanted: 60, least: 56 },
    chart: (width) => makeEnergySpec(shares, frame, width, under),
  }
}
