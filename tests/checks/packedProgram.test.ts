import { listPackage } from '@electron/asar'
import { spawnSync } from 'node:child_process'
import { existsSync, readdirSync, readFileSync } from 'node:fs'
import { join, sep } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { FUSE_SENTINEL } from '../../packaging/makeStandIn.mjs'
import { NOTICE } from '../../src-main/contract/notice'
import { SOFTWARE } from '../../src-main/contract/software'
import { canPack, howPacked, packProgram, type PackedProgram } from './packProgram'
import { top } from './trackedFiles'

describe.skipIf(!canPack)(`the packed program (${howPacked})`, () => {
  let packed: PackedProgram

  beforeAll(() => {
    packed = packProgram()
  }, 180_000)
  afterAll(() => packed?.remove())

  it('holds the built program, its samples and licence, and nothing else', () => {
    const files = listPackage(packed.find('app.asar'), { isPack: false }).map((path) =>
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
    const known = /^\/(package\.json|LICENSE|samples(\/.*)?|out(\/(main|preload|renderer)(\/.*)?)?)$/
    expect(files.filter((path) => !known.test(path))).toEqual([])
    const manifest = JSON.parse(readFileSync(join(packed.app, 'package.json'), 'utf8')) as { main: string }
    expect(existsSync(join(packed.app, manifest.main))).toBe(true)
  })

  it('names no folder of the machine that built it', () => {
    for (const path of listFiles(join(packed.app, 'out'))) {
      expect(readFileSync(path, 'latin1').includes(top), path).toBe(false)
    }
  })

  it('brings the samples beside it too, where a user finds them', () => {
    const samples = packed.find('samples')
    expect(readdirSync(samples).sort()).toEqual(readdirSync(join(top, 'samples')).sort())
  })

  it('has the fuses of the configuration in its executable', () => {
    const executable = readFileSync(packed.find(process.platform === 'win32' ? 'Barwright.exe' : 'barwright'))
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
      spawnSync(process.execPath, [join(packed.app, 'out/main/commandLine.js'), ...args], {
        cwd: packed.folder,
        encoding: 'utf8',
        env: { PATH: process.env.PATH },
      })
    expect(run('--version').stdout).toContain(SOFTWARE.version)
    const solved = run('solve', join(packed.find('samples'), 'drop-hammer-shaft/drop-hammer-shaft.rig.json'))
    expect([solved.status, solved.stderr]).toEqual([0, ''])
    expect(solved.stdout.replace(/\s+/g, ' ')).toContain(NOTICE)
  })
})

function listFiles(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name))
}
