import type { Rig } from '../../src-main/contract/rig'
import { makeElementLine } from '../../src-main/engine/elements/makeElementLine'
import { makeElementMethod } from '../../src-main/engine/elements/makeElementMethod'
import { makeLine } from '../../src-main/engine/line/makeLine'
import { makeMarch } from '../../src-main/engine/march/march'
import { makeRecords } from '../../src-main/engine/records/makeRecords'

/**
 * Marches a rig with elements at a share of the time step that they would choose, to its end.
 *
 * @param share in (0, 1]; the Courant number of a linear rig whose cells all have one travel time
 */
export function marchElementsAtCourant(rig: Rig, share: number) {
  const limit = makeElementLine(makeLine(rig))
  const dt = share * limit.dt
  const line = { ...limit, dt, steps: Math.ceil(rig.run.duration / dt - 1e-9) }
  const run = makeElementMethod(line)
  const records = makeRecords(run, false)
  const march = makeMarch(run, records, line.steps)
  march.advance(march.end)
  return { line, record: records.finish(), broken: march.broken }
}
