import { onMounted, onUnmounted } from 'vue'
import { useDocuments } from '../../stores/useDocuments'
import { useRig } from '../../stores/useRig'
import { useRun } from '../../stores/useRun'
import { useSelection } from '../../stores/useSelection'

/**
 * Lets the whole sheet hear its keys: Ctrl (or Cmd) with S, Shift+S, O, Z, Shift+Z or Y; Esc stops a run, and
 * otherwise closes the fields of a part.
 */
export function useSheetKeys(): void {
  const documents = useDocuments()
  const rig = useRig()
  const run = useRun()
  const selection = useSelection()

  function act(event: KeyboardEvent): (() => unknown) | undefined {
    const { key, ctrlKey, metaKey, shiftKey, altKey } = event
    if (key === 'Escape') {
      if (run.running.value && run.progress.value) return () => run.stop()
      // The field's cursor lets go first, where it has the focus.
      return selection.path.value !== null ? () => selection.select(null) : undefined
    }
    if (!(ctrlKey || metaKey) || altKey) return undefined
    switch (key.toLowerCase()) {
      case 's':
        return () => void (shiftKey ? documents.saveAs() : documents.save())
      case 'o':
        return () => void documents.open()
      case 'z':
        return shiftKey ? rig.redo : rig.undo
      case 'y':
        return rig.redo
      default:
        return undefined
    }
  }
  function hear(event: KeyboardEvent): void {
    if (event.defaultPrevented || documents.question.value) return
    const action = act(event)
    if (!action) return
    event.preventDefault()
    action()
  }
  onMounted(() => document.addEventListener('keydown', hear))
  onUnmounted(() => document.removeEventListener('keydown', hear))
}
