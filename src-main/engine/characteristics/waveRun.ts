import type { Line } from '../line/line'
import type { Port } from '../laws/barSide'
import type { Outside } from '../laws/outside'
import type { Beat, Body, NodeLaw } from '../laws/side'
import type { Block } from './block'
import type { DelayEnvelope } from './delayEnvelope'
import type { DelayLine } from './delayLine'
import type { HeldState } from '../march/makeHolder'
import type { Break } from '../march/methodRun'

/** The history of one inner position of a graded block, shape (steps + 1) each. */
export interface Probe {
  position: number
  /** [N] */
  force: Float64Array
  /** [m/s] in the falling frame */
  velocity: Float64Array
}

/** A block with its state: a delay line, or slots in the graded kernel. A class, so that all have one shape. */
export class LiveBlock implements Block {
  readonly kind: Block['kind']
  readonly bar: number
  readonly firstSpan: number
  readonly lastSpan: number
  readonly cells: number
  readonly spanStart: number[]
  readonly impedance: Float64Array
  readonly rightNode: number
  readonly probes: Probe[] = []
  /** Tension at which each position comes apart, shape (cells + 1) [N]; null where none does. */
  strength: Float64Array | null = null

  /**
   * @param slot of its first cell in the graded kernel; -1 for a delay line
   */
  constructor(
    block: Block,
    readonly left: Port,
    readonly right: Port,
    readonly slot: number,
    readonly delay: { line: DelayLine; envelope: DelayEnvelope } | null,
  ) {
    this.kind = block.kind
    this.bar = block.bar
    this.firstSpan = block.firstSpan
    this.lastSpan = block.lastSpan
    this.cells = block.cells
    this.spanStart = block.spanStart
    this.impedance = block.impedance
    this.rightNode = block.rightNode
  }
}

/** A part of a graded block that is marched in one go: the whole of it, or what lies between two breaks. */
export class Stretch {
  /** Slot of its first cell in the graded kernel. */
  readonly slot: number

  /**
   * @param start its first position in the block
   * @param opened steps in which its faces were opened; null for those that always were
   */
  constructor(
    readonly block: LiveBlock,
    readonly start: number,
    readonly cells: number,
    readonly left: Port,
    readonly right: Port,
    readonly opened: { left: number | null; right: number | null } = { left: null, right: null },
  ) {
    this.slot = block.slot + start
  }
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
  /** The nodes' laws by the line's node; breaks count from -1 down. */
  laws: Map<number, NodeLaw>
  /** Rigid bodies at the ends. */
  bodies: Body[]
  outside: { left: Outside; right: Outside; loads: Outside[] }
  graded: HeldState
  /** What is marched of the graded blocks, from left to right. */
  stretches: Stretch[]
  /** Where the line has come apart, in order of time. */
  breaks: Break[]
  beat: Beat
}
