import type { End, PointLoad } from '../../contract/rig'
import { faultText } from './faultText'
import type { Loose } from './form/loose'
import type { RigForm } from './form/rigForm'
import type { BarReading } from './geometry/readBars'
import { readPulse } from './motion/readPulse'
import type { Place } from './place'
import type { BarPoint } from './readBarPoint'
import { readBarPoint } from './readBarPoint'
import type { Reading } from './reading'

/** The ends of a line, null where one is faulty. */
export interface Ends {
  left: End | null
  right: End | null
}

/**
 * Reads the point forces.
 * @param reading gets `unknown-bar`, `out-of-range`, `both-motion-and-force` and the faults of pulses
 * @param forms undefined where there are none
 * @param bars of the rig
 * @param ends of the line: a force at an end whose motion is prescribed is refused
 * @param runDuration [s]; null where it is faulty
 * @returns those that are right
 */
export function readLoads(
  reading: Reading,
  forms: Loose<RigForm>['loads'],
  bars: BarReading[],
  ends: Ends,
  runDuration: number | null,
): PointLoad[] {
  return (forms ?? []).flatMap((form, i) => {
    if (!form) return []
    const place: Place = ['loads', i]
    const point = readBarPoint(reading, place, form, bars)
    const pulse = readPulse(reading, [...place, 'pulse'], form.pulse, 'force', runDuration)
    if (point === null) return []
    const end = endAt(point, bars, ends)
    if (end !== null && ['fixed', 'velocity', 'displacement'].includes(end.kind)) {
      const asks = [`a force at the end of the line`, `its motion by the kind "${end.kind}"`]
      reading.faults.add([...place, 'at'], faultText.bothMotionAndForce(asks))
    }
    return pulse === null ? [] : [{ ...point, pulse }]
  })
}

function endAt(point: BarPoint, bars: BarReading[], ends: Ends): End | null {
  if (point.bar === 0 && point.at === 0) return ends.left
  const last = bars.length - 1
  return point.bar === last && point.at === bars[last].length ? ends.right : null
}
