import { evaluateInitial } from '../line/evaluateInitial'
import type { Line } from '../line/line'
import type { MethodRun, SpanTrace } from '../march/methodRun'
import { WIDENING } from '../march/widening'
import { elementKernel } from './elementKernel'
import type { FaceForce, Piece } from './piece'

type Reader = Pick<
  MethodRun,
  | 'sumBar'
  | 'makeForceReader'
  | 'readMotion'
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

  /** Where a position of a span lies: its piece, its node and its slot, and its face where spans meet. */
  function seat(span: number, position: number) {
    const { bar, cells } = line.spans[span]
    const piece = pieces[bar]
    const index = span - piece.firstSpan
    const node = piece.spanStart[index] + position
    let face: FaceForce | null = null
    if (position === 0 && index > 0) face = piece.faces[index - 1].right
    else if (position === cells && index < piece.faces.length) face = piece.faces[index].left
    return { piece, node, slot: piece.first + node, face }
  }

  /** Force at a seat after the latest step k, on the side of its span where two meet. */
  function readSeat({ piece, slot, face }: ReturnType<typeof seat>, k: number): number {
    if (face !== null) return face.force
    if (slot === piece.first) return piece.left.force[k]
    if (slot === piece.last) return piece.right.force[k]
    return piece.stepper.keptForce(slot)
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
        seats.forEach(({ piece, slot, face }, i) => {
          if (face !== null) row[i] = face.force
          else if (slot === piece.first) row[i] = piece.left.face[k]
          else if (slot === piece.last) row[i] = piece.right.face[k]
          else row[i] = piece.stepper.keptForce(slot)
        })
    },
    readMotion(span, k, force, velocity) {
      enter()
      const { v } = elementKernel
      const { cells } = line.spans[span]
      const { slot, piece } = seat(span, 0)
      const { stepper } = piece
      for (let p = 0; p <= cells; p++) velocity[p] = v[slot + p]
      for (let p = 1; p < cells; p++) force[p] = stepper.keptForce(slot + p)
      force[0] = readSeat(seat(span, 0), k)
      force[cells] = readSeat(seat(span, cells), k)
    },
    readWaves: () => null,
    readExtremes(span) {
      enter()
      const { cells } = line.spans[span]
      const from = seat(span, 0).slot
      const high = elementKernel.high.slice(from, from + cells + 1)
      const low = elementKernel.low.slice(from, from + cells + 1)
      const highStep = elementKernel.highStep.slice(from, from + cells + 1)
      const lowStep = elementKernel.lowStep.slice(from, from + cells + 1)
      for (const p of [0, cells]) {
        const { face } = seat(span, p)
        if (face === null) continue
        high[p] = face.high
        low[p] = face.low
        highStep[p] = face.highStep
        lowStep[p] = face.lowStep
      }
      const narrow = (value: number) => value / WIDENING
      return { high: high.map(narrow), low: low.map(narrow), highStep, lowStep }
    },
    addProbe(span, position) {
      const { piece, node, face } = seat(span, position)
      const inner = node > 0 && node < piece.last - piece.first
      watchStrain(line, piece, span, position)
      if (!inner || piece.probes.some((probe) => probe.position === node && probe.face === face)) return
      const count = line.steps + 1
      const [force, velocity] = [new Float64Array(count), new Float64Array(count)]
      piece.probes.push({ position: node, face, force, velocity })
    },
    readTrace(span, position): SpanTrace {
      const { piece, node, face } = seat(span, position)
      const strain = piece.strains.find((one) => one.position === node && one.span === span)?.strain
      if (node === 0) return { force: piece.left.face, velocity: piece.left.velocity, strain }
      if (node === piece.last - piece.first) {
        return { force: piece.right.face, velocity: piece.right.velocity, strain }
      }
      return { ...piece.probes.find((probe) => probe.position === node && probe.face === face)!, strain }
    },
    readNode(node) {
      const joint = line.bars.some((bar) => bar.lastSpan + 1 === node)
      if (node !== 0 && !joint) return null
      const left = node === 0 ? pieces[0].left : pieces[line.spans[node - 1].bar].right
      const right = node === lastSpan ? left : pieces[line.spans[node].bar].left
      return {
        forceLeft: left.face,
        velocityLeft: left.velocity,
        forceRight: right.face,
        velocityRight: right.velocity,
        reaction: left.force,
      }
    },
    listFragments: () => [],
  }
}

/** Watches the strain at a position of a span: the mean over the elements beside it in that span. */
function watchStrain(line: Line, piece: Piece, span: number, position: number): void {
  const { cells, from: start, to: end, source, area } = line.spans[span]
  const node = piece.spanStart[span - piece.firstSpan] + position
  if (piece.strains.some((one) => one.position === node && one.span === span)) return
  const [before, after] = [position > 0 ? 1 : 0, position < cells ? 1 : 0]
  const slot = piece.first + node
  const force = evaluateInitial(line, span, position).force
  piece.strains.push({
    position: node,
    span,
    from: slot - before,
    to: slot + after,
    length: ((before + after) * (end - start)) / cells,
    now: force / (source.material.modulus * area[position]),
    strain: new Float64Array(line.steps + 1),
  })
}
