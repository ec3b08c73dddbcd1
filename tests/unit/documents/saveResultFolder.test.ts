import { spawnSync } from 'node:child_process'
import {
  chmodSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  realpathSync,
  renameSync,
  rmSync,
  statSync,
  symlinkSync,
  utimesSync,
  writeFileSync,
} from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { RESULT_FILE_NAMES, type ResultFiles } from '../../../src-main/documents/makeResultFiles'
import { checkResultFolder } from '../../../src-main/documents/save/checkResultFolder'
import { saveFile } from '../../../src-main/documents/save/saveFile'
import { saveResultFolder } from '../../../src-main/documents/save/saveResultFolder'

let place: string
let folder: string

beforeEach(() => {
  place = mkdtempSync(join(realpathSync(tmpdir()), 'save-'))
  folder = join(place, 'run 1')
})
afterEach(() => {
  rmSync(place, { recursive: true, force: true })
})

/** Files that each name the version they belong to; the first starts as `result.json` does. */
function makeFiles(version: string): ResultFiles {
  const start = '{\n  "format": "barwright-result/1",\n'
  const text = (name: string): string => (name === 'result.json' ? start : '') + version
  return Object.fromEntries(
    RESULT_FILE_NAMES.map((name) => [name, () => [text(name)]]),
  ) as unknown as ResultFiles
}

function readVersions(at = folder): string[] {
  return RESULT_FILE_NAMES.map((name) => readFileSync(join(at, name), 'utf8').split('\n').pop()!)
}

const five = (version: string): string[] => RESULT_FILE_NAMES.map(() => version)

describe('saving', () => {
  test('a new folder gets the five files and nothing stays beside it', async () => {
    folder = join(place, 'deep', 'er', 'run')
    expect(checkResultFolder(folder)).toBeNull()
    await saveResultFolder(folder, makeFiles('a'))
    expect(readVersions()).toEqual(five('a'))
    expect(readdirSync(join(place, 'deep', 'er'))).toEqual(['run'])
  })

  test('an earlier result is replaced as a whole', async () => {
    await saveResultFolder(folder, makeFiles('a'))
    writeFileSync(join(folder, '.DS_Store'), '')
    expect(checkResultFolder(folder)).toBeNull()
    await saveResultFolder(folder, makeFiles('b'))
    expect(readVersions()).toEqual(five('b'))
    expect(readdirSync(folder).sort()).toEqual([...RESULT_FILE_NAMES].sort())
    expect(readdirSync(place)).toEqual(['run 1'])
  })

  test.skipIf(process.platform === 'win32')('others may read it as far as the user lets them', async () => {
    await saveResultFolder(folder, makeFiles('a'))
    expect(statSync(folder).mode & 0o777).toBe(0o777 & ~process.umask())
  })

  test('content that cannot be made leaves the old result and nothing beside it', async () => {
    await saveResultFolder(folder, makeFiles('a'))
    const files = makeFiles('b')
    files['report.html'] = () => {
      throw new Error('no report')
    }
    await expect(saveResultFolder(folder, files)).rejects.toThrow('no report')
    expect(readVersions()).toEqual(five('a'))
    expect(readdirSync(place)).toEqual(['run 1'])
  })

  test('a wish to stop while it writes leaves the old result', async () => {
    await saveResultFolder(folder, makeFiles('a'))
    const stop = new AbortController()
    const files = makeFiles('b')
    files['gauges.csv'] = function* () {
      for (let i = 0; i < 1000; i++) {
        if (i === 500) stop.abort()
        yield 'x'.repeat(1000)
      }
    }
    await expect(saveResultFolder(folder, files, stop.signal)).rejects.toMatchObject({ name: 'AbortError' })
    expect(readVersions()).toEqual(five('a'))
    expect(readdirSync(place)).toEqual(['run 1'])
  })

  test('where the new folder cannot take the place, the old one comes back', async () => {
    await saveResultFolder(folder, makeFiles('a'))
    const files = makeFiles('b')
    files['report.html'] = function* () {
      yield 'b'
      // Takes the new folder away under the hands of the save, once its last file is made.
      const fresh = readdirSync(place).find((name) => name.startsWith('.run 1.new-'))!
      renameSync(join(place, fresh), join(place, 'gone'))
    }
    await expect(saveResultFolder(folder, files)).rejects.toThrow('ENOENT')
    expect(readVersions()).toEqual(five('a'))
  })
})

