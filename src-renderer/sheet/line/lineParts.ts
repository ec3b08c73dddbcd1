import { computed, inject, nextTick, provide, ref, type ComputedRef, type InjectionKey, type Ref } from 'vue'
import { useSelection } from '../../stores/useSelection'
import { useRemove } from '../edit/useRemove'

/** How the parts of the line are reached: one is in the order of Tab, arrows lead to the others. */
export interface LineParts {
  reachable: ComputedRef<string | null>
  focused: Ref<string | null>
  /** Keys on a part: arrows, Home and End go to another, Enter opens its values, Delete takes it out. */
  hear(event: KeyboardEvent, path: string): void
}

const KEY: InjectionKey<LineParts> = Symbol('line parts')

/**
 * Makes the way around the parts of the line and hands it to all below.
 *
 * @param paths - of the parts, from left to right
 * @param reveal - brings a part into sight
 * @returns the way
 */
export function provideLineParts(paths: ComputedRef<string[]>, reveal: (path: string) => void): LineParts {
  const { path: chosen, select } = useSelection()
  const { remove } = useRemove()
  const focused = ref<string | null>(null)
  const reachable = computed(
    () =>
      [focused.value, chosen.value].find((path) => path !== null && paths.value.includes(path)) ??
      paths.value[0] ??
      null,
  )

  async function go(from: Element, path: string): Promise<void> {
    const svg = from.closest('svg')
    reveal(path)
    await nextTick()
    svg?.querySelector<SVGElement>(`[data-path='${CSS.escape(path)}']`)?.focus()
  }

  function hear(event: KeyboardEvent, path: string): void {
    const at = paths.value.indexOf(path)
    const to = { ArrowRight: at + 1, ArrowLeft: at - 1, Home: 0, End: paths.value.length - 1 }[event.key]
    if (event.key === 'Enter' || event.key === ' ') select(path)
    else if (event.key === 'Delete') remove(path)
    else if (to === undefined || !paths.value[to]) return
    else void go(event.currentTarget as Element, paths.value[to])
    event.preventDefault()
  }
  const parts: LineParts = { reachable, focused, hear }
  provide(KEY, parts)
  return parts
}

/** Finds the way around the parts of the line that a part stands in. */
export function useLineParts(): LineParts {
  const parts = inject(KEY)
  if (!parts) throw new Error('useLineParts: this part stands in no line')
  return parts
}
