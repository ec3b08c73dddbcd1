import type { RigDocument } from '../../../stores/document/rigDocument'
import { namePart } from '../../../stores/document/namePart'
import { readAt } from '../../../stores/document/readAt'
import { writeAt } from '../../../stores/document/writeAt'
import { plainChoices, value, type FieldSpec, type PartAction, type PartForm } from './fieldSpec'
import { listPulseFields } from './pulseFields'

/** Fields of a strain gauge. */
export function makeGaugeForm(document: RigDocument, path: string): PartForm {
  const bridge = readAt(document, `${path}.bridge`) !== undefined
  const number = (key: string, label: string, empty?: string): FieldSpec => ({
    path: `${path}.bridge.${key}`,
    label,
    kind: 'number',
    empty,
    width: 64,
  })
  const arms: FieldSpec = {
    path: `${path}.bridge.arms`,
    label: 'Arms',
    kind: 'choice',
    choices: plainChoices(['1', '2', '4']),
    shown: String(readAt(document, `${path}.bridge.arms`) ?? 1),
    width: 48,
    set: (rig, next) => writeAt(rig, `${path}.bridge.arms`, Number(next)),
  }
  return {
    rows: [
      [
        { path: `${path}.name`, label: 'Name', kind: 'words', width: 88 },
        barField(document, path),
        value(`${path}.at`, "From the bar's left face", undefined, 132),
        ...(bridge
          ? [
              number('factor', 'Gauge factor'),
              arms,
              value(`${path}.bridge.excitation`, 'Excitation', undefined, 64),
              number('gain', 'Gain', '1'),
              number('poisson', 'Across arms ν', 'none'),
            ]
          : []),
      ],
    ],
    actions: [
      bridge
        ? {
            word: 'Take the bridge off',
            label: `Bridge of ${namePart(document, path)}`,
            change: (rig) => writeAt(rig, `${path}.bridge`, undefined),
          }
        : {
            word: 'Read it in volts',
            label: `Bridge of ${namePart(document, path)}`,
            change: (rig) =>
              writeAt(rig, `${path}.bridge`, { factor: 2.1, arms: 2, excitation: '5 V', gain: 100 }),
          },
      removal(document, path),
    ],
  }
}

/** Fields of an axial force at a point of a bar. */
export function makeLoadForm(document: RigDocument, path: string): PartForm {
  return {
    rows: [
      [
        barField(document, path),
        value(`${path}.at`, "From the bar's left face", undefined, 120),
        ...listPulseFields(document, `${path}.pulse`, 'force'),
      ],
    ],
    actions: [removal(document, path)],
    pulse: `${path}.pulse`,
  }
}

function barField(document: RigDocument, path: string): FieldSpec {
  const names = (document.bars ?? []).map(({ name }) => name ?? '')
  return { path: `${path}.bar`, label: 'Bar', kind: 'choice', choices: plainChoices(names), width: 104 }
}

function removal(document: RigDocument, path: string): PartAction {
  return {
    word: 'Remove',
    label: `Remove ${namePart(document, path)}`,
    change: (rig) => writeAt(rig, path, undefined),
    select: null,
  }
}
