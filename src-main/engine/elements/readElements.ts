import type { Line } from '../line/line'
import type { MethodRun, SpanTrace } from '../march/methodRun'
import { WIDENING } from '../march/widening'
import { elementKernel } from './elementKernel'
import type { Piece } from './piece'

type Reader = Pick<
  MethodRun,
  | 'sumBar'
  | 'makeForceReader'
  | 'makeVelocityReader'
  | 'readWaves'
  | 'readExtremes'
  | 'addProbe'
  | 'readTrace'
  | 'readNode'
  | 'listFragments'
>

/**
 * Makes what the records read of a run with elements.
 *
 * @param enter brings the run's arrays into the kernel
 */
export function makeElementReader(line: Line, pieces: readonly Piece[], enter: () => void): Reader {
  const lastSpan = line.spans.length

  /** Where a position of a span lies: its piece, its node and its slot. */
  function seat(span: number, position: number) {
    const piece = pieces[line.spans[span].bar]
    const node = piece.spanStart[span - piece.firstSpan] + position
    return { piece, node, slot: piece.first + node }
  }

  return {
    sumBar(bar, k, frame) {
      enter()
      const { stepper, mass } = pieces[bar]
      return {
        kinetic: stepper.kinetic(frame),
        strain: stepper.strain(k < 0),
        dissipated: stepper.dissipated(),
        momentum: stepper.momentum(),
        mass,
      }
    },
    makeForceReader(places) {
      const seats = places.map(({ span, position }) => seat(span, position))
      return (k, row) =>
        seats.forEach(({ piece, slot }, i) => {
          if (slot === piece.first) row[i] = piece.left.force[k]
          else if (slot === piece.last) row[i] = piece.right.force[k]
          else row[i] = piece.stepper.keptForce(slot)
        })
    },
    makeVelocityReader(places) {
      const slots = Int32Array.from(places, ({ span, position }) => seat(span, position).slot)
      return (_, row) => {
        enter()
        const { v } = elementKernel
        for (let i = 0; i < slots.length; i++) row[i] = v[slots[i]]
      }
    },
    readWaves: () => null,
    readExtremes(span) {
      enter()
      const { high, low, highStep, lowStep } = elementKernel
      const from = seat(span, 0).slot
      const to = from + line.spans[span].cells + 1
      return {
        high: high.slice(from, to).map((value) => value / WIDENING),
        low: low.slice(from, to).map((value) => value / WIDENING),
        highStep: highStep.slice(from, to),
        lowStep: lowStep.slice(from, to),
      }
    },
    addProbe(span, position) {
      const { piece, node } = seat(span, position)
      const inner = node > 0 && node < piece.last - piece.first
      if (!inner || piece.probes.some((probe) => probe.position === node)) return
      const count = line.steps + 1
      piece.probes.push({ position: node, force: new Float64Array(count), velocity: new Float64Array(count) })
    },
    readTrace(span, position): SpanTrace {
      const { piece, node } = seat(span, position)
      if (node === 0) return piece.left
      if (node === piece.last - piece.first) return piece.right
      return piece.probes.find((probe) => probe.position === node)!
    },
    readNode(node) {
      const joint = line.bars.some((bar) => bar.lastSpan + 1 === node)
      if (node !== 0 && !joint) return null
      const left = node === 0 ? pieces[0].left : pieces[line.spans[node - 1].bar].right
      const right = node === lastSpan ? left : pieces[line.spans[node].bar].left
      return {
        forceLeft: left.force,
        velocityLeft: left.velocity,
        forceRight: right.force,
        velocityRight: right.velocity,
      }
    },
    listFragments: () => [],
  }
}
