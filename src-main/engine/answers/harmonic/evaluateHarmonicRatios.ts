import type { TransferMatrix } from './transferMatrix'

/** Magnitudes of the harmonic force ratios and the share of the energy that passes, all [1]. */
export interface HarmonicRatios {
  reflectedForce: number
  transmittedForce: number
  transmittedEnergy: number
}

/**
 * What a lossless stretch between two long uniform bars does to a harmonic wave from the left.
 *
 *     F_T/F_I = 2/[d + a Zl/Zr + i (b/Zr + c Zl)]
 *     F_R/F_I = [d - a Zl/Zr + i (b/Zr - c Zl)] / [d + a Zl/Zr + i (b/Zr + c Zl)]
 *     E_T = |F_T/F_I|^2 Zl/Zr = 1 - |F_R/F_I|^2
 *
 * From F = f + g, v = (g - f)/Z on both sides and nothing arriving from the right.
 *
 * @param matrix the stretch
 * @param left impedance of the bar on the left, Zl [kg/s]
 * @param right impedance of the bar on the right, Zr [kg/s]
 */
export function evaluateHarmonicRatios(matrix: TransferMatrix, left: number, right: number): HarmonicRatios {
  const { a, b, c, d } = matrix
  const through = Math.hypot(d + (a * left) / right, b / right + c * left)
  const back = Math.hypot(d - (a * left) / right, b / right - c * left)
  const T = 2 / through
  return { reflectedForce: back / through, transmittedForce: T, transmittedEnergy: (T * T * left) / right }
}
