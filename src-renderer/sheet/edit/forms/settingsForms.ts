import type { RigDocument } from '../../../stores/document/rigDocument'
import { writeAt } from '../../../stores/document/writeAt'
import { value, type FieldSpec, type PartForm } from './fieldSpec'

const METHODS = [
  { value: 'characteristics', text: 'characteristics' },
  { value: 'elements', text: 'elements' },
  { value: 'both', text: 'both, compared' },
]

/** How the run is computed. */
export function makeRunForm({ run }: RigDocument): PartForm {
  const stepped = run?.timeStep !== undefined
  const flag = (key: string, label: string): FieldSpec => ({
    path: `run.${key}`,
    label,
    kind: 'flag',
    width: 84,
  })
  return {
    rows: [
      [
        value('run.duration', 'Duration'),
        stepped ? value('run.timeStep', 'Time step') : value('run.cell', 'Cell length'),
        {
          path: 'run',
          label: 'Fineness by',
          kind: 'choice',
          choices: [
            { value: 'cell', text: 'cell length' },
            { value: 'timeStep', text: 'time step' },
          ],
          shown: stepped ? 'timeStep' : 'cell',
          width: 92,
          set: setFineness,
        },
        {
          path: 'run.method',
          label: 'Method',
          kind: 'choice',
          choices: METHODS,
          shown: run?.method ?? 'characteristics',
          width: 112,
        },
        flag('finiteStrain', 'Finite strain'),
        flag('lateralInertia', 'Lateral inertia'),
        flag('bulkViscosity', 'Bulk viscosity'),
        flag('spall', 'Spall'),
      ],
    ],
    actions: [],
  }
}

function setFineness(document: RigDocument, by: unknown): RigDocument {
  const other = by === 'cell' ? 'timeStep' : 'cell'
  const start = by === 'cell' ? '2 mm' : '0.4 us'
  return writeAt(writeAt(document, `run.${other}`, undefined), `run.${String(by)}`, start)
}

/** What belongs to the rig as a whole. */
export function makeRigForm(document: RigDocument): PartForm {
  return {
    rows: [
      [
        { path: 'title', label: 'Title', kind: 'words', empty: 'none', width: 220 },
        { path: 'margins.factorOfSafety', label: 'Factor of safety', kind: 'number', empty: '1', width: 88 },
        value('gravity', 'Acceleration along x', 'level: none', 120),
        { path: 'notes', label: 'Notes', kind: 'words', empty: 'none', width: 230 },
      ],
    ],
    actions: [
      { word: 'Left end', select: 'leftEnd' },
      ...(document.bars ?? []).flatMap(({ name }, i) => [
        ...(i === 0 ? [] : [{ word: `Joint ${i}`, select: `joints[${i - 1}]` }]),
        { word: name || `Bar ${i + 1}`, select: `bars[${i}]` },
      ]),
      { word: 'Right end', select: 'rightEnd' },
      ...(document.gauges ?? []).map(({ name }, i) => ({
        word: name || `Gauge ${i + 1}`,
        select: `gauges[${i}]`,
      })),
    ],
  }
}
