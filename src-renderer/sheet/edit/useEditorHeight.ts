import { onMounted, onUnmounted, type Ref } from 'vue'
import { useSelection } from '../../stores/useSelection'

/**
 * Lets the sheet make room for what stands in place of the strip, so that nothing is covered.
 *
 * @param element - whose one child is measured
 */
export function useEditorHeight(element: Ref<HTMLElement | undefined>): void {
  const { editorHeight } = useSelection()
  let observer: ResizeObserver | null = null
  onMounted(() => {
    const content = element.value?.firstElementChild
    if (!content) return
    observer = new ResizeObserver(() => {
      editorHeight.value = Math.ceil(content.getBoundingClientRect().height) + 6
    })
    observer.observe(content)
  })
  onUnmounted(() => {
    observer?.disconnect()
    editorHeight.value = 0
  })
}
