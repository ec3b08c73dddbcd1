import type { AnnotationOptions } from 'chartjs-plugin-annotation'
import type { LinearScale } from '../../plot/linearScale'
import type { Inks } from './inks'

/** A numbered mark of an axis. */
export interface Mark {
  at: number
  text: string
  strong?: boolean
}

/** One axis of a chart, SI. */
export interface Axis {
  from: number
  to: number
  marks: Mark[]
  /** Where lines cross the plot. */
  grid: number[]
}

/** A line of a chart, as points `[x, y]` in the units of its axes. */
export interface Curve {
  points: readonly (readonly [x: number, y: number])[]
  colour: string
  width: number
  dash?: number[]
  /** Fills between the curve and zero, or the curve before it, in one colour or one for each place along the axes. */
  fill?: { to: 'zero' | 'before'; colour: string | ColourStops }
}

/** Colours along one axis, by share of the plot from its left or its top. */
export interface ColourStops {
  along: 'x' | 'y'
  stops: { share: number; colour: string }[]
}

/** What a mark that charts do not know is drawn with: both axes in pixels of the canvas, and the plot's area. */
export interface Plot {
  context: CanvasRenderingContext2D
  x: LinearScale
  y: LinearScale
  area: { left: number; top: number; right: number; bottom: number }
}

/** One chart to the pixel: the plot is exactly the canvas less its margins. */
export interface FrameSpec {
  width: number
  height: number
  /** Between the plot and the edges of the canvas [px]; left holds the marks of y, bottom those of x. */
  pads: { left: number; top: number; right: number; bottom: number }
  /** True where time, or another cause, runs upward and the value goes across. */
  upright: boolean
  x: Axis
  y: Axis
  curves: Curve[]
  annotations: AnnotationOptions[]
  /** Draws under and over the curves. */
  below: (plot: Plot) => void
  above: (plot: Plot) => void
  inks: Inks
}
