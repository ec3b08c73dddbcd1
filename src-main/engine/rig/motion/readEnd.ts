import type { z } from 'zod'
import type { Bar, End } from '../../../contract/rig'
import { faultText } from '../faultText'
import type { endForm } from '../form/endForm'
import type { Loose } from '../form/loose'
import type { DimensionName } from '../formula/dimension'
import type { Place } from '../place'
import type { Range } from '../faultText'
import { readOptionalQuantity, readQuantity } from '../readQuantity'
import type { Reading } from '../reading'
import { checkDisplacement } from './checkDisplacement'
import { readPulse } from './readPulse'

export type EndForm = Loose<z.infer<typeof endForm>>

/**
 * Reads an end of the line; free where it is left out.
 * @param reading gets `conflict`, `missing`, and the faults of pulses and quantities
 * @param side which end
 * @param form undefined where it is left out
 * @param bar the bar that ends there; null where it is faulty
 * @param runDuration [s]; null where it is faulty
 * @returns the end, or null where anything in it is faulty
 */
export function readEnd(
  reading: Reading,
  side: 'leftEnd' | 'rightEnd',
  form: EndForm | undefined,
  bar: Bar | null,
  runDuration: number | null,
): End | null {
  if (form === undefined) return { kind: 'free' }
  const place: Place = [side]
  const optional = (key: string, value: unknown, dimension: DimensionName, range: Range) =>
    readOptionalQuantity(reading, [...place, key], value, dimension, range, 0)
  switch (form.kind) {
    case undefined:
      return null
    case 'free':
    case 'fixed':
    case 'matched':
      return { kind: form.kind }
    case 'force':
    case 'velocity': {
      const pulse = readPulse(reading, [...place, 'pulse'], form.pulse, form.kind, runDuration)
      return pulse && { kind: form.kind, pulse }
    }
    case 'displacement': {
      const pulse = readPulse(reading, [...place, 'pulse'], form.pulse, 'length', runDuration)
      if (pulse === null) return null
      const jump = checkDisplacement(pulse, initialAt(side, bar), runDuration)
      if (jump) reading.faults.add([...place, 'pulse'], jump)
      return { kind: 'displacement', pulse }
    }
    case 'mass': {
      const mass = readQuantity(reading, [...place, 'mass'], form.mass, 'mass', 'positive')
      const velocity = optional('velocity', form.velocity, 'velocity', 'any')
      const gap = optional('gap', form.gap, 'length', 'not-negative')
      const joint = form.joint ?? 'contact'
      checkBondedGap(reading, place, joint, gap)
      return mass === null || velocity === null || gap === null
        ? null
        : { kind: 'mass', mass, velocity, joint, gap }
    }
    case 'support': {
      const stiffness = optional('stiffness', form.stiffness, 'stiffness', 'not-negative')
      const damping = optional('damping', form.damping, 'damping', 'not-negative')
      const mass = optional('mass', form.mass, 'mass', 'not-negative')
      const gap = optional('gap', form.gap, 'length', 'not-negative')
      const joint = form.joint ?? (form.gap === undefined ? 'bonded' : 'contact')
      checkBondedGap(reading, place, joint, gap)
      if (stiffness === null || damping === null || mass === null || gap === null) return null
      if (stiffness === 0 && damping === 0 && mass === 0) reading.faults.add(place, faultText.emptySupport())
      return { kind: 'support', stiffness, damping, mass, joint, gap }
    }
    case 'wall': {
      const gap = optional('gap', form.gap, 'length', 'not-negative')
      return gap === null ? null : { kind: 'wall', gap }
    }
    case 'penetration': {
      const loading = readQuantity(reading, [...place, 'loading'], form.loading, 'stiffness', 'positive')
      const unloading = readQuantity(
        reading,
        [...place, 'unloading'],
        form.unloading,
        'stiffness',
        'positive',
      )
      if (loading === null || unloading === null) return null
      if (unloading < loading) {
        reading.faults.add(
          [...place, 'unloading'],
          faultText.outside(String(form.unloading), 'at least the loading stiffness'),
        )
      }
      return { kind: 'penetration', loading, unloading }
    }
  }
}

function initialAt(side: 'leftEnd' | 'rightEnd', bar: Bar | null): number {
  if (!bar?.displacement) return 0
  const length = bar.sections.reduce((sum, section) => sum + section.length, 0)
  return side === 'leftEnd' ? bar.displacement(0, 0) : bar.displacement(length, 1)
}

function checkBondedGap(
  reading: Reading,
  place: Place,
  joint: 'bonded' | 'contact',
  gap: number | null,
): void {
  if (joint === 'bonded' && gap !== null && gap > 0)
    reading.faults.add([...place, 'gap'], faultText.bondedGap())
}
