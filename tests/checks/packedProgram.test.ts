import { extractAll, listPackage } from '@electron/asar'
import { execFileSync, spawnSync } from 'node:child_process'
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join, sep } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { hasElectronRuntime } from '../../packaging/electronRuntime.mjs'
import { FUSE_SENTINEL } from '../../packaging/makeStandIn.mjs'
import { NOTICE } from '../../src-main/contract/notice'
import { SOFTWARE } from '../../src-main/contract/software'

const top = join(import.meta.dirname, '../..')
const isBuilt = existsSync(join(top, 'out/main/commandLine.js'))
const canPack = process.platform === 'linux' || process.platform === 'win32' || hasElectronRuntime()
const why = !isBuilt
  ? 'needs npm run build'
  : !canPack
    ? "needs Electron's runtime on this platform"
    : hasElectronRuntime()
      ? "around Electron's runtime"
      : 'around a stand-in: contents and fuse setting only, nothing of windows or sandbox'

describe.skipIf(!isBuilt || !canPack)(`the packed program (${why})`, () => {
  let packed: string
  let app: string

  beforeAll(() => {
    packed = mkdtempSync(join(tmpdir(), 'barwright-packed-'))
    execFileSync(process.execPath, [join(top, 'packaging/pack.mjs'), `--output=${packed}`], { stdio: 'pipe' })
    app = join(packed, 'app')
    extractAll(findFile(packed, 'app.asar'), app)
  }, 180_000)
  afterAll(() => rmSync(packed, { recursive: true, force: true }))

  it('holds the built program, its licence, and nothing else', () => {
    const files = listPackage(findFile(packed, 'app.asar'), { isPack: false }).map((path) =>
      path.replaceAll(sep, '/'),
    )
    const needed = [
      '/package.json',
      '/LICENSE',
      '/out/main/desktop.js',
      '/out/main/commandLine.js',
      '/out/main/browserHost.js',
      '/out/preload/preload.cjs',
      '/out/renderer/index.html',
    ]
    expect(files).toEqual(expect.arrayContaining(needed))
    const known = /^\/(package\.json|LICENSE|out(\/(main|preload|renderer)(\/.*)?)?)$/
    expect(files.filter((path) => !known.test(path))).toEqual([])
    const manifest = JSON.parse(readFileSync(join(app, 'package.json'), 'utf8')) as { main: string }
    expect(existsSync(join(app, manifest.main))).toBe(true)
  })

  it('names no folder of the machine that built it', () => {
    for (const path of listFiles(join(app, 'out'))) {
      expect(readFileSync(path, 'latin1').includes(top), path).toBe(false)
    }
  })

  it('brings the samples', () => {
    const samples = findFile(packed, 'samples')
    expect(readdirSync(samples).sort()).toEqual(readdirSync(join(top, 'samples')).sort())
  })

  it('has the fuses of the configuration in its executable', () => {
    const executable = readFileSync(
      findFile(packed, process.platform === 'win32' ? 'Barwright.exe' : 'barwright'),
    )
    const wire = executable.indexOf(FUSE_SENTINEL) + FUSE_SENTINEL.length
    const names = [
      'runAsNode',
      'cookieEncryption',
      'nodeOptions',
      'nodeInspect',
      'asarIntegrity',
      'onlyAsar',
      'browserSnapshot',
      'fileProtocol',
    ]
    const fuses = names.map((name, index) => [name, String.fromCharCode(executable[wire + 2 + index])])
    expect(Object.fromEntries(fuses)).toEqual({
      runAsNode: '0',
      cookieEncryption: '1',
      nodeOptions: '0',
      nodeInspect: '0',
      asarIntegrity: '1',
      onlyAsar: '1',
      browserSnapshot: '0',
      fileProtocol: '0',
    })
  })

  it('has a command line that runs from what was packed alone', () => {
    const run = (...args: string[]) =>
      spawnSync(process.execPath, [join(app, 'out/main/commandLine.js'), ...args], {
        cwd: packed,
        encoding: 'utf8',
        env: { PATH: process.env.PATH },
      })
    expect(run('--version').stdout).toContain(SOFTWARE.version)
    const solved = run('solve', join(findFile(packed, 'samples'), 'DEMO.rig.json'))
    expect([solved.status, solved.stderr]).toEqual([0, ''])
    expect(solved.stdout.replace(/\s+/g, ' ')).toContain(NOTICE)
  })
})

function listFiles(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name))
}

function findFile(folder: string, name: string): string {
  const found = readdirSync(folder, { withFileTypes: true, recursive: true }).find(
    (entry) => entry.name === name,
  )
  if (!found) throw new Error(`${name} was not packed`)
  return join(found.parentPath, found.name)
}
