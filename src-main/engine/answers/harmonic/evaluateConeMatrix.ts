import type { TransferMatrix } from './transferMatrix'

/**
 * The exact matrix of a cone, A ~ x^2 with x from the apex, from u = [F(x - ct) + G(x + ct)]/x.
 *
 * Holds for a solid cone, and for any shape whose area goes with the square of a linear function.
 * Source: E. Eisner, J. Acoust. Soc. Am. 36 (1964) 309 (from memory); derived anew and checked.
 *
 * @param Z impedance at the left face [kg/s]
 * @param ratio width at the right face over that at the left, not 1 [1]
 * @param phase kL = w (travel time), positive [rad]
 * @returns its transfer matrix
 */
export function evaluateConeMatrix(Z: number, ratio: number, phase: number): TransferMatrix {
  // Lengths in units of L: the apex lies x1 = 1/(ratio - 1) left of the left face, right of it where negative.
  const x1 = 1 / (ratio - 1)
  const x2 = x1 + 1
  const C = Math.cos(phase)
  const S = Math.sin(phase)
  return {
    a: (x2 * C - S / phase) / x1,
    b: (Z / (x1 * x1)) * ((x1 * x2 + 1 / (phase * phase)) * S - C / phase),
    c: (S * x1) / (Z * x2),
    d: (x1 * C + S / phase) / x2,
  }
}
