/** A chain line: long, gap, short, gap. */
export const CHAIN = [12, 3, 2, 3]
export const DOTS = [1, 3]

/** How straight lines of a drawing are drawn. */
export interface LineStyle {
  colour: string
  width?: number
  dash?: readonly number[]
  alpha?: number
}

/**
 * Draws upright lines, each in the middle of a pixel so that it stays thin.
 *
 * @param context - drawn into
 * @param places - across [px]
 * @param top - upper end [px]
 * @param bottom - lower end [px]
 * @param style - how
 */
export function drawUprights(
  context: CanvasRenderingContext2D,
  places: readonly number[],
  top: number,
  bottom: number,
  style: LineStyle,
): void {
  drawLines(
    context,
    places.map((x) => [sharpen(x), top, sharpen(x), bottom]),
    style,
  )
}

/**
 * Draws level lines, each in the middle of a pixel so that it stays thin.
 *
 * @param context - drawn into
 * @param places - down [px]
 * @param left - left end [px]
 * @param right - right end [px]
 * @param style - how
 */
export function drawLevels(
  context: CanvasRenderingContext2D,
  places: readonly number[],
  left: number,
  right: number,
  style: LineStyle,
): void {
  drawLines(
    context,
    places.map((y) => [left, sharpen(y), right, sharpen(y)]),
    style,
  )
}

/** Middle of the pixel that a place falls in; the right and lower edge belong to the last one. */
function sharpen(place: number): number {
  return Math.ceil(place - 1e-6) - 0.5 < 0 ? 0.5 : Math.ceil(place - 1e-6) - 0.5
}

function drawLines(
  context: CanvasRenderingContext2D,
  lines: readonly (readonly number[])[],
  { colour, width = 1, dash = [], alpha = 1 }: LineStyle,
): void {
  context.save()
  context.strokeStyle = colour
  context.lineWidth = width
  context.globalAlpha = alpha
  context.setLineDash([...dash])
  context.beginPath()
  for (const [x1, y1, x2, y2] of lines) {
    context.moveTo(x1, y1)
    context.lineTo(x2, y2)
  }
  context.stroke()
  context.restore()
}
