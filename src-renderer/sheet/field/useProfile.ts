import { shallowRef, watch, type ShallowRef } from 'vue'
import type { PageResult, Profile } from '../../../src-main/contract/bridge'
import { useBridge } from '../../stores/useBridge'
import { useCursor } from '../../stores/useCursor'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'
import { makeLatest } from './makeLatest'
import { shareByRun } from './shareByRun'

/** Every quantity along the line at one moment of a run. */
export interface Moment {
  /** [s] */
  t: number
  profile: Profile
  /** Largest magnitude of each quantity met so far in this run: what is tiny beside it is rounding. */
  scale: ProfileScale
  result: PageResult
}

export type ProfileScale = Record<keyof Profile, number>

/** Most places asked for along the line, however closely it is looked at. */
const MOST_COLUMNS = 8000

/**
 * Hands out the quantities along the line at the cursor's moment, at rest that of the governing point;
 * asked for once for all views of a window.
 *
 * @returns the last answer of the host; null before the first and without a result
 */
export const useProfile: () => ShallowRef<Moment | null> = shareByRun(() => {
  const [bridge, run, cursor, view, layout] = [useBridge(), useRun(), useCursor(), useView(), useLayout()]
  const moment = shallowRef<Moment | null>(null)
  const latest = makeLatest(
    async ({ t, columns, result }: { t: number; columns: number; result: PageResult }) => ({
      t,
      result,
      profile: await bridge.readProfile({ slot: run.slot, t, columns }),
    }),
    (answer) => {
      if (answer.result !== run.result.value) return
      const before = moment.value?.result === answer.result ? moment.value.scale : null
      moment.value = { ...answer, scale: growScale(before, answer.profile) }
    },
    // Without a profile the read-outs stay as they were; the field says why.
    () => undefined,
  )
  watch(
    [run.result, () => cursor.place.value?.t, view.fromX, view.toX, () => layout.fieldWidth],
    () => {
      const result = run.result.value
      const t = cursor.place.value?.t
      if (!result || t === undefined) {
        latest.drop()
        moment.value = null
        return
      }
      const closer = view.lengthX.value / (view.toX.value - view.fromX.value)
      latest.ask({ t, result, columns: Math.min(MOST_COLUMNS, Math.round(layout.fieldWidth * closer)) })
    },
    { immediate: true },
  )
  return moment
})

function growScale(before: ProfileScale | null, profile: Profile): ProfileScale {
  const names = Object.keys(profile) as (keyof Profile)[]
  const largest = (name: keyof Profile): number => {
    let most = before?.[name] ?? 0
    for (const value of profile[name]) if (Math.abs(value) > most) most = Math.abs(value)
    return most
  }
  return Object.fromEntries(names.map((name) => [name, largest(name)])) as ProfileScale
}
