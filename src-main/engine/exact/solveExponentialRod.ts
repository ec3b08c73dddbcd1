import { findRoots } from './findRoots'
import type { TaperedRodEnds } from './taperedRodEnds'

/**
 * Natural frequencies kL of an exponential rod, A = A1 exp(2 g x/L), g = ln(A2/A1)/2, K^2 = (kL)^2 - g^2:
 *
 *     free: K = n pi   small end fixed: tan K = K/g   large end fixed: tan K = -K/g
 *
 * The first root of the small end fixed has an imaginary K where g > 1: tanh K = K/g.
 * Source: S. Abrate, J. Sound Vib. 185 (1995) 703 (from memory).
 *
 * @param ratio A2/A1, over 1 [1]
 * @param ends what is held; free stands for fixed at both ends as well
 * @param count number of modes
 * @returns kL in ascending order, shape (count) [1]
 */
export function solveExponentialRod(ratio: number, ends: TaperedRodEnds, count: number): number[] {
  const g = Math.log(ratio) / 2
  const K = (k: number) => Math.sqrt(Math.abs(k * k - g * g))
  const cosine = (k: number) => (k >= g ? Math.cos(K(k)) : Math.cosh(K(k)))
  const sine = (k: number) => (K(k) < 1e-8 ? 1 : (k > g ? Math.sin(K(k)) : Math.sinh(K(k))) / K(k))
  const condition = {
    free: sine,
    'large-fixed': (k: number) => g * sine(k) + cosine(k),
    'small-fixed': (k: number) => g * sine(k) - cosine(k),
  }[ends]
  return findRoots(condition, 1e-3, 0.01, count)
}
