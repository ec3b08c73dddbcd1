import { parsePath } from '../../../stores/document/parsePath'
import { namePart } from '../../../stores/document/namePart'
import { readAt } from '../../../stores/document/readAt'
import type { OutlineDocument, RigDocument, SectionDocument } from '../../../stores/document/rigDocument'
import { writeAt } from '../../../stores/document/writeAt'
import { addSection, canSplit, moveSection, splitSection } from '../changeBars'
import { listMaterialChoices, plainChoices, value, type FieldSpec, type PartForm } from './fieldSpec'

const FORMS = [
  { value: 'round', text: 'one diameter' },
  { value: 'taper', text: 'taper' },
  { value: 'stations', text: 'stations' },
  { value: 'area', text: 'area' },
]
const PROFILES = plainChoices(['linear', 'exponential', 'area-linear'])

/**
 * Lists the fields of a section.
 *
 * @param document - the rig
 * @param path - of the section
 * @returns its fields and what can be done with it
 */
export function makeSectionForm(document: RigDocument, path: string): PartForm {
  const section = (readAt(document, path) ?? {}) as SectionDocument
  const [, bar, , at] = parsePath(path) as [string, number, string, number]
  const barPath = `bars[${bar}]`
  const count = document.bars?.[bar]?.sections?.length ?? 0
  const name = namePart(document, path)
  const split = canSplit(section)
  return {
    rows: [
      [
        value(`${path}.length`, 'Length', section.stations ? 'as the stations' : undefined, 76),
        ...listShapeFields(section, path),
        value(`${path}.fillet`, 'Fillet', 'none', 64),
        {
          path: `${path}.material`,
          label: 'Material',
          kind: 'choice',
          choices: listMaterialChoices(document, `as the bar (${document.bars?.[bar]?.material ?? 'none'})`),
          empty: 'as the bar',
          width: 84,
        },
        value(`${path}.allowable.tension`, 'Tension allowable', 'as the bar', 90),
        value(`${path}.allowable.compression`, 'Compression allowable', 'as the bar', 116),
      ],
    ],
    beside: [
      {
        path,
        label: 'Form',
        kind: 'choice',
        choices: FORMS,
        shown: findForm(section),
        set: (rig, form) => setForm(rig, path, String(form)),
        width: 92,
      },
      { path: `${path}.name`, label: 'Name', kind: 'words', empty: 'none', width: 88 },
    ],
    actions: [
      { word: 'Bar', select: barPath },
      {
        word: 'Split in two',
        label: `Split ${name}`,
        change: (rig) => splitSection(rig, bar, at, ({ from, to }) => `(${from} + ${to}) / 2`),
        not: split ? undefined : 'Stations, and formulas in x or s, mean the whole section',
      },
      {
        word: 'Add section after',
        label: `Add a section after ${name}`,
        change: (rig) => addSection(rig, bar, at),
        select: `${barPath}.sections[${at + 1}]`,
      },
      {
        word: 'Move left',
        label: `Move ${name} left`,
        change: (rig) => moveSection(rig, bar, at, -1),
        select: `${barPath}.sections[${at - 1}]`,
        not: at > 0 ? undefined : 'It is the first of its bar',
      },
      {
        word: 'Move right',
        label: `Move ${name} right`,
        change: (rig) => moveSection(rig, bar, at, 1),
        select: `${barPath}.sections[${at + 1}]`,
        not: at < count - 1 ? undefined : 'It is the last of its bar',
      },
      {
        word: 'Remove',
        label: `Remove ${name}`,
        change: (rig) => writeAt(rig, path, undefined),
        select: `${barPath}.sections[${Math.max(0, at - 1)}]`,
        not: count > 1 ? undefined : 'A bar has at least one section',
      },
    ],
  }
}

function findForm({ diameter, area, stations }: SectionDocument): string {
  if (stations !== undefined) return 'stations'
  if (area !== undefined) return 'area'
  return typeof diameter === 'object' ? 'taper' : 'round'
}

function listShapeFields(section: SectionDocument, path: string): FieldSpec[] {
  const form = findForm(section)
  if (form === 'area') return [{ ...value(`${path}.area`, 'Area', undefined, 132) }]
  if (form === 'stations') {
    return [
      { path: `${path}.stations`, label: 'Stations: place, diameter; …', kind: 'pairs', width: 220 },
      ...listOutlineFields(section.bore, `${path}.bore`, 'Bore', 'none'),
    ]
  }
  return [
    ...listOutlineFields(section.diameter, `${path}.diameter`, 'Diameter'),
    ...listOutlineFields(section.bore, `${path}.bore`, 'Bore', 'none'),
  ]
}

function listOutlineFields(
  outline: OutlineDocument | undefined,
  path: string,
  label: string,
  empty?: string,
): FieldSpec[] {
  if (typeof outline !== 'object') return [value(path, label, empty, empty === undefined ? 116 : 74)]
  return [
    value(`${path}.from`, `${label} left`, undefined, 80),
    value(`${path}.to`, `${label} right`, undefined, 80),
    {
      path: `${path}.profile`,
      label: 'Profile',
      kind: 'choice',
      choices: PROFILES,
      shown: outline.profile ?? 'linear',
      width: 92,
    },
  ]
}

/** Another form of the same section, as near to it as the two forms allow. */
function setForm(document: RigDocument, path: string, form: string): RigDocument {
  const section = { ...((readAt(document, path) ?? {}) as SectionDocument) }
  const [left, right] = readEnds(section)
  const length = section.length ?? section.stations?.at(-1)?.[0] ?? '100 mm'
  delete section.diameter
  delete section.area
  delete section.stations
  section.length = length
  if (form === 'taper') section.diameter = { from: left, to: right }
  else if (form === 'stations')
    section.stations = [
      ['0 mm', left],
      [length, right],
    ]
  else if (form === 'area') {
    section.area = `pi / 4 * (${left})^2`
    delete section.bore
  } else section.diameter = left
  return writeAt(document, path, section)
}

function readEnds({ diameter, stations }: SectionDocument): [string, string] {
  if (stations) return [stations[0]?.[1] ?? '20 mm', stations.at(-1)?.[1] ?? '20 mm']
  if (typeof diameter === 'object') return [diameter.from ?? '20 mm', diameter.to ?? '20 mm']
  return [diameter ?? '20 mm', diameter ?? '20 mm']
}
