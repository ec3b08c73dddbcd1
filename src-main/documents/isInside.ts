import { isAbsolute, relative, sep } from 'node:path'

/**
 * Tells whether a path lies within a folder, below it and not the folder itself.
 *
 * @param folder - absolute path, links resolved
 * @param path - absolute path, links resolved
 * @returns true where the folder holds it at any depth
 */
export function isInside(folder: string, path: string): boolean {
  const way = relative(folder, path)
  return way !== '' && way !== '..' && !way.startsWith(`..${sep}`) && !isAbsolute(way)
}
