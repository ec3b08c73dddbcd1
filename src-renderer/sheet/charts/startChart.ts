import { Chart, Filler, LinearScale, LineController, LineElement, PointElement } from 'chart.js'
import annotation from 'chartjs-plugin-annotation'
import type { FrameSpec } from './frameSpec'
import { makeFrameConfig } from './makeFrameConfig'

Chart.register(LineController, LineElement, PointElement, LinearScale, Filler, annotation)

export type RunningChart = Chart<'line', { x: number; y: number }[]>

/**
 * Draws a chart.
 *
 * @param canvas - drawn on; it takes the chart's size
 * @param shown - the chart
 * @param pixelRatio - pixels of the screen per pixel of the page
 * @returns the chart, to be destroyed by its owner
 */
export function startChart(
  canvas: HTMLCanvasElement,
  shown: { spec: FrameSpec },
  pixelRatio: number,
): RunningChart {
  canvas.width = shown.spec.width
  canvas.height = shown.spec.height
  return new Chart(canvas, makeFrameConfig(shown, pixelRatio))
}
