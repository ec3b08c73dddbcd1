import type { Rig } from '../../contract/rig'
import { estimateSize } from '../../engine/rig/estimateSize'

/** Values that a field in full may have; `result.json` takes about 20 bytes for each. */
const MOST_VALUES = 20_000_000

/**
 * Checks that the field at every cell and step is not too much to keep.
 *
 * @param rig - checked
 * @returns why it is refused, with the estimate; null where it is not
 */
export function checkFullField(rig: Rig): string | null {
  const { cells, steps } = estimateSize(rig)
  const values = (cells + 1) * (steps + 1)
  if (values <= MOST_VALUES) return null
  return (
    `the field at every cell and step would have about ${(values / 1e6).toPrecision(3)} million values ` +
    `(${Math.round(cells)} cells, ${Math.round(steps)} steps); at most ${MOST_VALUES / 1e6} million are kept: ` +
    'give a longer cell or a shorter duration, or leave --full out'
  )
}
