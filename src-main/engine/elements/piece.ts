import type { Outside } from '../laws/outside'
import type { Side } from '../laws/side'

/** The history of an inner node, or of one face of a node where sections meet, shape (steps + 1) each. */
export interface NodeProbe {
  /** Node of the piece. */
  position: number
  /** Null for a node inside a section. */
  face: FaceForce | null
  /** [N] */
  force: Float64Array
  /** Working velocity in the falling frame [m/s] */
  velocity: Float64Array
}

/** Watches the strain of the one or two elements of a section beside a node. */
export interface StrainProbe {
  /** Node of the piece, and the span it is seen from. */
  position: number
  span: number
  /** Slots of the nodes between which it is taken, and their distance [m]. */
  from: number
  to: number
  length: number
  /** Strain after the latest step. */
  now: number
  /** Shape (steps + 1). */
  strain: Float64Array
}

/** A force of the surroundings at an inner node. */
export interface NodeLoad {
  /** Slot of the node. */
  slot: number
  force: (k: number) => number
  outside: Outside
  /** Velocity of the node before the step under way [m/s]. */
  before: number
}

/** Force on one face of a node at the latest step, and its extremes so far [N]. */
export interface FaceForce {
  force: number
  high: number
  low: number
  highStep: number
  lowStep: number
}

/** An inner node where sections meet, or where a load acts. */
export interface StepFaces {
  slot: number
  left: FaceForce
  right: FaceForce
  /** Takes the forces of the elements before and after the node at step k [N]. */
  take(k: number, before: number, after: number): void
}

/** One end node: its side for the law beside it, what the law found, and its history. */
export interface EndNode {
  side: Side
  /** Velocity found for the step under way, or the initial one [m/s]. */
  velocityNow: number
  /** Force of the law on the node, shape (steps + 1) [N]. */
  force: Float64Array
  /**
   * Force on the bar's face, shape (steps + 1) [N]: that of the law where the bar is linear. Where it is
   * not, the force of the element beside the node; the law's also stops the node's own mass, at rho c v
   * however soft the bar has become.
   */
  face: Float64Array
  /** Working velocity in the falling frame, shape (steps + 1) [m/s]. */
  velocity: Float64Array
}

/** One step as the laws at both ends have closed it. */
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
export interface Stepper {
  /** True where every element is linear. */
  readonly linear: boolean
  /** Finds what the forces inside and the loads do at step k; `share` of a step is 1/2 at k = 0. */
  prepare(k: number, share: number): void
  /** Velocity change of an end node by the forces inside, after `prepare` [m/s]. */
  readonly kickLeft: number
  readonly kickRight: number
  /** dv/dF of an end node over a whole step [s/kg]. */
  readonly admittanceLeft: number
  readonly admittanceRight: number
  /** Moves nodes and elements on. */
  finish(step: PieceStep): void
  /** Force of the element at a slot at the step under way, between `prepare` and `finish` [N]. */
  elementForce(slot: number): number
  /** Force at a node inside a section at that step, the mean of the elements beside it [N]. */
  nodeForce(slot: number): number
  /** The same after a `finish` that was asked to keep it. */
  keptForce(slot: number): number
  /** [J] at the half step on, the frame's velocity added [m/s]. */
  kinetic(frame: number): number
  /** [J] at the half step on, or at the start before any step. */
  strain(start: boolean): number
  /** In the falling frame [kg m/s]. */
  momentum(): number
  /** Plastic work and damping up to the half step on [J]. */
  dissipated(): number
}

/** The elements of one bar. */
export interface Piece {
  /** Its bar in the rig. */
  bar: number
  /** Slots of its first and last node in the kernel. */
  first: number
  last: number
  firstSpan: number
  /** Node of each of its spans' left faces, counted from its first, and its last node. */
  spanStart: number[]
  /** [kg] */
  mass: number
  stepper: Stepper
  left: EndNode
  right: EndNode
  /** At each face between its spans. */
  faces: StepFaces[]
  probes: NodeProbe[]
  strains: StrainProbe[]
  loads: NodeLoad[]
}
