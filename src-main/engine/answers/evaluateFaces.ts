import type { Span } from '../line/line'

/** One face of a span: its area [m^2] and impedance Z = A sqrt(E rho) [kg/s]. */
export interface Face {
  area: number
  impedance: number
}

/**
 * Area and impedance at the two faces of a span, Z = A sqrt(E rho) with the face's own area.
 *
 * In a taper the cells carry the impedance at their middles; what meets the next section is the face.
 *
 * @param span the span
 * @returns its left and right face
 */
export function evaluateFaces(span: Span): { left: Face; right: Face } {
  const { density, modulus } = span.source.material
  const perArea = Math.sqrt(density * modulus)
  const left = span.area[0]
  const right = span.area[span.cells]
  return {
    left: { area: left, impedance: perArea * left },
    right: { area: right, impedance: perArea * right },
  }
}
