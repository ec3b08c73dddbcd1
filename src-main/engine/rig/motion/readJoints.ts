import type { z } from 'zod'
import type { Joint } from '../../../contract/rig'
import { faultText } from '../faultText'
import type { jointForm } from '../form/jointForm'
import type { Loose } from '../form/loose'
import type { Place } from '../place'
import { readOptionalQuantity } from '../readQuantity'
import type { Reading } from '../reading'
import { readCushion } from './readCushion'
import { readSpecimen } from './readSpecimen'

type JointForm = Loose<z.infer<typeof jointForm>>

/**
 * Reads the joints between the bars; contacts without gap where they are left out.
 * @param reading gets `wrong-count`, `conflict`, `missing` and the faults of quantities
 * @param forms undefined where they are left out
 * @param count one fewer than bars; null where the bars are missing
 * @returns one per joint, or null where any is faulty
 */
export function readJoints(
  reading: Reading,
  forms: (JointForm | undefined)[] | undefined,
  count: number | null,
): Joint[] | null {
  const joints = forms?.map((form, i) => (form ? readJoint(reading, ['joints', i], form) : null))
  if (count === null) return null
  if (joints === undefined) return Array.from({ length: count }, () => ({ kind: 'contact', gap: 0 }))
  if (joints.length !== count) {
    const expected = `${count} joint${count === 1 ? '' : 's'}, one fewer than bars`
    reading.faults.add(['joints'], faultText.wrongCount(expected, joints.length))
  }
  return joints.length === count && joints.every((joint) => joint !== null) ? joints : null
}

function readJoint(reading: Reading, place: Place, form: JointForm): Joint | null {
  switch (form.kind) {
    case undefined:
      return null
    case 'bonded':
      return { kind: 'bonded' }
    case 'contact': {
      const gap = readOptionalQuantity(reading, [...place, 'gap'], form.gap, 'length', 'not-negative', 0)
      return gap === null ? null : { kind: 'contact', gap }
    }
    case 'cushion':
      return readCushion(reading, place, form)
    case 'specimen':
      return readSpecimen(reading, place, form)
  }
}
