import type { Rig } from '../../contract/rig'
import { estimateSize } from './estimateSize'
import type { FaultList } from './faultList'
import { faultText } from './faultText'
import { LIMITS } from './limits'
import { showLength, showNumber } from './showValue'

/**
 * Refuses a run that would be too large, before anything is made for it.
 * @param rig checked in all else
 * @param faults gets `too-many-cells`, `too-many-steps`, `too-much-memory`
 */
export function checkSize(rig: Rig, faults: FaultList): void {
  const { cells, steps, memory } = estimateSize(rig)
  const key = rig.run.cell === null ? 'timeStep' : 'cell'
  if (cells > LIMITS.cells) {
    faults.add(['run', key], faultText.tooManyCells(cells, coarser(rig, cells / LIMITS.cells)))
  }
  if (steps > LIMITS.steps) {
    const advice = `${coarser(rig, steps / LIMITS.steps)}, or a shorter duration`
    faults.add(['run', 'duration'], faultText.tooManySteps(steps, advice))
  }
  if (memory > LIMITS.memory && steps <= LIMITS.steps && cells <= LIMITS.cells) {
    const advice = `${coarser(rig, memory / LIMITS.memory)}, or a shorter duration`
    faults.add(['run', 'duration'], faultText.tooMuchMemory(memory, advice))
  }
}

/** What to write for a run that is smaller by a factor, rounded up to two digits. */
function coarser(rig: Rig, factor: number): string {
  const { cell, timeStep } = rig.run
  const enough = (value: number) => {
    const digit = 10 ** (Math.floor(Math.log10(value * factor)) - 1)
    return Math.ceil((value * factor * 1.01) / digit) * digit
  }
  return cell === null
    ? `give a time step of at least ${showNumber(enough(timeStep ?? 0) * 1e6)} us`
    : `give a cell of at least ${showLength(enough(cell))}`
}
