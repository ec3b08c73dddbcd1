/** Finest and coarsest step tried, as shares of the wanted one. */
const FINEST = 0.7
const COARSEST = 1
/** Candidates tried at most; more would take longer than they can gain. */
const MOST_CANDIDATES = 4000

/**
 * Chooses the time step near the wanted one that leaves the least rounding when each travel time
 * is cut into a whole number of steps (at least one).
 *
 * Candidates are tau/n for every travel time tau; the one with the smallest sum of
 * |n dt - tau| over all sections wins, the coarser one where two are equal to rounding.
 *
 * @param travelTimes travel time of each section [s], shape (sections), all positive
 * @param wanted the coarsest step allowed [s]
 * @returns the time step [s]
 */
export function chooseTimeStep(travelTimes: readonly number[], wanted: number): number {
  const counts = new Map<number, number>()
  for (const tau of travelTimes) {
    const key = Number(tau.toPrecision(13))
    counts.set(key, (counts.get(key) ?? 0) + 1)
  }
  const taus = [...counts.keys()]
  const weights = [...counts.values()]
  const noise = 1e-12 * travelTimes.reduce((sum, tau) => sum + tau, 0)

  let best = wanted
  let bestError = Infinity
  for (const dt of listCandidates(taus, wanted)) {
    let error = 0
    for (let i = 0; i < taus.length && error <= Math.max(bestError, noise); i++) {
      error += weights[i] * Math.abs(countCells(taus[i], dt) * dt - taus[i])
    }
    error = error < noise ? 0 : error
    if (error < bestError || (error === bestError && dt > best)) {
      best = dt
      bestError = error
    }
  }
  return best
}

/**
 * Counts the cells of one travel time dt that come nearest to a travel time tau, at least one.
 *
 * @param tau travel time [s]
 * @param dt time step [s]
 */
export function countCells(tau: number, dt: number): number {
  return Math.max(1, Math.round(tau / dt))
}

function listCandidates(taus: readonly number[], wanted: number): number[] {
  const candidates: number[] = [wanted]
  for (const tau of [...taus].sort((a, b) => b - a)) {
    const fewest = Math.max(1, Math.ceil(tau / (COARSEST * wanted) - 1e-9))
    const most = Math.floor(tau / (FINEST * wanted))
    for (let n = fewest; n <= most && candidates.length < MOST_CANDIDATES; n++) {
      candidates.push(tau / n)
    }
  }
  return candidates
}
