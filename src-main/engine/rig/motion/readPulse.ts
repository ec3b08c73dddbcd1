import type { Pulse } from '../../../contract/rig'
import { faultText } from '../faultText'
import type { AnyPulseForm } from '../form/pulseForm'
import type { Loose } from '../form/loose'
import type { DimensionName } from '../formula/dimension'
import { LIMITS } from '../limits'
import type { Place } from '../place'
import { readOptionalQuantity, readQuantity, readQuantityFormula } from '../readQuantity'
import type { Reading } from '../reading'
import { showNumber } from '../showValue'
import {
  makeHalfSine,
  makeHaversine,
  makeRamp,
  makeRectangle,
  makeStep,
  makeTable,
  makeTrapezoid,
} from './pulseShapes'
import type { Columns } from './readPairs'
import { readPairs } from './readPairs'
import { readRecordFile } from './readRecordFile'

export type PulseForm = Loose<AnyPulseForm>

/**
 * Reads a prescribed history.
 * @param reading gets `conflict`, `out-of-range`, `record-path`, `record-refused` and the faults of quantities
 * @param place where it stands
 * @param form undefined where it is missing
 * @param dimension of its values
 * @param runDuration [s], over which formulas are tried; null where it is faulty
 * @returns the pulse, or null where it is missing or faulty
 */
export function readPulse(
  reading: Reading,
  place: Place,
  form: PulseForm | undefined,
  dimension: DimensionName,
  runDuration: number | null,
): Pulse | null {
  if (form === undefined || form.shape === undefined) return null
  const pulse = readShape(reading, place, form, dimension, runDuration)
  if (pulse !== null) reading.notes?.pulse(place, pulse, dimension, runDuration)
  return pulse
}

function readShape(
  reading: Reading,
  place: Place,
  form: PulseForm,
  dimension: DimensionName,
  runDuration: number | null,
): Pulse | null {
  switch (form.shape) {
    case 'formula':
      return readFormulaPulse(reading, [...place, 'formula'], form.formula, dimension, runDuration)
    case 'table': {
      const rows = readPairs(reading, [...place, 'table'], form.table, ['time', dimension], 'times')
      return makeRows(reading, place, form, rows, dimension)
    }
    case 'file':
      return makeRows(reading, place, form, readRecordFile(reading, place, form, dimension), dimension)
    default:
      return readNamedPulse(reading, place, form, dimension)
  }
}

/** What the named shapes may hold, each as far as it applies. */
interface NamedForm {
  shape?: Pulse['shape']
  peak?: unknown
  duration?: unknown
  rise?: unknown
  fall?: unknown
  start?: unknown
}

function readStart(reading: Reading, place: Place, form: { start?: unknown }): number | null {
  return readOptionalQuantity(reading, [...place, 'start'], form.start, 'time', 'not-negative', 0)
}

function makeRows(
  reading: Reading,
  place: Place,
  form: { shape?: 'table' | 'file'; start?: unknown },
  rows: Columns | null,
  dimension: DimensionName,
): Pulse | null {
  const start = readStart(reading, place, form)
  if (rows === null || start === null || form.shape === undefined) return null
  const times = start === 0 ? rows.first : rows.first.map((time) => time + start)
  return makeTable(form.shape, times, rows.second, dimension === 'length')
}

function readNamedPulse(
  reading: Reading,
  place: Place,
  form: NamedForm,
  dimension: DimensionName,
): Pulse | null {
  const start = readStart(reading, place, form)
  const times = readTimes(reading, place, form)
  const peak = readQuantity(reading, [...place, 'peak'], form.peak, dimension)
  if (times === null || peak === null || start === null) return null
  const { duration, rise, fall } = times
  switch (form.shape) {
    case 'rectangle':
      return makeRectangle(peak, start, duration)
    case 'half-sine':
      return makeHalfSine(peak, start, duration)
    case 'haversine':
      return makeHaversine(peak, start, duration)
    case 'step':
      return makeStep(peak, start)
    case 'ramp':
      return makeRamp(peak, start, rise)
    case 'triangle':
      return makeTrapezoid('triangle', peak, start, duration, rise, duration - rise)
    case 'trapezoid':
      return makeTrapezoid('trapezoid', peak, start, duration, rise, fall)
    default:
      return null
  }
}

interface Times {
  duration: number
  rise: number
  fall: number
}

/** Reads the times of a named shape, each 0 where the shape has none. */
function readTimes(reading: Reading, place: Place, form: NamedForm): Times | null {
  const time = (key: 'duration' | 'rise' | 'fall', range: 'positive' | 'not-negative') =>
    readQuantity(reading, [...place, key], form[key], 'time', range)
  if (form.shape === 'step') return { duration: 0, rise: 0, fall: 0 }
  if (form.shape === 'ramp') {
    const keys = (['rise', 'duration'] as const).filter((key) => Object.hasOwn(form, key))
    if (keys.length !== 1) {
      reading.faults.add(
        keys.length === 0 ? [...place, 'rise'] : place,
        faultText.oneOf(['rise', 'duration'], keys.length),
      )
      return null
    }
    const rise = time(keys[0], 'positive')
    return rise === null ? null : { duration: rise, rise, fall: 0 }
  }
  const duration = time('duration', 'positive')
  if (form.shape !== 'triangle' && form.shape !== 'trapezoid') {
    return duration === null ? null : { duration, rise: 0, fall: 0 }
  }
  const rise = form.rise === undefined && duration !== null ? duration / 2 : time('rise', 'not-negative')
  const fall = form.fall === undefined ? rise : time('fall', 'not-negative')
  if (duration === null || rise === null || fall === null) return null
  const sum = form.shape === 'triangle' ? rise : rise + fall
  if (sum > duration * (1 + 1e-12)) {
    reading.faults.add(place, faultText.riseOverDuration())
    return null
  }
  return { duration, rise, fall: Math.min(fall, duration - rise) }
}

function readFormulaPulse(
  reading: Reading,
  place: Place,
  raw: unknown,
  dimension: DimensionName,
  runDuration: number | null,
): Pulse | null {
  const formula = readQuantityFormula(reading, place, raw, dimension, 't')
  if (formula === null) return null
  for (let i = 0; i <= LIMITS.samples && formula.fixed === null; i++) {
    const t = ((runDuration ?? 0) * i) / LIMITS.samples
    const value = formula.at(t, 0)
    if (Number.isFinite(value) && Math.abs(value) <= LIMITS.magnitude) continue
    reading.faults.add(place, faultText.formulaNotFinite(raw, ` at t = ${showNumber(t * 1e6)} us`))
    return null
  }
  const jumps = formula.at(0, 0) !== 0
  return {
    shape: 'formula',
    value: (t) => formula.at(t, 0),
    rise: jumps ? 0 : null,
    breaks: jumps ? [0] : [],
  }
}
