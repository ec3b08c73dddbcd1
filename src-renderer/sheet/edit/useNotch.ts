import { computed, type ComputedRef, type Ref } from 'vue'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'

/**
 * Finds where the notch points up at the part that is edited.
 *
 * @param path - of the part
 * @returns its middle along the sheet [px]; null for a part that has no place on the line
 */
export function useNotch(path: Ref<string>): ComputedRef<number | null> {
  const layout = useLayout()
  const run = useRun()
  const view = useView()
  return computed(() => {
    const line = run.line.value
    if (!line) return null
    const stretches = line.bars.flatMap((bar) => [bar, ...bar.sections])
    const points = [...line.joints, ...line.ends, ...line.gauges, ...line.loads]
    const stretch = stretches.find((part) => part.path === path.value)
    const point = points.find((part) => part.path === path.value)
    const from = Math.max(stretch?.from ?? point?.x ?? NaN, view.fromX.value)
    const to = Math.min(stretch?.to ?? point?.x ?? NaN, view.toX.value)
    if (!(to >= from)) return null
    const share = ((from + to) / 2 - view.fromX.value) / (view.toX.value - view.fromX.value)
    const pixel = layout.fieldLeft + share * layout.fieldWidth
    return Math.min(Math.max(pixel, layout.fieldLeft + 8), layout.fieldLeft + layout.fieldWidth - 8)
  })
}
