import { describe, expect, it } from 'vitest'
import { LIMITS } from '../../../../../src-main/engine/rig/limits'
import { parseRecord } from '../../../../../src-main/engine/rig/motion/parseRecord'
import { readChanged } from '../readChanged'

function read(text: string | { refused: string }, more: object = {}) {
  const asked: string[] = []
  const leftEnd = { kind: 'force', pulse: { shape: 'file', file: 'records/hit.csv', ...more } }
  const readRecord = (path: string) => {
    asked.push(path)
    return text
  }
  return { ...readChanged({ leftEnd }, { readRecord }), asked }
}

function values(text: string, more: object = {}): number[] {
  const { rig, faults } = read(text, more)
  if (rig?.leftEnd.kind !== 'force') throw new Error(JSON.stringify(faults))
  const { pulse } = rig.leftEnd
  return [1, 1.5, 2].map((t) => Number(pulse.value(t * 1e-6).toPrecision(12)))
}

const refusal = (text: string | { refused: string }, more: object = {}) =>
  read(text, more)
    .faults.map(({ code, path, message }) => `${code} ${path}: ${message}`)
    .join('\n')

describe('records', () => {
  const PLAIN = 't [us],F [kN]\n0,0\n1,2\n2,4\n3,0\n'

  it('are asked for by the path that the rig gives', () => {
    expect(read(PLAIN).asked).toEqual(['records/hit.csv'])
  })

  it.each([
    ['the first two columns by their headings', PLAIN, {}],
    [
      'with semicolons, spaces, quotes and Windows line ends',
      '"t [us]"; "F (kN)"\r\n0 ; 0\r\n1; 2\r\n2;4.0e0\r\n3;0\r\n',
      {},
    ],
    ['with tabs and a byte-order mark', '\uFEFFt [us]\tF [kN]\n0\t0\n1\t2\n2\t4\n3\t0', {}],
    ['in milliseconds and newton', 't [ms],F [N]\n0,0\n0.001,2000\n0.002,4000\n0.003,0\n', {}],
    [
      'columns by name',
      'x,F [kN],t [us]\n9,0,0\n9,2,1\n9,4,2\n9,0,3\n',
      { columns: { time: 't', value: 'F [kN]' } },
    ],
    [
      'columns by number',
      'x,F [kN],t [us]\n9,0,0\n9,2,1\n9,4,2\n9,0,3\n',
      { columns: { time: 3, value: 2 } },
    ],
    [
      'without headings',
      '0,0\n1,2\n2,4\n3,0\n',
      { columns: { time: { number: 1, unit: 'us' }, value: { number: 2, unit: 'kN' } } },
    ],
    [
      'scaled by a unit with a number',
      't [us],U\n0,0\n1,0.8\n2,1.6\n3,0\n',
      { columns: { value: { name: 'U', unit: '2.5 kN' } } },
    ],
    [
      'turned round by a negative unit',
      't [us],F\n0,0\n1,-2\n2,-4\n3,0\n',
      { columns: { value: { name: 'F', unit: '-1 kN' } } },
    ],
  ])('are read %s', (_name, text, more) => {
    expect(values(text, more)).toEqual([2000, 3000, 4000])
  })

  it.each([
    ['', 'the record is empty'],
    ['t [us],F [kN]\n', 'fewer than two rows'],
    ['t [us]\n1\n2\n', 'one column'],
    ['t [us],F [kN]\n0,0\n1,many\n', 'row 3, column 2 holds "many", which is no number'],
    ['t [us];F [kN]\n0;0\n1;2,5\n', 'write decimals with a point'],
    ['t [us],F [kN]\n0,0\n1,NaN\n', 'no number'],
    ['t [us],F [kN]\n0,0\n1,Infinity\n', 'no number'],
    ['t [us],F [kN]\n0,0\n1,1e999\n', 'no number'],
    ['t [us],F [kN]\n0,0\n1,0x10\n', 'no number'],
    ['t [us],F [kN]\n0,0\n1,\n', 'no number'],
    ['t [us],F [kN]\n0,0\n1,2,3\n', 'row 3 has 3 columns, the first has 2'],
    ['t [us],F [kN]\n0,0\n2,1\n1,2\n', 'row 4 does not come after'],
    ['t [us],F [kN]\n0,0\n1,"2\n', 'no table of numbers'],
    [`${'a,'.repeat(LIMITS.recordColumns)}b\n`, 'at most 100 are read'],
    [`t [us],F [kN]\n0,"${'1'.repeat(20_000)}"\n`, 'no table of numbers'],
  ])('are refused: %j', (text, why) => {
    expect(refusal(text)).toMatch(/^record-refused leftEnd\.pulse\.file: in "records\/hit\.csv": /)
    expect(refusal(text)).toContain(why)
  })

  it.each([
    [
      { columns: { time: 'T' } },
      'record-refused leftEnd.pulse.columns.time: the record has no column "T"; its headings are "t [us]", "F [kN]"',
    ],
    [
      { columns: { value: 3 } },
      'record-refused leftEnd.pulse.columns.value: there is no column 3; the record has 2',
    ],
    [
      { columns: { value: 1 } },
      'wrong-dimension leftEnd.pulse.columns.value: expected a force, got a time ("us")',
    ],
    [
      { columns: { value: { name: 'F', unit: 'mm' } } },
      'wrong-dimension leftEnd.pulse.columns.value.unit: expected a force, got a length ("mm")',
    ],
    [
      { columns: { value: {} } },
      'record-refused leftEnd.pulse.columns.value: name the column by either its name or its number',
    ],
    [{ columns: { value: 0 } }, 'out-of-range leftEnd.pulse.columns.value'],
  ])('are refused with %j', (more, why) => {
    expect(refusal(PLAIN, more)).toContain(why)
  })

  it('need a unit from somewhere', () => {
    expect(refusal('t,F\n0,0\n1,2\n')).toMatch(/no unit in brackets, such as "F \[kN\]"/)
  })

  it('pass on why a host does not give them', () => {
    expect(refusal({ refused: 'it is larger than 100 MB' })).toBe(
      'record-refused leftEnd.pulse.file: the record "records/hit.csv" cannot be read: it is larger than 100 MB',
    )
  })

  it('never asks a host for a path outside the folder', () => {
    for (const file of ['../a.csv', '/a.csv', 'C:\\a.csv', 'a/../../b.csv']) {
      expect(read(PLAIN, { file }).asked).toEqual([])
    }
  })

  it('stop at a million rows', () => {
    const rows = '1,1\n'.repeat(LIMITS.recordRows + 2)
    expect(parseRecord(rows)).toEqual({ refused: 'the record has more than 1000000 rows' })
  })
})
