import { accessSync, closeSync, constants, openSync, readdirSync, readSync, statSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { describeFileError } from '../describeFileError'
import { isInside } from '../isInside'
import { RESULT_FILE_NAMES } from '../makeResultFiles'
import { restoreResultFolder } from './restoreResultFolder'
import { findResultPlace } from './resultPlace'

/** Files that file managers leave in every folder that they show. */
const STRAY = ['.DS_Store', 'Thumbs.db', 'desktop.ini']
const MARK = Buffer.from('{\n  "format": "barwright-result/')

/**
 * Checks that a result may be written to a folder: the folder is new, empty, or holds an earlier result
 * and nothing else, since it is replaced as a whole.
 *
 * @param path - as the user gave it
 * @returns why it is refused; null where it may be written
 */
export function checkResultFolder(path: string): string | null {
  try {
    const { folder } = findResultPlace(path)
    restoreResultFolder(path)
    const status = statSync(folder, { throwIfNoEntry: false })
    if (!status) return checkParent(dirname(folder))
    if (!status.isDirectory()) return 'it is a file; a result is a folder'
    if (folder === process.cwd() || isInside(folder, process.cwd())) {
      return 'it is or holds the folder you are in, which cannot be replaced; name a folder inside it'
    }
    return checkContent(folder) ?? checkParent(dirname(folder))
  } catch (error) {
    return `cannot be written: ${describeFileError(error)}`
  }
}

function checkContent(folder: string): string | null {
  const names = readdirSync(folder, { withFileTypes: true })
  const known: readonly string[] = [...RESULT_FILE_NAMES, ...STRAY]
  const foreign = names.find((entry) => !entry.isFile() || !known.includes(entry.name))
  if (foreign) return `it holds "${foreign.name}", which is no part of a result; name a new folder`
  const files = names.filter((entry) => !STRAY.includes(entry.name))
  if (files.length === 0 || isResult(join(folder, 'result.json'))) return null
  return 'it holds files but no result of this program; name a new folder'
}

/** Tells whether a file begins as `result.json` does. */
function isResult(path: string): boolean {
  if (!statSync(path, { throwIfNoEntry: false })?.isFile()) return false
  const file = openSync(path, 'r')
  try {
    const start = Buffer.alloc(MARK.length)
    readSync(file, start, 0, start.length, 0)
    return start.equals(MARK)
  } finally {
    closeSync(file)
  }
}

/** The nearest folder above that is there must take new entries. */
function checkParent(parent: string): string | null {
  const status = statSync(parent, { throwIfNoEntry: false })
  if (!status) return checkParent(dirname(parent))
  if (!status.isDirectory()) return `"${parent}" is a file, not a folder`
  accessSync(parent, constants.W_OK)
  return null
}
