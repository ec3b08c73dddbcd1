import type { PageGauge } from '../../../src-main/contract/bridge'
import { formatQuantity } from '../../format/formatQuantity'
import { drawHaloText } from '../../plot/haloText'
import { drawHatch } from '../../plot/hatching'
import { findFrom } from '../../plot/thinTrace'
import type { FrameSpec, Plot } from '../charts/frameSpec'
import { writeFont, type Inks } from '../charts/inks'
import { listColourStops } from './colourStops'
import { writeDuration } from './describeWindow'
import { findPulseWindow, listPassing, type PulseWindow } from './pulseWindow'
import { thinPoints } from './thinPoints'
import { makeDimension, makeLine, makeTraceSpec, type TraceFrame } from './traceFrame'
import type { TraceQuantity } from './traceQuantity'

/** Width of the bars along the edges while a wave passes [px]. */
const BAR = 3
/** Where the dimension line of the window stands, as a share of the half that the pulse leaves free. */
const BESIDE = 0.74

/**
 * Describes the chart of a gauge: its trace filled by value, the first pulse's window as a dimension line
 * in time, its overlap hatched, bars at the edges while waves pass rightward (left edge) and leftward.
 *
 * @param gauge - of the run, SI
 * @param quantity - which of its traces
 * @param limit - end of the axis, the same for all gauges, SI
 * @param frame - shared by all traces
 * @param width - of the plot [px]
 * @param frozen - the same gauge of a run laid under; null for none
 */
export function makeGaugeSpec(
  gauge: PageGauge,
  quantity: TraceQuantity,
  limit: number,
  frame: TraceFrame,
  width: number,
  frozen: PageGauge | null,
): FrameSpec {
  const { fromT, toT, height, inks, units } = frame
  const spec = makeTraceSpec(frame, width, [-limit, limit], quantity, 4)
  const points = thinPoints(gauge.t, gauge[quantity], frame)
  const pixels = height / (toT - fromT)

  spec.curves.push({ points, colour: inks.ink, width: 1.5 })
  if (frozen) {
    const under = thinPoints(frozen.t, frozen[quantity], frame)
    spec.curves.push({ points: under, colour: inks.unit, width: 1, dash: [4, 2] })
  }
  const colour = listColourStops(points, fromT, toT, inks.map, limit)
  spec.curves.push({ points, colour: 'transparent', width: 0, fill: { to: 'zero', colour } })
  spec.annotations.push(makeLine({ x: 0 }, inks))

  const window = findPulseWindow(gauge.pulses)
  let peak: { value: number; words: string } | null = null
  if (window) {
    const value = findPeak(gauge, quantity, window)
    const { text, unit } = formatQuantity(value, quantity, units, { digits: 3 })
    peak = { value, words: `${text} ${unit}` }
  }
  if (window && peak && window.until !== null && window.until > window.from) {
    const x = -Math.sign(peak.value || -1) * BESIDE * limit
    const { from, until } = window
    for (const at of [from, until]) {
      spec.annotations.push(makeLine({ y: at, from: Math.min(0, x * 1.2), to: Math.max(0, x * 1.2) }, inks))
    }
    spec.annotations.push(
      makeDimension(x, from, until, writeDuration(until - from), (until - from) * pixels, inks),
    )
  }

  spec.below = (plot) => drawOverlap(plot, window, inks)
  spec.above = (plot) => {
    for (const direction of ['right', 'left'] as const) {
      drawPassing(plot, listPassing(gauge.pulses, direction, 1 / pixels), direction, inks)
    }
    if (window && peak) drawPeak(plot, window, peak, inks)
  }
  return spec
}

/** The value of largest magnitude while the first pulse passes alone, or at all where it is never alone. */
function findPeak(gauge: PageGauge, quantity: TraceQuantity, { from, to, until }: PulseWindow): number {
  const alone = until !== null && until > from ? Math.min(to, until) : to
  const values = gauge[quantity]
  let peak = 0
  for (let i = findFrom(gauge.t, from); i < findFrom(gauge.t, alone); i++) {
    if (Math.abs(values[i]) > Math.abs(peak)) peak = values[i]
  }
  return peak
}

function drawOverlap({ context, y, area }: Plot, window: PulseWindow | null, inks: Inks): void {
  if (!window || window.until === null || window.until >= window.to) return
  const top = Math.max(area.top, y.at(window.to))
  const bottom = Math.min(area.bottom, y.at(window.until))
  drawHatch(context, { ...area, top, bottom }, { gap: 5, width: 1, colour: inks.ink, lean: 'rising' })
}

function drawPassing(
  { context, y, area }: Plot,
  passing: { from: number; to: number }[],
  direction: 'right' | 'left',
  inks: Inks,
): void {
  context.fillStyle = inks.unit
  for (const { from, to } of passing) {
    const top = Math.max(area.top, y.at(to))
    const bottom = Math.min(area.bottom, y.at(from))
    if (bottom > top)
      context.fillRect(direction === 'right' ? area.left : area.right - BAR, top, BAR, bottom - top)
  }
}

/** Writes the peak of the first pulse under where it comes, or over it where there is no room below. */
function drawPeak(
  { context, x, y, area }: Plot,
  { from }: PulseWindow,
  { value, words }: { value: number; words: string },
  inks: Inks,
): void {
  const at = y.at(from)
  if (at < area.top || at > area.bottom) return
  const half = inks.size / 2
  const below = at + half + 4
  const font = writeFont(inks.size, 600)
  context.font = font
  const width = context.measureText(words).width
  // On the side that the pulse leaves free, but within the plot.
  const left =
    value < 0 ? Math.min(x.at(0) + 6, area.right - width - 6) : Math.max(x.at(0) - 6 - width, area.left + 6)
  drawHaloText(context, words, left, below + half > area.bottom ? at - half - 3 : below, {
    font,
    ink: inks.ink,
    halo: inks.paper,
    align: 'left',
  })
}
