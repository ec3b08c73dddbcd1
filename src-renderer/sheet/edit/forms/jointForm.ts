import type { PartDocument, RigDocument } from '../../../stores/document/rigDocument'
import { readAt } from '../../../stores/document/readAt'
import { writeAt } from '../../../stores/document/writeAt'
import { plainChoices, readKind, value, type Choice, type FieldSpec, type PartForm } from './fieldSpec'

const KINDS: Choice[] = [
  { value: 'contact', text: 'contact: presses only' },
  { value: 'bonded', text: 'bonded' },
  { value: 'cushion', text: 'cushion: a spring between' },
  { value: 'specimen', text: 'specimen between' },
]
const LAWS = plainChoices(['elastic', 'bilinear', 'power', 'curve'])

/** What a joint of each kind begins with. */
const STARTS: Record<string, PartDocument> = {
  cushion: { stiffness: '100 kN/mm' },
  specimen: { length: '5 mm', diameter: '10 mm', law: { kind: 'elastic', modulus: '70 GPa' } },
}
const LAW_STARTS: Record<string, PartDocument> = {
  elastic: { modulus: '70 GPa' },
  bilinear: { modulus: '70 GPa', yield: '200 MPa', hardening: '1 GPa' },
  power: { strength: '400 MPa', exponent: 0.2 },
  curve: {
    curve: [
      [0, '0 MPa'],
      [0.05, '250 MPa'],
    ],
  },
}

/**
 * Lists the fields of a joint.
 *
 * @param document - the rig, which may leave the joint out: a contact without gap
 * @param path - of the joint
 * @returns its fields
 */
export function makeJointForm(document: RigDocument, path: string): PartForm {
  const kind = readKind(document, path, 'contact')
  const joint = (readAt(document, path) ?? {}) as PartDocument
  const first: FieldSpec = {
    path: `${path}.kind`,
    label: 'Joint',
    kind: 'choice',
    choices: KINDS,
    shown: kind,
    width: 164,
    set: (rig, next) => writeJoint(rig, path, makeJoint(joint, String(next))),
  }
  const gap: FieldSpec = {
    ...value(`${path}.gap`, 'Gap', 'none'),
    set: (rig, next) => writeJoint(rig, path, clean({ ...joint, kind, gap: next })),
  }
  if (kind === 'cushion') {
    const curved = joint.curve !== undefined
    return form([
      [
        first,
        curved
          ? { path: `${path}.curve`, label: 'Curve: closing, force; …', kind: 'pairs', width: 220 }
          : value(`${path}.stiffness`, 'Stiffness'),
        {
          path: `${path}.curve`,
          label: 'Given by',
          kind: 'choice',
          choices: [
            { value: 'stiffness', text: 'stiffness' },
            { value: 'curve', text: 'curve' },
          ],
          shown: curved ? 'curve' : 'stiffness',
          width: 84,
          set: (rig, next) => writeAt(rig, path, setCurve(joint, next === 'curve')),
        },
        value(`${path}.unloading`, 'Stiffness opening', 'as loading'),
        value(`${path}.damping`, 'Damping', 'none'),
        value(`${path}.mass`, 'Mass', 'none', 72),
        gap,
        { path: `${path}.tension`, label: 'Also pulls', kind: 'flag', width: 64 },
      ],
    ])
  }
  if (kind !== 'specimen') return form([kind === 'contact' ? [first, gap] : [first]])
  return form([
    [
      first,
      value(`${path}.length`, 'Length', undefined, 72),
      joint.area === undefined
        ? value(`${path}.diameter`, 'Diameter', undefined, 72)
        : value(`${path}.area`, 'Area', undefined, 88),
      ...listLawFields(joint, path),
    ],
  ])
}

const form = (rows: FieldSpec[][]): PartForm => ({ rows, actions: [] })

function listLawFields(joint: PartDocument, path: string): FieldSpec[] {
  const law = (joint.law ?? {}) as PartDocument
  const number = (key: string, label: string, empty?: string): FieldSpec => ({
    path: `${path}.law.${key}`,
    label,
    kind: 'number',
    empty,
    width: 80,
  })
  const fields: FieldSpec[] = [
    {
      path: `${path}.law.kind`,
      label: 'Law',
      kind: 'choice',
      choices: LAWS,
      width: 76,
      set: (rig, next) => writeAt(rig, `${path}.law`, { kind: next, ...LAW_STARTS[String(next)] }),
    },
  ]
  if (law.kind === 'elastic' || law.kind === 'bilinear') fields.push(value(`${path}.law.modulus`, 'Modulus'))
  if (law.kind === 'bilinear') {
    fields.push(value(`${path}.law.yield`, 'Yield'), value(`${path}.law.hardening`, 'Tangent after yield'))
  }
  if (law.kind === 'power') {
    fields.push(value(`${path}.law.strength`, 'Stress at strain 1'), number('exponent', 'Exponent'))
  }
  if (law.kind === 'curve') {
    fields.push({ path: `${path}.law.curve`, label: 'Curve: strain, stress; …', kind: 'pairs', width: 220 })
  }
  return [
    ...fields,
    number('rateSensitivity', 'Rate sensitivity', 'none'),
    value(`${path}.law.referenceRate`, 'Reference rate', 'none'),
  ]
}

/** Joints before it that were left out are written out, so that it keeps its place. */
function writeJoint(document: RigDocument, path: string, joint: PartDocument): RigDocument {
  const at = Number(/\d+/.exec(path)?.[0])
  const count = Math.max(0, (document.bars?.length ?? 1) - 1)
  const joints = Array.from({ length: count }, (_, i) => document.joints?.[i] ?? { kind: 'contact' })
  joints[at] = joint
  return { ...document, joints }
}

function makeJoint(before: PartDocument, kind: string): PartDocument {
  return clean({
    kind,
    ...STARTS[kind],
    gap: kind === 'contact' || kind === 'cushion' ? before.gap : undefined,
  })
}

function setCurve({ stiffness, curve: _curve, ...rest }: PartDocument, curved: boolean): PartDocument {
  return curved
    ? {
        ...rest,
        curve: [
          ['0 mm', '0 kN'],
          ['1 mm', '100 kN'],
        ],
      }
    : { ...rest, stiffness: stiffness ?? '100 kN/mm' }
}

function clean(part: PartDocument): PartDocument {
  return Object.fromEntries(Object.entries(part).filter(([, it]) => it !== undefined))
}
