import type { AnnotationOptions } from 'chartjs-plugin-annotation'
import type { UnitDimension, UnitSystem } from '../../format/units'
import { makeLinearScale } from '../../plot/linearScale'
import { keepWithin, listMarks } from '../charts/listMarks'
import type { Axis, FrameSpec } from '../charts/frameSpec'
import { FONT_FAMILY, type Inks } from '../charts/inks'

/** What all traces on the sheet share. */
export interface TraceFrame {
  /** Height of the plot, that of the field, and of the ruler below it [px]. */
  height: number
  foot: number
  /** Between plots [px]; half of it stands on both sides within each canvas. */
  gap: number
  /** [s] */
  fromT: number
  toT: number
  /** Where lines of time cross [s]. */
  times: number[]
  /** Moment of the governing margin [s]; null without one. */
  governing: number | null
  inks: Inks
  units: UnitSystem
}

/** Dashes of a chain line [px]. */
export const CHAIN = [12, 3, 2, 3]

/**
 * Makes the part of an upright chart that does not depend on what it shows.
 *
 * @param frame - shared by all traces
 * @param width - of the plot [px]
 * @param across - ends of the axis across, SI
 * @param dimension - what it measures
 * @param wanted - largest count of its marks
 */
export function makeTraceSpec(
  { height, foot, gap, fromT, toT, times, governing, inks, units }: TraceFrame,
  width: number,
  [from, to]: [number, number],
  dimension: UnitDimension,
  wanted: number,
): FrameSpec {
  const side = gap / 2
  const canvas = width + gap
  const { at } = makeLinearScale(from, to, side, side + width)
  const marks = keepWithin(listMarks(from, to, dimension, units, wanted), at, canvas, inks.size)
  const x: Axis = { from, to, marks, grid: marks.map((mark) => mark.at) }
  return {
    width: canvas,
    height: height + foot,
    pads: { left: side, right: side, top: 0, bottom: foot },
    upright: true,
    x,
    y: { from: fromT, to: toT, marks: [], grid: times },
    curves: [],
    annotations: governing === null ? [] : [makeLine({ y: governing }, inks, { dash: CHAIN })],
    below: () => {},
    above: () => {},
    inks,
  }
}

/**
 * A thin line across a plot, or along it, or between two places.
 *
 * @param place - its value on one axis, and the stretch on the other where it does not go all through
 * @param inks - of the drawing
 * @param style - dashes and weight
 */
export function makeLine(
  place: { x: number; from?: number; to?: number } | { y: number; from?: number; to?: number },
  inks: Inks,
  { dash = [], width = 1 }: { dash?: number[]; width?: number } = {},
): AnnotationOptions {
  const { from, to } = place
  const ends =
    'x' in place
      ? { xMin: place.x, xMax: place.x, yMin: from, yMax: to }
      : { yMin: place.y, yMax: place.y, xMin: from, xMax: to }
  return { type: 'line', ...ends, borderColor: inks.ink, borderWidth: width, borderDash: dash }
}

/** Room that words take along a dimension line: of each letter as a share of the type's size, and around them [px]. */
const LETTER = 0.47
const AROUND = 8

/**
 * A dimension line in time, with arrows at both ends and its words along it.
 *
 * @param x - where it stands on the axis across
 * @param from - [s]
 * @param to - [s]
 * @param words - such as `157 µs`
 * @param pixels - its length on the sheet [px]; the words are left out where they have no room
 * @param inks - of the drawing
 */
export function makeDimension(
  x: number,
  from: number,
  to: number,
  words: string,
  pixels: number,
  inks: Inks,
): AnnotationOptions {
  const arrow = {
    display: true,
    length: 7,
    width: 2.5,
    fill: true,
    backgroundColor: inks.ink,
    borderColor: inks.ink,
  }
  return {
    type: 'line',
    xMin: x,
    xMax: x,
    yMin: from,
    yMax: to,
    borderColor: inks.ink,
    borderWidth: 1,
    arrowHeads: pixels < 18 ? {} : { start: arrow, end: arrow },
    label: {
      display: words !== '' && pixels >= words.length * LETTER * inks.size + AROUND,
      content: words,
      rotation: -90,
      padding: 2,
      color: inks.ink,
      backgroundColor: inks.paper,
      font: { family: FONT_FAMILY, size: inks.size, weight: 600 },
    },
  }
}
