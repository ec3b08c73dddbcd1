import type { Section } from '../../../contract/rig'
import { evaluateConeMatrix } from './evaluateConeMatrix'
import { evaluateCosine } from './evaluateCosine'
import { evaluateExponentialMatrix } from './evaluateExponentialMatrix'
import { evaluateSineShare } from './evaluateSineShare'
import { evaluateUniformMatrix } from './evaluateUniformMatrix'
import { findAreaLaw } from './findAreaLaw'
import type { TransferMatrix } from './transferMatrix'

const FIRST_PIECES = 64
const MOST_PIECES = 2048
const TOLERANCE = 1e-7

/**
 * The matrices of one section at several frequencies: exact for uniform, conical and exponential ones.
 *
 * Any other profile is cut into exponential pieces through its own areas, twice as many each time, their
 * second-order error taken off, until no entry (forces taken as F, velocities as Z v of the left face)
 * changes by more than 1e-7 or there are 2048 pieces, as where the profile jumps.
 *
 * @param section the section
 * @param phases kL = w (travel time of the section) at each frequency, positive [rad]
 * @returns a matrix per frequency
 */
export function solveSectionMatrices(section: Section, phases: number[]): TransferMatrix[] {
  const { shape, material } = section
  const perArea = Math.sqrt(material.density * material.modulus)
  const Z = perArea * shape.area(0)
  switch (findAreaLaw(shape)) {
    case 'uniform':
      return phases.map((phase) => evaluateUniformMatrix(Z, phase))
    case 'cone':
      return phases.map((phase) => evaluateConeMatrix(Z, Math.sqrt(shape.area(1) / shape.area(0)), phase))
    case 'exponential':
      return phases.map((phase) =>
        evaluateExponentialMatrix(Z, Math.log(shape.area(1) / shape.area(0)) / 2, phase),
      )
    case 'other':
      return solvePieces(section, phases, perArea)
  }
}

/** Halves the pieces, and takes what is left of their second-order error off two results in a row (Richardson). */
function solvePieces(section: Section, phases: number[], perArea: number): TransferMatrix[] {
  const Z = perArea * section.shape.area(0)
  let coarse = evaluatePieces(section, phases, perArea, FIRST_PIECES)
  let last = coarse
  for (let pieces = 2 * FIRST_PIECES; ; pieces *= 2) {
    const fine = evaluatePieces(section, phases, perArea, pieces)
    const better = fine.map((matrix, i) => extrapolate(matrix, coarse[i]))
    const change = Math.max(...better.map((matrix, i) => evaluateChange(matrix, last[i], Z)))
    if (change <= TOLERANCE || pieces >= MOST_PIECES) return better
    coarse = fine
    last = better
  }
}

function extrapolate(fine: TransferMatrix, coarse: TransferMatrix): TransferMatrix {
  const each = (key: keyof TransferMatrix) => fine[key] + (fine[key] - coarse[key]) / 3
  return { a: each('a'), b: each('b'), c: each('c'), d: each('d') }
}

function evaluatePieces(
  section: Section,
  phases: number[],
  perArea: number,
  pieces: number,
): TransferMatrix[] {
  const Z = Float64Array.from({ length: pieces + 1 }, (_, i) => perArea * section.shape.area(i / pieces))
  const g = Z.slice(1).map((after, i) => Math.log(after / Z[i]) / 2)
  const growth = g.map(Math.exp)
  return phases.map((whole) => {
    const phase = whole / pieces
    let [a, b, c, d] = [1, 0, 0, 1]
    for (let i = 0; i < pieces; i++) {
      // The matrix of `evaluateExponentialMatrix`, chained in place: this loop is most of a taper's time.
      const square = phase * phase - g[i] * g[i]
      const C = evaluateCosine(square)
      const S = evaluateSineShare(square)
      const pa = growth[i] * (C - g[i] * S)
      const pb = Z[i] * phase * growth[i] * S
      const pc = (phase * S) / (Z[i] * growth[i])
      const pd = (C + g[i] * S) / growth[i]
      const nextA = pa * a - pb * c
      const nextB = pa * b + pb * d
      const nextC = pc * a + pd * c
      d = pd * d - pc * b
      a = nextA
      b = nextB
      c = nextC
    }
    return { a, b, c, d }
  })
}

function evaluateChange(one: TransferMatrix, other: TransferMatrix, Z: number): number {
  return Math.max(
    Math.abs(one.a - other.a),
    Math.abs(one.b - other.b) / Z,
    Math.abs(one.c - other.c) * Z,
    Math.abs(one.d - other.d),
  )
}
