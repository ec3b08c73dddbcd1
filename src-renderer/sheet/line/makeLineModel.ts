import type { DrawnEnd, DrawnSection, LineDrawing } from '../../../src-main/contract/lineDrawing'
import { formatQuantity } from '../../format/formatQuantity'
import type { UnitSystem } from '../../format/units'
import type { RigDocument } from '../../stores/document/rigDocument'
import { readAt } from '../../stores/document/readAt'
import { describeSection } from './describeSection'
import type { LineScale } from './makeLineScale'
import { evaluateFilletPath, evaluateSectionPaths, type SectionPaths } from './outlinePaths'
import { listSections } from './listParts'
import { findHatch } from './hatches'

/** A section as it is drawn and named. */
export interface SectionModel extends SectionPaths {
  path: string
  section: DrawnSection
  bar: number
  barName: string
  hatch: string
  left: number
  right: number
  /** Path of the fillet at its right face; empty without one. */
  fillet: string
  length: string
  diameters: string
  /** Spoken. */
  name: string
  /** The section after it in the same bar, whose shoulder can be dragged. */
  next: DrawnSection | null
}

/** Words for the joints and ends under the line. */
export const KIND_WORDS: Record<string, string> = { penetration: 'ground' }

/**
 * Puts together the sections of the line as they are drawn.
 *
 * @param line - drawn, SI
 * @param scale - of the drawing
 * @param document - the rig, for what is round and what is not
 * @param units - whose units
 * @returns a model for each section, from the left
 */
export function listSectionModels(
  line: LineDrawing,
  scale: LineScale,
  document: RigDocument,
  units: UnitSystem,
): SectionModel[] {
  const all = listSections(line)
  const materials = [...new Set(all.map(({ section }) => section.material))]
  return all.map(({ section, bar }, i) => {
    const after = all[i + 1]
    const next = after && after.bar === bar ? after.section : null
    const round = readAt(document, `${section.path}.area`) === undefined
    const diameters = describeSection(section, units, round)
    const length = formatQuantity(section.to - section.from, 'length', units, { trim: true })
    const barName = line.bars[bar].name
    const alone = line.bars[bar].sections.length === 1
    return {
      ...evaluateSectionPaths(section, scale),
      path: section.path,
      section,
      bar,
      barName,
      hatch: findHatch(materials, section.material, bar),
      left: scale.x(section.from),
      right: scale.x(section.to),
      fillet: next ? evaluateFilletPath(section, next, scale) : '',
      length: length.text,
      diameters,
      name: `${barName}${alone ? '' : `, section ${section.index + 1}`}${section.name ? `, ${section.name}` : ''}: ${length.text} ${length.unit} long, ${diameters}, ${section.material}`,
      next,
    }
  })
}

/** Half the height of the bar at an end of the line or at a joint [px], the larger of both sides. */
export function findHalfAt(line: LineDrawing, x: number, scale: LineScale): number {
  let largest = 0
  for (const { section } of listSections(line)) {
    for (const point of [section.outline[0], section.outline[section.outline.length - 1]]) {
      if (Math.abs(point[0] - x) < 1e-9 * Math.max(1, Math.abs(x)) + 1e-9)
        largest = Math.max(largest, point[1])
    }
  }
  return scale.half(largest)
}

/**
 * What stands at an end in words, with the value that is prescribed there.
 *
 * @param end - drawn
 * @param document - the rig, where the value stands as typed
 * @returns such as `fixed` or `force 60 kN`
 */
export function describeEnd({ kind, path }: DrawnEnd, document: RigDocument): string {
  const word = KIND_WORDS[kind] ?? kind
  const typed = readAt(document, `${path}.pulse.peak`) ?? readAt(document, `${path}.velocity`)
  return typeof typed === 'string' ? `${word} ${typed}` : word
}
