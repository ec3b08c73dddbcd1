import { computed, shallowRef, watch, type ShallowRef } from 'vue'
import type { PageResult, Profile } from '../../../src-main/contract/bridge'
import { useBridge } from '../../stores/useBridge'
import { useCursor } from '../../stores/useCursor'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'
import { findGoverningPeak } from '../margin/governingPeak'
import { makeLatest } from './makeLatest'
import { shareByRun } from './shareByRun'

/** Half the width of the sliver that is read for one place, as a share of the line. */
const SLIVER = 1e-9

/** Share of a line by which a place on a face is moved into the section that is meant. */
const INSIDE = 1e-7

/** Every quantity at one place and time: profiles of one column. */
export interface PointValues {
  values: Profile
  result: PageResult
}

/**
 * Hands out every quantity exactly at the cursor, at rest at the governing point: there inside the governing
 * section, whose face may be that of its neighbour as well.
 *
 * @returns the last answer of the host; null before the first and without a result
 */
export const usePointValues: () => ShallowRef<PointValues | null> = shareByRun(() => {
  const [bridge, run, cursor, view] = [useBridge(), useRun(), useCursor(), useView()]
  const point = shallowRef<PointValues | null>(null)

  const wanted = computed(() => {
    const result = run.result.value
    const place = cursor.place.value
    if (!result || !place) return null
    const margin = INSIDE * view.lengthX.value
    const governing = cursor.x.value === null ? findGoverningPeak(result) : null
    const { from, to } = governing?.row ?? { from: 0, to: view.lengthX.value }
    return { result, t: place.t, x: Math.min(Math.max(place.x, from + margin), to - margin) }
  })

  const latest = makeLatest(
    async ({ result, t, x }: NonNullable<typeof wanted.value>) => {
      const half = SLIVER * view.lengthX.value
      const part = { fromX: x - half, toX: x + half }
      return { result, values: await bridge.readProfile({ slot: run.slot, t, columns: 1, part }) }
    },
    (answer) => {
      if (answer.result === run.result.value) point.value = answer
    },
    // Without an answer the read-outs stay as they were; the field says why.
    () => undefined,
  )
  watch(
    wanted,
    (next) => {
      if (next) return latest.ask(next)
      latest.drop()
      point.value = null
    },
    { immediate: true },
  )
  return point
})
