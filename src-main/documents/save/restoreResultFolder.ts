import { existsSync, readdirSync, renameSync, rmSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { findResultPlace, isLeftover } from './resultPlace'

/** Age at which what a killed run left behind is no longer taken for that of a run under way [ms]. */
const ABANDONED = 24 * 60 * 60 * 1000

/**
 * Puts things right after a run that was killed while it replaced a result: an old result that was moved
 * aside comes back, and folders left half written for a day are removed.
 *
 * @param path - the result folder, as the user gave it
 */
export function restoreResultFolder(path: string): void {
  const { folder, parent, newPrefix, oldPrefix } = findResultPlace(path)
  if (!existsSync(parent)) return
  const names = readdirSync(parent)
  const aside = names.filter((name) => isLeftover(name, oldPrefix)).map((name) => join(parent, name))
  if (!existsSync(folder) && aside.length > 0) renameSync(aside.pop()!, folder)
  const halves = names.filter((name) => isLeftover(name, newPrefix)).map((name) => join(parent, name))
  for (const left of [...aside, ...halves]) {
    if (Date.now() - statSync(left).mtimeMs > ABANDONED) rmSync(left, { recursive: true, force: true })
  }
}
