import type { DrawnSection } from '../../../src-main/contract/lineDrawing'
import type { LineScale } from './makeLineScale'

/** A section as the parts of a drawing, each the data of a path. */
export interface SectionPaths {
  /** All around. */
  body: string
  /** What is cut: the whole section, or the walls on both sides of its bore. */
  cut: string
  /** Edges of the bore; empty without one. */
  bore: string
  /** Half its largest height [px]. */
  half: number
}

/**
 * Draws a section in longitudinal section.
 *
 * @param section - with its outline from face to face
 * @param scale - of the line
 * @returns paths
 */
export function evaluateSectionPaths({ outline }: DrawnSection, scale: LineScale): SectionPaths {
  const outer = outline.map(([x, diameter]) => [scale.x(x), scale.half(diameter)] as const)
  const inner = outline.map(([x, , bore]) => [scale.x(x), scale.half(bore)] as const)
  const bored = outline.some(([, , bore]) => bore > 0)
  const edge = (points: typeof outer, side: 1 | -1): string[] =>
    points.map(([x, half]) => `${write(x)} ${write(scale.centre - side * half)}`)
  const ring = (there: string[], back: string[]): string => `M${[...there, ...back.reverse()].join('L')}Z`
  const body = ring(edge(outer, 1), edge(outer, -1))
  return {
    body,
    cut: bored ? ring(edge(outer, 1), edge(inner, 1)) + ring(edge(outer, -1), edge(inner, -1)) : body,
    bore: bored ? `M${edge(inner, 1).join('L')}M${edge(inner, -1).join('L')}` : '',
    half: Math.max(...outer.map(([, half]) => half)),
  }
}

/**
 * Draws the fillet of a shoulder in the corner of the smaller side, above and below.
 *
 * @param one - left of the shoulder
 * @param other - right of it
 * @param scale - of the line
 * @returns a path that closes over both corners; empty without a fillet or a step
 */
export function evaluateFilletPath(one: DrawnSection, other: DrawnSection, scale: LineScale): string {
  if (!one.fillet) return ''
  const [x, before] = one.outline[one.outline.length - 1]
  const after = other.outline[0][1]
  const step = Math.abs(after - before) / 2
  if (step === 0) return ''
  const corner = scale.x(x)
  const height = Math.min(2 * scale.half(one.fillet), scale.half(2 * step))
  const width = Math.abs(scale.x(x + one.fillet) - corner)
  const away = after > before ? corner - width : corner + width
  const half = scale.half(Math.min(before, after))
  return ([1, -1] as const)
    .map((side) => {
      const low = scale.centre - side * half
      const high = low - side * height
      return `M${write(away)} ${write(low)}Q${write(corner)} ${write(low)} ${write(corner)} ${write(high)}L${write(corner)} ${write(low)}Z`
    })
    .join('')
}

const write = (pixel: number): string => pixel.toFixed(2)
