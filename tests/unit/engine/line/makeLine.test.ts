import { describe, expect, it } from 'vitest'
import type { PointLoad, Rig } from '../../../../src-main/contract/rig'
import { evaluatePlace } from '../../../../src-main/engine/line/line'
import { makeLine } from '../../../../src-main/engine/line/makeLine'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../testRig'

const DT = 1e-6
const CELL = 5000 * DT
const load = (at: number, bar = 0): PointLoad => ({ bar, at, pulse: makePulse(() => 1) })
const cut = (rig: Partial<Rig> & { bars: Rig['bars'] }) =>
  makeLine(makeRig(rig.bars, { duration: 1e-4, timeStep: DT }, rig))

const ALUMINIUM = { ...ROUND_STEEL, density: 2700, modulus: 67.5e9 }

describe('the cut line', () => {
  const line = cut({
    bars: [
      makeBar('first', [makeSection(10 * CELL, 1e-3), makeSection(4 * CELL, 2e-3, { material: ALUMINIUM })]),
      makeBar('second', [makeSection(3 * CELL, (s) => 1e-3 * (1 + s) ** 2)]),
    ],
  })

  it('has a span per section, bars face to face, ends and joints at their nodes', () => {
    expect(line.spans.map(({ bar, section, cells }) => [bar, section, cells])).toEqual([
      [0, 0, 10],
      [0, 1, 4],
      [1, 0, 3],
    ])
    expect(line.nodes.map(({ kind, joint }) => [kind, joint])).toEqual([
      ['left-end', -1],
      ['step', -1],
      ['joint', 0],
      ['right-end', -1],
    ])
    const places = [0, 10 * CELL, 14 * CELL, 17 * CELL]
    line.nodes.forEach(({ x }, i) => expect(x).toBeCloseTo(places[i], 14))
    line.spans.forEach(({ from, to }, i) => {
      expect(from).toBeCloseTo(places[i], 14)
      expect(to).toBeCloseTo(places[i + 1], 14)
    })
    expect(line.length).toBeCloseTo(17 * CELL, 14)
    expect(line.bars.map(({ name, firstSpan, lastSpan }) => [name, firstSpan, lastSpan])).toEqual([
      ['first', 0, 1],
      ['second', 2, 2],
    ])
  })

  it('has the impedance of each cell at its middle, the area at each position with both faces of a step', () => {
    const [steel, aluminium, cone] = line.spans
    expect([...steel.impedance].every((Z) => Math.abs(Z / 4e4 - 1) < 1e-15)).toBe(true)
    expect([...aluminium.impedance].every((Z) => Math.abs(Z / (13.5e6 * 2e-3) - 1) < 1e-15)).toBe(true)
    expect([steel.area[10], aluminium.area[0]]).toEqual([1e-3, 2e-3])
    cone.impedance.forEach((Z, i) => expect(Z / (4e4 * (1 + (i + 0.5) / 3) ** 2)).toBeCloseTo(1, 14))
    cone.area.forEach((A, p) => expect(A / (1e-3 * (1 + p / 3) ** 2)).toBeCloseTo(1, 14))
    expect(line.spans.map(({ uniform }) => uniform)).toEqual([true, true, false])
    expect(evaluatePlace(cone, 1)).toBeCloseTo(15 * CELL, 14)
    expect(evaluatePlace(cone, 3)).toBe(cone.to)
  })

  it('knows the exact masses and travel times of its bars', () => {
    const [first, second] = line.bars
    expect(first.mass / (8000 * 1e-3 * 10 * CELL + 2700 * 2e-3 * 4 * CELL)).toBeCloseTo(1, 14)
    // Frustum: L (A1 + sqrt(A1 A2) + A2)/3.
    expect(second.mass / ((8000 * 3 * CELL * (1e-3 + 2e-3 + 4e-3)) / 3)).toBeCloseTo(1, 13)
    expect(first.travelTime).toBeCloseTo(14 * DT, 15)
    expect(second.travelTime).toBeCloseTo(3 * DT, 15)
  })

  it('reports no rounding where the travel times are whole, and the share that is left where not', () => {
    for (const { error } of line.rounding) expect(Math.abs(error)).toBeLessThan(1e-12)
    const rough = cut({
      bars: [makeBar('bar', [makeSection(10.4 * CELL, 1e-3), makeSection(0.3 * CELL, 1e-3)])],
    })
    expect(rough.rounding.map(({ bar, section }) => [bar, section])).toEqual([
      [0, 0],
      [0, 1],
    ])
    expect(rough.rounding[0].error).toBeCloseTo((10 - 10.4) / 10.4, 12)
    // At least one cell, here more than three times too long: said, not hidden.
    expect(rough.rounding[1].error).toBeCloseTo((1 - 0.3) / 0.3, 12)
  })

  it('has steps that cover the duration, and one more only where they do not', () => {
    const steps = (duration: number) =>
      makeLine(makeRig([makeBar('bar', [makeSection(CELL, 1e-3)])], { duration, timeStep: DT })).steps
    expect([steps(0.2 * DT), steps(5 * DT), steps(5.01 * DT), steps(300 * 1.0000000000000002 * DT)]).toEqual([
      1, 5, 6, 300,
    ])
  })

  it('takes its time step from the wanted cell and the fastest wave', () => {
    const made = makeLine(
      makeRig([makeBar('bar', [makeSection(0.3, 1e-3), makeSection(0.09, 1e-3)])], {
        duration: 1e-3,
        cell: 3e-3,
      }),
    )
    expect(made.dt).toBeCloseTo(3e-3 / 5000, 15)
    expect(made.spans.map(({ cells }) => cells)).toEqual([100, 30])
  })
})

