import { computed, ref, type ComputedRef } from 'vue'
import { usePalette } from '../../plot/usePalette'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { makeInks, writeFont, type Inks } from './inks'

/**
 * The inks of the sheet's drawings, new whenever the page's colours, its type or the result's standing change.
 *
 * @param alwaysStale - for what is grey whatever the result's standing
 */
export function useInks(alwaysStale = false): ComputedRef<Inks> {
  const layout = useLayout()
  const { stale } = useRun()
  const palette = usePalette()
  const fonts = ref(0)
  void Promise.all([document.fonts.load(writeFont(12)), document.fonts.load(writeFont(12, 600))]).then(
    () => fonts.value++,
  )
  return computed(() => {
    // A drawing that was made before its type had come is made again.
    void fonts.value
    return makeInks(palette.value, alwaysStale || stale.value, layout.type.axis)
  })
}
