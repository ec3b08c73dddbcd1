import { afterEach, beforeEach, expect, test, vi } from 'vitest'
import { makeSolve } from '../../../../src-main/engine/solveRig'
import { runCommandLine } from '../../../../src-main/hosts/command-line/runCommandLine'
import { makeRigFolder, type RigFolder } from './makeRigFolder'
import { makeTestTerminal } from './makeTestTerminal'

vi.mock('../../../../src-main/engine/solveRig', () => ({ makeSolve: vi.fn() }))

let folder: RigFolder
beforeEach(() => {
  folder = makeRigFolder()
})
afterEach(() => folder.remove())

test('a run that loses its numbers says where, and writes nothing', async () => {
  vi.mocked(makeSolve).mockReturnValue({
    step: 7,
    steps: 100,
    broken: true,
    advance: () => undefined,
    finish: () => {
      throw new Error('a broken run has no answers')
    },
  } as unknown as ReturnType<typeof makeSolve>)
  const rig = folder.write('a.rig.json')
  const terminal = makeTestTerminal()
  expect(await runCommandLine(['solve', rig, '--out', folder.at('result')], terminal)).toBe(1)
  expect(terminal.printed.err).toBe(
    `${rig}: the run was stopped after step 7 of 100, where its numbers were no longer finite; nothing was written\n`,
  )
  expect(Object.keys(folder.look())).toEqual(['a.rig.json'])
})

test.each([false, true])(
  'a fault of the program is not blamed on the rig (place asked for: %s)',
  async (debug) => {
    vi.mocked(makeSolve).mockImplementation(() => {
      throw new Error('index out of\nbounds')
    })
    const terminal = makeTestTerminal({ debug })
    expect(await runCommandLine(['solve', folder.write('a.rig.json')], terminal)).toBe(1)
    const [first, ...rest] = terminal.printed.err.split('\n')
    expect(first).toBe('A fault of the program, not of the rig: index out of\\u{a}bounds')
    expect(rest.join('\n').includes('faults.test.ts')).toBe(debug)
  },
)
