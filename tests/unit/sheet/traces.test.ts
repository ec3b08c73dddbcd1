import { describe, expect, it } from 'vitest'
import type { GaugePulse } from '../../../src-main/contract/result'
import { makeSignedTable } from '../../../src-renderer/plot/colour/colourMap'
import { makeFieldScales } from '../../../src-renderer/sheet/field/draw/fieldScales'
import { makePlot } from '../../../src-renderer/sheet/charts/makeFrameConfig'
import { writeSvg } from '../../../src-renderer/sheet/charts/writeSvg'
import { listColourStops } from '../../../src-renderer/sheet/traces/colourStops'
import { describeWindow, writeDuration } from '../../../src-renderer/sheet/traces/describeWindow'
import { evaluateEnergyShares } from '../../../src-renderer/sheet/traces/energyShares'
import { layColumns } from '../../../src-renderer/sheet/traces/layColumns'
import { makeContactSpec } from '../../../src-renderer/sheet/traces/makeContactSpec'
import { makeEnergySpec } from '../../../src-renderer/sheet/traces/makeEnergySpec'
import { makeGaugeSpec } from '../../../src-renderer/sheet/traces/makeGaugeSpec'
import { findPulseWindow, listPassing } from '../../../src-renderer/sheet/traces/pulseWindow'
import { readNearest } from '../../../src-renderer/sheet/traces/readNearest'
import type { TraceFrame } from '../../../src-renderer/sheet/traces/traceFrame'
import { findWhole, readTrace } from '../../../src-renderer/sheet/traces/useJointTraces'
import { solvePage, STEPPED_RIG } from './solvePage'
import { testInks } from './testInks'

const result = solvePage(STEPPED_RIG)
const c = Math.sqrt(207e9 / 7850)
const pulse = (direction: GaugePulse['direction'], from: number, to: number): GaugePulse => ({
  direction,
  from,
  to,
  peakForce: -1,
  clear: true,
})
const frame: TraceFrame = {
  height: 380,
  foot: 20,
  gap: 8,
  fromT: 0,
  toT: 1e-3,
  times: [0.5e-3],
  governing: 0.6e-3,
  inks: testInks,
  units: 'si',
}
const context = {} as CanvasRenderingContext2D

describe('the window of the first pulse', () => {
  it('is what the solved run gives: G1 sees 2 L / c of the striker alone, until the shoulder answers', () => {
    const window = findPulseWindow(result.gauges[0].pulses)
    // From the contact at 300 mm to G1 at 700 mm, and to the taper's foot at 1100 mm and back.
    const step = result.run.timeStep
    expect(Math.abs(window!.from - 0.4 / c)).toBeLessThan(3 * step)
    expect(Math.abs(window!.to - window!.from - 0.6 / c)).toBeLessThan(3 * step)
    // What a taper's first slice sends back starts from nothing and counts at 1 % of the largest wave.
    expect(window!.until! - (0.8 + 0.4) / c).toBeGreaterThan(-step)
    expect(window!.until! - (0.8 + 0.4) / c).toBeLessThan(4e-6)
    expect(describeWindow(window, 1e-3)).toMatchObject({
      alarm: false,
      text: expect.stringMatching(/fits, \d+ µs spare/),
    })
  })

  it('is negative where the next wave comes first, and says so', () => {
    const window = findPulseWindow([pulse('left', 80e-6, 300e-6), pulse('right', 10e-6, 100e-6)])
    expect(window).toMatchObject({ from: 10e-6, until: 80e-6 })
    expect(window!.spare).toBeCloseTo(-20e-6, 12)
    expect(describeWindow(window, 1e-3)).toEqual({
      text: 'pulse overlaps by 20 µs',
      short: 'overlaps 20 µs',
      alarm: true,
    })
  })

  it('has no end where nothing comes back, and none at all where nothing passes', () => {
    expect(findPulseWindow([pulse('right', 1e-6, 2e-6), pulse('right', 3e-6, 4e-6)])).toMatchObject({
      until: null,
      spare: null,
    })
    expect(describeWindow(findPulseWindow([pulse('right', 0, 1e-3)]), 1e-3).text).toBe(
      'pulse outlasts the run',
    )
    expect(findPulseWindow([])).toBeNull()
  })

  it('starts with the pulse where an opposite wave is there already', () => {
    expect(findPulseWindow([pulse('right', 5, 9), pulse('left', 6, 7), pulse('left', 4.5, 8)])).toMatchObject(
      { direction: 'left' },
    )
    expect(findPulseWindow([pulse('right', 5, 9), pulse('left', 5, 8)])).toMatchObject({
      until: 5,
      spare: -4,
    })
  })

  it('merges passing waves that no pixel parts', () => {
    const pulses = [pulse('right', 0, 1), pulse('right', 1.05, 2), pulse('right', 3, 4), pulse('left', 1, 3)]
    expect(listPassing(pulses, 'right', 0.1)).toEqual([
      { from: 0, to: 2 },
      { from: 3, to: 4 },
    ])
  })

  it('writes durations in the unit that keeps them short', () => {
    expect([1.234e-6, 157.4e-6, 12.34e-3, 2.5].map(writeDuration)).toEqual([
      '1.2 µs',
      '157 µs',
      '12 ms',
      '2.5 s',
    ])
  })
})

