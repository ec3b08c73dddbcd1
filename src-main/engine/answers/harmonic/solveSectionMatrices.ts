import type { Section } from '../../../contract/rig'
import { evaluateChain } from './evaluateChain'
import { evaluateConeMatrix } from './evaluateConeMatrix'
import { evaluateExponentialMatrix } from './evaluateExponentialMatrix'
import { evaluateUniformMatrix } from './evaluateUniformMatrix'
import { findAreaLaw } from './findAreaLaw'
import type { TransferMatrix } from './transferMatrix'

const FIRST_PIECES = 32
const MOST_PIECES = 4096
const TOLERANCE = 1e-7

/**
 * The matrices of one section at several frequencies: exact for uniform, conical and exponential ones.
 *
 * Any other profile is cut into exponential pieces through its own areas, twice as many each time, until
 * no entry (forces taken as F, velocities as Z v of the left face) changes by more than 1e-7 or there are
 * 4096; the error falls with the square of the piece.
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
    case 'other': {
      let coarse = evaluatePieces(section, phases, perArea, FIRST_PIECES)
      for (let pieces = 2 * FIRST_PIECES; ; pieces *= 2) {
        const fine = evaluatePieces(section, phases, perArea, pieces)
        const change = Math.max(...fine.map((matrix, i) => evaluateChange(matrix, coarse[i], Z)))
        if (change <= TOLERANCE || pieces >= MOST_PIECES) return fine
        coarse = fine
      }
    }
  }
}

function evaluatePieces(
  section: Section,
  phases: number[],
  perArea: number,
  pieces: number,
): TransferMatrix[] {
  const areas = Array.from({ length: pieces + 1 }, (_, i) => section.shape.area(i / pieces))
  return phases.map((phase) => {
    let whole: TransferMatrix = { a: 1, b: 0, c: 0, d: 1 }
    for (let i = 0; i < pieces; i++) {
      const g = Math.log(areas[i + 1] / areas[i]) / 2
      whole = evaluateChain(whole, evaluateExponentialMatrix(perArea * areas[i], g, phase / pieces))
    }
    return whole
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
