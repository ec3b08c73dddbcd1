import { ref, watch, type Ref } from 'vue'
import type { Rig } from './makeRig'
import { readAt } from './document/readAt'

/** The part that is being edited. */
export interface Selection {
  /** Such as `bars[0].sections[1]`, `joints[0]`, `leftEnd`, `gauges[0]`, `run`, `rig`; null for none. */
  path: Ref<string | null>
  /** Height that the fields of the part take in place of the strip [px]; 0 where none are shown. */
  editorHeight: Ref<number>
  select(path: string | null): void
}

/** Parts that may be edited though the document does not hold them yet. */
const ALWAYS_THERE = /^(leftEnd|rightEnd|run|rig|materials|variables|joints\[\d+\])$/

/**
 * Makes the store of the selection.
 *
 * @param rig - whose parts are selected; a part that is gone is let go
 * @returns the store
 */
export function makeSelection(rig: Rig): Selection {
  const path = ref<string | null>(null)
  watch(rig.opened, () => (path.value = null))
  watch(rig.document, (document) => {
    if (path.value === null || ALWAYS_THERE.test(path.value)) return
    if (readAt(document, path.value) === undefined) path.value = null
  })
  return {
    path,
    editorHeight: ref(0),
    select(next) {
      if (next !== path.value) rig.seal()
      path.value = next
    },
  }
}
