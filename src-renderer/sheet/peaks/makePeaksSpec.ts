import type { AnnotationOptions } from 'chartjs-plugin-annotation'
import type { PageResult } from '../../../src-main/contract/bridge'
import { UNITS, type UnitSystem } from '../../format/units'
import { findEntry, writeColour } from '../../plot/colour/colourMap'
import { thinTrace } from '../../plot/thinTrace'
import type { ColourStops, Curve, FrameSpec, Mark, Plot } from '../charts/frameSpec'
import { writeFont, type Inks } from '../charts/inks'
import { listMarks } from '../charts/listMarks'
import { findGoverningPeak, type GoverningPeak } from '../margin/governingPeak'
import { CHAIN, makeDimension, makeLine } from '../traces/traceFrame'
import { drawOver, drawSides, drawStems } from './drawBounds'
import { drawMargins } from './drawMargins'
import { findStressRange, listBounds, type Bound } from './listBounds'

/** What the peaks are drawn with, and where. */
export interface PeaksFrame {
  /** Of the plot [px]. */
  width: number
  height: number
  /** Room for words beside the plot [px]. */
  left: number
  right: number
  /** [m] */
  fromX: number
  toX: number
  /** Value of the last colour of the field [Pa]. */
  limit: number
  inks: Inks
  units: UnitSystem
}

/** Colours that the fill is mixed of. */
const SHADES = 48

/** Distance from an allowable within which the axis has no mark of its own [px]. */
const CLEAR = 13

/**
 * Describes the chart of the peaks: largest tension and compression along x on the field's scale, the
 * allowables of each section hatched on the forbidden side, and the margin of each section.
 *
 * @param result - of the run, SI
 * @param frozen - of a run laid under; null for none
 * @param frame - size, range and inks
 */
export function makePeaksSpec(result: PageResult, frozen: PageResult | null, frame: PeaksFrame): FrameSpec {
  const { width, height, left, right, fromX, toX, inks } = frame
  const [low, high] = findStressRange(result, frozen)
  const bounds = { tension: listBounds(result, 'tension'), compression: listBounds(result, 'compression') }
  const seen = [...bounds.tension, ...bounds.compression].filter(
    ({ from, to, stress }) => from < toX && to > fromX && stress > low && stress < high,
  )
  const governing = findGoverningPeak(result)
  const gradient = makeGradient(low, high, frame)
  const curves: Curve[] = []
  for (const sense of ['tension', 'compression'] as const) {
    curves.push({ points: listPoints(result, sense, frame), colour: inks.ink, width: 1.5 })
    if (frozen)
      curves.push({ points: listPoints(frozen, sense, frame), colour: inks.unit, width: 1, dash: [4, 2] })
  }
  for (const sense of ['tension', 'compression'] as const) {
    const points = listPoints(result, sense, frame)
    curves.push({ points, colour: 'transparent', width: 0, fill: { to: 'zero', colour: gradient } })
  }
  const edges = [...new Set(result.sections.flatMap(({ from, to }) => [from, to]))]
  return {
    width: left + width + right,
    height,
    pads: { left, right, top: 0, bottom: 0 },
    upright: false,
    x: { from: fromX, to: toX, marks: [], grid: edges.filter((x) => x > fromX && x < toX) },
    y: { from: low, to: high, marks: listStressMarks(low, high, seen, frame), grid: [] },
    curves,
    annotations: [
      makeLine({ y: 0 }, inks),
      ...seen.map(({ from, to, stress }) => makeLine({ y: stress, from, to }, inks, { width: 2 })),
      ...listGap(governing, seen, height / (high - low), inks),
      ...(governing
        ? [makeLine({ x: governing.at }, inks, { dash: CHAIN, width: governing.margin < 0 ? 2 : 1 })]
        : []),
    ],
    below: () => {},
    above: (plot) => {
      drawSides(plot, seen, inks)
      drawOver(plot, result, bounds, inks)
      drawStems(plot, result.sections, inks)
      drawMargins(plot, result, seen, inks)
      writeRightBounds(plot, seen, frame)
    },
    inks,
  }
}

/** At the right of the plot: allowables there that are not those at its left. */
function writeRightBounds(
  { context, y, area }: Plot,
  seen: Bound[],
  { fromX, toX, inks, units }: PeaksFrame,
): void {
  const atLeft = new Set(seen.filter(({ from }) => from <= fromX + 1e-9).map(({ stress }) => stress))
  context.font = writeFont(inks.size, 600)
  context.fillStyle = inks.ink
  context.textAlign = 'left'
  context.textBaseline = 'middle'
  for (const { to, stress } of seen) {
    if (to < toX - 1e-9 || atLeft.has(stress)) continue
    context.fillText(writeWhole(stress, units), area.right + 4, y.at(stress))
  }
}

/** The distance between the governing stress and its allowable, as a dimension line where it has room. */
function listGap(
  governing: GoverningPeak | null,
  seen: Bound[],
  pixels: number,
  inks: Inks,
): AnnotationOptions[] {
  if (!governing) return []
  const { local } = governing.peak
  const bound = seen.find(
    ({ from, to, stress }) =>
      stress * local > 0 && governing.row.from >= from - 1e-9 && governing.row.to <= to + 1e-9,
  )
  if (!bound) return []
  return [makeDimension(governing.at, local, bound.stress, '', Math.abs(bound.stress - local) * pixels, inks)]
}

function listPoints(
  { envelope }: PageResult,
  sense: 'tension' | 'compression',
  { fromX, toX, width }: PeaksFrame,
): [number, number][] {
  const kept = thinTrace(envelope.x, envelope[sense], fromX, toX, Math.max(1, Math.round(width)))
  return kept.map((i) => [envelope.x[i], envelope[sense][i]])
}

/** Colours of the field by stress, from the top of the plot down. */
function makeGradient(low: number, high: number, { limit, inks }: PeaksFrame): ColourStops {
  const stops = Array.from({ length: SHADES + 1 }, (_none, i) => {
    const share = i / SHADES
    const stress = high + (low - high) * share
    return { share, colour: writeColour(inks.map, findEntry(stress, limit)) }
  })
  return { along: 'y', stops }
}

/** Round numbers in light ink, and the allowables at the left edge in strong ink. */
function listStressMarks(
  low: number,
  high: number,
  seen: Bound[],
  { height, fromX, units }: PeaksFrame,
): Mark[] {
  const pixels = height / (high - low)
  const strong = seen
    .filter(({ from }) => from <= fromX + 1e-9)
    .map(({ stress }) => ({ at: stress, text: writeWhole(stress, units), strong: true }))
  const isClear = (at: number): boolean =>
    strong.every((mark) => Math.abs(mark.at - at) * pixels >= CLEAR) &&
    (high - at) * pixels >= CLEAR / 2 &&
    (at - low) * pixels >= CLEAR / 2
  const wanted = Math.max(2, Math.floor(height / 18))
  return [...listMarks(low, high, 'stress', units, wanted).filter(({ at }) => isClear(at)), ...strong]
}

function writeWhole(stress: number, units: UnitSystem): string {
  const value = stress / UNITS.stress[units].size
  const text = Math.abs(value) < 99.5 ? Math.abs(value).toFixed(1) : Math.abs(value).toFixed(0)
  return value < 0 ? `−${text}` : text
}
