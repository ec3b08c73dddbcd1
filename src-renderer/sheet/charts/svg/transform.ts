/** A plane transform as a canvas has it: `x' = a x + c y + e`, `y' = b x + d y + f`. */
export type Transform = readonly [a: number, b: number, c: number, d: number, e: number, f: number]

export const IDENTITY: Transform = [1, 0, 0, 1, 0, 0]

/**
 * Puts one transform after another, `p' = outer (inner p)`.
 *
 * @param outer - applied last
 * @param inner - applied first
 * @returns both in one
 */
export function combine(outer: Transform, inner: Transform): Transform {
  const [a, b, c, d, e, f] = outer
  const [A, B, C, D, E, F] = inner
  return [a * A + c * B, b * A + d * B, a * C + c * D, b * C + d * D, a * E + c * F + e, b * E + d * F + f]
}

/**
 * Moves a point.
 *
 * @param by - the transform
 * @param x - [px]
 * @param y - [px]
 * @returns the moved point [px]
 */
export function apply([a, b, c, d, e, f]: Transform, x: number, y: number): [x: number, y: number] {
  return [a * x + c * y + e, b * x + d * y + f]
}

/**
 * How much longer a length becomes; the transforms of a drawing scale both ways alike.
 *
 * @param by - the transform
 * @returns the square root of its area factor
 */
export function evaluateGrowth([a, b, c, d]: Transform): number {
  return Math.sqrt(Math.abs(a * d - b * c))
}
