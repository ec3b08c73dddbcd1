/** Most misses that are told; the rest are counted. */
const TOLD = 5

/**
 * Collects what is off among a great many numbers, so that one expectation can say it of all of them:
 * `expect(misses.told).toEqual([])`.
 */
export function makeMisses() {
  const told: string[] = []
  let looked = 0
  return {
    told,
    /** Numbers looked at. */
    get looked() {
      return looked
    },
    /**
     * @param tolerance largest distance allowed
     * @param where words that name the place
     */
    look(found: number, right: number, tolerance: number, ...where: (string | number)[]): void {
      looked++
      if (Math.abs(found - right) <= tolerance || told.length >= TOLD) return
      told.push(`${where.join(' ')}: ${found} for ${right}, allowed ${tolerance}`)
    },
  }
}
