import type { Pulse } from '../../../contract/rig'
import type { FaultText } from '../faultText'
import { faultText } from '../faultText'
import { showLength, showNumber } from '../showValue'
import { findJump } from './findJump'

/** Share of the largest value below which a difference is a rounding. */
const ROUNDING = 1e-9

/**
 * Checks that a prescribed displacement nowhere jumps.
 * @param pulse the displacement [m]
 * @param initial displacement of the bar at this end at the start [m]
 * @param runDuration [s]; null where it is faulty
 * @returns the fault `conflict`, or null
 */
export function checkDisplacement(
  pulse: Pulse,
  initial: number,
  runDuration: number | null,
): FaultText | null {
  const first = pulse.value(0)
  if (Math.abs(first - initial) > ROUNDING * Math.max(Math.abs(first), Math.abs(initial))) {
    return faultText.displacementJump(
      `it starts at ${showLength(first)} and the end of the bar at ${showLength(initial)}`,
    )
  }
  if (!['table', 'file', 'formula'].includes(pulse.shape) && pulse.rise === 0) {
    return faultText.displacementJump(`a ${pulse.shape} without rise or fall does`)
  }
  const begin = pulse.breaks[0]
  if ((pulse.shape === 'table' || pulse.shape === 'file') && begin > 0 && pulse.value(begin) !== 0) {
    return faultText.displacementJump(
      `its first value is ${showLength(pulse.value(begin))} and it is zero before`,
    )
  }
  const jump = pulse.shape === 'formula' && runDuration !== null ? findJump(pulse, runDuration) : null
  return jump === null
    ? null
    : faultText.displacementJump(`the formula does at t = ${showNumber(jump * 1e6)} us`)
}
