import type { SectionShape } from '../../../contract/rig'

export type AreaLaw = 'uniform' | 'cone' | 'exponential' | 'other'

/** Places where a law is tried, none of them a round fraction that a drawing would use. */
const PLACES = [0.07, 0.19, 0.31, 0.43, 0.57, 0.69, 0.81, 0.93]
const TOLERANCE = 1e-10

/**
 * The law that the area of a section follows, told from the area itself, so that a tube with a conical
 * bore or a formula is taken for what it is.
 *
 * @param shape the section's shape
 * @returns `cone` where sqrt(A) is linear in s, `exponential` where ln A is, each to 1e-10 of the area
 */
export function findAreaLaw(shape: SectionShape): AreaLaw {
  if (shape.uniform) return 'uniform'
  const first = shape.area(0)
  const last = shape.area(1)
  const fits = (law: (s: number) => number) =>
    PLACES.every((s) => Math.abs(shape.area(s) - law(s)) <= TOLERANCE * Math.max(first, last))
  if (fits(() => first)) return 'uniform'
  if (fits((s) => (Math.sqrt(first) * (1 - s) + Math.sqrt(last) * s) ** 2)) return 'cone'
  if (fits((s) => first * (last / first) ** s)) return 'exponential'
  return 'other'
}
