/** Keys and indexes from the top of a rig document. */
export type Path = (string | number)[]

const PART = /\.?([A-Za-z_][A-Za-z0-9_-]*)|\[(\d+)\]|\[("(?:[^"\\]|\\.)*")\]/gy

/**
 * Takes a path apart that is written the way faults name places.
 *
 * @param text - such as `bars[0].sections[1].length` or `materials["a b"].density`
 * @returns its keys and indexes
 */
export function parsePath(text: string): Path {
  const path: Path = []
  let end = 0
  for (const match of text.matchAll(PART)) {
    end = match.index + match[0].length
    if (match[1] !== undefined) path.push(match[1])
    else if (match[2] !== undefined) path.push(Number(match[2]))
    else path.push(JSON.parse(match[3]) as string)
  }
  if (end !== text.length) throw new Error(`not a path: ${text}`)
  return path
}
