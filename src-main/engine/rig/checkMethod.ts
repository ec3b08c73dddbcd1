import type { Bar, Material, RunSettings } from '../../contract/rig'
import { checkLateralInertia } from './checkLateralInertia'
import type { FaultList } from './faultList'
import { faultText } from './faultText'

/** The settings of a run that only elements follow, and what they are called. */
const ELEMENTS_ONLY = [
  ['finiteStrain', 'finite strain'],
  ['lateralInertia', 'lateral inertia'],
  ['bulkViscosity', 'bulk viscosity'],
] as const

/**
 * Refuses what the method of a run would leave out without a word: a law that only elements follow,
 * or spall, which only characteristics do.
 *
 * @param run its settings, with the method that was asked for; null where it is missing
 * @param bars from the left; null for a faulty one, whose materials are not looked at
 * @param faults gets `conflict`, `missing`
 */
export function checkMethod(
  run: Omit<RunSettings, 'duration'> | null,
  bars: readonly (Bar | null)[],
  faults: FaultList,
): void {
  if (run === null) return
  const used = listUsed(bars)
  if (run.method === 'characteristics') {
    for (const [key, what] of ELEMENTS_ONLY) {
      if (run[key]) faults.add(['run', key], faultText.needsElements(what))
    }
    for (const { name, viscosity } of used) {
      if ((viscosity ?? 0) > 0) {
        faults.add(['materials', name, 'viscosity'], faultText.needsElements('viscosity'))
      }
    }
  } else if (run.lateralInertia) {
    checkLateralInertia(run, bars, used, faults)
  }
  if (run.spall) checkSpall(run.method, used, !bars.includes(null), faults)
}

function checkSpall(
  method: RunSettings['method'],
  used: readonly Material[],
  whole: boolean,
  faults: FaultList,
): void {
  if (method !== 'characteristics') {
    faults.add(['run', 'spall'], faultText.spallNeedsCharacteristics(method))
  } else if (whole && used.every(({ spall }) => spall === null)) {
    faults.add(['run', 'spall'], faultText.spallWithoutStrength())
  }
}

/** The materials that the bars are made of, each once. */
function listUsed(bars: readonly (Bar | null)[]): Material[] {
  return [...new Set(bars.flatMap((bar) => bar?.sections.map(({ material }) => material) ?? []))]
}
