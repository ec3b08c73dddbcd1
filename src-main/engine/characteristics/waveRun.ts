import type { Line } from '../line/line'
import type { Port } from '../laws/barSide'
import type { Outside } from '../laws/outside'
import type { Body, NodeLaw } from '../laws/side'
import type { Block } from './block'
import type { DelayEnvelope } from './delayEnvelope'
import type { DelayLine } from './delayLine'
import type { GradedState } from './gradedKernel'

/** The history of one inner position of a graded block, shape (steps + 1) each. */
export interface Probe {
  position: number
  /** [N] */
  force: Float64Array
  /** [m/s] in the falling frame */
  velocity: Float64Array
}

/** A block with its state: a delay line, or slots in the graded kernel. */
export interface LiveBlock extends Block {
  left: Port
  right: Port
  delay: { line: DelayLine; envelope: DelayEnvelope } | null
  /** Slot of its first cell in the graded kernel; -1 for a delay line. */
  slot: number
  probes: Probe[]
}

/** A node with a law of its own between two blocks, or at an end. */
export interface LiveNode {
  /** Index of the line's node. */
  index: number
  law: NodeLaw
  /** Blocks left and right of it; -1 outside the line. */
  leftBlock: number
  rightBlock: number
}

/** A line with its waves under way. */
export interface WaveRun {
  line: Line
  blocks: LiveBlock[]
  nodes: LiveNode[]
  /** Rigid bodies at the ends. */
  bodies: Body[]
  outside: { left: Outside; right: Outside; loads: Outside[] }
  graded: GradedState
}
