import { drawFigure, type Figure } from './figure'
import { saveFile } from './saveFile'
import { startChart } from './startChart'
import { writeSvg } from './writeSvg'

/** Pixels of a saved picture per pixel of the page. */
const SHARPNESS = 3

/**
 * Saves a picture as it is shown.
 *
 * @param figure - what it shows
 * @param name - of the file, without its ending
 * @param form - as an image, or as a drawing whose text stays text
 */
export async function saveFigure(figure: Figure, name: string, form: 'png' | 'svg'): Promise<void> {
  const canvas = document.createElement('canvas')
  const context = canvas.getContext('2d')
  if (!context) throw new Error('This browser gives no canvas to draw on.')
  if (form === 'svg') {
    const measure = (text: string, font: string): number => {
      context.font = font
      return context.measureText(text).width
    }
    return saveFile(`${name}.svg`, new Blob([writeSvg(figure, measure)], { type: 'image/svg+xml' }))
  }
  canvas.width = figure.width * SHARPNESS
  canvas.height = figure.height * SHARPNESS
  context.scale(SHARPNESS, SHARPNESS)
  context.fillStyle = figure.inks.paper
  context.fillRect(0, 0, figure.width, figure.height)
  drawFigure(context, figure, ({ spec, left, top }) => {
    const own = document.createElement('canvas')
    const chart = startChart(own, { spec }, SHARPNESS)
    context.drawImage(own, left, top, spec.width, spec.height)
    chart.destroy()
  })
  const image = await new Promise<Blob | null>((resolve) => canvas.toBlob(resolve, 'image/png'))
  if (!image) throw new Error('The picture is too large for this browser.')
  saveFile(`${name}.png`, image)
}
