import type { PartDocument, RigDocument } from '../../../stores/document/rigDocument'
import { readAt } from '../../../stores/document/readAt'
import { writeAt } from '../../../stores/document/writeAt'
import { plainChoices, readKind, value, type Choice, type FieldSpec, type PartForm } from './fieldSpec'
import { listPulseFields, reshape, type PulseDimension } from './pulseFields'

const KINDS: Choice[] = [
  { value: 'free', text: 'free' },
  { value: 'fixed', text: 'fixed' },
  { value: 'matched', text: 'matched: goes on for ever' },
  { value: 'wall', text: 'wall: a rigid stop' },
  { value: 'mass', text: 'mass: rigid hammer or anvil' },
  { value: 'support', text: 'support: spring and dashpot' },
  { value: 'penetration', text: 'penetration into the ground' },
  { value: 'force', text: 'force on the bar' },
  { value: 'velocity', text: 'velocity prescribed' },
  { value: 'displacement', text: 'displacement prescribed' },
]
const CONTACTS = plainChoices(['bonded', 'contact'])

const PULSES: Record<string, PulseDimension> = {
  force: 'force',
  velocity: 'velocity',
  displacement: 'length',
}

/** What an end of each kind begins with. */
const STARTS: Record<string, PartDocument> = {
  mass: { mass: '2 kg' },
  support: { stiffness: '100 kN/mm' },
  penetration: { loading: '20 kN/mm', unloading: '20 kN/mm' },
}

/**
 * Lists the fields of an end of the line.
 *
 * @param document - the rig
 * @param path - `leftEnd` or `rightEnd`
 * @returns its fields
 */
export function makeEndForm(document: RigDocument, path: string): PartForm {
  const kind = readKind(document, path, 'free')
  const row: FieldSpec[] = [
    {
      path: `${path}.kind`,
      label: 'End',
      kind: 'choice',
      choices: KINDS,
      shown: kind,
      width: 184,
      set: (rig, next) => writeAt(rig, path, makeEnd(rig, path, String(next))),
    },
  ]
  const pulse = PULSES[kind]
  if (pulse) row.push(...listPulseFields(document, `${path}.pulse`, pulse))
  const joint: FieldSpec = {
    path: `${path}.joint`,
    label: 'Joined',
    kind: 'choice',
    choices: [{ value: '', text: kind === 'mass' ? 'in contact' : 'as the gap says' }, ...CONTACTS],
    empty: 'left out',
    width: 104,
  }
  if (kind === 'mass')
    row.push(value(`${path}.mass`, 'Mass'), value(`${path}.velocity`, 'Velocity', 'at rest', 140), joint)
  if (kind === 'support') {
    row.push(
      value(`${path}.stiffness`, 'Stiffness', 'none'),
      value(`${path}.damping`, 'Damping', 'none'),
      value(`${path}.mass`, 'Mass', 'none'),
      joint,
    )
  }
  if (kind === 'penetration') {
    row.push(value(`${path}.loading`, 'Stiffness going in'), value(`${path}.unloading`, 'Coming back'))
  }
  if (kind === 'mass' || kind === 'support' || kind === 'wall') row.push(value(`${path}.gap`, 'Gap', 'none'))
  return { rows: [row], actions: [], ...(pulse ? { pulse: `${path}.pulse` } : {}) }
}

function makeEnd(document: RigDocument, path: string, kind: string): PartDocument {
  const before = (readAt(document, path) ?? {}) as PartDocument
  const pulse = PULSES[kind]
  if (pulse) {
    const old = (before.pulse ?? {}) as { shape?: string }
    // A peak of another dimension would be refused.
    const kept = PULSES[before.kind ?? ''] === pulse ? old : { ...old, peak: undefined }
    return { kind, pulse: reshape(kept, old.shape ?? 'half-sine', pulse) }
  }
  const gap =
    ['mass', 'support', 'wall'].includes(kind) && before.gap !== undefined ? { gap: before.gap } : {}
  return { kind, ...STARTS[kind], ...gap }
}
