import { randomBytes } from 'node:crypto'
import { realpathSync } from 'node:fs'
import { basename, dirname, join, resolve } from 'node:path'

/** Where a result folder stands, and how the folders beside it are called while it is replaced. */
export interface ResultPlace {
  /** Absolute path, links resolved. */
  folder: string
  parent: string
  /** Start of the name of the new folder while it is written. */
  newPrefix: string
  /** Start of the name of the old folder while it is replaced. */
  oldPrefix: string
}

/**
 * Finds where a result folder stands.
 *
 * @param path - as the user gave it; need not exist
 * @returns the place; a link to a folder is followed
 */
export function findResultPlace(path: string): ResultPlace {
  const folder = followLinks(resolve(path))
  const name = basename(folder)
  return { folder, parent: dirname(folder), newPrefix: `.${name}.new-`, oldPrefix: `.${name}.old-` }
}

/**
 * Makes what ends the name of a folder beside the result, different on every call.
 *
 * @returns twelve hexadecimal digits
 */
export function makeSuffix(): string {
  return randomBytes(6).toString('hex')
}

/**
 * Tells whether a name is that of a folder which a run has left beside a result.
 *
 * @param name - of an entry of the parent folder
 * @param prefix - either prefix of the place
 * @returns true where our own suffix follows the prefix
 */
export function isLeftover(name: string, prefix: string): boolean {
  return name.startsWith(prefix) && /^[0-9a-f]{12}$/.test(name.slice(prefix.length))
}

function followLinks(path: string): string {
  try {
    return realpathSync(path)
  } catch {
    const parent = dirname(path)
    return parent === path ? path : join(followLinks(parent), basename(path))
  }
}
