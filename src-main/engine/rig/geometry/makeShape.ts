import type { SectionShape, ShapeKind } from '../../../contract/rig'
import type { Outline } from './outline'
import { makeConstantOutline } from './outline'

/**
 * Makes the shape of a round section, `A = pi/4 (d^2 - b^2)`.
 * @param diameter outline [m]
 * @param bore outline [m]; null for a solid section
 */
export function makeRoundShape(diameter: Outline, bore: Outline | null): SectionShape {
  const inner = bore ?? makeConstantOutline(0)
  const uniform = diameter.uniform && inner.uniform
  const area = (s: number): number => {
    const outside = diameter.at(s)
    const inside = inner.at(s)
    return (Math.PI / 4) * (outside - inside) * (outside + inside)
  }
  const fixedArea = area(0)
  return {
    kind: kindOf(diameter, inner, uniform),
    uniform,
    round: true,
    area: uniform ? () => fixedArea : area,
    diameter: diameter.at,
    bore: inner.at,
  }
}

/** Uniform sections are cylinders and tubes, whatever they were given by; a taper has the name of its outline. */
function kindOf(diameter: Outline, bore: Outline, uniform: boolean): ShapeKind {
  if (uniform) return bore.at(0) === 0 ? 'cylinder' : 'tube'
  const kinds = [diameter, bore].filter((it) => !it.uniform).map((it) => it.kind)
  return kinds.find((kind) => kind === 'formula' || kind === 'stations') ?? kinds[0]
}

/**
 * Makes the shape of a section given by its area; its diameter is that of the circle of equal area.
 * @param area outline [m^2]
 */
export function makeAreaShape(area: Outline): SectionShape {
  return {
    kind: 'area',
    uniform: area.uniform,
    round: false,
    area: area.at,
    diameter: (s) => Math.sqrt((4 / Math.PI) * area.at(s)),
    bore: () => 0,
  }
}
