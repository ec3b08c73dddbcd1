import { onScopeDispose, shallowRef, watch, type ShallowRef } from 'vue'
import type { PageResult } from '../../../src-main/contract/bridge'
import { useBridge } from '../../stores/useBridge'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'
import { listSpells } from '../field/listSpells'
import { makeLatest } from '../field/makeLatest'
import type { JointTrace } from './makeContactSpec'
import type { Stretch } from './pulseWindow'

/** What a joint that can open carries in the time that is looked at. */
export interface JointReading {
  name: string
  kind: string
  trace: JointTrace
  /** When it carries force [s]; those that reach over the time that is looked at are cut there. */
  contacts: Stretch[]
  /** The first of them that is seen whole, to a time step; null where none is. */
  whole: Stretch | null
  /** Force of largest magnitude in the whole run [N]. */
  peak: number
  /** The run that it was read from; null before it is. */
  result: PageResult | null
}

/** Share of a joint's largest force up to which it carries none. */
const REST = 1e-6

/** Width of the sliver of bar before a joint in which its force is read, as a share of the line. */
const SLIVER = 1e-6

/**
 * Reads the force in every joint but bonded ones, one value for each pixel of the field's height: of those
 * within the pixel the one of largest magnitude.
 *
 * @returns the readings of the last result, and what was read of earlier results
 */
export function useJointTraces(): {
  readings: ShallowRef<JointReading[]>
  earlier: WeakMap<PageResult, JointReading[]>
} {
  const [bridge, run, view, layout] = [useBridge(), useRun(), useView(), useLayout()]
  const readings = shallowRef<JointReading[]>([])
  const earlier = new WeakMap<PageResult, JointReading[]>()

  async function fetch({ result, fromT, toT, rows }: Wanted): Promise<JointReading[]> {
    const joints = run.line.value?.joints ?? []
    const found = await Promise.all(
      joints.map(async ({ kind, x }, i) => {
        const joint = result.joints[i]
        if (kind === 'bonded' || !joint) return []
        const least = REST * Math.abs(joint.peakForce)
        const read = async (from: number, to: number, count: number): Promise<Float32Array> =>
          bridge.readField({
            slot: run.slot,
            quantity: 'force',
            fromX: x - SLIVER * view.lengthX.value,
            toX: x,
            fromT: from,
            toT: to,
            columns: 1,
            rows: count,
          })
        const values = await read(fromT, toT, rows)
        const contacts = listSpells(values, least, fromT, toT)
        const whole = findWhole(contacts, { fromT, toT })
        return [
          {
            name: joint.name,
            kind,
            trace: readTrace(values, fromT, toT),
            contacts,
            whole: whole && (await sharpen(whole, (toT - fromT) / rows, result.run.timeStep, least, read)),
            peak: joint.peakForce,
            result,
          },
        ]
      }),
    )
    return found.flat()
  }

  const latest = makeLatest(
    fetch,
    (answer, { result }) => {
      if (result !== run.result.value) return
      readings.value = answer
      earlier.set(result, answer)
    },
    () => (readings.value = listUnread()),
  )

  /** Joints of the line before their force has come: what is known of those of the same name, or nothing. */
  function listUnread(): JointReading[] {
    const known = new Map(readings.value.map((reading) => [reading.name, reading]))
    return (run.line.value?.joints ?? []).flatMap(({ kind }, i): JointReading[] => {
      const joint = run.result.value?.joints[i]
      if (kind === 'bonded' || !joint) return []
      const { name, peakForce: peak } = joint
      return [
        known.get(name) ?? {
          name,
          kind,
          trace: readTrace([], 0, 1),
          contacts: [],
          whole: null,
          peak,
          result: null,
        },
      ]
    })
  }

  watch(
    [run.result, view.fromT, view.toT, () => layout.field.height],
    () => {
      const result = run.result.value
      if (!result) {
        latest.drop()
        readings.value = []
        return
      }
      readings.value = listUnread()
      latest.ask({
        result,
        fromT: view.fromT.value,
        toT: view.toT.value,
        rows: Math.max(1, Math.round(layout.field.height)),
      })
    },
    { immediate: true },
  )
  onScopeDispose(() => latest.drop())
  return { readings, earlier }
}

interface Wanted {
  result: PageResult
  fromT: number
  toT: number
  rows: number
}

/**
 * Finds the first contact that is not cut by the time that is looked at; one at the start of the run is whole.
 *
 * @param contacts - in that time, ascending [s]
 * @param shown - the time [s]
 */
export function findWhole(
  contacts: readonly Stretch[],
  { fromT, toT }: { fromT: number; toT: number },
): Stretch | null {
  return contacts.find(({ from, to }) => (from > fromT || fromT <= 0) && to < toT) ?? null
}

/** Reads both ends of a contact again, to a time step: the rows of the trace are coarser. */
async function sharpen(
  { from, to }: Stretch,
  row: number,
  step: number,
  least: number,
  read: (from: number, to: number, rows: number) => Promise<Float32Array>,
): Promise<Stretch> {
  const rows = Math.min(MOST_ROWS, Math.max(2, Math.ceil((2 * row) / step)))
  const look = async (at: number): Promise<Stretch[]> => {
    const start = Math.max(0, at - row)
    return listSpells(await read(start, at + row, rows), least, start, at + row)
  }
  const [first, last] = await Promise.all([look(from), look(to)])
  return { from: first.at(-1)?.from ?? from, to: last.at(0)?.to ?? to }
}

/** Rows that are read about one end of a contact, at most. */
const MOST_ROWS = 256

/**
 * Makes a trace of the extremes in each row.
 *
 * @param values - smallest and largest in each row, the earliest first, shape (rows, 2)
 * @param fromT - start of the first row [s]
 * @param toT - end of the last row [s]
 */
export function readTrace(values: ArrayLike<number>, fromT: number, toT: number): JointTrace {
  const rows = values.length / 2
  const t = new Float64Array(rows)
  const force = new Float64Array(rows)
  for (let row = 0; row < rows; row++) {
    const [low, high] = [values[2 * row], values[2 * row + 1]]
    t[row] = fromT + ((toT - fromT) * (row + 0.5)) / rows
    // Outside the run there is no number; a joint rests there.
    force[row] = (high + low >= 0 ? high : low) || 0
  }
  return { t, force }
}
