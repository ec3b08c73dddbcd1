import type { Section } from '../../contract/rig'

const TOLERANCE = 1e-13
const DEEPEST = 30

/**
 * Integrates the area of a section along it: its volume (adaptive Simpson rule, to about 1e-13).
 *
 * @param section a checked section
 * @returns the volume [m^3]
 */
export function integrateArea(section: Section): number {
  const { shape, length } = section
  if (shape.uniform) return shape.area(0) * length
  const scale = (shape.area(0) + 4 * shape.area(0.5) + shape.area(1)) / 6
  let sum = 0
  const panels = 16
  for (let i = 0; i < panels; i++) {
    sum += integratePanel(shape.area, i / panels, (i + 1) / panels, scale * TOLERANCE, DEEPEST)
  }
  return sum * length
}

function integratePanel(
  area: (s: number) => number,
  from: number,
  to: number,
  tolerance: number,
  depth: number,
): number {
  const middle = (from + to) / 2
  const h = (to - from) / 2
  const [a, b, c, d, e] = [from, (from + middle) / 2, middle, (middle + to) / 2, to].map(area)
  const coarse = (h / 3) * (a + 4 * c + e)
  const fine = (h / 6) * (a + 4 * b + 2 * c + 4 * d + e)
  if (depth === 0 || Math.abs(fine - coarse) <= 15 * tolerance) return fine + (fine - coarse) / 15
  return (
    integratePanel(area, from, middle, tolerance / 2, depth - 1) +
    integratePanel(area, middle, to, tolerance / 2, depth - 1)
  )
}
