import type { DrawnSection, LineDrawing } from '../../../src-main/contract/lineDrawing'

/** A part of the line that can be chosen, in the order in which it stands on the bench. */
export interface LinePart {
  path: string
  kind: 'end' | 'section' | 'joint' | 'gauge' | 'load'
  /** [m] where it begins */
  x: number
}

const ORDER = { end: 0, joint: 1, section: 2, gauge: 3, load: 4 } as const

/**
 * Lists the parts of a line from left to right.
 *
 * @param line - drawn
 * @returns its ends, joints, sections, gauges and loads
 */
export function listParts({ bars, joints, ends, gauges, loads }: LineDrawing): LinePart[] {
  const [left, right] = ends
  const inner: LinePart[] = [
    ...bars.flatMap(({ sections }) =>
      sections.map(({ path, from }): LinePart => ({ path, kind: 'section', x: from })),
    ),
    ...joints.map(({ path, x }): LinePart => ({ path, kind: 'joint', x })),
    ...gauges.map(({ path, x }): LinePart => ({ path, kind: 'gauge', x })),
    ...loads.map(({ path, x }): LinePart => ({ path, kind: 'load', x })),
  ]
  inner.sort((a, b) => a.x - b.x || ORDER[a.kind] - ORDER[b.kind])
  return [
    ...(left ? [{ path: left.path, kind: 'end' as const, x: left.x }] : []),
    ...inner,
    ...(right ? [{ path: right.path, kind: 'end' as const, x: right.x }] : []),
  ]
}

/** The sections of a line from left to right, each with its bar's place. */
export function listSections({ bars }: LineDrawing): { section: DrawnSection; bar: number }[] {
  return bars.flatMap(({ sections }, bar) => sections.map((section) => ({ section, bar })))
}
