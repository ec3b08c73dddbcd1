import { BasicPlatform, Chart } from 'chart.js'
import type { FrameSpec } from './frameSpec'
import { makeFrameConfig } from './makeFrameConfig'
import './startChart'
import type { SvgContext } from './svg/svgContext'

/**
 * Draws a chart as it stands on the sheet into a picture of its own.
 *
 * @param picture - drawn into
 * @param spec - the chart
 * @param left - where the chart's canvas begins in the picture [px]
 * @param top - [px]
 */
export function drawChart(picture: SvgContext, spec: FrameSpec, left: number, top: number): void {
  picture.setOrigin(left, top)
  const canvas = { width: spec.width, height: spec.height, getContext: () => picture }
  picture.canvas = canvas
  const config = makeFrameConfig({ spec }, 1)
  for (const dataset of config.data.datasets) {
    // With a `segment` the line is stroked by plain calls, not by a Path2D that no picture can read.
    dataset.segment = {}
  }
  const chart = new Chart(canvas as unknown as HTMLCanvasElement, { ...config, platform: BasicPlatform })
  chart.destroy()
  picture.setOrigin(0, 0)
}
