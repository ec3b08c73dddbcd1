import type { ContactSpell } from './draw/fieldModel'
import type { PageResult, Quantity } from '../../../src-main/contract/bridge'
import { WEAKEST_FRONT } from './draw/listFrontLabels'
import { isOverAnywhere } from './makeFieldImage'

/**
 * Lists what the field's signs mean, of those that are in it.
 *
 * @param result - shown
 * @param quantity - shown
 * @param contacts - spells in which joints carry force
 * @returns a line for each
 */
export function listKey(result: PageResult, quantity: Quantity, contacts: readonly ContactSpell[]): string[] {
  const { wavefronts } = result
  const key: string[] = []
  if (wavefronts.some((front) => !front.spread))
    key.push('solid: front, with its force relative to the first')
  if (wavefronts.some((front) => front.spread)) key.push('dashed: front spread by a taper')
  if (wavefronts.some((front) => Math.abs(front.force) < WEAKEST_FRONT)) {
    key.push(`fronts under ${WEAKEST_FRONT} are left out`)
  }
  if (contacts.length > 0) key.push('thick bar: the contact carries force')
  if (result.spalls.length > 0) key.push('double line: the bar has come apart')
  if (quantity === 'stress' && isOverAnywhere(result)) key.push('hatched: over the allowable')
  return key
}
