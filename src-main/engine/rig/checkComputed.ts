import type { Material, RunSettings } from '../../contract/rig'
import type { FaultList } from './faultList'
import { faultText } from './faultText'
import type { Loose } from './form/loose'
import type { RigForm } from './form/rigForm'

/**
 * Refuses by name what is read and checked but whose law is not there yet. Each law that comes
 * deletes its lines here.
 * @param form of the rig
 * @param run its settings, with the method that was asked for
 * @param materials by name
 * @param faults gets `not-computed-yet`
 */
export function checkComputed(
  form: Loose<RigForm>,
  run: Pick<RunSettings, 'method'> | null,
  materials: Map<string, Material | null>,
  faults: FaultList,
): void {
  const refuse = (place: (string | number)[], what: string) =>
    faults.add(place, faultText.notComputedYet(what))
  for (const side of ['leftEnd', 'rightEnd'] as const) {
    if (form[side]?.kind === 'penetration')
      refuse([side, 'kind'], 'an end that goes into the ground (penetration)')
  }
  form.joints?.forEach((joint, i) => {
    if (joint?.kind === 'specimen') refuse(['joints', i, 'kind'], 'a specimen between two bars')
    if (joint?.kind !== 'cushion') return
    if (joint.curve !== undefined) refuse(['joints', i, 'curve'], 'a cushion given by a curve')
    if (joint.unloading !== undefined)
      refuse(['joints', i, 'unloading'], 'a cushion that unloads along another line')
    if (joint.mass !== undefined) refuse(['joints', i, 'mass'], 'a cushion with a mass')
  })
  for (const [name, material] of materials) {
    if ((material?.viscosity ?? 0) > 0) refuse(['materials', name, 'viscosity'], 'a material with viscosity')
  }
  if (run && run.method !== 'characteristics') {
    refuse(['run', 'method'], run.method === 'both' ? 'a run by both methods' : 'a run by elements')
  }
  if (form.run?.finiteStrain) refuse(['run', 'finiteStrain'], 'a run with finite strain')
  if (form.run?.lateralInertia) refuse(['run', 'lateralInertia'], 'a run with lateral inertia')
  if (form.run?.bulkViscosity) refuse(['run', 'bulkViscosity'], 'a run with bulk viscosity')
  if (form.run?.spall) refuse(['run', 'spall'], 'a run in which bars come apart by spall')
}
