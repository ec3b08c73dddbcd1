import { computed, type ComputedRef, type Ref } from 'vue'
import type { Palette } from '../../plot/usePalette'
import { useRun } from '../../stores/useRun'
import type { PaintedPicture } from './draw/drawPicture'
import { makeFieldImage } from './makeFieldImage'
import { useFieldPicture } from './useFieldPicture'
import { useLayout } from '../../stores/useLayout'

/**
 * Paints the field's picture anew when it, its colours or its state change.
 *
 * @param palette - colours of the moment
 * @param ratio - pixels of the screen in one of the page
 * @returns the painted picture; null where there is none
 */
export function usePaintedPicture(
  palette: Ref<Palette>,
  ratio: Ref<number>,
): ComputedRef<PaintedPicture | null> {
  const run = useRun()
  const layout = useLayout()
  const { picture, limit } = useFieldPicture()
  return computed(() => {
    if (!picture.value) return null
    const { columns, rows, request } = picture.value
    const image = document.createElement('canvas')
    image.width = columns
    image.height = rows
    const painted = makeFieldImage(picture.value, {
      theme: palette.value.theme,
      ink: run.stale.value ? palette.value.stale : palette.value.ink,
      stale: run.stale.value,
      limit: limit.value,
      density: Math.min(ratio.value, columns / layout.fieldWidth),
    })
    image.getContext('2d')?.putImageData(painted, 0, 0)
    return { image, fromX: request.fromX, toX: request.toX, fromT: request.fromT, toT: request.toT }
  })
}
