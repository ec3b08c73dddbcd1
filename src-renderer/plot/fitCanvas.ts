/**
 * Gives a canvas the size of its place at the screen's resolution, clears it, and makes one unit of the
 * context one pixel of the page.
 *
 * @param canvas - drawn on
 * @param width - of its place [px]
 * @param height - of its place [px]
 * @param ratio - pixels of the screen in one of the page
 * @returns the context
 */
export function fitCanvas(
  canvas: HTMLCanvasElement,
  width: number,
  height: number,
  ratio: number,
): CanvasRenderingContext2D {
  const columns = Math.round(width * ratio)
  const rows = Math.round(height * ratio)
  if (canvas.width !== columns || canvas.height !== rows) {
    canvas.width = columns
    canvas.height = rows
  }
  const context = canvas.getContext('2d')
  if (!context) throw new Error('fitCanvas: the page gives no drawing context')
  context.setTransform(ratio, 0, 0, ratio, 0, 0)
  context.clearRect(0, 0, width, height)
  return context
}
