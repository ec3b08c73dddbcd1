import type { z } from 'zod'
import type { Joint } from '../../../contract/rig'
import { faultText } from '../faultText'
import type { jointForm } from '../form/jointForm'
import type { Loose } from '../form/loose'
import type { Place } from '../place'
import { readOptionalQuantity } from '../readQuantity'
import type { Reading } from '../reading'
import { checkLoading } from './checkLoading'
import { checkOneOf } from './checkOneOf'
import { type Columns, readPairs } from './readPairs'

type Cushion = Extract<Joint, { kind: 'cushion' }>

/**
 * Reads a cushion between two bars.
 * @param reading gets `conflict`, `missing`, `out-of-range` and the faults of quantities
 * @param place where it stands
 * @param form as far as its form is right
 * @returns the cushion, or null where anything in it is faulty
 */
export function readCushion(
  reading: Reading,
  place: Place,
  form: Extract<Loose<z.infer<typeof jointForm>>, { kind?: 'cushion' }>,
): Cushion | null {
  const stiff = (key: 'stiffness' | 'unloading') =>
    readOptionalQuantity(reading, [...place, key], form[key], 'stiffness', 'positive', null)
  const atLeastZero = (key: 'damping' | 'mass' | 'gap', dimension: 'damping' | 'mass' | 'length') =>
    readOptionalQuantity(reading, [...place, key], form[key], dimension, 'not-negative', 0)

  checkOneOf(reading, place, form, ['stiffness', 'curve'])
  const stiffness = stiff('stiffness')
  const rows = readPairs(reading, [...place, 'curve'], form.curve, ['length', 'force'], 'closings')
  const unloading = stiff('unloading')
  const damping = atLeastZero('damping', 'damping')
  const mass = atLeastZero('mass', 'mass')
  const gap = atLeastZero('gap', 'length')
  if (rows) checkCurve(reading, [...place, 'curve'], rows)
  const tension = form.tension ?? false
  if (tension && gap !== null && gap > 0) reading.faults.add([...place, 'gap'], faultText.tensionAcrossGap())
  if (tension && Object.hasOwn(form, 'unloading')) {
    reading.faults.add([...place, 'unloading'], faultText.tensionAndUnloading())
  }
  const steepest = rows ? evaluateSteepest(rows) : stiffness
  if (unloading !== null && steepest !== null && unloading < steepest * (1 - ROUNDING)) {
    reading.faults.add([...place, 'unloading'], faultText.unloadingTooSoft(unloading, steepest))
  }
  if (damping === null || mass === null || gap === null) return null
  const curve = rows && { closing: rows.first, force: rows.second }
  return { kind: 'cushion', stiffness, curve, unloading, damping, mass, gap, tension }
}

/** An unloading given as the same slope in other words is not refused for its last digit. */
const ROUNDING = 1e-9

function checkCurve(reading: Reading, place: Place, rows: Columns): void {
  if (rows.first[0] !== 0 || rows.second[0] !== 0) {
    reading.faults.add(
      [...place, 0],
      faultText.outside('another first row', 'a first row of "0 mm" and "0 N"'),
    )
  }
  checkLoading(reading, place, rows.second, 'forces')
}

function evaluateSteepest({ first, second }: Columns): number {
  const slopes = first.slice(1).map((x, i) => (second[i + 1] - second[i]) / (x - first[i]))
  return slopes.reduce((a, b) => Math.max(a, b), 0)
}
