import { solveBracket } from './solveBracket'

/**
 * Natural frequencies b = w L/c of a rod free at one end with a mass at the other, or fixed with a spring:
 * the roots of tan b = -b/r. Source: Blevins (1979) ch. 8 (from memory).
 *
 * @param r mass of the rod over the mass, m/M; or the spring over the rod, k L/(E A) [1]
 * @param count number of modes
 * @returns b in ascending order, shape (count) [1]
 */
export function solveFreeMassRod(r: number, count: number): number[] {
  return Array.from({ length: count }, (_, i) =>
    solveBracket((b) => r * Math.sin(b) + b * Math.cos(b), (i + 0.5) * Math.PI, (i + 1) * Math.PI),
  )
}
