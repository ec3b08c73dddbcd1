import type { Section } from '../../contract/rig'
import type { Line, Span } from '../line/line'
import { evaluateShoulderFactor, type ShoulderFactor } from './evaluateShoulderFactor'
import { isJump } from './isJump'

/** A step between two sections of one bar, seen as a shoulder. */
export interface LineShoulder {
  bar: number
  /** Index of the section left of the step. */
  section: number
  /** Index of the section with the smaller area, in which the local stress counts. */
  smallerSection: number
  /** Span whose face at the step is the smaller one, and its position there. */
  span: number
  position: number
  /** Along the line [m]. */
  x: number
  /** [m]; null where none was given */
  fillet: number | null
  factor: ShoulderFactor
}

/**
 * Every step in area or width between two sections of a bar, with its fillet factor or the reason for none.
 *
 * The factor is for a solid round bar of one material between two straight sections; tubes, tapers
 * that meet the step, sections given by area and changes of material have none.
 *
 * @param line the cut line
 * @returns the shoulders from left to right
 */
export function listShoulders(line: Line): LineShoulder[] {
  const found: LineShoulder[] = []
  for (let i = 1; i < line.spans.length; i++) {
    const left = line.spans[i - 1]
    const right = line.spans[i]
    if (left.bar !== right.bar || left.section === right.section) continue
    const [areaLeft, areaRight] = [left.area[left.cells], right.area[0]]
    const [widthLeft, widthRight] = [left.source.shape.diameter(1), right.source.shape.diameter(0)]
    if (!isJump(areaLeft, areaRight) && !isJump(widthLeft, widthRight)) continue
    const leftIsSmaller = isJump(areaLeft, areaRight) ? areaLeft < areaRight : widthLeft < widthRight
    const fillet = left.source.fillet
    found.push({
      bar: left.bar,
      section: left.section,
      smallerSection: leftIsSmaller ? left.section : right.section,
      span: leftIsSmaller ? i - 1 : i,
      position: leftIsSmaller ? left.cells : 0,
      x: line.nodes[i].x,
      fillet,
      factor: evaluateFactor(left, right, fillet, widthLeft, widthRight),
    })
  }
  return found
}

function evaluateFactor(
  left: Span,
  right: Span,
  fillet: number | null,
  widthLeft: number,
  widthRight: number,
): ShoulderFactor {
  // What no radius could mend comes first.
  const reason =
    left.source.material.modulus !== right.source.material.modulus
      ? 'the material changes at the step'
      : (refuseSection(left.source) ?? refuseSection(right.source))
  if (reason) return { kt: null, inRange: false, reason }
  if (fillet === null) return { kt: null, inRange: false, reason: 'no fillet radius was given' }
  return evaluateShoulderFactor({
    larger: Math.max(widthLeft, widthRight),
    smaller: Math.min(widthLeft, widthRight),
    radius: fillet,
    form: 'round',
  })
}

function refuseSection(section: Section): string | undefined {
  const { shape } = section
  if (!shape.round) return 'a section given by its area has no diameter to enter the fit with'
  if (shape.bore(0) > 0 || shape.bore(1) > 0) return 'the fit is for solid bars, not for tubes'
  if (!shape.uniform) return 'the fit is for two straight sections, not for a taper that meets the step'
  return undefined
}
