/**
 * Puts a key or an index behind a path, the way faults name places.
 *
 * @param path - the path so far; empty at the top
 * @param part - the key or index that follows
 * @returns such as `bars[0].name`; a key that is no plain name stands as `["a b"]`
 */
export function joinPath(path: string, part: string | number): string {
  if (typeof part === 'number') return `${path}[${part}]`
  if (/^[A-Za-z_][A-Za-z0-9_-]*$/.test(part)) return path === '' ? part : `${path}.${part}`
  return `${path}[${JSON.stringify(part)}]`
}
