/** How an area is hatched. */
export interface Hatch {
  /** Between lines, measured square to them [px]. */
  gap: number
  /** Width of a line [px]. */
  width: number
  colour: string
  /** Rising to the right like `/`, or falling like `\`. */
  lean: 'rising' | 'falling'
}

/** An area in pixels. */
export interface Area {
  left: number
  top: number
  right: number
  bottom: number
}

/**
 * Lists the lines that hatch an area at 45 degrees. Lines lie on one grid over the whole drawing, so that
 * hatched areas side by side join.
 *
 * @param area - hatched [px]
 * @param gap - between lines, measured square to them [px]
 * @param lean - rising like `/`, or falling like `\`
 * @returns ends of each line, cut to the area [px]
 */
export function listHatchLines(
  { left, top, right, bottom }: Area,
  gap: number,
  lean: Hatch['lean'],
): [x1: number, y1: number, x2: number, y2: number][] {
  if (!(right > left) || !(bottom > top)) return []
  const step = gap * Math.SQRT2
  const lines: [number, number, number, number][] = []
  if (lean === 'rising') {
    // x + y = s
    for (let s = Math.ceil((left + top) / step) * step; s < right + bottom; s += step) {
      const x1 = Math.max(left, s - bottom)
      const x2 = Math.min(right, s - top)
      if (x2 > x1) lines.push([x1, s - x1, x2, s - x2])
    }
    return lines
  }
  // x - y = s
  for (let s = Math.ceil((left - bottom) / step) * step; s < right - top; s += step) {
    const x1 = Math.max(left, s + top)
    const x2 = Math.min(right, s + bottom)
    if (x2 > x1) lines.push([x1, x1 - s, x2, x2 - s])
  }
  return lines
}

/**
 * Hatches an area.
 *
 * @param context - drawn into; its settings are left as they were
 * @param area - hatched [px]
 * @param hatch - how
 */
export function drawHatch(context: CanvasRenderingContext2D, area: Area, hatch: Hatch): void {
  context.save()
  context.strokeStyle = hatch.colour
  context.lineWidth = hatch.width
  context.beginPath()
  for (const [x1, y1, x2, y2] of listHatchLines(area, hatch.gap, hatch.lean)) {
    context.moveTo(x1, y1)
    context.lineTo(x2, y2)
  }
  context.stroke()
  context.restore()
}

/**
 * How much of a pixel of a picture a line of the hatching covers, on the same grid as the lines above.
 *
 * @param x - column [px]
 * @param y - row [px]
 * @param gap - between lines, measured square to them [px]
 * @param width - of a line [px]
 * @param lean - rising like `/`, or falling like `\`
 * @returns 0..1
 */
export function evaluateHatchCover(
  x: number,
  y: number,
  gap: number,
  width: number,
  lean: Hatch['lean'],
): number {
  const step = gap * Math.SQRT2
  const s = lean === 'rising' ? x + y + 1 : x - y
  const rest = s - Math.round(s / step) * step
  return Math.min(1, Math.max(0, width / 2 + 0.5 - Math.abs(rest) / Math.SQRT2))
}
