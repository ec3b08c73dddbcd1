import { solveBracket } from './solveBracket'

/**
 * Natural frequencies b = w L/c of a rod fixed at one end with a mass at the other, or free with a spring:
 * the roots of b tan b = r. Source: Blevins (1979) ch. 8 (from memory).
 *
 * @param r mass of the rod over the mass, m/M; or the spring over the rod, k L/(E A) [1]
 * @param count number of modes
 * @returns b in ascending order, shape (count) [1]
 */
export function solveFixedMassRod(r: number, count: number): number[] {
  return Array.from({ length: count }, (_, i) =>
    solveBracket((b) => b * Math.sin(b) - r * Math.cos(b), i * Math.PI, (i + 0.5) * Math.PI),
  )
}
