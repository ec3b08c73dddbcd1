import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { cleanLine } from '../../../../src-main/documents/format/cleanLine'
import { runCommandLine } from '../../../../src-main/hosts/command-line/runCommandLine'
import { BROKEN_RIGS } from '../../engine/rig/brokenRigs'
import { makeRigFolder, type RigFolder } from './makeRigFolder'
import { makeTestTerminal } from './makeTestTerminal'

let folder: RigFolder
let before: Record<string, string>

beforeAll(async () => {
  folder = makeRigFolder()
  folder.write('good.rig.json')
  await runCommandLine(
    ['solve', folder.at('good.rig.json'), '--out', folder.at('result')],
    makeTestTerminal(),
  )
  before = folder.look()
  expect(Object.keys(before)).toHaveLength(6)
})
afterAll(() => folder.remove())

describe('a broken rig ends with its path, within a second, and an earlier result stays', () => {
  test.each(BROKEN_RIGS)('$name', async ({ text, path }) => {
    const rig = folder.write('broken.rig.json', text)
    const terminal = makeTestTerminal()
    const started = performance.now()
    const status = await runCommandLine(['solve', rig, '--out', folder.at('result')], terminal)
    expect(performance.now() - started).toBeLessThan(1000)
    expect([status, terminal.printed.out]).toEqual([2, ''])
    const lines = terminal.printed.err.trimEnd().split('\n')
    expect(lines).toHaveLength(1)
    expect(lines[0].startsWith(`${cleanLine(path === '' ? rig : path)}: `)).toBe(true)
    expect(folder.look()).toEqual({ ...before, 'broken.rig.json': Buffer.from(text).toString('latin1') })
  })
})
