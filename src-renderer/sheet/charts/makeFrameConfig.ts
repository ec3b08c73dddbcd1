import type { ChartConfiguration, ChartDataset, Plugin, Scale, ScriptableContext } from 'chart.js'
import { makeLinearScale } from '../../plot/linearScale'
import type { Axis, ColourStops, Curve, FrameSpec, Plot } from './frameSpec'
import { FONT_FAMILY } from './inks'

type Point = { x: number; y: number }

/**
 * Turns a chart's description into what Chart.js takes. Nothing is left to its own layout: the plot is the
 * canvas less the margins that were asked for, so that axes agree with those of other views to the pixel.
 *
 * @param shown - the chart; its marks are drawn from what it holds at the time
 * @param pixelRatio - pixels of the screen per pixel of the page
 */
export function makeFrameConfig(
  shown: { spec: FrameSpec },
  pixelRatio: number,
): ChartConfiguration<'line', Point[]> {
  const { spec } = shown
  const { pads, upright } = spec
  return {
    type: 'line',
    data: { datasets: spec.curves.map((curve) => makeDataset(curve)) },
    options: {
      animation: false,
      responsive: false,
      maintainAspectRatio: false,
      devicePixelRatio: pixelRatio,
      events: [],
      parsing: false,
      normalized: true,
      indexAxis: upright ? 'y' : 'x',
      layout: { autoPadding: false, padding: { left: 0, bottom: 0, top: pads.top, right: pads.right } },
      scales: {
        x: makeScale(spec.x, spec, (scale) => (scale.height = pads.bottom)),
        y: makeScale(spec.y, spec, (scale) => (scale.width = pads.left)),
      },
      plugins: {
        legend: { display: false },
        tooltip: { enabled: false },
        annotation: { clip: true, annotations: spec.annotations },
      },
    },
    plugins: [makeMarks(shown)],
  }
}

/**
 * The plot of a chart in pixels of its canvas.
 *
 * @param spec - the chart
 * @param context - drawn into
 */
export function makePlot({ width, height, pads, x, y }: FrameSpec, context: CanvasRenderingContext2D): Plot {
  const area = { left: pads.left, top: pads.top, right: width - pads.right, bottom: height - pads.bottom }
  return {
    context,
    area,
    x: makeLinearScale(x.from, x.to, area.left, area.right),
    y: makeLinearScale(y.from, y.to, area.bottom, area.top),
  }
}

function makeScale({ from, to, marks, grid }: Axis, { inks }: FrameSpec, fit: (scale: Scale) => void) {
  const ruled = new Set(grid)
  const byValue = new Map(marks.map((mark) => [mark.at, mark]))
  const values = [...new Set([...grid, ...byValue.keys()])].sort((a, b) => a - b)
  const strong = (value: number): boolean => byValue.get(value)?.strong ?? false
  return {
    type: 'linear' as const,
    min: from,
    max: to,
    border: { display: false },
    grid: {
      drawTicks: false,
      lineWidth: 1,
      color: ({ tick }: { tick: { value: number } }) => (ruled.has(tick?.value) ? inks.grid : 'transparent'),
    },
    afterBuildTicks: (scale: Scale) => {
      scale.ticks = values.map((value) => ({ value }))
    },
    afterFit: (scale: Scale) => {
      fit(scale)
      scale.paddingLeft = scale.paddingRight = scale.paddingTop = scale.paddingBottom = 0
    },
    ticks: {
      display: marks.length > 0,
      autoSkip: false,
      minRotation: 0,
      maxRotation: 0,
      padding: 4,
      callback: (value: number | string) => byValue.get(Number(value))?.text ?? '',
      color: ({ tick }: { tick: { value: number } }) => (strong(tick?.value) ? inks.ink : inks.unit),
      font: ({ tick }: { tick: { value: number } }) => ({
        family: FONT_FAMILY,
        size: inks.size,
        weight: strong(tick?.value) ? (600 as const) : (400 as const),
      }),
    },
  }
}

function makeDataset({ points, colour, width, dash, fill }: Curve): ChartDataset<'line', Point[]> {
  return {
    data: points.map(([x, y]) => ({ x, y })),
    borderColor: colour,
    borderWidth: width,
    borderDash: dash ?? [],
    borderJoinStyle: 'round',
    pointRadius: 0,
    // Plain colours of their own, or a fill that is made for the plot would be asked for at every point.
    pointBackgroundColor: 'transparent',
    pointBorderColor: 'transparent',
    pointHitRadius: 0,
    tension: 0,
    fill: fill ? (fill.to === 'zero' ? 'origin' : '-1') : false,
    backgroundColor: fill ? makeFill(fill.colour) : 'transparent',
  }
}

function makeFill(colour: string | ColourStops) {
  if (typeof colour === 'string') return colour
  // Asked for each point of a line: one gradient serves as long as the plot stays where it is.
  let known: { place: string; gradient: CanvasGradient } | null = null
  return ({ chart }: ScriptableContext<'line'>) => {
    const { left, top, right, bottom } = chart.chartArea ?? { left: 0, top: 0, right: 1, bottom: 1 }
    const place = `${left} ${top} ${right} ${bottom}`
    if (known?.place === place) return known.gradient
    const gradient =
      colour.along === 'y'
        ? chart.ctx.createLinearGradient(0, top, 0, bottom)
        : chart.ctx.createLinearGradient(left, 0, right, 0)
    for (const { share, colour: at } of colour.stops) gradient.addColorStop(share, at)
    known = { place, gradient }
    return gradient
  }
}

/** What charts do not know, and the frame around the plot. */
function makeMarks(shown: { spec: FrameSpec }): Plugin<'line'> {
  return {
    id: 'marks',
    beforeDatasetsDraw: ({ ctx }) => inPlot(shown.spec, ctx, shown.spec.below),
    afterDatasetsDraw: ({ ctx }) => {
      const { spec } = shown
      inPlot(spec, ctx, spec.above)
      const { area } = makePlot(spec, ctx)
      ctx.save()
      ctx.strokeStyle = spec.inks.ink
      ctx.lineWidth = 1
      ctx.strokeRect(area.left + 0.5, area.top + 0.5, area.right - area.left - 1, area.bottom - area.top - 1)
      ctx.restore()
    },
  }
}

function inPlot(spec: FrameSpec, context: CanvasRenderingContext2D, draw: (plot: Plot) => void): void {
  context.save()
  draw(makePlot(spec, context))
  context.restore()
}
