import type { RunSettings } from '../../contract/rig'
import { faultText } from './faultText'
import type { Loose } from './form/loose'
import type { RigForm } from './form/rigForm'
import type { Place } from './place'
import { readOptionalQuantity, readQuantity } from './readQuantity'
import type { Reading } from './reading'

/**
 * Reads how a rig is computed.
 * @param reading gets `missing`, `conflict` and the faults of quantities
 * @param form undefined where it is missing
 * @param method goes before the one of the file; null for the one of the file
 * @returns the settings; those that are faulty are null
 */
export function readRun(
  reading: Reading,
  form: Loose<RigForm>['run'],
  method: RunSettings['method'] | null,
): (Omit<RunSettings, 'duration'> & { duration: number | null }) | null {
  if (!form) return null
  const place: Place = ['run']
  const given = (['cell', 'timeStep'] as const).filter((key) => Object.hasOwn(form, key))
  if (given.length !== 1) {
    reading.faults.add(
      given.length === 0 ? [...place, 'cell'] : place,
      faultText.oneOf(['cell', 'timeStep'], given.length),
    )
  }
  return {
    duration: readQuantity(reading, [...place, 'duration'], form.duration, 'time', 'positive'),
    cell: readOptionalQuantity(reading, [...place, 'cell'], form.cell, 'length', 'positive', null),
    timeStep: readOptionalQuantity(reading, [...place, 'timeStep'], form.timeStep, 'time', 'positive', null),
    method: method ?? form.method ?? 'characteristics',
    finiteStrain: form.finiteStrain ?? false,
    lateralInertia: form.lateralInertia ?? false,
    bulkViscosity: form.bulkViscosity ?? false,
    spall: form.spall ?? false,
  }
}
