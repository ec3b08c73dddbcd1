import type { Fault } from '../../contract/fault'
import type { Bar, Rig, RunSettings } from '../../contract/rig'
import { checkCounts } from './checkCounts'
import { checkMethod } from './checkMethod'
import { checkNames } from './checkNames'
import { checkSize } from './checkSize'
import { checkStudies } from './checkStudies'
import { makeFaultList } from './faultList'
import { checkForm } from './form/checkForm'
import type { Loose } from './form/loose'
import type { RigForm } from './form/rigForm'
import { readBars } from './geometry/readBars'
import { checkEndAsks } from './motion/checkEndAsks'
import { readEnd } from './motion/readEnd'
import { readJoints } from './motion/readJoints'
import { readGauges } from './readGauges'
import { readJson } from './readJson'
import { readLoads } from './readLoads'
import { readMaterials } from './readMaterials'
import { readOptionalQuantity } from './readQuantity'
import { readRun } from './readRun'
import { readVariables } from './readVariables'
import type { Reading, ReadRecord } from './reading'
import type { RigNotes } from './makeInspection'
import { makeReading } from './reading'

export interface ReadRigOptions {
  /** Access to records beside the rig; without it a rig that names one is refused. */
  readRecord?: ReadRecord
  /** Goes before the method that the file names. */
  method?: RunSettings['method']
  /** Takes down what the values are worth, also of a rig that is refused. */
  notes?: RigNotes
}

/** A checked rig, or every reason why there is none, in the order of the file. */
export type RigReading = { rig: Rig; faults: [] } | { rig: null; faults: Fault[] }

/**
 * Reads a rig file: the only way to a `Rig`. All faults of a file are found in one go.
 * @param text of the whole file; a host checks its size against `LIMITS.textBytes` before it reads it
 * @param options what lies beside the file, and what goes before it
 * @returns the rig in SI, or the faults, which may carry any `FaultCode`
 */
export function readRig(text: string, options: ReadRigOptions = {}): RigReading {
  const faults = makeFaultList()
  const document = readJson(text, faults)
  if (document === undefined) return { rig: null, faults: faults.inOrder(document) }
  checkEndAsks(document, faults)
  const form = checkForm(document, faults)
  const reading = makeReading(faults, options.readRecord ?? null, options.notes ?? null)
  const rig = form === null ? null : readForm(reading, form, options.method ?? null)
  if (rig !== null && faults.empty) checkSize(rig, faults)
  if (rig !== null && faults.empty) return { rig, faults: [] }
  if (faults.empty) throw new Error('a rig was refused without a fault')
  return { rig: null, faults: faults.inOrder(document) }
}

function readForm(reading: Reading, form: Loose<RigForm>, method: RunSettings['method'] | null): Rig | null {
  if (!checkCounts(form, reading.faults)) return null
  checkNames(form, reading.faults)
  readVariables(reading, form.variables ?? {})
  const materials = readMaterials(reading, form.materials ?? {})
  const run = readRun(reading, form.run, method)
  const duration = run?.duration ?? null
  const bars = readBars(reading, form.bars ?? [], materials)
  const leftEnd = readEnd(reading, 'leftEnd', form.leftEnd, bars[0]?.bar ?? null, duration)
  const rightEnd = readEnd(reading, 'rightEnd', form.rightEnd, bars[bars.length - 1]?.bar ?? null, duration)
  const joints = readJoints(reading, form.joints, bars.length === 0 ? null : bars.length - 1)
  const loads = readLoads(reading, form.loads, bars, { left: leftEnd, right: rightEnd }, duration)
  const gravity = readOptionalQuantity(reading, ['gravity'], form.gravity, 'acceleration', 'any', 0)
  const gauges = readGauges(reading, form.gauges, bars)
  const safety = form.margins?.factorOfSafety
  const factorOfSafety = readOptionalQuantity(
    reading,
    ['margins', 'factorOfSafety'],
    safety,
    'number',
    'positive',
    1,
  )
  checkStudies(reading, form.studies)
  checkMethod(
    run,
    bars.map(({ bar }) => bar),
    reading.faults,
  )
  const whole = bars.map(({ bar }) => bar).filter((bar): bar is Bar => bar !== null)
  if (whole.length !== bars.length || run === null || duration === null) return null
  if (leftEnd === null || rightEnd === null || joints === null) return null
  if (gravity === null || factorOfSafety === null) return null
  return {
    title: form.title ?? '',
    notes: form.notes ?? '',
    bars: whole,
    joints,
    leftEnd,
    rightEnd,
    loads,
    gravity,
    gauges,
    factorOfSafety,
    run: { ...run, duration },
  }
}
