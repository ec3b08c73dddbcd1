import type { Section } from '../../contract/rig'
import { evaluateInitial } from '../line/evaluateInitial'
import type { Line, Span } from '../line/line'
import type { Beat } from '../laws/side'
import { elementKernel } from './elementKernel'
import { makeElementMaterial } from './elementMaterial'
import { makeEndNode } from './makeEndNode'
import { makeGeneralStepper } from './makeGeneralStepper'
import { makeKernelStepper } from './makeKernelStepper'
import { makeStepFaces } from './makeStepFaces'
import type { NodeLoad, Piece, Stepper } from './piece'

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
 * @param makeLoads the loads at a node of the line, whose slot is given
 */
export function makePieces(
  line: Line,
  beat: Beat,
  makeLoads: (node: number, slot: number) => NodeLoad[],
): Piece[] {
  let first = 0
  return line.bars.map(({ firstSpan, lastSpan }, bar) => {
    const spans = line.spans.slice(firstSpan, lastSpan + 1)
    const spanStart = [0]
    for (const span of spans) spanStart.push(spanStart[spanStart.length - 1] + span.cells)
    const count = spanStart[spans.length]
    const elements = cutElements(spans, count)
    const elementMass = elements.density.map((rho, i) => rho * elements.area[i] * elements.length[i])
    const start = first
    const loads = spans.slice(1).flatMap((_, i) => makeLoads(firstSpan + i + 1, start + spanStart[i + 1]))
    fillKernel(line, bar, start, spanStart, elements, elementMass)
    first += count + 1
    const stepper = makeStepper(line, start, elements, elementMass, loads)
    return {
      bar,
      first: start,
      last: start + count,
      firstSpan,
      spanStart,
      mass: elementMass.reduce((sum, m) => sum + m, 0),
      stepper,
      left: makeEndNode(start, stepper, 'left', beat, line.steps),
      right: makeEndNode(start + count, stepper, 'right', beat, line.steps),
      faces: spanStart
        .slice(1, -1)
        .map((j) => makeStepFaces(start + j, elementMass[j - 1] / 2, elementMass[j] / 2, loads)),
      probes: [],
      strains: [],
      loads,
    }
  })
}

/** Mass of each node of a row of elements: half of each element beside it [kg]. */
function lumpMass(elementMass: Float64Array): Float64Array {
  const mass = new Float64Array(elementMass.length + 1)
  elementMass.forEach((m, i) => {
    mass[i] += m / 2
    mass[i + 1] += m / 2
  })
  return mass
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
  elementMass: Float64Array,
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
  lumpMass(elementMass).forEach((mass, j) => (Y[first + j] = dt / mass))
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

function makeStepper(
  line: Line,
  first: number,
  elements: Elements,
  elementMass: Float64Array,
  loads: NodeLoad[],
): Stepper {
  const { run } = line.rig
  const last = first + elementMass.length
  const nodeMass = lumpMass(elementMass)
  const material = elements.section.map((section) => makeElementMaterial(section.material))
  // The kernel hardens a whole piece in one way; the general stepper each element in its own.
  const plastic = material.filter((one) => one.yield < Infinity)
  const mixed = plastic.some((one) => one.kinematic !== plastic[0].kinematic)
  const viscous = material.some((one) => one.viscosity > 0)
  if (run.finiteStrain || run.lateralInertia || run.bulkViscosity || viscous || mixed) {
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
