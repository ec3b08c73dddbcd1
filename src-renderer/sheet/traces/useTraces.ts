import { computed, type ComputedRef } from 'vue'
import type { PageGauge, PageResult } from '../../../src-main/contract/bridge'
import { formatQuantity } from '../../format/formatQuantity'
import { roundUpLimit } from '../../plot/listTicks'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'
import { useInks } from '../charts/useInks'
import { findGoverningPeak } from '../margin/governingPeak'
import { useFieldPicture } from '../field/useFieldPicture'
import { useRulers } from '../field/useRulers'
import { describeWindow, writeDuration } from './describeWindow'
import { evaluateEnergyShares } from './energyShares'
import { makeContactSpec } from './makeContactSpec'
import { makeEnergySpec } from './makeEnergySpec'
import { makeGaugeSpec } from './makeGaugeSpec'
import { findPulseWindow } from './pulseWindow'
import { readNearest } from './readNearest'
import type { TraceFrame } from './traceFrame'
import type { TraceItem } from './traceItem'
import { findLargest, TRACE_QUANTITY } from './traceQuantity'
import { makeEnergyTable, makeGaugeTable, makeJointTable } from './traceTables'
import { useJointTraces, type JointReading } from './useJointTraces'

/** Share of the largest value under which another one is rounding. */
const ROUNDING = 1e-12

/** Between traces [px]. */
export const GAP = 8

/** Hands out the traces of the run: gauges, joints that can open, and the energy. */
export function useTraces(): {
  items: ComputedRef<TraceItem[]>
  joints: ComputedRef<JointReading[]>
} {
  const [run, view, layout, inks] = [useRun(), useView(), useLayout(), useInks()]
  const { t: ruler } = useRulers()
  const { limit: fieldLimit } = useFieldPicture()
  const { readings, earlier } = useJointTraces()

  const frame = computed<TraceFrame>(() => ({
    height: layout.field.height,
    foot: layout.ruler.height,
    gap: GAP,
    fromT: view.fromT.value,
    toT: view.toT.value,
    times: ruler.value.ticks.major.map((value) => value * ruler.value.size),
    governing: (run.result.value && findGoverningPeak(run.result.value)?.time) ?? null,
    inks: inks.value,
    units: view.units.value,
  }))
  const staleInks = useInks(true)
  const quantity = computed(() => TRACE_QUANTITY[view.quantity.value])
  const limit = computed(() => {
    const gauges = run.result.value?.gauges ?? []
    const largest = findLargest([...gauges, ...(run.frozen.value?.gauges ?? [])], quantity.value)
    // As in the field where it shows the same, so that one colour is one value.
    const same = view.quantity.value === quantity.value ? fieldLimit.value : 0
    return Math.max(same, largest > same ? roundUpLimit(largest) : 0) || 1
  })

  const items = computed<TraceItem[]>(() => {
    const result = run.result.value
    if (!result) return []
    const shares = evaluateEnergyShares(result.energy)
    return [
      ...result.gauges.map((gauge) => makeGaugeItem(gauge, result)),
      ...readings.value.map((reading) => makeJointItem(reading)),
      ...(shares ? [makeEnergyItem(result, shares)] : []),
    ]
  })

  function makeGaugeItem(gauge: PageGauge, result: PageResult): TraceItem {
    const bar = result.line.bars.find(({ from, to }) => gauge.x >= from - 1e-9 && gauge.x <= to + 1e-9)
    const local = formatQuantity(gauge.x - (bar?.from ?? 0), 'length', view.units.value, { trim: true })
    const frozen =
      run.frozen.value === result ? null : run.frozen.value?.gauges.find((it) => it.name === gauge.name)
    const note = describeWindow(findPulseWindow(gauge.pulses), result.run.duration)
    return {
      key: `gauge ${gauge.name}`,
      name: gauge.name,
      where: `${bar?.name ?? ''} ${local.text}`,
      x: gauge.x,
      dimension: quantity.value,
      note,
      at: (moment) => {
        const value = readNearest(gauge.t, gauge[quantity.value], moment)
        // What rounding leaves beside the values of this run reads 0.
        return value !== null && Math.abs(value) < ROUNDING * limit.value ? 0 : value
      },
      summary: `${quantity.value} over time at ${local.text} ${local.unit} on ${bar?.name ?? 'the line'}; ${note.text}`,
      table: () => makeGaugeTable(gauge, frame.value),
      claim: { wanted: 126, least: 92 },
      chart: (width) => makeGaugeSpec(gauge, quantity.value, limit.value, frame.value, width, frozen ?? null),
    }
  }

  function makeJointItem(reading: JointReading): TraceItem {
    const { name, kind, trace, contacts, whole } = reading
    const drawn = run.line.value?.joints.find((_joint, i) => run.result.value?.joints[i]?.name === name)
    const { frozen, result } = run
    const under = frozen.value && frozen.value !== result.value ? earlier.get(frozen.value) : undefined
    const lasts = whole ? writeDuration(whole.to - whole.from) : ''
    const isFirst = whole !== null && frame.value.fromT <= 0 && whole.from < contacts[0].to
    const rest = contacts.length > 0 ? 'none whole in view' : 'none in view'
    const said = whole
      ? `${isFirst ? 'first ' : 'lasts '}${lasts}`
      : reading.peak === 0
        ? 'carries nothing'
        : rest
    const text = reading.result === result.value ? said : 'being read'
    // A reading that is still that of the run before is drawn as stale.
    const shown = reading.result === result.value ? frame.value : { ...frame.value, inks: staleInks.value }
    const kindName = kind[0].toUpperCase() + kind.slice(1)
    const alone = readings.value.length === 1
    return {
      key: `joint ${name}`,
      name: alone ? kindName : name,
      where: alone ? name : kind,
      x: drawn?.x ?? null,
      dimension: 'force',
      note: { text, short: text, alarm: false },
      at: (moment) => readNearest(trace.t, trace.force, moment),
      summary: `force over time in the ${kind} ${name}; ${text}`,
      table: () => makeJointTable(reading, frame.value),
      claim: { wanted: 88, least: 64 },
      chart: (width) =>
        makeContactSpec(
          trace,
          whole,
          reading.peak,
          shown,
          width,
          under?.find((it) => it.name === name)?.trace ?? null,
        ),
    }
  }

  function makeEnergyItem(
    result: PageResult,
    shares: NonNullable<ReturnType<typeof evaluateEnergyShares>>,
  ): TraceItem {
    const { energy } = result
    const frozen = run.frozen.value === result ? null : run.frozen.value
    const under = frozen && evaluateEnergyShares(frozen.energy)
    const total = formatQuantity(shares.total, 'energy', view.units.value, { digits: 3 })
    return {
      key: 'energy',
      name: 'Energy',
      where: '',
      x: null,
      dimension: 'energy',
      note: { text: `of ${total.text} ${total.unit}`, short: `of ${total.text}`, alarm: false },
      at: (moment) => {
        const kinetic = readNearest(energy.t, energy.kinetic, moment)
        const strain = readNearest(energy.t, energy.strain, moment)
        return kinetic === null || strain === null ? null : kinetic + strain
      },
      summary:
        `shares of all energy over time: ${shares.bands.map(({ name }) => name).join(', ')}; ` +
        `their sum is straight to ${energy.closure.toExponential(1)}`,
      table: () => makeEnergyTable(energy, frame.value),
      claim: { wanted: 60, least: 56 },
      chart: (width) => makeEnergySpec(shares, frame.value, width, under),
    }
  }

  return { items, joints: computed(() => readings.value) }
}
