import { spawn } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { BROKEN_RIGS } from '../../engine/rig/brokenRigs'
import { makeLongExample, makeRigFolder, type RigFolder } from './makeRigFolder'

const entry = join(import.meta.dirname, '../../../../out/main/commandLine.js')

let folder: RigFolder
beforeEach(() => {
  folder = makeRigFolder()
})
afterEach(() => folder.remove())

function start(...args: string[]) {
  const child = spawn(process.execPath, [entry, ...args], { stdio: ['ignore', 'pipe', 'pipe'] })
  const printed = { out: '', err: '' }
  child.stdout.on('data', (data: Buffer) => (printed.out += data.toString()))
  child.stderr.on('data', (data: Buffer) => (printed.err += data.toString()))
  const ended = new Promise<number | null>((resolve) => child.on('close', resolve))
  return { child, printed, ended }
}

async function run(...args: string[]) {
  const { printed, ended } = start(...args)
  return { status: await ended, ...printed }
}

describe.skipIf(!existsSync(entry))('the built command line (after npm run build)', () => {
  test('gives the same bytes twice, times of running apart', async () => {
    const rig = folder.write('a.rig.json')
    for (const name of ['one', 'two']) {
      expect(await run('solve', rig, '--quiet', '--out', folder.at(name))).toEqual({
        status: 0,
        out: '',
        err: '',
      })
    }
    const files = folder.look()
    const apart = (text: string): string =>
      text.replace(/"solveTime": [-+.e\d]+/, '').replace(/<dt>time spent in the solve<\/dt><dd>[^<]*/, '')
    for (const name of ['result.json', 'report.html', 'envelope.csv', 'gauges.csv', 'sections.csv']) {
      expect(apart(files[join('two', name)])).toBe(apart(files[join('one', name)]))
    }
  })

  test('refuses broken rigs by exit status 2, each with its path', async () => {
    const some = BROKEN_RIGS.filter((_rig, i) => i % 24 === 0)
    const rigs = some.map(({ text }, i) => folder.write(`${i}.rig.json`, text))
    const before = folder.look()
    for (const [i, { path }] of some.entries()) {
      const { status, out, err } = await run('solve', rigs[i], '--out', folder.at('result'))
      expect([status, out]).toEqual([2, ''])
      expect(err.startsWith(`${path === '' ? rigs[i] : path}: `)).toBe(true)
      expect(err.trimEnd().split('\n')).toHaveLength(1)
    }
    expect(folder.look()).toEqual(before)
  })

  test.skipIf(process.platform === 'win32').each(['SIGINT', 'SIGTERM'] as const)(
    'stops at %s (Windows cannot send one to another process)',
    async (signal) => {
      const long = folder.write('b.rig.json', JSON.stringify(makeLongExample()))
      const before = folder.look()
      const { child, printed, ended } = start('solve', long, '--out', folder.at('result'))
      await wait(1500)
      const asked = performance.now()
      child.kill(signal)
      expect(await ended).toBe(130)
      // 100 ms is what a user may wait; the rest is for a machine that runs other tests meanwhile.
      expect(performance.now() - asked).toBeLessThan(500)
      expect(printed).toEqual({ out: '', err: 'Stopped; nothing was written.\n' })
      expect(folder.look()).toEqual(before)
    },
  )

  test('leaves the old result when it is killed', async () => {
    const rig = folder.write('a.rig.json')
    const result = folder.at('result')
    expect((await run('solve', rig, '--quiet', '--out', result)).status).toBe(0)
    const before = readFileSync(join(result, 'result.json'), 'utf8')
    const long = folder.write('b.rig.json', JSON.stringify(makeLongExample()))
    const { child, ended } = start('solve', long, '--quiet', '--out', result)
    await wait(1000)
    child.kill('SIGKILL')
    expect(await ended).toBeNull()
    expect(readFileSync(join(result, 'result.json'), 'utf8')).toBe(before)
    expect((await run('solve', rig, '--quiet', '--out', result)).status).toBe(0)
  })

  test('a reader that closes the pipe is no fault', async () => {
    const { child, printed, ended } = start('solve', folder.write('a.rig.json'))
    child.stdout.destroy()
    expect(await ended).toBe(0)
    expect(printed.err).toBe('')
  })

  test.skipIf(process.platform === 'win32')(
    'serve prints one line, the address, and ends when told to (Windows cannot tell it)',
    async () => {
      const { child, printed, ended } = start('serve', '--port', '0')
      while (!printed.out.includes('\n')) await wait(20)
      const [address, token] = printed.out.trim().split('#')
      expect(printed.out).toMatch(/^http:\/\/127\.0\.0\.1:\d+\/#[\w-]{43}\n$/)
      expect(token.length).toBe(43)
      expect((await fetch(address)).status).toBe(200)
      const second = await run('serve', '--port', new URL(address).port)
      expect(second).toEqual({
        status: 2,
        out: '',
        err: expect.stringMatching(/^--port: port \d+ is taken.*\n$/),
      })
      child.kill('SIGTERM')
      expect(await ended).toBe(0)
      expect(printed.err).toBe('')
    },
  )

  test('holds no path of the machine that built it', () => {
    expect(readFileSync(entry, 'utf8')).not.toContain(join(import.meta.dirname, '../../../..'))
  })
})
