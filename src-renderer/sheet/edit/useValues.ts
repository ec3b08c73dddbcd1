import { computed, type ComputedRef } from 'vue'
import { useRun } from '../../stores/useRun'

/** What a formula of the rig is worth. */
export interface KnownValue {
  /** [SI] */
  value: number
  /** What it is, by the reader's words. */
  dimension: string
}

/** Hands out what the values of the rig are worth, by path, as far as the host could read them. */
export function useValues(): ComputedRef<ReadonlyMap<string, KnownValue>> {
  const { inspection } = useRun()
  return computed(
    () =>
      new Map(
        (inspection.value?.values ?? []).map(({ path, value, dimension }) => [path, { value, dimension }]),
      ),
  )
}
