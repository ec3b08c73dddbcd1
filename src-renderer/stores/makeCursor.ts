import { computed, ref, type ComputedRef, type Ref } from 'vue'
import type { PageResult } from '../../src-main/contract/bridge'
import type { Run } from './makeRun'
import type { View } from './makeView'

/** The one place and moment that every view shows. */
export interface Cursor {
  /** [m] [s]; both null at rest */
  x: Ref<number | null>
  t: Ref<number | null>
  held: Ref<boolean>
  /** What is shown: the cursor, at rest the governing point. */
  place: ComputedRef<{ x: number; t: number } | null>
  /** Moves it where it is not held; null at rest again. */
  setHover(x: number | null, t: number | null): void
  /** Moves it there and holds it. */
  hold(x: number, t: number): void
  /** Steps a held or resting cursor by pixels of the field. */
  step(columns: number, rows: number): void
  letGo(): void
}

/**
 * Makes the store of the cursor.
 *
 * @param run - whose governing point is shown at rest
 * @param view - which keeps it in sight
 * @param pixels - width and height of the field [px]
 * @returns the store
 */
export function makeCursor(run: Run, view: View, pixels: () => { width: number; height: number }): Cursor {
  const x = ref<number | null>(null)
  const t = ref<number | null>(null)
  const held = ref(false)
  const place = computed(() => {
    if (x.value !== null && t.value !== null) return { x: x.value, t: t.value }
    return run.result.value && findGoverningPoint(run.result.value)
  })

  function put(toX: number | null, toT: number | null): void {
    x.value = toX === null ? null : Math.min(Math.max(toX, 0), view.lengthX.value)
    t.value = toT === null ? null : Math.min(Math.max(toT, 0), view.lengthT.value)
  }

  return {
    x,
    t,
    held,
    place,
    setHover(toX, toT) {
      if (!held.value) put(toX, toT)
    },
    hold(toX, toT) {
      put(toX, toT)
      held.value = true
    },
    step(columns, rows) {
      const from = place.value
      if (!from) return
      const { width, height } = pixels()
      put(
        from.x + (columns * (view.toX.value - view.fromX.value)) / width,
        from.t + (rows * (view.toT.value - view.fromT.value)) / height,
      )
      held.value = true
    },
    letGo() {
      held.value = false
      put(null, null)
    },
  }
}

/** Place and moment of the governing margin; without one, of the largest stress. */
function findGoverningPoint({ governing, sections }: PageResult): { x: number; t: number } | null {
  const ofMargin =
    governing && sections.find((it) => it.bar === governing.bar && it.section === governing.section)
  if (governing && ofMargin) {
    const { localAt, localTime } = ofMargin[governing.sense]
    return { x: localAt, t: localTime }
  }
  const peaks = sections.flatMap(({ tension, compression }) => [tension, compression])
  if (peaks.length === 0) return null
  const largest = peaks.reduce((a, b) => (Math.abs(b.peak) > Math.abs(a.peak) ? b : a))
  return { x: largest.at, t: largest.time }
}
