import type {
  BarDocument,
  PartDocument,
  RigDocument,
  SectionDocument,
} from '../../stores/document/rigDocument'

/** A joint as the reader takes one that was left out. */
const CONTACT: PartDocument = { kind: 'contact' }

/** Every joint written out, so that bars can be moved with theirs. */
function listJoints({ bars = [], joints }: RigDocument): PartDocument[] {
  return Array.from({ length: Math.max(0, bars.length - 1) }, (_, i) => joints?.[i] ?? CONTACT)
}

/**
 * Takes a bar out, with the joint after it (before it where it is the last), its gauges and its loads.
 *
 * @param document - the rig
 * @param at - place of the bar
 * @returns the rig without it
 */
export function removeBar(document: RigDocument, at: number): RigDocument {
  const bars = document.bars ?? []
  const name = bars[at]?.name
  const joints = listJoints(document)
  joints.splice(Math.min(at, joints.length - 1), 1)
  const next: RigDocument = { ...document, bars: bars.filter((_, i) => i !== at), joints }
  if (document.gauges) next.gauges = document.gauges.filter(({ bar }) => bar !== name)
  if (document.loads) next.loads = document.loads.filter(({ bar }) => bar !== name)
  return next
}

/**
 * Puts a new bar behind another, as thick as that one ends, in contact with it.
 *
 * @param document - the rig
 * @param after - place of the bar before it
 * @returns the rig with it
 */
export function addBar(document: RigDocument, after: number): RigDocument {
  const bars = document.bars ?? []
  const before = bars[after]
  const bar: BarDocument = {
    name: findFreeName(
      bars.map(({ name }) => name ?? ''),
      'bar',
    ),
    ...(before?.material ? { material: before.material } : {}),
    sections: [{ length: '100 mm', diameter: findEndDiameter(before?.sections?.at(-1)) }],
  }
  const joints = listJoints(document)
  joints.splice(after, 0, CONTACT)
  return { ...document, bars: [...bars.slice(0, after + 1), bar, ...bars.slice(after + 1)], joints }
}

/**
 * Lets a bar change places with its neighbour; the joints stay where they are.
 *
 * @param document - the rig
 * @param at - place of the bar
 * @param by - -1 to the left, 1 to the right
 * @returns the rig with both changed over
 */
export function moveBar(document: RigDocument, at: number, by: -1 | 1): RigDocument {
  return { ...document, bars: swap(document.bars ?? [], at, at + by) }
}

/** Puts a new section behind another, as thick as that one ends. */
export function addSection(document: RigDocument, bar: number, after: number): RigDocument {
  return changeSections(document, bar, (sections) => {
    const before = sections[after]
    const section: SectionDocument = { length: '50 mm', diameter: findEndDiameter(before) }
    if (before?.material !== undefined) section.material = before.material
    return [...sections.slice(0, after + 1), section, ...sections.slice(after + 1)]
  })
}

/** Lets a section change places with its neighbour in the same bar. */
export function moveSection(document: RigDocument, bar: number, at: number, by: -1 | 1): RigDocument {
  return changeSections(document, bar, (sections) => swap(sections, at, at + by))
}

/**
 * Cuts a section in two halves that together are what it was; the fillet stays at its end.
 *
 * @param document - the rig
 * @param bar - place of the bar
 * @param at - place of the section
 * @param middle - its diameter and bore halfway, as text, where it is a linear taper; null for one that cannot be cut
 * @returns the rig with both halves
 */
export function splitSection(
  document: RigDocument,
  bar: number,
  at: number,
  middle: (outline: { from?: string; to?: string }) => string,
): RigDocument {
  return changeSections(document, bar, (sections) => {
    const whole = sections[at]
    const half = halve(whole.length ?? '0 mm')
    const left: SectionDocument = { ...whole, length: half }
    const right: SectionDocument = { ...whole, length: half }
    delete left.fillet
    delete right.name
    for (const key of ['diameter', 'bore'] as const) {
      const outline = whole[key]
      if (typeof outline !== 'object') continue
      const between = middle(outline)
      left[key] = { ...outline, to: between }
      right[key] = { ...outline, from: between }
    }
    return [...sections.slice(0, at), left, right, ...sections.slice(at + 1)]
  })
}

/** True where a section can be cut: formulas along it and read-off stations mean the whole of it. */
export function canSplit(section: SectionDocument | undefined): boolean {
  if (!section?.length || section.stations || section.area?.match(/\b[xs]\b/)) return false
  return [section.diameter, section.bore].every((outline) =>
    typeof outline === 'string'
      ? !/\b[xs]\b/.test(outline)
      : outline === undefined || outline.profile === undefined || outline.profile === 'linear',
  )
}

function changeSections(
  document: RigDocument,
  bar: number,
  make: (sections: SectionDocument[]) => SectionDocument[],
): RigDocument {
  const bars = (document.bars ?? []).map((one, i) =>
    i === bar ? { ...one, sections: make(one.sections ?? []) } : one,
  )
  return { ...document, bars }
}

function swap<T>(list: readonly T[], one: number, other: number): T[] {
  if (other < 0 || other >= list.length) return [...list]
  const next = [...list]
  ;[next[one], next[other]] = [next[other], next[one]]
  return next
}

function halve(text: string): string {
  const match = /^\s*(\d+\.?\d*|\.\d+)\s+([A-Za-z]+)\s*$/.exec(text)
  return match ? `${Number((Number(match[1]) / 2).toPrecision(12))} ${match[2]}` : `(${text}) / 2`
}

function findEndDiameter(section: SectionDocument | undefined): string {
  const diameter = section?.diameter
  if (typeof diameter === 'object') return diameter.to ?? '20 mm'
  if (diameter !== undefined && !/\b[xs]\b/.test(diameter)) return diameter
  return section?.stations?.at(-1)?.[1] ?? '20 mm'
}

/** The first of `bar`, `bar 2`, `bar 3` that is free. */
export function findFreeName(taken: readonly string[], wanted: string): string {
  for (let count = 1; ; count++) {
    const name = count === 1 ? wanted : `${wanted} ${count}`
    if (!taken.includes(name)) return name
  }
}
