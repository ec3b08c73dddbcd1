import type { Section } from '../../contract/rig'
import { evaluateInitial } from '../line/evaluateInitial'
import type { Line, Span } from '../line/line'
import { elementKernel } from './elementKernel'
import { makeElementMaterial } from './elementMaterial'
import { makeGeneralStepper } from './makeGeneralStepper'
import { makeKernelStepper } from './makeKernelStepper'
import type { NodeLoad, PieceStepper } from './piece'

/** A bar cut into elements, before its ends are given to the laws. */
export interface PieceDraft {
  bar: number
  first: number
  last: number
  firstSpan: number
  spanStart: number[]
  nodeMass: Float64Array
  loads: NodeLoad[]
  stepper: PieceStepper
}

/** Elements of one bar, shape (elements) each. */
interface Elements {
  section: Section[]
  length: Float64Array
  area: Float64Array
  density: Float64Array
  modulus: Float64Array
  /** rho nu^2 Ip / h [kg] */
  lateral: Float64Array
}

/**
 * Cuts each bar of a line into elements, one per cell, with its initial state in the kernel: lumped
 * masses `rho A h`, half at each node, area and polar moment at the element's middle.
 *
 * @param line the line of the run with elements
 * @param makeLoads the loads at a node of the line, by its position in the bar
 */
export function makePieces(
  line: Line,
  makeLoads: (node: number, position: number) => NodeLoad[],
): PieceDraft[] {
  let first = 0
  return line.bars.map(({ firstSpan, lastSpan }, bar) => {
    const spans = line.spans.slice(firstSpan, lastSpan + 1)
    const spanStart = [0]
    for (const span of spans) spanStart.push(spanStart[spanStart.length - 1] + span.cells)
    const count = spanStart[spans.length]
    const elements = cutElements(spans, count)
    const nodeMass = new Float64Array(count + 1)
    for (let i = 0; i < count; i++) {
      const half = (elements.density[i] * elements.area[i] * elements.length[i]) / 2
      nodeMass[i] += half
      nodeMass[i + 1] += half
    }
    const loads = spans.slice(1).flatMap((_, i) => makeLoads(firstSpan + i + 1, spanStart[i + 1]))
    fillKernel(line, bar, first, spanStart, elements, nodeMass)
    const draft = { bar, first, last: first + count, firstSpan, spanStart, nodeMass, loads }
    first += count + 1
    return { ...draft, stepper: makeStepper(line, draft, elements) }
  })
}

function cutElements(spans: readonly Span[], count: number): Elements {
  const elements: Elements = {
    section: [],
    length: new Float64Array(count),
    area: new Float64Array(count),
    density: new Float64Array(count),
    modulus: new Float64Array(count),
    lateral: new Float64Array(count),
  }
  for (const span of spans) {
    const { material, shape } = span.source
    const h = (span.to - span.from) / span.cells
    for (let p = 0; p < span.cells; p++) {
      const i = elements.section.push(span.source) - 1
      const s = span.sFrom + ((span.sTo - span.sFrom) * (p + 0.5)) / span.cells
      elements.length[i] = h
      elements.area[i] = span.impedance[p] / Math.sqrt(material.modulus * material.density)
      elements.density[i] = material.density
      elements.modulus[i] = material.modulus
      const [D, d] = [shape.diameter(s), shape.bore(s)]
      const polar = (Math.PI * (D ** 4 - d ** 4)) / 32
      elements.lateral[i] = (material.density * (material.poisson ?? 0) ** 2 * polar) / h
    }
  }
  return elements
}

/** Puts a bar's stiffness, masses, yield and initial state into the kernel. */
function fillKernel(
  line: Line,
  bar: number,
  first: number,
  spanStart: number[],
  elements: Elements,
  nodeMass: Float64Array,
): void {
  const { v, F, K, Y, R, P } = elementKernel
  const { dt } = line
  const { firstSpan, lastSpan } = line.bars[bar]
  for (let i = 0; i < elements.length.length; i++) {
    const one = makeElementMaterial(elements.section[i].material)
    const { [i]: A } = elements.area
    K[first + i] = (dt * elements.modulus[i] * A) / elements.length[i]
    R[first + i] = one.yield * A
    P[first + i] = (dt * one.plasticModulus * A) / elements.length[i]
  }
  nodeMass.forEach((mass, j) => (Y[first + j] = dt / mass))
  for (let span = firstSpan; span <= lastSpan; span++) {
    const start = spanStart[span - firstSpan]
    for (let p = 0; p <= line.spans[span].cells; p++) {
      const here = evaluateInitial(line, span, p)
      v[first + start + p] = here.velocity
      if (p === 0) continue
      const before = evaluateInitial(line, span, p - 1)
      F[first + start + p - 1] = (before.force + here.force) / 2
    }
  }
}

function makeStepper(line: Line, draft: Omit<PieceDraft, 'stepper'>, elements: Elements): PieceStepper {
  const { run } = line.rig
  const material = elements.section.map((section) => makeElementMaterial(section.material))
  const { first, last, nodeMass, loads } = draft
  const general =
    run.finiteStrain || run.lateralInertia || run.bulkViscosity || material.some((one) => one.viscosity > 0)
  // The kernel hardens a whole piece in one way; the general stepper each element in its own.
  const plastic = material.filter((one) => one.yield < Infinity)
  const mixed = plastic.some((one) => one.kinematic !== plastic[0].kinematic)
  if (general || mixed) {
    return makeGeneralStepper({
      first,
      last,
      nodeMass,
      lateral: run.lateralInertia ? elements.lateral : null,
      loads,
      dt: line.dt,
      length: elements.length,
      area: elements.area,
      density: elements.density,
      material,
      finiteStrain: run.finiteStrain,
      bulkViscosity: run.bulkViscosity,
    })
  }
  const hardening = plastic.length === 0 ? null : plastic[0].kinematic ? 'kinematic' : 'isotropic'
  return makeKernelStepper({ first, last, nodeMass, loads, dt: line.dt, hardening })
}
