import { computed, ref, watch, type ComputedRef, type Ref } from 'vue'
import type { Quantity } from '../../src-main/contract/bridge'
import type { UnitSystem } from '../format/units'
import type { Run } from './makeRun'
import { keepSetting } from './keepSetting'

/** What part of the run is looked at, and how it is written. */
export interface View {
  /** [m] [m] [s] [s] */
  fromX: Ref<number>
  toX: Ref<number>
  fromT: Ref<number>
  toT: Ref<number>
  /** The whole line [m] and the whole run [s]. */
  lengthX: ComputedRef<number>
  lengthT: ComputedRef<number>
  zoomed: ComputedRef<boolean>
  zoomTo(fromX: number, toX: number, fromT: number, toT: number): void
  /** Back to the whole. */
  zoomOut(): void
  pan(dx: number, dt: number): void
  /** Zooms about a place; factors under 1 come closer. */
  zoomAbout(x: number, t: number, factorX: number, factorT: number): void
  quantity: Ref<Quantity>
  units: Ref<UnitSystem>
  theme: Ref<'light' | 'dark' | 'system'>
}

/** Closest look: a thousandth of the whole. */
const CLOSEST = 1e-3

/**
 * Makes the store of what is looked at.
 *
 * @param run - whose line and duration are the whole
 * @returns the store; units and theme are kept on this machine for this user
 */
export function makeView(run: Run): View {
  const lengthX = computed(() => run.line.value?.bars.at(-1)?.to ?? run.result.value?.line.length ?? 1)
  const lengthT = computed(() => run.result.value?.run.duration ?? 1e-3)
  const fromX = ref(0)
  const toX = ref(lengthX.value)
  const fromT = ref(0)
  const toT = ref(lengthT.value)
  const zoomed = computed(
    () => fromX.value > 0 || toX.value < lengthX.value || fromT.value > 0 || toT.value < lengthT.value,
  )

  function zoomTo(x0: number, x1: number, t0: number, t1: number): void {
    ;[fromX.value, toX.value] = clampRange(x0, x1, lengthX.value)
    ;[fromT.value, toT.value] = clampRange(t0, t1, lengthT.value)
  }
  const zoomOut = (): void => zoomTo(0, lengthX.value, 0, lengthT.value)

  watch(
    [lengthX, lengthT],
    ([x, t], [oldX, oldT]) => {
      const wasWhole = fromX.value === 0 && toX.value === oldX
      const wasWholeT = fromT.value === 0 && toT.value === oldT
      zoomTo(
        wasWhole ? 0 : fromX.value,
        wasWhole ? x : toX.value,
        wasWholeT ? 0 : fromT.value,
        wasWholeT ? t : toT.value,
      )
    },
    { flush: 'sync' },
  )

  return {
    fromX,
    toX,
    fromT,
    toT,
    lengthX,
    lengthT,
    zoomed,
    zoomTo,
    zoomOut,
    pan: (dx, dt) => zoomTo(fromX.value + dx, toX.value + dx, fromT.value + dt, toT.value + dt),
    zoomAbout: (x, t, factorX, factorT) =>
      zoomTo(
        x - (x - fromX.value) * factorX,
        x + (toX.value - x) * factorX,
        t - (t - fromT.value) * factorT,
        t + (toT.value - t) * factorT,
      ),
    quantity: ref('stress'),
    units: keepSetting('units', ['si', 'us']),
    theme: keepSetting('theme', ['system', 'light', 'dark']),
  }
}

/** Keeps the width of a range where it fits, and moves it into 0..whole. */
function clampRange(from: number, to: number, whole: number): [number, number] {
  const width = Math.min(whole, Math.max(to - from, whole * CLOSEST))
  const start = Math.min(Math.max(from, 0), whole - width)
  return [start, width === whole ? whole : start + width]
}
