import type { FieldScales } from './fieldScales'

/** A painted picture of the field and the part of the run that it shows. */
export interface PaintedPicture {
  image: HTMLCanvasElement
  /** [m] [s] */
  fromX: number
  toX: number
  fromT: number
  toT: number
}

/**
 * Draws the field's picture where its part of the run now is: stretched while a newer one is on its way.
 *
 * @param context - drawn into
 * @param picture - with the latest row on top
 * @param scales - of the field
 */
export function drawPicture(
  context: CanvasRenderingContext2D,
  { image, fromX, toX, fromT, toT }: PaintedPicture,
  { x, t }: FieldScales,
): void {
  const [left, top] = [x.at(fromX), t.at(toT)]
  const [width, height] = [x.at(toX) - left, t.at(fromT) - top]
  context.save()
  context.imageSmoothingEnabled = false
  context.drawImage(image, left, top, width, height)
  context.restore()
}
