import type { Span } from '../../line/line'

/** What turns the force and the velocity at a place of a span into the quantities of the field. */
export interface SpanPlace {
  /** [m^2] */
  area: number
  /** Z = rho c A [kg/s] */
  impedance: number
  /** E [Pa] */
  modulus: number
}

export function makeSpanPlace({ source, area }: Span, position: number): SpanPlace {
  const { modulus, density } = source.material
  const A = area[position]
  return { area: A, impedance: Math.sqrt(modulus * density) * A, modulus }
}
