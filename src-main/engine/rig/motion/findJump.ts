import type { Pulse } from '../../../contract/rig'

const INTERVALS = 4096
const HALVINGS = 60
/** A difference that is left after all halvings is a jump where it is more than this share of the range. */
const SHARE = 1e-6

/**
 * Looks for a jump in a pulse: the interval with the largest difference is halved until any
 * continuous function would have none left.
 * @param pulse to look at
 * @param duration time from 0 to look at [s]
 * @returns time of the jump [s], or null where none is found
 */
export function findJump(pulse: Pulse, duration: number): number | null {
  let before = pulse.value(0)
  let least = before
  let most = before
  let worst = 0
  let from = 0
  for (let i = 1; i <= INTERVALS; i++) {
    const value = pulse.value((duration * i) / INTERVALS)
    least = Math.min(least, value)
    most = Math.max(most, value)
    if (Math.abs(value - before) > worst) {
      worst = Math.abs(value - before)
      from = (duration * (i - 1)) / INTERVALS
    }
    before = value
  }
  let to = from + duration / INTERVALS
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (from + to) / 2
    const value = pulse.value(middle)
    if (Math.abs(value - pulse.value(from)) >= Math.abs(pulse.value(to) - value)) to = middle
    else from = middle
  }
  return Math.abs(pulse.value(to) - pulse.value(from)) > SHARE * (most - least) ? to : null
}
