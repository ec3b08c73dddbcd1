import { readFileSync } from 'node:fs'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import type { Result } from '../../../../src-main/contract/result'
import { runCommandLine } from '../../../../src-main/hosts/command-line/runCommandLine'
import { makeExample, makeRigFolder, type RigFolder } from './makeRigFolder'
import { makeTestTerminal } from './makeTestTerminal'

let folder: RigFolder

beforeEach(() => {
  folder = makeRigFolder()
})
afterEach(() => folder.remove())

async function run(argv: string[]) {
  const terminal = makeTestTerminal({})
  const status = await runCommandLine(argv, terminal)
  return { status, ...terminal.printed }
}

const onOneLine = (text: string): string => text.replace(/\s+/g, ' ')
const write = (change: (rig: Record<string, never>) => object): string =>
  folder.write('a.rig.json', JSON.stringify(change(makeExample() as unknown as Record<string, never>)))

describe('the two methods', () => {
  test('elements solve a rig, and the result names them', async () => {
    const rig = folder.write('a.rig.json')
    const { status, out } = await run(['solve', rig, '--method', 'elements', '--out', folder.at('result')])
    expect(status).toBe(0)
    expect(out).toContain('Result written')
    const result = JSON.parse(readFileSync(folder.at('result/result.json'), 'utf8')) as Result
    expect([result.method, result.comparison]).toEqual(['elements', null])
    expect(result.energy.closure).toBeLessThan(1e-9)
  })

  test('both are compared in words and in numbers', async () => {
    const rig = folder.write('a.rig.json')
    const { status, out } = await run(['solve', rig, '--method', 'both'])
    expect(status).toBe(0)
    expect(out).toMatch(/^ {2}method +characteristics, compared with elements$/m)
    const part = onOneLine(
      out.slice(out.indexOf('The two methods compared'), out.indexOf('Energy and momentum')),
    )
    expect(part).toContain('all other numbers are those of the characteristics')
    expect(part).toMatch(/The envelopes differ by up to [\d.]+ % of the largest stress\. .*trust/)
    expect(part).toMatch(/largest difference of the envelopes [\d.]+ % of the largest stress/)
    expect(part).toMatch(/gauge largest difference root mean square G1 [\d.]+ % [\d.]+ %/)
    await run(['solve', rig, '--method', 'both', '--out', folder.at('result')])
    expect(readFileSync(folder.at('result/report.html'), 'utf8')).toContain('The two methods compared')
  })

  test('what only elements follow is refused where the method is overridden', async () => {
    const rig = write((it) => ({
      ...it,
      run: { ...(it.run as object), method: 'elements', finiteStrain: true },
    }))
    expect((await run(['solve', rig, '--quiet'])).status).toBe(0)
    const { status, out, err } = await run(['solve', rig, '--method', 'characteristics'])
    expect([status, out]).toEqual([2, ''])
    expect(err).toMatch(/^run\.finiteStrain: finite strain is computed with elements alone.*\n$/)
  })
})

test('a bar that comes apart is shown with its breaks and its pieces', async () => {
  const weak = (it: Record<string, never>) => {
    const steel = { ...(it.materials as { steel: object }).steel, spall: '60 MPa' }
    return {
      ...it,
      materials: { steel },
      rightEnd: { kind: 'free' },
      run: { ...(it.run as object), spall: true },
    }
  }
  const { status, out } = await run(['solve', write(weak)])
  expect(status).toBe(0)
  const part = out.slice(out.indexOf('\nSpall\n'), out.indexOf('Energy and momentum'))
  expect(part).toMatch(/^ {2}bar +came apart at \[mm\] +time \[[µm]s\] +tension \[MPa\]\n {2}shaft /m)
  expect(part).toMatch(/^Pieces at the end of the run\n {2}piece of .*mean velocity \[m\/s\]\n {2}shaft /m)
})
