import type { FatigueCycle } from '../../../contract/result'
import type { Material } from '../../../contract/rig'
import type { RainflowCycle } from './countRainflow'
import { evaluateDamage } from './evaluateDamage'

/** Rows at most; sums over all cycles stand elsewhere. */
const MOST = 10
/** Ranges and means that differ by less than this share of the largest range are equal. */
const SAME = 1e-9

/**
 * Lists the largest ranges of a count with what each uses up of a life, equal ones in one row.
 *
 * @param cycles local stress [Pa]
 * @param fatigue the material's Basquin line
 * @returns at most ten rows, the largest range first
 */
export function listLargestCycles(
  cycles: readonly RainflowCycle[],
  fatigue: NonNullable<Material['fatigue']>,
): FatigueCycle[] {
  const sorted = [...cycles].sort((one, other) => other.range - one.range || other.mean - one.mean)
  const rows: Omit<FatigueCycle, 'damage'>[] = []
  for (const { range, mean, count } of sorted) {
    const isEqual = (row: (typeof rows)[number]): boolean =>
      Math.abs(row.range - range) <= SAME * sorted[0].range &&
      Math.abs(row.mean - mean) <= SAME * sorted[0].range
    const equal = rows.find(isEqual)
    if (equal !== undefined) equal.count += count
    else if (rows.length < MOST) rows.push({ range, mean, count })
    else if (range < rows[MOST - 1].range * (1 - SAME)) break
  }
  return rows.map((row) => ({ ...row, damage: evaluateDamage([row], fatigue) }))
}
