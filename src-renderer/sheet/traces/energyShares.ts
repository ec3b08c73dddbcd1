import type { EnergyTable } from '../../../src-main/contract/result'

type Energy = {
  [K in keyof EnergyTable]: EnergyTable[K] extends number[] ? ArrayLike<number> : EnergyTable[K]
}

/** Where the energy of a run is, as shares of all of it that are stacked: each adds to those before. */
export interface EnergyShares {
  /** [s], shape (n) */
  t: ArrayLike<number>
  /** All energy of the run: what is stored at the start and the most that the surroundings give [J]. */
  total: number
  /** Upper edge of each share [1], shape (n) each; the last is 1 but for the closure. */
  bands: { name: string; edge: Float64Array }[]
}

/** Shares that never come to this much of the whole have no band of their own. */
const LEAST = 1e-9

/**
 * Stacks the energy of a run: kinetic, strain, lost, and what the surroundings have still to give,
 *
 *     (K + S + D + (W_most - W)) / (K0 + S0 + D0 - W0 + W_most),
 *
 * which is 1 at all times where energy is kept; so the edge of the stack is straight, and how far it is
 * from straight is the closure.
 *
 * @param energy - of the run, SI
 * @returns the shares; null where there is no energy at all
 */
export function evaluateEnergyShares(energy: Energy): EnergyShares | null {
  const { t, kinetic, strain, dissipated, work } = energy
  if (t.length === 0) return null
  let most = work[0]
  for (let i = 1; i < t.length; i++) most = Math.max(most, work[i])
  const total = kinetic[0] + strain[0] + dissipated[0] - work[0] + most
  if (!(total > 0)) return null
  const parts = [
    { name: 'kinetic', of: (i: number) => kinetic[i] },
    { name: 'strain', of: (i: number) => strain[i] },
    { name: 'lost', of: (i: number) => dissipated[i] },
    { name: 'to come', of: (i: number) => most - work[i] },
  ]
  const below = new Float64Array(t.length)
  const bands = parts.flatMap(({ name, of }) => {
    let largest = 0
    for (let i = 0; i < t.length; i++) {
      const share = of(i) / total
      below[i] += share
      largest = Math.max(largest, Math.abs(share))
    }
    return largest > LEAST ? [{ name, edge: below.slice() }] : []
  })
  // A share too small for a band of its own still counts at the edge.
  bands.at(-1)?.edge.set(below)
  return { t, total, bands }
}
