import type { Inks } from '../charts/inks'
import type { RatioPair } from './findStep'

/** Width of the line of a wave that carries all that arrives [px]. */
const FULL = 2

/**
 * Draws the two small x-t pictures of a step: a wave that arrives from the left and one from the right,
 * with what is reflected and what passes, as heavy as its force. Reflections from a taper are spread and
 * drawn in dashes.
 *
 * @param context - drawn into
 * @param ratios - force shares
 * @param spread - true for a taper
 * @param box - where [px]
 * @param inks - of the drawing
 */
export function drawWaves(
  context: CanvasRenderingContext2D,
  ratios: RatioPair,
  spread: boolean,
  box: { left: number; top: number; width: number; height: number },
  inks: Inks,
): void {
  const half = box.width / 2
  for (const side of ['fromLeft', 'fromRight'] as const) {
    const middle = box.left + (side === 'fromLeft' ? half / 2 : half * 1.5)
    const { top, height } = box
    const centre = top + height / 2
    const reach = Math.min(half / 2 - 6, height * 0.55)
    const from = side === 'fromLeft' ? -1 : 1
    const { reflected, transmitted } = ratios[side]
    context.save()
    context.strokeStyle = inks.rule
    context.lineWidth = 1
    drawStroke(context, middle, top, middle, top + height)
    context.strokeStyle = inks.ink
    context.lineWidth = FULL
    drawStroke(context, middle + from * reach, top + height, middle, centre)
    context.lineWidth = weigh(transmitted)
    drawStroke(context, middle, centre, middle - from * reach, top)
    if (reflected !== null && Math.abs(reflected) > 5e-4) {
      context.lineWidth = weigh(reflected)
      context.setLineDash(spread ? [4, 3] : [])
      drawStroke(context, middle, centre, middle + from * reach, top)
    }
    context.restore()
  }
}

function weigh(share: number): number {
  return Math.min(2 * FULL, Math.max(0.75, FULL * Math.abs(share)))
}

function drawStroke(context: CanvasRenderingContext2D, x1: number, y1: number, x2: number, y2: number): void {
  context.beginPath()
  context.moveTo(x1, y1)
  context.lineTo(x2, y2)
  context.stroke()
}
