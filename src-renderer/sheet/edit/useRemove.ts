import { namePart } from '../../stores/document/namePart'
import { parsePath } from '../../stores/document/parsePath'
import type { RigDocument } from '../../stores/document/rigDocument'
import { writeAt } from '../../stores/document/writeAt'
import { useRig } from '../../stores/useRig'
import { useSelection } from '../../stores/useSelection'
import { removeBar } from './changeBars'

/** Makes the way to take parts out of the rig. */
export function useRemove(): { remove(path: string): void; canRemove(path: string): boolean } {
  const rig = useRig()
  const selection = useSelection()

  function canRemove(path: string): boolean {
    const { bars } = rig.document.value
    const [first, index, inner] = parsePath(path)
    if (first === 'gauges' || first === 'loads') return true
    if (first !== 'bars' || typeof index !== 'number') return false
    const sections = bars?.[index]?.sections?.length ?? 0
    return inner === 'sections' ? sections > 1 : (bars?.length ?? 0) > 1
  }

  function remove(path: string): void {
    if (!canRemove(path)) return
    const [first, index, inner] = parsePath(path)
    const make = (document: RigDocument): RigDocument =>
      first === 'bars' && inner === undefined
        ? removeBar(document, Number(index))
        : writeAt(document, path, undefined)
    const label = `Remove ${namePart(rig.document.value, path)}`
    if (selection.path.value?.startsWith(path)) selection.select(null)
    rig.change(label, make)
  }
  return { remove, canRemove }
}
