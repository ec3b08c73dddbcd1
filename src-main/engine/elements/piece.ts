import type { Outside } from '../laws/outside'
import type { Side } from '../laws/side'

/** The history of an inner node, shape (steps + 1) each. */
export interface NodeProbe {
  position: number
  /** [N] */
  force: Float64Array
  /** Working velocity in the falling frame [m/s] */
  velocity: Float64Array
}

/** A force of the surroundings at an inner node. */
export interface NodeLoad {
  position: number
  force: (k: number) => number
  outside: Outside
  /** Velocity of the node before the step under way [m/s]. */
  before: number
}

/** One end node of a piece: its side for the law beside it, what the law found, and its history. */
export interface EndNode {
  side: Side
  /** Velocity that the law found for the step under way [m/s]. */
  next: number
  /** Shape (steps + 1) [N]. */
  force: Float64Array
  /** Working velocity in the falling frame, shape (steps + 1) [m/s]. */
  velocity: Float64Array
}

/** One step as the laws at a piece's ends have closed it. */
export interface PieceStep {
  k: number
  /** Share of dt that its forces work. */
  share: number
  /** New velocities of the end nodes [m/s] and forces on them, tension positive [N]. */
  vLeft: number
  vRight: number
  forceLeft: number
  forceRight: number
  /** True where energies and forces will be asked for after it. */
  keep: boolean
}

/** How a piece takes a step: forces inside first, then, once the laws have closed its ends, motion. */
export interface PieceStepper {
  /** Finds what the forces inside and the loads do at step k; `share` of a step is 1/2 at k = 0. */
  prepare(k: number, share: number): void
  /** Velocity change of an end node by the forces inside, after `prepare` [m/s]. */
  readonly kickLeft: number
  readonly kickRight: number
  /** dv/dF of an end node over a whole step [s/kg]. */
  readonly admittanceLeft: number
  readonly admittanceRight: number
  /** Moves nodes and elements on; the laws have found the ends' velocities and forces. */
  finish(step: PieceStep): void
  /** Force at an inner node at the step under way, between `prepare` and `finish` [N]. */
  nodeForce(position: number): number
  /** The same after a `finish` that was asked to keep it. */
  keptForce(position: number): number
  /** [J] at the half step on, the frame's velocity added [m/s]. */
  kinetic(frame: number): number
  /** [J] at the half step on, or at the start before any step. */
  strain(start: boolean): number
  /** Plastic work and damping so far [J]. */
  dissipated(): number
}

/** The elements of one bar between its two end nodes. */
export interface Piece {
  /** Its bar in the rig. */
  bar: number
  /** Slot of its first node in the kernel, and of its last. */
  first: number
  last: number
  firstSpan: number
  /** Node of each of its spans' left faces, counted from its first, and its last node. */
  spanStart: number[]
  /** Mass of each node [kg], shape (last - first + 1). */
  nodeMass: Float64Array
  stepper: PieceStepper
  left: EndNode
  right: EndNode
  probes: NodeProbe[]
  loads: NodeLoad[]
}
