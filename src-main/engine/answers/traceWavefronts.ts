import type { Wavefront } from '../../contract/result'
import type { Line } from '../line/line'
import type { RunRecord } from '../records/record'
import { evaluateForceless } from './evaluateForceless'
import { makeFrontNode } from './fronts/frontNode'
import { listClosings } from './fronts/listClosings'
import { listFrontSources, type FrontSource } from './fronts/listFrontSources'
import { makeFrontTrace, type FrontTrace } from './fronts/makeFrontTrace'
import { makeGate, type Gate } from './fronts/makeGate'

/**
 * The lines that sudden fronts draw in the x-t diagram, from every start through every step and joint.
 *
 * Starts are impacts, releases, gaps that close, and what ends and loads prescribe (its jumps, or its
 * onset where it is smooth). Fronts of one start that meet at a node are one from there on. At a contact
 * the recorded force says whether it is closed. A front runs through a taper as one line, its force
 * changed by sqrt(Z2/Z1), and is `spread` from there on, since a tail follows it; a taper sends no front back.
 *
 * @param line the cut line
 * @param record of the run; its envelope and the traces of its joints and ends
 * @param options threshold: fronts under this share of the first of their start, and starts under this
 *   share of the largest, are dropped (0.02). most: lines drawn at most, the earliest ones (4000)
 * @returns the lines in order of their start time; the force is that at their far end over that of the
 *   first front of their start
 */
export function traceWavefronts(
  line: Line,
  record: Pick<RunRecord, 'node' | 'envelope'>,
  options: { threshold?: number; most?: number } = {},
): Wavefront[] {
  const { threshold = 0.02, most = 4000 } = options
  const nodes = line.nodes.map((_, i) => makeFrontNode(line, i))
  const forceless = evaluateForceless(record.envelope)
  const gates = nodes.map((node, i) => makeGate(node, node.canOpen ? record.node(i) : null, forceless))
  const sources = nodes.map((node, i) => listFrontSources(line, i, node))
  const largest = Math.max(0, ...sources.flat().map(evaluateSize))
  const trace = makeFrontTrace(line, nodes, gates, { threshold, most })
  for (const own of sources) {
    if (own.length === 0 || evaluateSize(own[0]) <= threshold * largest) continue
    const start = trace.addStart(evaluateFirst(own[0]))
    for (const source of own) trace.emit(start, source)
  }
  addClosings(trace, line, gates, forceless)
  for (let step = 0; step < line.steps && trace.fronts.length < most; step++) trace.advance(step)
  return trace.fronts
}

function evaluateSize({ left, right }: FrontSource): number {
  return Math.max(Math.abs(left), Math.abs(right))
}

function evaluateFirst({ left, right }: FrontSource): number {
  return Math.abs(left) > Math.abs(right) ? left : right
}

/** A gap that closes where no front arrives at that time is a start of its own. */
function addClosings(trace: FrontTrace, line: Line, gates: Gate[], forceless: number): void {
  gates.forEach((gate, node) => {
    if (gate.force === null) return
    for (const { step, force } of listClosings(gate.force, forceless))
      trace.addClosing(step, {
        step,
        node,
        left: node > 0 ? force : 0,
        right: node < line.spans.length ? force : 0,
      })
  })
}
