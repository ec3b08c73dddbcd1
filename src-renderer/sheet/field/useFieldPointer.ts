import { shallowRef, type ComputedRef, type ShallowRef } from 'vue'
import { useCursor } from '../../stores/useCursor'
import { useView } from '../../stores/useView'
import type { FieldScales } from './draw/fieldScales'

/** An area that is being drawn to be looked at closer [px]. */
export interface DragArea {
  left: number
  top: number
  width: number
  height: number
}

/** Movement up to which a press is a click, and up to which an area is a range of the other axis alone [px]. */
const CLICK = 4
const THIN = 12

/** Growth of the view for one unit of a wheel. */
const WHEEL = 0.0015

interface Press {
  x: number
  y: number
  lastX: number
  lastY: number
  pans: boolean
  moved: boolean
}

/**
 * What a pointer does in the field: hovering moves the cursor, a click holds it, a drag looks closer at a
 * range, with Shift or the middle button it pans; the wheel zooms about the place below it (Shift: x alone,
 * Alt: time alone), a double click goes back to the whole.
 *
 * @param scales - of the field
 * @returns the area being dragged, null otherwise, and handlers for the field's element
 */
export function useFieldPointer(scales: ComputedRef<FieldScales>): {
  area: ShallowRef<DragArea | null>
  handlers: Record<string, (event: never) => void>
} {
  const cursor = useCursor()
  const view = useView()
  const area = shallowRef<DragArea | null>(null)
  let press: Press | null = null

  const locate = (event: MouseEvent): { x: number; y: number } => {
    const { left, top } = (event.currentTarget as HTMLElement).getBoundingClientRect()
    return { x: event.clientX - left, y: event.clientY - top }
  }
  const placeAt = (x: number, y: number): [number, number] => [
    scales.value.x.valueAt(x),
    scales.value.t.valueAt(y),
  ]

  function begin(event: PointerEvent): void {
    if (event.button > 1) return
    ;(event.currentTarget as HTMLElement).setPointerCapture(event.pointerId)
    const { x, y } = locate(event)
    press = { x, y, lastX: x, lastY: y, pans: event.button === 1 || event.shiftKey, moved: false }
    if (event.button === 1) event.preventDefault()
  }

  function move(event: PointerEvent): void {
    const { x, y } = locate(event)
    if (!press) {
      cursor.setHover(...placeAt(x, y))
      return
    }
    press.moved ||= Math.hypot(x - press.x, y - press.y) > CLICK
    if (!press.moved) return
    if (press.pans) {
      const [toX, toT] = placeAt(x, y)
      const [fromX, fromT] = placeAt(press.lastX, press.lastY)
      view.pan(fromX - toX, fromT - toT)
      ;[press.lastX, press.lastY] = [x, y]
    } else area.value = makeArea(press, x, y, scales.value)
  }

  function end(event: PointerEvent): void {
    const ended = press
    press = null
    const drawn = area.value
    area.value = null
    if (!ended) return
    if (!ended.moved) {
      if (!ended.pans) cursor.hold(...placeAt(ended.x, ended.y))
    } else if (drawn) {
      const [fromX, toT] = placeAt(drawn.left, drawn.top)
      const [toX, fromT] = placeAt(drawn.left + drawn.width, drawn.top + drawn.height)
      view.zoomTo(fromX, toX, fromT, toT)
    }
    event.stopPropagation()
  }

  function leave(): void {
    if (!press) cursor.setHover(null, null)
  }

  function cancel(): void {
    press = null
    area.value = null
  }

  function turn(event: WheelEvent): void {
    event.preventDefault()
    const { x, y } = locate(event)
    const lines = event.deltaMode === 1 ? 16 : 1
    const factor = Math.exp(WHEEL * lines * (event.deltaY || event.deltaX))
    view.zoomAbout(...placeAt(x, y), event.altKey ? 1 : factor, event.shiftKey ? 1 : factor)
  }

  return {
    area,
    handlers: {
      pointerdown: begin,
      pointermove: move,
      pointerup: end,
      pointerleave: leave,
      pointercancel: cancel,
      wheel: turn,
      dblclick: () => view.zoomOut(),
    },
  }
}

/** The area between two places; a thin one takes the whole of the other axis. */
function makeArea(press: Press, x: number, y: number, { width, height }: FieldScales): DragArea {
  const clamp = (value: number, size: number): number => Math.min(Math.max(value, 0), size)
  const [x1, x2] = [clamp(Math.min(press.x, x), width), clamp(Math.max(press.x, x), width)]
  const [y1, y2] = [clamp(Math.min(press.y, y), height), clamp(Math.max(press.y, y), height)]
  const [wide, high] = [x2 - x1, y2 - y1]
  if (high < THIN && wide >= THIN) return { left: x1, top: 0, width: wide, height }
  if (wide < THIN && high >= THIN) return { left: 0, top: y1, width, height: high }
  return { left: x1, top: y1, width: wide, height: high }
}
