import type { FrameSpec } from './frameSpec'
import { writeFont, type Inks } from './inks'

/** A chart in a picture. */
export interface FigurePart {
  spec: FrameSpec
  left: number
  top: number
}

/** A word in a picture, its baseline at y. */
export interface FigureWord {
  text: string
  x: number
  y: number
  strong?: boolean
  quiet?: boolean
  size?: number
  align?: 'left' | 'center' | 'right'
  /** Room that it has; longer words are cut short [px]. */
  room?: number
}

/** A picture as it is saved: charts, and the words that stand around them on the sheet. */
export interface Figure {
  title: string
  width: number
  height: number
  parts: FigurePart[]
  words: FigureWord[]
  /** Draws what is no chart. */
  draw?: (context: CanvasRenderingContext2D) => void
  inks: Inks
}

/**
 * Draws a picture that is to be saved.
 *
 * @param context - drawn into, in pixels of the page
 * @param figure - what it shows
 * @param place - draws one of its charts
 */
export function drawFigure(
  context: CanvasRenderingContext2D,
  { parts, words, draw, inks }: Figure,
  place: (part: FigurePart) => void,
): void {
  parts.forEach(place)
  context.textBaseline = 'alphabetic'
  for (const { text, x, y, strong, quiet, size, align, room } of words) {
    context.font = writeFont(size ?? inks.size + 1, strong ? 600 : 400)
    context.fillStyle = quiet ? inks.unit : inks.ink
    context.textAlign = align ?? 'left'
    context.fillText(shorten(context, text, room ?? Infinity), x, y)
  }
  draw?.(context)
}

function shorten(context: CanvasRenderingContext2D, text: string, room: number): string {
  if (context.measureText(text).width <= room) return text
  let length = text.length - 1
  while (length > 1 && context.measureText(`${text.slice(0, length)}…`).width > room) length--
  return `${text.slice(0, length)}…`
}
