/** What a trace asks of the width. */
export interface Claim {
  /** Width that it would like, and least width at which it can be read [px]. */
  wanted: number
  least: number
}

/** A trace with its place. */
export interface LaidColumn {
  /** In the list of claims. */
  index: number
  /** From the left of the traces [px]. */
  left: number
  width: number
}

/**
 * Shares a width among traces from one of them on, as many as can be read, and one that always stands last.
 *
 * @param claims - of all traces but the last
 * @param last - claim of the one that stands last
 * @param from - first trace that is shown
 * @param width - to be shared [px]
 * @param gap - between traces [px]
 * @returns the traces shown with the last one at the end (index `claims.length`), in whole pixels
 */
export function layColumns(
  claims: readonly Claim[],
  last: Claim,
  from: number,
  width: number,
  gap: number,
): LaidColumn[] {
  let taken = last.least
  let count = 0
  while (from + count < claims.length && taken + gap + claims[from + count].least <= width) {
    taken += gap + claims[from + count].least
    count++
  }
  const shown = [...claims.slice(from, from + count), last]
  const room = width - gap * (shown.length - 1)
  const wanted = shown.reduce((sum, claim) => sum + claim.wanted, 0)
  // What some need beyond their share of the room comes from the others.
  const bound = shown.map((claim) => (claim.wanted / wanted) * room < claim.least)
  const fixed = shown.reduce((sum, claim, i) => sum + (bound[i] ? claim.least : 0), 0)
  const loose = shown.reduce((sum, claim, i) => sum + (bound[i] ? 0 : claim.wanted), 0)
  let left = 0
  return shown.map((claim, i) => {
    const own = bound[i] ? claim.least : (claim.wanted / loose) * (room - fixed)
    const isLast = i === shown.length - 1
    const whole = isLast ? width - left : Math.max(claim.least, Math.floor(own))
    const column = { index: isLast ? claims.length : from + i, left, width: whole }
    left += whole + gap
    return column
  })
}
