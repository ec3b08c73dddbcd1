import type { NodeTrace } from '../march/methodRun'

export type { NodeTrace }

/** Largest forces at every position of every span; the positions of span i start at `start[i]`. */
export interface ForceEnvelope {
  /** First position of each span, and the total count at the end: shape (spans + 1). */
  start: Int32Array
  /** Largest tension, zero or positive [N]. */
  tension: Float64Array
  /** Step at which it is first reached. */
  tensionStep: Int32Array
  /** Largest compression, zero or negative [N]. */
  compression: Float64Array
  compressionStep: Int32Array
}

/** What passes a place of a bar at every step, shape (steps + 1) each. */
export interface PlaceTrace {
  /** Place along the line [m]. */
  x: number
  /** Area [m^2], impedance [kg/s] and modulus [Pa] there. */
  area: number
  impedance: number
  modulus: number
  poisson: number | null
  /** [N] */
  force: Float64Array
  /** du/dx; F/(E A) where the bar is linear. */
  strain: Float64Array
  /** [m/s] */
  velocity: Float64Array
  /** Directional waves f = (F - Z v)/2 and g = (F + Z v)/2 [N]. */
  rightgoing: Float64Array
  leftgoing: Float64Array
}

/** Stored, dissipated and supplied energy at the sampled steps [J]. */
export interface EnergyLedger {
  step: Int32Array
  kinetic: Float64Array
  strain: Float64Array
  dissipated: Float64Array
  work: Float64Array
  /** Largest imbalance over the largest energy at play; 0 where nothing moves. */
  closure: number
  /** Largest imbalance of momentum over the largest momentum or impulse at play. */
  momentumClosure: number
}

/** Stress at sampled steps and positions. */
export interface FieldRecord {
  step: Int32Array
  /** [m] */
  x: Float64Array
  /** A row per step [Pa]. */
  stress: Float64Array[]
}

/** State of a bar at the end of the run. */
export interface BarRecord {
  /** [kg m/s] */
  momentum: number
  /** Mass of its cells, sum of Z dt [kg]. */
  mass: number
  /** [J] */
  kinetic: number
  strain: number
}

/** All that a finished run has recorded; the answers are made from it. */
export interface RunRecord {
  envelope: ForceEnvelope
  /** The trace at a node: joints, ends and loaded nodes; null at a plain step inside a bar. */
  node(index: number): NodeTrace | null
  /** In the order of the rig's gauges. */
  gauges: PlaceTrace[]
  energy: EnergyLedger
  field: FieldRecord
  bars: BarRecord[]
  /** Energy each joint took and did not give back, in the order of the rig's joints [J]. */
  jointLoss: number[]
  ends: { left: EndRecord; right: EndRecord }
}

export interface EndRecord {
  /** Impulse of the surroundings on the bar, positive to the right [N s]. */
  impulse: number
  /** Work of the surroundings on the bar [J]. */
  work: number
  /** Velocity of the body that stands there, after the run, in the frame of the ground [m/s]; null without a mass. */
  bodyVelocity: number | null
}
