import type { TransferMatrix } from './transferMatrix'

/**
 * The matrix of a uniform stretch: F and Z v turn into each other by the phase kL (d'Alembert).
 *
 * @param Z impedance [kg/s]
 * @param phase kL = w (travel time) [rad]
 * @returns its transfer matrix
 */
export function evaluateUniformMatrix(Z: number, phase: number): TransferMatrix {
  const C = Math.cos(phase)
  const S = Math.sin(phase)
  return { a: C, b: Z * S, c: S / Z, d: C }
}