describe('what may not be replaced', () => {
  test.each([
    ['a file of the user', (at: string) => writeFileSync(join(at, 'thesis.docx'), 'x'), '"thesis.docx"'],
    ['a folder of the user', (at: string) => mkdirSync(join(at, 'photos')), '"photos"'],
    [
      'a folder by the name of a file of ours',
      (at: string) => {
        rmSync(join(at, 'gauges.csv'))
        mkdirSync(join(at, 'gauges.csv'))
      },
      '"gauges.csv"',
    ],
  ])('a result beside %s', async (_what, spoil, named) => {
    await saveResultFolder(folder, makeFiles('a'))
    spoil(folder)
    expect(checkResultFolder(folder)).toContain(`it holds ${named}, which is no part of a result`)
  })

  test('a folder whose files only have the names of ours', () => {
    mkdirSync(folder)
    writeFileSync(join(folder, 'report.html'), 'of another program')
    expect(checkResultFolder(folder)).toContain('no result of this program')
    writeFileSync(join(folder, 'result.json'), '{"format":"other"}')
    expect(checkResultFolder(folder)).toContain('no result of this program')
  })

  test('a file', () => {
    writeFileSync(folder, 'x')
    expect(checkResultFolder(folder)).toBe('it is a file; a result is a folder')
    expect(checkResultFolder(join(folder, 'below'))).toContain('is a file, not a folder')
  })

  test('the folder one is in, or one above it', () => {
    const here = realpathSync(process.cwd())
    expect(checkResultFolder('.')).toContain('the folder you are in')
    expect(checkResultFolder(here)).toContain('the folder you are in')
    expect(checkResultFolder(join(here, '..'))).toContain('the folder you are in')
  })

  test.skipIf(process.platform === 'win32' || process.getuid?.() === 0)(
    'a folder that is not writable (not tried by root, who may write anywhere)',
    () => {
      chmodSync(place, 0o500)
      expect(checkResultFolder(folder)).toContain('access is denied')
      chmodSync(place, 0o700)
    },
  )
})

test('an empty folder may be used', async () => {
  mkdirSync(folder)
  expect(checkResultFolder(folder)).toBeNull()
  await saveResultFolder(folder, makeFiles('a'))
  expect(readVersions()).toEqual(five('a'))
})

test.skipIf(process.platform === 'win32')('a link to a result is followed and stays a link', async () => {
  await saveResultFolder(folder, makeFiles('a'))
  const link = join(place, 'latest')
  symlinkSync(folder, link)
  expect(checkResultFolder(link)).toBeNull()
  await saveResultFolder(link, makeFiles('b'))
  expect(readVersions()).toEqual(five('b'))
  expect(readVersions(link)).toEqual(five('b'))
})

describe('what killed runs leave', () => {
  test('an old result that was moved aside comes back', async () => {
    await saveResultFolder(folder, makeFiles('a'))
    renameSync(folder, join(place, '.run 1.old-0123456789ab'))
    expect(checkResultFolder(folder)).toBeNull()
    expect(readVersions()).toEqual(five('a'))
    expect(readdirSync(place)).toEqual(['run 1'])
  })

  test('halves are removed after a day, not before, and only under our own names', () => {
    const names = [
      '.run 1.new-0123456789ab',
      '.run 1.new-ba9876543210',
      '.run 1.new-mine',
      '.other.new-0123456789ab',
    ]
    for (const name of names) mkdirSync(join(place, name))
    const old = new Date(Date.now() - 25 * 60 * 60 * 1000)
    for (const name of [names[0], names[2], names[3]]) utimesSync(join(place, name), old, old)
    expect(checkResultFolder(folder)).toBeNull()
    expect(readdirSync(place).sort()).toEqual([names[1], names[2], names[3]].sort())
  })

  test('a save that is killed at any moment leaves the old or the new result', async () => {
    const { build } = await import('vite')
    await build({
      configFile: false,
      logLevel: 'error',
      ssr: { noExternal: true },
      build: {
        ssr: join(import.meta.dirname, 'saveForEver.ts'),
        outDir: place,
        emptyOutDir: false,
        target: 'node20',
        rolldownOptions: { output: { entryFileNames: 'saveForEver.mjs' } },
      },
    })
    for (let i = 0; i < 12; i++) {
      const child = spawnSync(process.execPath, [join(place, 'saveForEver.mjs'), folder], {
        timeout: 250 + 17 * i,
        killSignal: 'SIGKILL',
        encoding: 'utf8',
      })
      expect([child.signal, child.stderr]).toEqual(['SIGKILL', ''])
      expect(checkResultFolder(folder)).toBeNull()
      if (!existsSync(folder)) continue
      const versions = readVersions()
      expect(versions).toEqual(five(versions[0]))
      expect(versions[0]).toMatch(/^x+ \d+$/)
    }
    expect(existsSync(folder)).toBe(true)
  })
})

test('a single file is replaced whole', async () => {
  const file = join(place, 'report.html')
  await saveFile(file, 'old')
  await saveFile(file, 'new')
  expect(readFileSync(file, 'utf8')).toBe('new')
  expect(readdirSync(place)).toEqual(['report.html'])
  await expect(saveFile(join(place, 'none', 'report.html'), 'x')).rejects.toThrow('ENOENT')
})
