import { describe, expect, test } from 'vitest'
import { NOTICE } from '../../../../src-main/contract/notice'
import { runCommandLine } from '../../../../src-main/hosts/command-line/runCommandLine'
import { selfcheckCommand } from '../../../../src-main/hosts/command-line/selfcheckCommand'
import type { Check } from '../../../../src-main/selfcheck/check'
import { CHECKS } from '../../../../src-main/selfcheck/checks'
import { makeTestTerminal } from './makeTestTerminal'

const onOneLine = (text: string): string => text.replace(/\s+/g, ' ')

const make = (id: string, computed: number): Check => ({
  id,
  title: `Check of ${id}`,
  section: 1,
  source: `the book of ${id}`,
  values: [
    { what: 'first number', published: 3 },
    { what: 'second number', published: 2 },
  ],
  tolerance: 1e-6,
  reason: 'of a reason',
  compute: () => [3, computed],
})

describe('selfcheck', () => {
  test('runs the whole list, shows every check with its source, and ends with the count', async () => {
    const terminal = makeTestTerminal()
    expect(await runCommandLine(['selfcheck'], terminal)).toBe(0)
    const { out, err } = terminal.printed
    expect(err).toBe('')
    const lines = out.trimEnd().split('\n')
    expect(lines.at(-1)).toBe(`${CHECKS.length} of ${CHECKS.length} checks passed on this machine`)
    expect(onOneLine(out)).toContain(NOTICE)
    for (const { id, title, source } of CHECKS) {
      const row = lines.find((line) => line.trim().startsWith(`${id} `))
      expect(row).toContain(title)
      expect(row).toMatch(/ {2}pass$/)
      const number = /\[\d+\]/.exec(row!)![0]
      expect(onOneLine(out)).toContain(`${number} ${source}`)
    }
  })

  test('--json has every value of every check', async () => {
    const terminal = makeTestTerminal()
    expect(await runCommandLine(['selfcheck', '--json'], terminal)).toBe(0)
    const report = JSON.parse(terminal.printed.out) as {
      passed: number
      count: number
      notice: string
      checks: { id: string; values: { what: string; published: number; computed: number }[] }[]
    }
    expect(report).toMatchObject({ passed: CHECKS.length, count: CHECKS.length, notice: NOTICE })
    expect(report.checks.map(({ id, values }) => [id, values.length])).toEqual(
      CHECKS.map(({ id, values }) => [id, values.length]),
    )
  })

  test('a check that fails gives status 3, and is told in full', async () => {
    const terminal = makeTestTerminal()
    expect(await selfcheckCommand({}, terminal, [make('good', 2), make('bad', 2.0001)])).toBe(3)
    const { out } = terminal.printed
    expect(out).toMatch(/^ {2}good .* pass$/m)
    expect(out).toMatch(/^ {2}bad .* FAIL$/m)
    expect(out).toMatch(/^bad fails: allowed is .*, because of a reason$/m)
    expect(out).toMatch(/^ {2}second number +2 +2\.0001 +5\.000 × 10⁻⁵$/m)
    expect(out).not.toMatch(/^ {2}first number/m)
    expect(out.trimEnd().split('\n').at(-1)).toBe('1 of 2 checks passed on this machine')
  })

  test('a number that is none fails', async () => {
    const terminal = makeTestTerminal()
    expect(await selfcheckCommand({}, terminal, [make('none', NaN)])).toBe(3)
    expect(terminal.printed.out).toMatch(/^ {2}none .* FAIL$/m)
  })

  test('shows progress on a terminal and leaves nothing of it behind', async () => {
    let now = 0
    const terminal = makeTestTerminal({ showsProgress: true, clock: () => (now += 700) })
    await selfcheckCommand({}, terminal, [make('a', 2), make('b', 2), make('c', 2), make('d', 2)])
    expect(terminal.printed.err).toContain('50 %')
    expect(terminal.printed.err.endsWith('\r\u001b[2K')).toBe(true)
  })

  test('can be stopped between two checks', async () => {
    const terminal = makeTestTerminal()
    const computed: string[] = []
    const stopping = ['a', 'b', 'c'].map((id) => ({
      ...make(id, 2),
      compute: () => {
        computed.push(id)
        if (id === 'b') terminal.stop()
        return [3, 2]
      },
    }))
    await expect(selfcheckCommand({}, terminal, stopping)).rejects.toThrow('aborted')
    expect(computed).toEqual(['a', 'b'])
    expect(terminal.printed.out).toBe('')
  })
})
