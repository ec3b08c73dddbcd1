import { evaluateCosine } from './evaluateCosine'
import { evaluateSineShare } from './evaluateSineShare'
import type { TransferMatrix } from './transferMatrix'

/**
 * The exact matrix of an exponential stretch, A = A1 exp(2 g x/L), from u = exp(-g x/L) exp(+-i K x),
 * K^2 = k^2 - (g/L)^2; under the cut-off kL = |g| nothing oscillates in it.
 *
 * Source: Elmore and Heald, Physics of Waves, ch. 4 (the horn); derived anew and checked.
 *
 * @param Z impedance at the left face [kg/s]
 * @param g half the logarithm of the area ratio, ln(A2/A1)/2 [1]
 * @param phase kL = w (travel time), positive [rad]
 * @returns its transfer matrix
 */
export function evaluateExponentialMatrix(Z: number, g: number, phase: number): TransferMatrix {
  const square = phase * phase - g * g
  const C = evaluateCosine(square)
  const S = evaluateSineShare(square)
  const growth = Math.exp(g)
  return {
    a: growth * (C - g * S),
    b: Z * phase * growth * S,
    c: (phase * S) / (Z * growth),
    d: (C + g * S) / growth,
  }
}
