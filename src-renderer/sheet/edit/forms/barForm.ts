import { parsePath } from '../../../stores/document/parsePath'
import { namePart } from '../../../stores/document/namePart'
import type { RigDocument } from '../../../stores/document/rigDocument'
import { writeAt } from '../../../stores/document/writeAt'
import { addBar, moveBar, removeBar } from '../changeBars'
import { listMaterialChoices, value, type PartForm } from './fieldSpec'

/**
 * Lists the fields of a bar.
 *
 * @param document - the rig
 * @param path - of the bar
 * @returns its fields and what can be done with it
 */
export function makeBarForm(document: RigDocument, path: string): PartForm {
  const at = parsePath(path)[1] as number
  const bar = document.bars?.[at]
  const count = document.bars?.length ?? 0
  const name = namePart(document, path)
  return {
    rows: [
      [
        {
          path: `${path}.name`,
          label: 'Name',
          kind: 'words',
          width: 104,
          set: (rig, next) => renameBar(rig, at, String(next)),
        },
        {
          path: `${path}.material`,
          label: 'Material',
          kind: 'choice',
          choices: listMaterialChoices(document, 'each section its own'),
          empty: 'each section its own',
          width: 132,
        },
        value(`${path}.velocity`, 'Velocity at the start', 'at rest', 176),
        value(`${path}.preload`, 'Preload, tension +', 'none'),
        value(`${path}.displacement`, 'Displacement in x, s', 'none', 120),
        value(`${path}.allowable.tension`, 'Tension allowable', 'as material'),
        value(`${path}.allowable.compression`, 'Compression allowable', 'as material', 116),
      ],
    ],
    actions: [
      ...(bar?.sections ?? []).map((_, i) => ({
        word: `Section ${i + 1}`,
        select: `${path}.sections[${i}]`,
      })),
      {
        word: 'Add bar after',
        label: `Add a bar after ${name}`,
        change: (rig) => addBar(rig, at),
        select: `bars[${at + 1}]`,
      },
      {
        word: 'Move left',
        label: `Move ${name} left`,
        change: (rig) => moveBar(rig, at, -1),
        select: `bars[${at - 1}]`,
        not: at > 0 ? undefined : 'It is the first',
      },
      {
        word: 'Move right',
        label: `Move ${name} right`,
        change: (rig) => moveBar(rig, at, 1),
        select: `bars[${at + 1}]`,
        not: at < count - 1 ? undefined : 'It is the last',
      },
      {
        word: 'Add gauge',
        label: `Add a gauge on ${name}`,
        change: (rig) => addGauge(rig, at),
        select: `gauges[${document.gauges?.length ?? 0}]`,
      },
      {
        word: 'Add force',
        label: `Add a force on ${name}`,
        change: (rig) => addLoad(rig, at),
        select: `loads[${document.loads?.length ?? 0}]`,
      },
      {
        word: 'Remove',
        label: `Remove ${name}`,
        change: (rig) => removeBar(rig, at),
        select: null,
        not: count > 1 ? undefined : 'A rig has at least one bar',
      },
    ],
  }
}

/** A new name goes to the gauges and loads of the bar as well. */
function renameBar(document: RigDocument, at: number, name: string): RigDocument {
  const before = document.bars?.[at]?.name
  const next = writeAt(document, `bars[${at}].name`, name)
  const follow = <T extends { bar?: string }>(parts: T[]): T[] =>
    parts.map((part) => (part.bar === before ? { ...part, bar: name } : part))
  if (next.gauges) next.gauges = follow(next.gauges)
  if (next.loads) next.loads = follow(next.loads)
  return next
}

function addGauge(document: RigDocument, bar: number): RigDocument {
  const gauges = document.gauges ?? []
  const taken = gauges.map(({ name }) => name)
  let number = gauges.length + 1
  while (taken.includes(`G${number}`)) number++
  const at = document.bars?.[bar]?.sections?.[0]?.length
  const gauge = { name: `G${number}`, bar: document.bars?.[bar]?.name ?? '', at: at ? `(${at}) / 2` : '0 mm' }
  return { ...document, gauges: [...gauges, { ...gauge, at: plainHalf(at) ?? gauge.at }] }
}

function plainHalf(text: string | undefined): string | null {
  const match = /^\s*(\d+\.?\d*)\s+([A-Za-z]+)\s*$/.exec(text ?? '')
  return match && `${Number(match[1]) / 2} ${match[2]}`
}

function addLoad(document: RigDocument, bar: number): RigDocument {
  const load = {
    bar: document.bars?.[bar]?.name ?? '',
    at: '0 mm',
    pulse: { shape: 'half-sine', peak: '10 kN', duration: '100 us' },
  }
  return { ...document, loads: [...(document.loads ?? []), load] }
}
