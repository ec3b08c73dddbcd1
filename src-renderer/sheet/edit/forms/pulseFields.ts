import type { PulseDocument, RigDocument } from '../../../stores/document/rigDocument'
import { readAt } from '../../../stores/document/readAt'
import { writeAt } from '../../../stores/document/writeAt'
import { plainChoices, value, type FieldSpec } from './fieldSpec'

const SHAPES = plainChoices([
  'rectangle',
  'half-sine',
  'haversine',
  'triangle',
  'trapezoid',
  'step',
  'ramp',
  'formula',
  'table',
  'file',
])

/** What the values of a pulse are. */
export type PulseDimension = 'force' | 'velocity' | 'length'

const PEAKS: Record<PulseDimension, string> = { force: '10 kN', velocity: '5 m/s', length: '1 mm' }
const NAMED = ['rectangle', 'half-sine', 'haversine', 'triangle', 'trapezoid']

/**
 * Lists the fields of a prescribed history.
 *
 * @param document - the rig
 * @param path - of the pulse
 * @param dimension - of its values
 * @returns its fields
 */
export function listPulseFields(document: RigDocument, path: string, dimension: PulseDimension): FieldSpec[] {
  const pulse = (readAt(document, path) ?? {}) as PulseDocument
  const shape = pulse.shape ?? ''
  const start = value(`${path}.start`, 'Start', 'at once', 72)
  const fields: FieldSpec[] = [
    {
      path: `${path}.shape`,
      label: 'Pulse',
      kind: 'choice',
      choices: SHAPES,
      width: 92,
      set: (rig, next) => writeAt(rig, path, reshape(pulse, String(next), dimension)),
    },
  ]
  if (shape === 'formula') return [...fields, value(`${path}.formula`, 'Formula in t', undefined, 280)]
  if (shape === 'table') {
    return [
      ...fields,
      { path: `${path}.table`, label: 'Rows: time, value; …', kind: 'pairs', width: 300 },
      start,
    ]
  }
  if (shape === 'file') {
    return [
      ...fields,
      { path: `${path}.file`, label: 'CSV file beside the rig', kind: 'words', width: 150 },
      { path: `${path}.columns.time`, label: 'Column of time', kind: 'words', empty: 'the first', width: 92 },
      {
        path: `${path}.columns.value`,
        label: 'Column of value',
        kind: 'words',
        empty: 'the second',
        width: 92,
      },
      start,
    ]
  }
  fields.push(value(`${path}.peak`, 'Peak'))
  if (NAMED.includes(shape)) fields.push(value(`${path}.duration`, 'Duration'))
  if (shape === 'triangle') fields.push(value(`${path}.rise`, 'Rise', 'half'))
  if (shape === 'trapezoid')
    fields.push(value(`${path}.rise`, 'Rise'), value(`${path}.fall`, 'Fall', 'as the rise'))
  if (shape === 'ramp')
    fields.push(value(`${path}.${pulse.duration === undefined ? 'rise' : 'duration'}`, 'Rise'))
  return [...fields, start]
}

/** Another shape, with what of the old one it can hold. */
export function reshape(pulse: PulseDocument, shape: string, dimension: PulseDimension): PulseDocument {
  const text = (key: string, fallback: string): string =>
    typeof pulse[key] === 'string' ? (pulse[key] as string) : fallback
  const peak = text('peak', PEAKS[dimension])
  const duration = text('duration', text('rise', '100 us'))
  const rise = text('rise', '20 us')
  const start = typeof pulse.start === 'string' && shape !== 'formula' ? { start: pulse.start } : {}
  switch (shape) {
    case 'formula':
      return { shape, formula: `(${peak}) * sin(pi * t / (${duration}))` }
    case 'table':
      return {
        shape,
        table: [
          ['0 us', peak.replace(/^-?\d+(\.\d+)?/, '0')],
          [duration, peak],
        ],
        ...start,
      }
    case 'file':
      return { shape, file: 'record.csv', ...start }
    case 'step':
      return { shape, peak, ...start }
    case 'ramp':
      return { shape, peak, rise, ...start }
    case 'triangle':
      return { shape, peak, duration, ...start }
    case 'trapezoid':
      return { shape, peak, duration, rise, ...start }
    default:
      return { shape, peak, duration, ...start }
  }
}
