import { useCursor } from '../../stores/useCursor'
import { useView } from '../../stores/useView'

/** How far a press of a key zooms, and what share of the view it pans. */
const CLOSER = 0.7
const PAN = 0.1

const ARROWS: Record<string, [columns: number, rows: number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
}

/**
 * What keys do in the field: arrows step the cursor by a pixel (Shift: ten; Ctrl: pan), Enter holds it, Esc
 * lets it go, plus and minus zoom about it, 0 goes back to the whole.
 *
 * @returns the handler; keys that it does not know, and Esc where nothing is held, pass on
 */
export function useFieldKeys(): (event: KeyboardEvent) => void {
  const cursor = useCursor()
  const view = useView()

  function act(event: KeyboardEvent): boolean {
    const arrow = ARROWS[event.key]
    const place = cursor.place.value
    if (event.altKey || event.metaKey) return false
    if (arrow && event.ctrlKey) {
      view.pan(
        arrow[0] * PAN * (view.toX.value - view.fromX.value),
        arrow[1] * PAN * (view.toT.value - view.fromT.value),
      )
      return true
    }
    if (event.ctrlKey) return false
    if (arrow) {
      const steps = event.shiftKey ? 10 : 1
      cursor.step(arrow[0] * steps, arrow[1] * steps)
      return true
    }
    if (event.key === '0') {
      view.zoomOut()
      return true
    }
    if (event.key === 'Escape' && cursor.held.value) {
      cursor.letGo()
      return true
    }
    if (!place) return false
    if (event.key === 'Enter') cursor.hold(place.x, place.t)
    else if (event.key === '+' || event.key === '=') view.zoomAbout(place.x, place.t, CLOSER, CLOSER)
    else if (event.key === '-' || event.key === '_') view.zoomAbout(place.x, place.t, 1 / CLOSER, 1 / CLOSER)
    else return false
    return true
  }

  return (event) => {
    if (!act(event)) return
    event.preventDefault()
    event.stopPropagation()
  }
}
