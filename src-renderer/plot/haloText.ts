/** How a word is written over a drawing. */
export interface TextStyle {
  /** Of the canvas, such as `400 11px "IBM Plex Sans Condensed"`. */
  font: string
  ink: string
  /** Colour behind the word, so that it reads on any ground. */
  halo: string
  align?: CanvasTextAlign
  baseline?: CanvasTextBaseline
}

/** Width of the halo around each stroke [px]. */
const HALO = 2

/**
 * Writes a word with a halo.
 *
 * @param context - drawn into; its settings are left as they were
 * @param text - one line
 * @param x - where its alignment says [px]
 * @param y - where its baseline says [px]
 * @param style - how
 */
export function drawHaloText(
  context: CanvasRenderingContext2D,
  text: string,
  x: number,
  y: number,
  style: TextStyle,
): void {
  context.save()
  context.font = style.font
  context.textAlign = style.align ?? 'center'
  context.textBaseline = style.baseline ?? 'middle'
  context.lineJoin = 'round'
  context.lineWidth = 2 * HALO
  context.strokeStyle = style.halo
  context.strokeText(text, x, y)
  context.fillStyle = style.ink
  context.fillText(text, x, y)
  context.restore()
}
