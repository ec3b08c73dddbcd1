import { computed, type ComputedRef } from 'vue'
import { listTicks, type Ticks } from '../../plot/listTicks'
import { writeFixed } from '../../plot/writeFixed'
import { UNITS } from '../../format/units'
import { useLayout } from '../../stores/useLayout'
import { useView } from '../../stores/useView'
import { makeFieldScales, type FieldScales } from './draw/fieldScales'

/** One ruler: its marks in its own unit. */
export interface Ruler {
  ticks: Ticks
  /** Name of its unit, and its size in SI. */
  unit: string
  size: number
  /** Writes a number of the ruler. */
  writeTick(value: number): string
  /** Writes a value in SI as finely as a pixel tells apart. */
  write(value: number): string
}

/** Room that a number on a ruler needs [px]. */
const ACROSS = 68
const UPRIGHT = 34

/** Time shown below which a ruler counts microseconds [s]. */
const SHORT = 5e-5

/**
 * Hands out the scales and the rulers of what is looked at; field, traces and peaks share them.
 *
 * @returns scales with the field's left upper corner at 0, and both rulers
 */
export function useRulers(): {
  scales: ComputedRef<FieldScales>
  x: ComputedRef<Ruler>
  t: ComputedRef<Ruler>
} {
  const view = useView()
  const layout = useLayout()
  const scales = computed(() =>
    makeFieldScales(
      { fromX: view.fromX.value, toX: view.toX.value, fromT: view.fromT.value, toT: view.toT.value },
      layout.fieldWidth,
      layout.field.height,
    ),
  )
  const x = computed(() => {
    const unit = UNITS.length[view.units.value]
    return makeRuler(view.fromX.value, view.toX.value, layout.fieldWidth, ACROSS, unit)
  })
  const t = computed(() => {
    const isShort = view.toT.value - view.fromT.value < SHORT
    const unit = UNITS[isShort ? 'shortTime' : 'time'][view.units.value]
    return makeRuler(view.fromT.value, view.toT.value, layout.field.height, UPRIGHT, unit)
  })
  return { scales, x, t }
}

function makeRuler(
  from: number,
  to: number,
  pixels: number,
  room: number,
  { name, size }: { name: string; size: number },
): Ruler {
  const ticks = listTicks(from / size, to / size, Math.max(1, Math.floor(pixels / room)))
  const places = Math.max(0, Math.ceil(-Math.log10((to - from) / size / pixels) - 0.2))
  return {
    ticks,
    unit: name,
    size,
    writeTick: (value) => writeFixed(value, ticks.places),
    write: (value) => writeFixed(value / size, places),
  }
}
