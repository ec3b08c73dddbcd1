import { execFileSync } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'

/** Top of the project. */
export const top = join(import.meta.dirname, '..', '..')

/**
 * Lists the files under version control, with what stands in those that are text.
 *
 * @returns path from the top and content, the lock of the packages left out
 */
export function readTrackedFiles(): { path: string; text: string }[] {
  return execFileSync('git', ['ls-files', '-z'], { cwd: top, encoding: 'utf8' })
    .split('\0')
    .filter((path) => path !== '' && path !== 'package-lock.json' && existsSync(join(top, path)))
    .map((path) => ({ path, text: readFileSync(join(top, path), 'utf8') }))
    .filter(({ text }) => !text.includes('\0'))
}
