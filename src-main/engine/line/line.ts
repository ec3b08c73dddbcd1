import type { PointLoad, Rig, Section } from '../../contract/rig'

/**
 * One stretch of one section, cut into cells of one common travel time. A section is one span,
 * or several where point loads cut it. Positions 0..cells are the cell boundaries, the first and
 * the last being the span's own faces.
 */
export interface Span {
  /** Index of the bar in the rig. */
  bar: number
  /** Index of the section in its bar. */
  section: number
  source: Section
  /** Ends along the line [m]; bars stand face to face, gaps take no length. */
  from: number
  to: number
  /** The part of the section it covers, 0..1. */
  sFrom: number
  sTo: number
  cells: number
  /** True where impedance and area are the same all along. */
  uniform: boolean
  /** Bar wave speed c = sqrt(E/rho) [m/s]. */
  speed: number
  /** Z = rho c A at each cell's middle, shape (cells) [kg/s]. */
  impedance: Float64Array
  /** A at each position, the faces being those of this span, shape (cells + 1) [m^2]. */
  area: Float64Array
}

/** What stands at the left of span i (node i), or at the right of the last span. */
export interface LineNode {
  kind: 'left-end' | 'step' | 'joint' | 'right-end'
  /** Along the line [m]. */
  x: number
  /** Index into the rig's joints; -1 where it is none. */
  joint: number
  /** Forces of the surroundings at this node. */
  loads: PointLoad[]
}

/** A rig cut into cells for a time march. */
export interface Line {
  rig: Rig
  /** Time step, the travel time of every cell [s]. */
  dt: number
  /** Steps that cover the duration; states are known at 0..steps. */
  steps: number
  /** [m] */
  length: number
  bars: {
    name: string
    /** [m] */
    from: number
    to: number
    /** Exact mass [kg]. */
    mass: number
    /** Exact travel time [s]. */
    travelTime: number
    firstSpan: number
    lastSpan: number
  }[]
  spans: Span[]
  /** One more than spans. */
  nodes: LineNode[]
  /** (cells dt - tau) / tau of each section, in order. */
  rounding: { bar: number; section: number; error: number }[]
}

/** Place of position p of a span along the line [m]. */
export function evaluatePlace(span: Span, p: number): number {
  return p === span.cells ? span.to : span.from + ((span.to - span.from) * p) / span.cells
}
