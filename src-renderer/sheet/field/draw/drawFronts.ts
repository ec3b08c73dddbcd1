import type { FrontLine } from './listFrontLabels'

/** Strength from which a front is drawn with the full line. */
const STRONG = 0.6

/** Count of fronts above which all grow paler, so that the field shows between them. */
const MANY = 80

/**
 * Draws wavefronts: solid, dashed where they are spread; the weaker the paler.
 *
 * @param context - drawn into
 * @param lines - the strongest first
 * @param ink - colour of the lines
 */
export function drawFronts(
  context: CanvasRenderingContext2D,
  lines: readonly FrontLine[],
  ink: string,
): void {
  context.save()
  context.strokeStyle = ink
  const paleness = Math.max(0.5, Math.min(1, Math.sqrt(MANY / Math.max(1, lines.length))))
  for (const { x1, y1, x2, y2, force, spread } of [...lines].reverse()) {
    const strength = Math.min(1, Math.abs(force) / STRONG)
    context.globalAlpha = paleness * (0.16 + 0.79 * strength ** 1.5)
    context.lineWidth = 0.75 + 0.5 * strength * paleness
    context.setLineDash(spread ? [5, 3] : [])
    context.beginPath()
    context.moveTo(x1, y1)
    context.lineTo(x2, y2)
    context.stroke()
  }
  context.restore()
}