describe('traces and field', () => {
  it('put the same time on the same pixel, zoomed or not', () => {
    for (const [fromT, toT] of [
      [0, 1e-3],
      [0.3117e-3, 0.4831e-3],
    ]) {
      const field = makeFieldScales({ fromX: 0, toX: 1, fromT, toT }, 700, frame.height)
      const specs = [
        makeGaugeSpec(result.gauges[0], 'stress', 350e6, { ...frame, fromT, toT }, 126, null),
        makeContactSpec(readTrace([0, 0, -5, 0], fromT, toT), null, -5, { ...frame, fromT, toT }, 88, null),
        makeEnergySpec(evaluateEnergyShares(result.energy)!, { ...frame, fromT, toT }, 60, null),
      ]
      for (const spec of specs) {
        const plot = makePlot(spec, context)
        for (const share of [0, 0.37, 1]) {
          const t = fromT + share * (toT - fromT)
          expect(plot.y.at(t)).toBeCloseTo(field.t.at(t), 9)
        }
        expect(plot.area.right - plot.area.left).toBe(spec.width - frame.gap)
      }
    }
  })

  it('stand on the sheet as whole drawings: curve, window, and words', () => {
    const spec = makeGaugeSpec(result.gauges[0], 'stress', 350e6, frame, 126, result.gauges[1])
    const svg = writeSvg(
      { title: 'G1', width: 134, height: 400, parts: [{ spec, left: 0, top: 0 }], words: [], inks: testInks },
      (text) => 5 * text.length,
    )
    // -rho c v / 2 = -241.9 MPa, rounded to three digits.
    expect(svg).toContain('>−242 MPa</text>')
    expect(svg).toMatch(/>15\d µs<\/text>/)
    expect(svg).toContain('stroke-dasharray="4 2"')
  })
})