describe('a point load', () => {
  const bars = [makeBar('bar', [makeSection(10 * CELL, 1e-3), makeSection(6 * CELL, (s) => 1e-3 * (2 - s))])]

  it('cuts its section at the nearest cell boundary, the two parts keeping the form of the whole', () => {
    const line = cut({ bars, loads: [load(12.6 * CELL)] })
    expect(line.spans.map(({ section, cells }) => [section, cells])).toEqual([
      [0, 10],
      [1, 3],
      [1, 3],
    ])
    expect(line.nodes[2]).toMatchObject({ kind: 'step', joint: -1 })
    expect(line.nodes[2].loads).toHaveLength(1)
    expect(line.nodes[2].x).toBeCloseTo(13 * CELL, 14)
    expect(line.spans.map(({ sFrom, sTo }) => [sFrom, sTo])).toEqual([
      [0, 1],
      [0, 0.5],
      [0.5, 1],
    ])
    const whole = cut({ bars }).spans[1]
    expect([...line.spans[1].impedance, ...line.spans[2].impedance]).toEqual([...whole.impedance])
    expect(line.spans[1].area[3]).toBe(line.spans[2].area[0])
    expect(line.rounding).toHaveLength(2)
    expect(line.bars[0].lastSpan).toBe(2)
  })

  it('shares its cut with others at the same place, in any order', () => {
    const line = cut({ bars, loads: [load(7 * CELL), load(3.1 * CELL), load(2.9 * CELL)] })
    expect(line.spans.map(({ cells }) => cells)).toEqual([3, 4, 3, 6])
    expect(line.nodes.map(({ loads }) => loads.length)).toEqual([0, 2, 1, 0, 0])
  })

  it('stays inside: at a face it goes one cell in, and its section has at least two', () => {
    const at = (place: number) =>
      cut({ bars, loads: [load(place)] }).nodes.find(({ loads }) => loads.length > 0)!.x / CELL
    expect(at(0)).toBeCloseTo(1, 12)
    expect(at(16 * CELL)).toBeCloseTo(15, 12)
    expect(at(10 * CELL)).toBeCloseTo(11, 12)
    const short = cut({ bars: [makeBar('bar', [makeSection(CELL, 1e-3)])], loads: [load(0.5 * CELL)] })
    expect(short.spans.map(({ cells }) => cells)).toEqual([1, 1])
    expect(short.rounding[0].error).toBeCloseTo(1, 12)
  })

  it('belongs to its own bar', () => {
    const line = cut({
      bars: [...bars, makeBar('next', [makeSection(4 * CELL, 1e-3)])],
      loads: [load(2 * CELL, 1)],
    })
    expect(line.spans.map(({ bar, cells }) => [bar, cells])).toEqual([
      [0, 10],
      [0, 6],
      [1, 2],
      [1, 2],
    ])
  })
})
