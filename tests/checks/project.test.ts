import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { readTrackedFiles, top } from './trackedFiles'

const files = readTrackedFiles()
const LARGEST_FILE = 280

/** Spelt in two parts, so that this file does not hold what it looks for. */
const STRAY_WORDS = [
  [
    'a place of one machine',
    new RegExp(['(^|[\\s"\'`(=])/(wor', 'k|far', 'm|hom', 'e|roo', 't|Use', 'rs)/'].join('')),
  ],
  ['a place of one machine', new RegExp('bash_' + 'jobs')],
  [
    'a source outside the project',
    new RegExp('\\b(lec' + 'ture|trans' + 'cript|seed docu' + 'ment)\\b', 'i'),
  ],
  ['a host of packages', new RegExp('https?://[^ "]*\\b(regis' + 'try|de' + 'b)\\.', 'i')],
  ['a resolved address', new RegExp('"resol' + 'ved":')],
] as const

describe('the project', () => {
  it.each(STRAY_WORDS)('names nowhere %s', (_what, pattern) => {
    const found = files.flatMap(({ path, text }) =>
      text
        .split('\n')
        .filter((line) => pattern.test(line))
        .map((line) => `${path}: ${line.trim()}`),
    )
    expect(found).toEqual([])
  })

  it(`has no source file over ${LARGEST_FILE} lines of code`, () => {
    const large = files
      .filter(({ path }) => /^src-(main|renderer)\/.*\.(ts|vue)$/.test(path))
      .map(({ path, text }) => ({ path, lines: countCode(text) }))
      .filter(({ lines }) => lines > LARGEST_FILE)
    expect(large).toEqual([])
  })

  it('keeps no download address in the lock of its packages', () => {
    expect(readFileSync(join(top, 'package-lock.json'), 'utf8')).not.toMatch(/"resolved"|https?:\/\/registry/)
  })

  it('pins every package exactly, and bundles all of them', () => {
    const manifest = readManifest()
    expect(manifest.dependencies).toBeUndefined()
    for (const [name, version] of Object.entries(manifest.devDependencies)) {
      expect(version, name).toMatch(/^\d+\.\d+\.\d+$/)
    }
  })

  it('has every npm command that README and DEVELOPERS name', () => {
    const named = files
      .filter(({ path }) => /^(README|DEVELOPERS)\.md$|^samples\/.*\.md$/.test(path))
      .flatMap(({ text }) => [...text.matchAll(/npm (?:run )?([a-z][a-z:-]*)/g)].map(([, name]) => name))
    expect(named).toEqual(expect.arrayContaining(['ci', 'demo', 'test']))
    const known = ['ci', 'install', ...Object.keys(readManifest().scripts)]
    expect(known).toEqual(expect.arrayContaining(named))
  })

  it('has every file and folder that README and DEVELOPERS point at', () => {
    const pointed = files
      .filter(({ path }) => /^(README|DEVELOPERS)\.md$/.test(path))
      .flatMap(({ text }) => [
        ...[...text.matchAll(/\]\((?!https?:|#)([^)#]+)/g)].map(([, path]) => path),
        ...[...text.matchAll(/`((?:src-main|src-renderer|tests|samples|packaging)\/[\w./-]+)`/g)].map(
          ([, path]) => path,
        ),
      ])
    expect(pointed.length).toBeGreaterThan(0)
    expect(pointed.filter((path) => !existsSync(join(top, path)))).toEqual([])
  })
})

interface Manifest {
  scripts: Record<string, string>
  dependencies?: Record<string, string>
  devDependencies: Record<string, string>
}

function readManifest(): Manifest {
  return JSON.parse(readFileSync(join(top, 'package.json'), 'utf8')) as Manifest
}

function countCode(text: string): number {
  return text.split('\n').filter((line) => !/^\s*(\/\/|\*|\/\*|$)/.test(line)).length
}
