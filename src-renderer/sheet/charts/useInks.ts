import { computed, ref, type ComputedRef } from 'vue'
import { usePalette } from '../../plot/usePalette'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { makeInks, writeFont, type Inks } from './inks'

/** The inks of the sheet's drawings, new whenever the page's colours, its type or the result's standing change. */
export function useInks(): ComputedRef<Inks> {
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
    return makeInks(palette.value, stale.value, layout.type.axis)
  })
}
