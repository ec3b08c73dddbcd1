import { mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { NOTICE } from '../../../../src-main/contract/notice'
import type { Result } from '../../../../src-main/contract/result'
import { RESULT_FILE_NAMES } from '../../../../src-main/documents/makeResultFiles'
import { runCommandLine } from '../../../../src-main/hosts/command-line/runCommandLine'
import type { Terminal } from '../../../../src-main/hosts/command-line/terminal'
import { makeExample, makeLongExample, makeRigFolder, type RigFolder } from './makeRigFolder'
import { makeTestTerminal } from './makeTestTerminal'

let folder: RigFolder
let rig: string

beforeEach(() => {
  folder = makeRigFolder()
  rig = folder.write('a.rig.json')
})
afterEach(() => folder.remove())

async function run(argv: string[], options: Partial<Terminal> = {}) {
  const terminal = makeTestTerminal(options)
  const status = await runCommandLine(argv, terminal)
  return { status, ...terminal.printed }
}

const onOneLine = (text: string): string => text.replace(/\s+/g, ' ')

describe('usage', () => {
  test('--version and --help print to standard output', async () => {
    expect(await run(['--version'])).toEqual({
      status: 0,
      out: expect.stringMatching(/^Barwright \d+\.\d+\.\d+\n$/),
      err: '',
    })
    const help = await run(['--help'])
    expect(help.status).toBe(0)
    expect(help.err).toBe('')
    for (const command of ['solve', 'check', 'study', 'report', 'selfcheck', 'serve']) {
      expect(help.out).toContain(`\n  ${command}`)
    }
    expect(onOneLine(help.out)).toContain(NOTICE)
  })

  test.each([
    [['solv', 'a'], "command line: unknown command 'solv' (Did you mean solve?)\n"],
    [['solve'], "command line: missing required argument 'rig'\n"],
    [['solve', 'a', '--fast'], "command line: unknown option '--fast'\n"],
    [['solve', 'a', 'b'], /^command line: too many arguments .*\n$/],
    [
      ['solve', 'a', '--method', 'guess'],
      /^command line: option '--method <method>' argument 'guess' is invalid\. .*\n$/,
    ],
    [['report', 'a'], "command line: required option '--out <file>' not specified\n"],
    [['serve', '--port', '70000'], /^command line: option '--port <port>'.*65535.*\n$/],
    [['serve', '--port', '1e3'], /^command line: option '--port <port>'.*\n$/],
  ])('%j is refused in one line', async (argv, message) => {
    const { status, out, err } = await run(argv)
    expect([status, out]).toEqual([2, ''])
    expect(err).toEqual(typeof message === 'string' ? message : expect.stringMatching(message))
  })

  test('no command at all is refused with the help', async () => {
    const { status, out, err } = await run([])
    expect([status, out]).toEqual([2, ''])
    expect(err).toContain('Usage: barwright')
  })
})

describe('what is not computed yet is refused, and says so', () => {
  test.each([
    [(at: string) => ['study', at], /^studies: .*not computed yet\n$/],
  ])('%s', async (argv, message) => {
    expect(await run(argv(rig))).toEqual({ status: 2, out: '', err: expect.stringMatching(message) })
  })

  test('a study of a broken rig is refused by the faults of the rig', async () => {
    expect((await run(['study', folder.write('b.rig.json', '{')])).err).toContain('b.rig.json: line 1')
  })
})

describe('refusals', () => {
  test('every fault of a file has its line, each with its path', async () => {
    const broken = makeExample()
    broken.bars[0].sections[0].length = '300 MPa'
    broken.gauges[0].bar = 'shift'
    const { status, out, err } = await run(['check', folder.write('b.rig.json', JSON.stringify(broken))])
    expect([status, out]).toEqual([2, ''])
    const lines = err.trimEnd().split('\n')
    expect(lines).toHaveLength(2)
    expect(lines[0]).toMatch(/^bars\[0\]\.sections\[0\]\.length: .*length.*/)
    expect(lines[1]).toMatch(/^gauges\[0\]\.bar: .*"shaft"/)
  })

  test('a fault of the whole file stands under the name of the file', async () => {
    const missing = folder.at('none.rig.json')
    expect(await run(['solve', missing])).toEqual({
      status: 2,
      out: '',
      err: `${missing}: cannot be read: there is no such file or folder\n`,
    })
    expect((await run(['solve', folder.path])).err).toBe(
      `${folder.path}: cannot be read: it is a folder, not a file\n`,
    )
  })

  test('a hostile file cannot write to the terminal', async () => {
    const text = '{ "\\u001b[2Jtitle\\nformat: fine": 1, "format": "barwright-rig/1" }'
    const { err } = await run(['check', folder.write('b.rig.json', text)])
    expect(err).not.toContain('\u001b')
    for (const line of err.trimEnd().split('\n')) expect(line).toMatch(/^[^:]+: ./)
    expect(err).not.toMatch(/^format: fine/m)
    const named = folder.at('none\u001b[2J\nformat: fine')
    expect((await run(['check', named])).err).toBe(
      `${folder.at('none\\u{1b}[2J\\u{a}format: fine')}: cannot be read: there is no such file or folder\n`,
    )
  })

  test('a field in full is refused with its size before the run', async () => {
    const long = folder.write('b.rig.json', JSON.stringify(makeLongExample()))
    const { status, out, err } = await run(['solve', long, '--full', '--out', folder.at('result')])
    expect([status, out]).toEqual([2, ''])
    expect(err).toMatch(/^--full: .*about 1\.36e\+4 million values.*at most 20 million.*\n$/)
  })

  test.each(['a.rig.json', 'sub', 'page.txt'])('a report to %s is refused', async (name) => {
    mkdirSync(folder.at('sub'))
    const before = folder.look()
    const { status, err } = await run(['report', rig, '--out', folder.at(name)])
    expect(status).toBe(2)
    expect(err.startsWith(`${folder.at(name)}: a report is a page`)).toBe(true)
    expect(folder.look()).toEqual(before)
  })

  test('a folder with files of the user is refused before the run and stays as it is', async () => {
    mkdirSync(folder.at('mine'))
    writeFileSync(folder.at('mine/notes.txt'), 'mine')
    const before = folder.look()
    const { status, err } = await run(['solve', rig, '--out', folder.at('mine')])
    expect(status).toBe(2)
    expect(err).toBe(
      `${folder.at('mine')}: it holds "notes.txt", which is no part of a result; name a new folder\n`,
    )
    expect(folder.look()).toEqual(before)
  })
})

describe('solve', () => {
  test('a short table has the governing margin first, and the notice', async () => {
    const { status, out, err } = await run(['solve', rig])
    expect([status, err]).toEqual([0, ''])
    expect(out).toMatch(/^Drop striker on a stepped shaft\n\nGoverning margin \+\d/)
    for (const heading of [
      'Striker',
      'Peaks and margins',
      'First pulses',
      'Energy and momentum',
      'The run',
      'Cautions',
    ]) {
      expect(out).toMatch(new RegExp(`^${heading}`, 'm'))
    }
    expect(onOneLine(out)).toContain(NOTICE)
    expect(out).not.toContain('!!!')
    expect(Object.keys(folder.look())).toEqual(['a.rig.json'])
  })

  test('a negative margin cannot be missed', async () => {
    const weak = makeExample()
    weak.materials.steel.allowable.tension = '100 MPa'
    const { status, out } = await run(['solve', folder.write('b.rig.json', JSON.stringify(weak))])
    expect(status).toBe(0)
    const rule = '!'.repeat(96)
    expect(out).toMatch(new RegExp(`\\n${rule}\\nGoverning margin −0\\.\\d+\\. NEGATIVE MARGIN: `))
    expect(out).toMatch(/−0\.\d+ {2}NEGATIVE: over the limit, governing\n/)
  })

  test('a folder gets the five files, and its result is whole', async () => {
    const { status, out } = await run(['solve', rig, '--out', folder.at('result')])
    expect(status).toBe(0)
    expect(out).toContain(`Result written to ${folder.at('result')}\n`)
    expect(onOneLine(out)).toContain(NOTICE)
    expect(Object.keys(folder.look()).sort()).toEqual(
      ['a.rig.json', ...RESULT_FILE_NAMES.map((name) => join('result', name))].sort(),
    )
    const result = readResult('result')
    expect(result.format).toBe('barwright-result/1')
    expect(result.rig).toEqual({
      title: 'Drop striker on a stepped shaft',
      sha256: expect.stringMatching(/^[0-9a-f]{64}$/),
    })
    expect(result.software.name).toBe('Barwright')
    expect(result.notice).toBe(NOTICE)
    expect(result.run.solveTime).toBeGreaterThan(0)
    expect(readFileSync(folder.at('result/report.html'), 'utf8')).toContain('sqrt(2 * gravity * drop)')
    // The elastic impact of two equal impedances, rho c v / 2 with v = sqrt(2 g h): plain mechanics.
    const speed = Math.sqrt(2 * 9.80665 * 1.5)
    expect(result.striker!.speed / speed).toBeCloseTo(1, 12)
    const stress = (Math.sqrt(207e9 * 7850) * speed) / 2
    expect(Math.min(...result.gauges[0].stress.slice(0, 120)) / -stress).toBeCloseTo(1, 9)
  })

  test('--quiet prints nothing but errors', async () => {
    expect(await run(['solve', rig, '--quiet', '--out', folder.at('result')])).toEqual({
      status: 0,
      out: '',
      err: '',
    })
    expect(await run(['solve', rig, '--quiet'])).toEqual({ status: 0, out: '', err: '' })
  })

  test('--full keeps every cell and step', async () => {
    await run(['solve', rig, '--out', folder.at('thin')])
    await run(['solve', rig, '--full', '--out', folder.at('full')])
    const [thin, full] = [readResult('thin'), readResult('full')]
    expect(full.field.t).toHaveLength(full.run.steps + 1)
    expect(full.field.x.length).toBeGreaterThan(full.run.cells)
    expect(thin.field.t.length).toBeLessThan(full.field.t.length)
    // The ledgers are looked at more often, and so meet another rounding.
    const others = { field: null, energy: null, momentum: null, run: null }
    expect({ ...full, ...others }).toEqual({ ...thin, ...others })
  })

  test('the same rig gives the same bytes, however the run is sliced', async () => {
    let time = 0
    const clocks = {
      slow: () => (time += 1000),
      still: () => 0,
      true: () => performance.now(),
    }
    const texts = []
    for (const [name, clock] of Object.entries(clocks)) {
      await run(['solve', rig, '--quiet', '--out', folder.at(name)], { clock })
      texts.push(
        readFileSync(folder.at(`${name}/result.json`), 'utf8').replace(/"solveTime": .*/, '"solveTime": 0,'),
      )
    }
    expect(texts[1]).toBe(texts[0])
    expect(texts[2]).toBe(texts[0])
  })

  test('a rig with a hostile title runs nothing in a page or a spreadsheet', async () => {
    const hostile = makeExample()
    hostile.title = '<script>alert(1)</script>'
    hostile.bars[1].name = '=cmd|calc'
    hostile.gauges[0].name = '=1+1'
    hostile.gauges[0].bar = '=cmd|calc'
    const { status } = await run([
      'solve',
      folder.write('b.rig.json', JSON.stringify(hostile)),
      '--out',
      folder.at('result'),
    ])
    expect(status).toBe(0)
    const written = folder.look()
    expect(written[join('result', 'report.html')]).not.toContain('<script')
    expect(written[join('result', 'report.html')]).toContain('&lt;script&gt;alert(1)&lt;/script&gt;')
    expect(written[join('result', 'sections.csv')]).toMatch(/^'=cmd\|calc,/m)
    expect(written[join('result', 'gauges.csv')]).toMatch(/^time \[s\],'=1\+1 stress/)
  })

  test('a wish to stop ends the run with nothing written and the old result as it was', async () => {
    await run(['solve', rig, '--out', folder.at('result')])
    const long = folder.write('b.rig.json', JSON.stringify(makeLongExample()))
    const before = folder.look()
    const terminal = makeTestTerminal()
    let asked = Infinity
    setTimeout(() => {
      asked = performance.now()
      terminal.stop()
    }, 300)
    expect(await runCommandLine(['solve', long, '--out', folder.at('result')], terminal)).toBe(130)
    // 100 ms is what a user may wait; the rest is for a machine that runs other tests meanwhile.
    expect(performance.now() - asked).toBeLessThan(500)
    expect(terminal.printed).toEqual({ out: '', err: 'Stopped; nothing was written.\n' })
    expect(folder.look()).toEqual(before)
  })

  function readResult(name: string): Result {
    return JSON.parse(readFileSync(folder.at(join(name, 'result.json')), 'utf8')) as Result
  }
})

test('check prints the line as it is cut, and the notice', async () => {
  const { status, out, err } = await run(['check', rig])
  expect([status, err]).toEqual([0, ''])
  expect(out).toMatch(/\n {2}shaft +300\.0 +1660 +1360 +/)
  expect(out).toMatch(/\n {2}shaft, section 2 +cone +60\.00 +6 +/)
  expect(out).toMatch(/\n {2}time step +1\.947 µs\n/)
  expect(onOneLine(out)).toContain(NOTICE)
})

test('report writes one page', async () => {
  const { status, out } = await run(['report', rig, '--out', folder.at('page.html')])
  expect(status).toBe(0)
  expect(out).toContain(`Report written to ${folder.at('page.html')}`)
  expect(Object.keys(folder.look())).toEqual(['a.rig.json', 'page.html'])
  expect(readFileSync(folder.at('page.html'), 'utf8')).toContain('Governing margin of safety')
})

test('a place that cannot be written is reported as such', async () => {
  const { status, err } = await run(['report', rig, '--out', folder.at('none/page.html')])
  expect(status).toBe(1)
  expect(err).toBe(
    `${folder.at('none/page.html')}: cannot be written: there is no such file or folder; what was there before is unchanged\n`,
  )
})
