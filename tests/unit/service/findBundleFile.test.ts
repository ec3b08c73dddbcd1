import { mkdirSync, mkdtempSync, realpathSync, rmSync, symlinkSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { findBundleFile } from '../../../src-main/service/findBundleFile'

describe('findBundleFile', () => {
  let folder: string
  let bundle: string

  beforeAll(() => {
    folder = realpathSync(mkdtempSync(join(tmpdir(), 'barwright-bundle-')))
    bundle = join(folder, 'renderer')
    mkdirSync(join(bundle, 'assets'), { recursive: true })
    writeFileSync(join(bundle, 'index.html'), '')
    writeFileSync(join(bundle, 'assets', 'index-a_1.js'), '')
    writeFileSync(join(bundle, 'secret.json'), '')
    writeFileSync(join(folder, 'outside.js'), '')
    mkdirSync(join(folder, 'renderer-other'))
    writeFileSync(join(folder, 'renderer-other', 'a.js'), '')
    symlinkSync(join(folder, 'outside.js'), join(bundle, 'linked.js'))
  })
  afterAll(() => rmSync(folder, { recursive: true }))

  it('finds the page and its files with their types', async () => {
    expect(await findBundleFile(bundle, '/')).toEqual({
      file: join(bundle, 'index.html'),
      contentType: 'text/html; charset=utf-8',
    })
    expect(await findBundleFile(bundle, '/assets/index-a_1.js')).toEqual({
      file: join(bundle, 'assets', 'index-a_1.js'),
      contentType: 'text/javascript; charset=utf-8',
    })
  })

  it.each([
    '/outside.js',
    '/../outside.js',
    '/assets/../../outside.js',
    '/%2e%2e/outside.js',
    '/..%2foutside.js',
    '/..\\outside.js',
    '/linked.js',
    '/../renderer-other/a.js',
    '//index.html',
    '/assets/',
    '/assets',
    '/index.html\0.js',
    '/secret.json',
    '/.hidden.js',
    'index.html',
    '',
  ])('finds nothing at %j', async (path) => {
    expect(await findBundleFile(bundle, path)).toBeNull()
  })
})
