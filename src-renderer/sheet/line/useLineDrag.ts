import { readAt } from '../../stores/document/readAt'
import { writeAt } from '../../stores/document/writeAt'
import { chooseStep, readPlainValue, writePlainValue } from '../../stores/document/plainValue'
import { useRig } from '../../stores/useRig'

/** A value that a hand can drag. */
export interface DragValue {
  /** Where it stands in the rig. */
  path: string
  /** What it is now [SI]. */
  value: number
  /** Change for a pixel of movement [SI]. */
  perPixel: number
  /** Bounds [SI]. */
  least: number
  most?: number
}

/** How values of the rig follow the hand. */
export interface LineDrag {
  /** True where every value is typed as one number, not as a formula. */
  canDrag(...paths: string[]): boolean
  /** Begins to follow the pointer. */
  begin(event: PointerEvent, label: string, axis: 'x' | 'y', values: DragValue[]): void
}

/** Sizes of units in which a length of zero may be typed [m]; of other lengths the run tells what they are. */
const LENGTHS: Record<string, number> = { mm: 1e-3, cm: 1e-2, m: 1, um: 1e-6, inch: 0.0254, ft: 0.3048 }

/** Makes the ways to drag values in the drawing; runs are coarse until the hand lets go. */
export function useLineDrag(): LineDrag {
  const rig = useRig()
  const canDrag = (...paths: string[]): boolean =>
    paths.every((path) => {
      const plain = readPlainValue(readAt(rig.document.value, path))
      return plain !== null && (plain.number !== 0 || Object.hasOwn(LENGTHS, plain.unit))
    })

  function begin(event: PointerEvent, label: string, axis: 'x' | 'y', values: DragValue[]): void {
    if (event.button !== 0 || !canDrag(...values.map(({ path }) => path))) return
    const target = event.currentTarget as Element
    const origin = axis === 'x' ? event.clientX : event.clientY
    const starts = values.map((one) => ({
      ...one,
      plain: readPlainValue(readAt(rig.document.value, one.path))!,
    }))
    event.preventDefault()
    event.stopPropagation()
    target.setPointerCapture(event.pointerId)
    rig.seal()

    function move(moved: Event): void {
      const { clientX, clientY, shiftKey } = moved as PointerEvent
      const pixels = (axis === 'x' ? clientX : clientY) - origin
      if (pixels === 0 && !rig.dragging.value) return
      rig.dragging.value = true
      rig.change(
        label,
        (document) =>
          starts.reduce(
            (rest, start) => writeAt(rest, start.path, follow(start, pixels, shiftKey)),
            document,
          ),
        `drag ${starts.map(({ path }) => path).join(' ')}`,
      )
    }
    function end(): void {
      target.removeEventListener('pointermove', move)
      target.removeEventListener('pointerup', end)
      target.removeEventListener('pointercancel', end)
      rig.seal()
      rig.dragging.value = false
    }
    target.addEventListener('pointermove', move)
    target.addEventListener('pointerup', end)
    target.addEventListener('pointercancel', end)
  }
  return { canDrag, begin }
}

/** The value after a movement, on a grid no coarser than a pixel, in the unit in which it was typed; Shift is finer. */
function follow(
  { value, perPixel, least, most = Infinity, plain }: DragValue & { plain: { number: number; unit: string } },
  pixels: number,
  fine: boolean,
): string {
  const size = plain.number === 0 ? LENGTHS[plain.unit] : value / plain.number
  const step = chooseStep(Math.abs(perPixel / size) * (fine ? 0.1 : 1))
  const wanted = (value + pixels * perPixel * (fine ? 0.1 : 1)) / size
  const onGrid = Math.round(wanted / step) * step
  const low = Math.ceil(least / size / step - 1e-9) * step
  const high = Math.floor(most / size / step + 1e-9) * step
  return writePlainValue(Math.min(Math.max(onGrid, low), high), plain.unit, step)
}
