import type { Outside } from '../laws/outside'
import type { Beat, Body, NodeLaw } from '../laws/side'
import type { Line } from '../line/line'
import type { Method } from './march'

/** Energy and momentum in a stretch of bar between two steps. */
export interface Stock {
  /** [J] */
  kinetic: number
  strain: number
  /** Energy its material has taken and will not give back [J]. */
  dissipated: number
  /** In the falling frame [kg m/s]. */
  momentum: number
  /** [kg] */
  mass: number
}

/** Largest and smallest force at each position of a span, with the steps, shape (cells + 1) each. */
export interface SpanExtremes {
  high: Float64Array
  low: Float64Array
  highStep: Int32Array
  lowStep: Int32Array
}

/** Force [N] and velocity in the falling frame [m/s] at a position over the run, shape (steps + 1). */
export interface SpanTrace {
  force: Float64Array
  velocity: Float64Array
  /** Strain there, du/dx; left out where it is F/(E A). */
  strain?: Float64Array
}

/** The motion and the force on both sides of a node at every step, shape (steps + 1) each. */
export interface NodeTrace {
  /** [N] tension positive */
  forceLeft: Float64Array
  forceRight: Float64Array
  /** What the law passes from left to right [N]: its impulse counts. With elements that yield it stops the end node too. */
  reaction: Float64Array
  /** [m/s] */
  velocityLeft: Float64Array
  velocityRight: Float64Array
}

/** A place where a bar came apart. */
export interface Break {
  bar: number
  /** Along the line [m]. */
  x: number
  /** The smaller of the areas that meet there [m^2]. */
  area: number
  /** Tension that opened it [N]. */
  force: number
  /** Step in which it opened. */
  k: number
}

/** A piece of a bar between its ends and its breaks. */
export interface Fragment {
  bar: number
  /** Along the line [m]. */
  from: number
  to: number
  /** [kg] */
  mass: number
  /** In the falling frame [kg m/s]. */
  momentum: number
}

/**
 * The waves in a uniform span over the whole run: at position p (0..cells) and step k,
 * `f = right[k - p + cells]` and `g = left[k + p]`, shape (cells + steps + 1) each [N].
 */
export interface SpanWaves {
  right: Float64Array
  left: Float64Array
}

/** A position of a span. */
export interface SpanPlace {
  span: number
  position: number
}

/** A line under way by either method, as the records read it. */
export interface MethodRun extends Method {
  line: Line
  beat: Beat
  /** Laws by the line's node; nodes without a law of their own are not in it. Breaks count from -1 down. */
  laws: Map<number, NodeLaw>
  /** Rigid bodies that move with the line. */
  bodies: Body[]
  outside: { left: Outside; right: Outside; loads: Outside[] }

  /**
   * Sums a bar after step k (k = -1: before the first). Steps other than the latest only where the
   * method keeps them.
   *
   * @param frame velocity of the falling frame [m/s]
   */
  sumBar(bar: number, k: number, frame: number): Stock
  /**
   * Makes a reader of the force at chosen positions after the latest step k [N]: it fills `row`, of the
   * shape of `places`.
   */
  makeForceReader(places: readonly SpanPlace[]): (k: number, row: Float64Array) => void
  /**
   * Reads the force [N] and the velocity in the falling frame [m/s] at every position of a span after the
   * latest step k, shape (cells + 1) each; by elements the velocity is that of half a step later. Only for
   * a span whose waves the method does not keep. Where a bar came apart they are those of the right-hand face.
   */
  readMotion(span: number, k: number, force: Float64Array, velocity: Float64Array): void
  /** The waves of a span that the method keeps over the whole run; null where it keeps the latest step only. */
  readWaves(span: number): SpanWaves | null
  readExtremes(span: number): SpanExtremes
  /** Asks for the history of a position; call before the first step. */
  addProbe(span: number, position: number): void
  /** The history of a position that was asked for, or of a face. */
  readTrace(span: number, position: number): SpanTrace
  /** Where bars came apart so far, in order of time. */
  breaks: readonly Break[]
  /** The pieces of the bars that came apart, from left to right, after the latest step. */
  listFragments(): Fragment[]
  /** Both sides of a node that has a law over the run, falling frame; null for other nodes. */
  readNode(node: number): NodeTrace | null
}