describe('energy', () => {
  it('stacks to a straight edge in a run that keeps its energy', () => {
    const shares = evaluateEnergyShares(result.energy)!
    // The striker's energy, m v^2 / 2, is all there is.
    const mass = 7850 * (Math.PI / 4) * 0.02 ** 2 * 0.3
    expect(shares.total / ((mass * 12 ** 2) / 2)).toBeCloseTo(1, 9)
    for (const edge of shares.bands.at(-1)!.edge) expect(Math.abs(edge - 1)).toBeLessThan(1e-12)
  })

  it('counts what the surroundings have still to give, so that a driven run is straight as well', () => {
    const shares = evaluateEnergyShares({
      t: [0, 1, 2],
      kinetic: [0, 3, 1],
      strain: [0, 1, 1],
      dissipated: [0, 0, 2],
      work: [0, 4, 4],
      closure: 0,
    })!
    expect(shares.bands.map(({ name }) => name)).toEqual(['kinetic', 'strain', 'lost', 'to come'])
    expect([...shares.bands[3].edge]).toEqual([1, 1, 1])
    expect([...shares.bands[0].edge]).toEqual([0, 0.75, 0.25])
  })

  it('shows a loss that no ledger explains', () => {
    const leak = {
      t: [0, 1],
      kinetic: [4, 3],
      strain: [0, 0],
      dissipated: [0, 0],
      work: [0, 0],
      closure: 0.25,
    }
    expect(evaluateEnergyShares(leak)!.bands.at(-1)!.edge[1]).toBe(0.75)
    expect(evaluateEnergyShares({ ...leak, kinetic: [0, 0] })).toBeNull()
  })
})

describe('parts of traces', () => {
  it('share the width, whole pixels, as many as can be read, the last always there', () => {
    const gauge = { wanted: 126, least: 92 }
    const laid = layColumns([gauge, gauge, { wanted: 88, least: 64 }], { wanted: 60, least: 56 }, 0, 424, 8)
    expect(laid.map(({ width }) => width)).toEqual([126, 126, 88, 60])
    expect(laid.at(-1)!.left + laid.at(-1)!.width).toBe(424)
    const many = layColumns(Array(12).fill(gauge), { wanted: 60, least: 56 }, 4, 424, 8)
    expect(many.map(({ index }) => index)).toEqual([4, 5, 6, 12])
    expect(many.at(-1)!.left + many.at(-1)!.width).toBe(424)
    for (const { width } of many) expect(width).toBeGreaterThanOrEqual(56)
    expect(layColumns([], { wanted: 60, least: 56 }, 0, 424, 8)).toEqual([{ index: 0, left: 0, width: 424 }])
  })

  it('colour by value, from the top down, with hard edges at jumps', () => {
    const map = makeSignedTable('light')
    const { stops } = listColourStops(
      [
        [0, 0],
        [0, 1],
        [-1, 1],
        [-1, 3],
        [-1, 4],
      ],
      0,
      4,
      map,
      1,
    )
    expect(stops.map(({ share }) => share)).toEqual([0, 0.75, 0.75, 1])
    expect(stops[0].colour).toBe('rgb(30, 80, 153)')
    expect(stops[2].colour).toBe('rgb(251, 250, 246)')
  })

  it('read the nearest sample', () => {
    const [t, values] = [
      [0, 1, 2],
      [10, 20, 30],
    ]
    expect([-5, 0.4, 0.6, 9].map((moment) => readNearest(t, values, moment))).toEqual([10, 10, 20, 30])
    expect(readNearest([], [], 1)).toBeNull()
  })

  it('keep the larger extreme of each row, and rest outside the run', () => {
    const { t, force } = readTrace([-5, 1, -1, 4, NaN, NaN], 0, 3)
    expect([...t]).toEqual([0.5, 1.5, 2.5])
    expect([...force]).toEqual([-5, 4, 0])
  })

  it('take no contact for whole that the view cuts, but one that begins with the run', () => {
    const contacts = [
      { from: 0, to: 1 },
      { from: 2, to: 3 },
      { from: 4, to: 5 },
    ]
    expect(findWhole(contacts, { fromT: 0, toT: 5 })).toEqual(contacts[0])
    const cut = [{ from: 0.5, to: 1 }, contacts[1]]
    expect(findWhole(cut, { fromT: 0.5, toT: 5 })).toEqual(contacts[1])
    expect(findWhole([{ from: 4, to: 4.5 }], { fromT: 3.5, toT: 4.5 })).toBeNull()
  })
})
