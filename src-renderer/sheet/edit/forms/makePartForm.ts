import type { RigDocument } from '../../../stores/document/rigDocument'
import { parsePath } from '../../../stores/document/parsePath'
import { makeBarForm } from './barForm'
import { makeEndForm } from './endForm'
import type { PartForm } from './fieldSpec'
import { makeJointForm } from './jointForm'
import { makeMaterialForm } from './materialForm'
import { makeGaugeForm, makeLoadForm } from './pointForms'
import { makeSectionForm } from './sectionForm'
import { makeRigForm, makeRunForm } from './settingsForms'

/**
 * Lists the fields of whatever part is chosen.
 *
 * @param document - the rig
 * @param path - of the part
 * @returns its fields; null for a part that is edited in a way of its own
 */
export function makePartForm(document: RigDocument, path: string): PartForm | null {
  const [first, index, inner] = parsePath(path)
  if (first === 'rig') return makeRigForm(document)
  if (first === 'run') return makeRunForm(document)
  if (first === 'leftEnd' || first === 'rightEnd') return makeEndForm(document, path)
  if (index === undefined) return null
  if (first === 'bars')
    return inner === 'sections' ? makeSectionForm(document, path) : makeBarForm(document, path)
  if (first === 'joints') return makeJointForm(document, path)
  if (first === 'gauges') return makeGaugeForm(document, path)
  if (first === 'loads') return makeLoadForm(document, path)
  return first === 'materials' ? makeMaterialForm(document, path) : null
}
