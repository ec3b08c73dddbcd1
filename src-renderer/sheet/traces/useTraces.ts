import { computed, type ComputedRef } from 'vue'
import { roundUpLimit } from '../../plot/listTicks'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'
import { useInks } from '../charts/useInks'
import { useFieldPicture } from '../field/useFieldPicture'
import { useRulers } from '../field/useRulers'
import { findGoverningPeak } from '../margin/governingPeak'
import { evaluateEnergyShares } from './energyShares'
import { makeEnergyItem, makeGaugeItem, makeJointItem } from './makeTraceItems'
import type { TraceFrame } from './traceFrame'
import type { TraceItem } from './traceItem'
import { findLargest, TRACE_QUANTITY } from './traceQuantity'
import { useJointTraces, type JointReading } from './useJointTraces'

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

  const frozen = computed(() => (run.frozen.value === run.result.value ? null : run.frozen.value))
  const shared = computed(() => ({
    frame: frame.value,
    quantity: quantity.value,
    limit: limit.value,
    frozen: frozen.value,
  }))

  // Apart, so that what a joint reads late draws no other trace again.
  const gauges = computed(() => {
    const result = run.result.value
    return result ? result.gauges.map((gauge) => makeGaugeItem(gauge, result, shared.value)) : []
  })
  const contacts = computed(() => {
    const result = run.result.value
    const under = frozen.value ? earlier.get(frozen.value) : undefined
    return readings.value.map((reading) => {
      const at = result?.joints.findIndex(({ name }) => name === reading.name) ?? -1
      const current = reading.result === result
      return makeJointItem(
        reading,
        run.line.value?.joints[at]?.x ?? null,
        current,
        readings.value.length === 1,
        under?.find(({ name }) => name === reading.name)?.trace ?? null,
        // A reading that is still that of the run before is drawn as stale.
        current ? frame.value : { ...frame.value, inks: staleInks.value },
      )
    })
  })
  const energy = computed(() => {
    const result = run.result.value
    const shares = result && evaluateEnergyShares(result.energy)
    return shares ? [makeEnergyItem(result, shares, shared.value)] : []
  })
  const items = computed(() =>
    run.result.value ? [...gauges.value, ...contacts.value, ...energy.value] : [],
  )

  return { items, joints: computed(() => readings.value) }
}
