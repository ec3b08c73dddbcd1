import { parse } from 'csv-parse/sync'
import { describe, expect, it } from 'vitest'
import { writeCell, writeHeading, type ChartTable } from '../../../src-renderer/sheet/charts/chartTable'
import { makeFileName } from '../../../src-renderer/sheet/charts/saveFile'
import { writeCsvTable, writePastedTable } from '../../../src-renderer/sheet/charts/writeTable'
import { makeEnvelopeTable, makeSectionsTable, readPeak } from '../../../src-renderer/sheet/peaks/peaksTables'
import { makeRatiosTable } from '../../../src-renderer/sheet/ratios/makeRatiosTable'
import {
  makeEnergyTable,
  makeGaugeTable,
  makeMomentTable,
} from '../../../src-renderer/sheet/traces/traceTables'
import { solvePage, STEPPED_RIG } from './solvePage'

const result = solvePage(STEPPED_RIG)
const whole = { fromT: 0, toT: 1 }

describe('tables behind the charts', () => {
  it('write units in headings and numbers in full', () => {
    const table: ChartTable = {
      name: 'x',
      rows: 2,
      columns: [
        { heading: 'stress', dimension: 'stress', at: (row) => [-0.3e6, null][row] },
        { heading: 'who', dimension: null, at: () => 'a, "b"' },
      ],
    }
    expect(parse(writeCsvTable(table, 'si'))).toEqual([
      ['stress [MPa]', 'who'],
      ['-0.3', 'a, "b"'],
      ['', 'a, "b"'],
    ])
    expect(writeHeading(table.columns[0], 'us')).toBe('stress [ksi]')
    // 1 ksi = 6.894757 MPa, by definition of pound, inch and standard gravity.
    expect(Number(parse(writeCsvTable(table, 'us'))[1][0])).toBeCloseTo(-0.3 / 6.894757293, 9)
    expect(writeCell(table.columns[0], 0, 'si')).toBe('−0.3000')
    expect(writeCell(table.columns[0], 1, 'si')).toBe('none')
  })

  it('disarm text that a spreadsheet would run, and leave numbers alone', () => {
    const table: ChartTable = {
      name: 'x',
      rows: 4,
      columns: [
        { heading: '=1+1', dimension: null, at: (row) => ['=cmd()', '+1', '@x', '-x'][row] },
        { heading: 'force', dimension: 'force', at: () => -1e3 },
      ],
    }
    const [heading, ...rows] = parse(writeCsvTable(table, 'si')) as string[][]
    expect(heading[0]).toBe("'=1+1")
    expect(rows.map(([text]) => text)).toEqual(["'=cmd()", "'+1", "'@x", "'-x"])
    expect(rows.map(([, number]) => number)).toEqual(['-1', '-1', '-1', '-1'])
    expect(writePastedTable(table, 'si').split('\n')[1]).toBe("'=cmd()\t-1")
  })

  it('hold every sample of a gauge in the time that is looked at, ends included', () => {
    const [gauge] = result.gauges
    expect(makeGaugeTable(gauge, whole).rows).toBe(gauge.t.length)
    const [from, to] = [gauge.t[10], gauge.t[20]]
    const part = makeGaugeTable(gauge, { fromT: from, toT: to })
    expect(part.rows).toBe(11)
    expect(part.columns[0].at(0)).toBe(from)
    expect(part.columns[0].at(10)).toBe(to)
    expect(part.columns.map(({ heading }) => heading)).not.toContain('bridge')
    expect(makeEnergyTable(result.energy, whole).rows).toBe(result.energy.t.length)
  })

  it('read all traces at one moment, a joint by its force alone', () => {
    const moment = 0.15e-3
    const joint = { t: Float64Array.of(0, 0.1e-3, 0.2e-3), force: Float64Array.of(0, -5, -9) }
    const table = makeMomentTable(
      result,
      [
        {
          name: 'striker | shaft',
          kind: 'contact',
          trace: joint,
          contacts: [],
          whole: null,
          peak: -9,
          result,
        },
      ],
      0.16e-3,
    )
    const at = (heading: string, row: number) => table.columns.find((one) => one.heading === heading)?.at(row)
    expect(table.rows).toBe(3)
    expect(at('force', 2)).toBe(-9)
    expect(at('stress', 2)).toBeNull()
    // The striker's pulse, -rho c v / 2 with c = sqrt(E / rho) = 5135 m/s, has come to G1 by then.
    const expected = (-7850 * Math.sqrt(207e9 / 7850) * 12) / 2
    expect(at('stress', 0)).toBeCloseTo(expected, -2)
    expect(moment).toBeLessThan(0.16e-3)
  })

  it('hold the peaks of every section and of every place', () => {
    const sections = makeSectionsTable(result.sections)
    expect(sections.rows).toBe(2 * result.sections.length)
    const all = makeEnvelopeTable(result.envelope, 0, result.line.length)
    expect(all.rows).toBe(result.envelope.x.length)
    const part = makeEnvelopeTable(result.envelope, 0.3, 1.1)
    expect(part.columns[0].at(0)).toBeCloseTo(0.3, 9)
    expect(part.columns[0].at(part.rows - 1)).toBeCloseTo(1.1, 9)
  })

  it('read the larger face at a step', () => {
    const faces = {
      x: Float64Array.of(0, 1, 1, 2),
      tension: Float64Array.of(1, 2, 5, 3),
      tensionTime: Float64Array.of(10, 20, 50, 30),
      compression: Float64Array.of(-1, -7, -2, -3),
      compressionTime: Float64Array.of(11, 71, 21, 31),
    }
    expect(readPeak(faces, 1.2)).toEqual({
      tension: 5,
      tensionTime: 50,
      compression: -7,
      compressionTime: 71,
    })
    expect(readPeak(faces, 9)).toMatchObject({ tension: 3 })
  })

  it('hold the shares at every step and taper, from the left', () => {
    const table = makeRatiosTable(result)
    expect(table.rows).toBe(3 * (result.interfaces.length + result.tapers.length))
    const places = Array.from({ length: table.rows }, (_none, i) => Number(table.columns[1].at(i)))
    expect(places).toEqual([...places].sort((a, b) => a - b))
  })

  it('make file names that every system takes', () => {
    expect(makeFileName('Striker: 12 m/s <new>', 'G1')).toBe('Striker 12 m s new - G1')
    expect(makeFileName('../..\\evil\u202e', '')).not.toMatch(/[\\/\u202e]|^\./)
    expect(makeFileName('\u0000', '')).toBe('chart')
  })
})
