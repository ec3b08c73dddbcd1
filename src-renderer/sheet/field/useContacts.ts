import { shallowRef, watch, type ShallowRef } from 'vue'
import type { PageResult } from '../../../src-main/contract/bridge'
import { useBridge } from '../../stores/useBridge'
import { useLayout } from '../../stores/useLayout'
import { useRun } from '../../stores/useRun'
import { useView } from '../../stores/useView'
import type { ContactSpell } from './draw/fieldModel'
import { listSpells } from './listSpells'
import { makeLatest } from './makeLatest'
import { shareByRun } from './shareByRun'

/**
 * Keeps the spells in which the joints that can open carry force, within the time that is looked at: read
 * from the force in the bar's last sliver before each joint.
 *
 * @returns spells of all joints but bonded ones
 */
export const useContacts: () => ShallowRef<ContactSpell[]> = shareByRun(() => {
  const [bridge, run, view, layout] = [useBridge(), useRun(), useView(), useLayout()]
  const contacts = shallowRef<ContactSpell[]>([])

  async function fetch({ result, fromT, toT, rows }: Wanted): Promise<ContactSpell[]> {
    const joints = run.line.value?.joints ?? []
    const spells = await Promise.all(
      joints.map(async ({ kind, x }, i) => {
        if (kind === 'bonded') return []
        const values = await bridge.readField({
          slot: run.slot,
          quantity: 'force',
          fromX: x - 1e-6 * view.lengthX.value,
          toX: x,
          fromT,
          toT,
          columns: 1,
          rows,
        })
        const least = 1e-6 * Math.abs(result.joints[i]?.peakForce ?? 0)
        return listSpells(values, least, fromT, toT).map((spell) => ({ x, ...spell }))
      }),
    )
    return spells.flat()
  }

  const latest = makeLatest(
    fetch,
    (answer, { result }) => {
      if (result === run.result.value) contacts.value = answer
    },
    () => (contacts.value = []),
  )
  watch(
    [run.result, view.fromT, view.toT, () => layout.field.height],
    () => {
      const result = run.result.value
      if (!result) {
        latest.drop()
        contacts.value = []
        return
      }
      const [fromT, toT] = [view.fromT.value, view.toT.value]
      latest.ask({ result, fromT, toT, rows: Math.round(layout.field.height) })
    },
    { immediate: true },
  )
  return contacts
})

interface Wanted {
  result: PageResult
  fromT: number
  toT: number
  rows: number
}
