const MOST = 4

/**
 * Several places as one line: each once, in order, at most four by name.
 *
 * @param places such as `shaft, section 2`
 * @returns such as `shaft, section 2; shaft, section 3; and 5 more`
 */
export function joinPlaces(places: string[]): string {
  const each = [...new Set(places)]
  if (each.length <= MOST) return each.join('; ')
  return `${each.slice(0, MOST).join('; ')}; and ${each.length - MOST} more`
}
