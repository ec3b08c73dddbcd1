import { findRoots } from './findRoots'
import type { TaperedRodEnds } from './taperedRodEnds'

/**
 * Natural frequencies kL of a cone, A ~ x^2 from x1 to x2 = R x1:
 *
 *     free: tan kL = kL/(1 + k^2 x1 x2)   large end fixed: tan kL = -k x1   small end fixed: tan kL = k x2
 *
 * Source: S. Abrate, J. Sound Vib. 185 (1995) 703 (from memory).
 *
 * @param R ratio of the end radii, over 1 [1]
 * @param ends what is held
 * @param count number of modes
 * @returns kL in ascending order, shape (count) [1]
 */
export function solveConeRod(R: number, ends: TaperedRodEnds, count: number): number[] {
  const x1 = 1 / (R - 1)
  const x2 = R * x1
  const condition = {
    free: (k: number) => (1 + k * k * x1 * x2) * Math.sin(k) - k * Math.cos(k),
    'large-fixed': (k: number) => Math.sin(k) + k * x1 * Math.cos(k),
    'small-fixed': (k: number) => Math.sin(k) - k * x2 * Math.cos(k),
  }[ends]
  return findRoots(condition, 1e-3, 0.01, count)
}
