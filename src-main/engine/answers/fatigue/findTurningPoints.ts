/**
 * Finds the peaks and valleys of a history.
 *
 * A turn counts once the history has gone back from it by more than `smallest`. Equal neighbours are
 * one point, named where they are first reached; the first and the last point are kept. Where small
 * swings are dropped, the points left are still the true extremes: the largest and the smallest value
 * of the history always stay.
 *
 * @param history values in their order, shape (n), all finite
 * @param smallest swing that is dropped, zero or more, in the unit of the history; 0 keeps every turn
 * @returns indices of the turning points, ascending; one where the history never leaves its start by
 *   more than `smallest`, none for an empty history
 */
export function findTurningPoints(history: ArrayLike<number>, smallest = 0): number[] {
  if (history.length === 0) return []
  const points: number[] = []
  let lowest = 0
  let highest = 0
  let direction = 0
  for (let i = 1; i < history.length; i++) {
    const value = history[i]
    if (value > history[highest]) highest = i
    if (value < history[lowest]) lowest = i
    if (direction >= 0 && history[highest] - value > smallest) {
      points.push(highest)
      direction = -1
      lowest = i
    } else if (direction <= 0 && value - history[lowest] > smallest) {
      points.push(lowest)
      direction = 1
      highest = i
    }
  }
  if (direction === 0) return [0]
  points.push(direction > 0 ? highest : lowest)
  return points
}
