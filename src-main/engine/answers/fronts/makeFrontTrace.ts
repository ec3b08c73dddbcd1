import type { Wavefront } from '../../../contract/result'
import { evaluatePlace, type Line } from '../../line/line'
import { evaluateFaces } from '../evaluateFaces'
import type { FrontNode } from './frontNode'
import type { FrontSource } from './listFrontSources'
import type { Gate } from './makeGate'

/** Fronts of one start at one node and step: what arrives from each side and what is sent off anew [N]. */
interface Meeting {
  start: number
  node: number
  fromLeft: number
  fromRight: number
  emitLeft: number
  emitRight: number
  spread: boolean
}

/** Fronts on their way, step by step. */
export interface FrontTrace {
  readonly fronts: Wavefront[]
  /** Begins a start whose first front has this force [N]; gives its index. */
  addStart(force: number): number
  /** Sends fronts off. */
  emit(start: number, source: FrontSource): void
  /** Sends fronts off as a start of their own, unless a front arrives at that node within a step of it. */
  addClosing(step: number, source: FrontSource): void
  /** Lets everything happen that happens at a step; call for each step in order. */
  advance(step: number): void
}

/**
 * Makes a trace of fronts. At a node with admittances Y the force changes by
 *
 *     dF = 2 (Y_left a_left + Y_right a_right)/(Y_left + Y_right + Y_joint)
 *
 * for fronts a arriving from both sides; dF - a goes back on each side. From a face with a mass a goes back.
 *
 * @param line the cut line
 * @param nodes what a front meets at each node
 * @param gates what each node lets through
 * @param limits share of the first front under which one is dropped, and number of lines
 */
export function makeFrontTrace(
  line: Line,
  nodes: FrontNode[],
  gates: Gate[],
  { threshold, most }: { threshold: number; most: number },
): FrontTrace {
  const { spans, dt, steps } = line
  const growth = spans.map((span) => {
    const { left, right } = evaluateFaces(span)
    return span.uniform ? 1 : Math.sqrt(right.impedance / left.impedance)
  })
  const fronts: Wavefront[] = []
  const firsts: number[] = []
  const pending = new Map<number, Meeting[]>()
  const closings = new Map<number, FrontSource[]>()
  const lastArrival = new Int32Array(nodes.length).fill(-2)

  function findMeeting(step: number, node: number, start: number): Meeting {
    const meetings = pending.get(step) ?? []
    pending.set(step, meetings)
    let meeting = meetings.find((each) => each.node === node && each.start === start)
    if (meeting === undefined) {
      meeting = { start, node, fromLeft: 0, fromRight: 0, emitLeft: 0, emitRight: 0, spread: false }
      meetings.push(meeting)
    }
    return meeting
  }

  function emit(start: number, { step, node, left, right }: FrontSource): void {
    const meeting = findMeeting(step, node, start)
    meeting.emitLeft += left
    meeting.emitRight += right
  }

  function addStart(force: number): number {
    firsts.push(force)
    return firsts.length - 1
  }

  /** Draws a front through the span beside a node and lets it arrive at the other end. */
  function send(
    step: number,
    { start, node, spread }: Meeting,
    direction: 'right' | 'left',
    force: number,
  ): void {
    const isRight = direction === 'right'
    const index = isRight ? node : node - 1
    const span = spans[index]
    if (span === undefined || Math.abs(force) < threshold * Math.abs(firsts[start])) return
    if (fronts.length >= most) return
    const taken = Math.min(span.cells, steps - step)
    const far = force * (isRight ? growth[index] : 1 / growth[index])
    const isSpread = spread || !span.uniform
    fronts.push({
      fromX: isRight ? span.from : span.to,
      fromT: step * dt,
      toX: evaluatePlace(span, isRight ? taken : span.cells - taken),
      toT: (step + taken) * dt,
      direction,
      force: far / firsts[start],
      spread: isSpread,
    })
    if (step + span.cells > steps) return
    const meeting = findMeeting(step + span.cells, isRight ? node + 1 : node - 1, start)
    meeting[isRight ? 'fromLeft' : 'fromRight'] += far
    meeting.spread ||= isSpread
  }

  function scatter(step: number, meeting: Meeting): void {
    const { left, right, joint, heavy } = nodes[meeting.node]
    const { fromLeft, fromRight } = meeting
    if (fromLeft !== 0 || fromRight !== 0) lastArrival[meeting.node] = step
    const bonded = (2 * (weigh(left, fromLeft) + weigh(right, fromRight))) / (left + right + joint)
    const change = gates[meeting.node].limit(step, bonded)
    send(step, meeting, 'left', (heavy ? fromLeft : change - fromLeft) + meeting.emitLeft)
    send(step, meeting, 'right', (heavy ? fromRight : change - fromRight) + meeting.emitRight)
  }

  function isArriving(node: number, step: number): boolean {
    const near = [step, step + 1].flatMap((at) => pending.get(at) ?? [])
    const arrives = near.some((each) => each.node === node && (each.fromLeft !== 0 || each.fromRight !== 0))
    return arrives || lastArrival[node] >= step - 1
  }

  return {
    fronts,
    addStart,
    emit,
    addClosing(step, source) {
      closings.set(step, [...(closings.get(step) ?? []), source])
    },
    advance(step) {
      for (const source of closings.get(step) ?? [])
        if (!isArriving(source.node, step)) emit(addStart(source.left || source.right), source)
      for (const meeting of pending.get(step) ?? []) scatter(step, meeting)
      pending.delete(step)
    },
  }
}

/** Y a, nothing where nothing arrives: an end that takes any speed sends nothing. */
function weigh(admittance: number, arriving: number): number {
  return arriving === 0 ? 0 : admittance * arriving
}
