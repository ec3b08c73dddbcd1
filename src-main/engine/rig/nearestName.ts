/**
 * Finds the known name that someone may have meant.
 * @param name what was written
 * @param known the names that would have been right
 * @returns the known name that differs only in capitals or in a few letters, or null
 */
export function nearestName(name: string, known: Iterable<string>): string | null {
  const allowed = Math.max(1, Math.min(3, Math.floor(name.length / 3)))
  let best: string | null = null
  let bestDistance = allowed + 1
  for (const candidate of known) {
    if (Math.abs(candidate.length - name.length) > allowed) continue
    const sameLetters = candidate.toLowerCase() === name.toLowerCase()
    const distance = sameLetters ? 0.5 : editDistance(name.toLowerCase(), candidate.toLowerCase())
    if (distance < bestDistance) {
      best = candidate
      bestDistance = distance
    }
  }
  return best
}

/** Letters to insert, drop, change or swap with their neighbour to turn one word into the other. */
function editDistance(a: string, b: string): number {
  let beforeLast: number[] = []
  let last = Array.from({ length: b.length + 1 }, (_, j) => j)
  for (let i = 1; i <= a.length; i++) {
    const row = [i]
    for (let j = 1; j <= b.length; j++) {
      const change = last[j - 1] + (a[i - 1] === b[j - 1] ? 0 : 1)
      row[j] = Math.min(last[j] + 1, row[j - 1] + 1, change)
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) {
        row[j] = Math.min(row[j], beforeLast[j - 2] + 1)
      }
    }
    beforeLast = last
    last = row
  }
  return last[b.length]
}
