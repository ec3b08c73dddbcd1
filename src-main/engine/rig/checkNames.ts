import { faultText } from './faultText'
import type { FaultList } from './faultList'
import type { Loose } from './form/loose'
import type { RigForm } from './form/rigForm'
import { LIMITS } from './limits'
import type { Place } from './place'
import { formatPlace } from './place'

/**
 * Checks the texts of a rig that people read: lengths, empty names, and names taken twice.
 * @param form of the rig
 * @param faults gets `too-large`, `missing`, `duplicate-name`
 */
export function checkNames(form: Loose<RigForm>, faults: FaultList): void {
  checkLength(['title'], form.title, LIMITS.titleLength, faults)
  checkLength(['notes'], form.notes, LIMITS.notesLength, faults)
  for (const name of Object.keys(form.materials ?? {})) checkName(['materials', name], name, faults)
  checkList('bars', form.bars, faults)
  checkList('gauges', form.gauges, faults)
  form.bars?.forEach((bar, i) =>
    bar?.sections?.forEach((section, k) => {
      checkLength(['bars', i, 'sections', k, 'name'], section?.name, LIMITS.nameLength, faults)
    }),
  )
}

function checkList(
  key: string,
  items: ({ name?: string } | undefined)[] | undefined,
  faults: FaultList,
): void {
  const first = new Map<string, Place>()
  items?.forEach((item, i) => {
    const name = item?.name
    if (name === undefined) return
    const place: Place = [key, i, 'name']
    checkName(place, name, faults)
    const before = first.get(name)
    if (before) faults.add(place, faultText.duplicateName(name, formatPlace(before.slice(0, -1))))
    else first.set(name, place)
  })
}

function checkName(place: Place, name: string, faults: FaultList): void {
  if (name.trim() === '') faults.add(place, faultText.nameEmpty())
  checkLength(place, name, LIMITS.nameLength, faults)
}

function checkLength(place: Place, text: string | undefined, most: number, faults: FaultList): void {
  if (text !== undefined && text.length > most) faults.add(place, faultText.nameTooLong(text.length, most))
}
