import { drawChart } from './drawChart'
import { drawFigure, type Figure } from './figure'
import { SvgContext, type MeasureText } from './svg/svgContext'

/**
 * Writes a picture as SVG.
 *
 * @param figure - what it shows
 * @param measure - width of a text
 * @returns one SVG document, its text as text
 */
export function writeSvg(figure: Figure, measure: MeasureText): string {
  const picture = new SvgContext(figure.width, figure.height, measure)
  drawFigure(picture as unknown as CanvasRenderingContext2D, figure, ({ spec, left, top }) =>
    drawChart(picture, spec, left, top),
  )
  return picture.finish(figure.title, figure.inks.paper)
}
