import { describe, expect, it } from 'vitest'
import type { Pulse } from '../../../../../src-main/contract/rig'
import { readChanged, readGood } from '../readChanged'

function pulseOf(pulse: object, kind = 'force'): Pulse {
  const { leftEnd } = readGood({ leftEnd: { kind, pulse } })
  if (!('pulse' in leftEnd)) throw new Error(leftEnd.kind)
  return leftEnd.pulse
}

/** Times from 10 % to 90 % of the peak, found by trying. */
function measureRise(pulse: Pulse, peak: number, until: number): number {
  const count = 200_000
  const first = (share: number) => {
    for (let i = 0; i <= count; i++)
      if (pulse.value((until * i) / count) >= share * peak) return (until * i) / count
    return NaN
  }
  return first(0.9) - first(0.1)
}

/** Values at times in microseconds. */
const at = (pulse: Pulse, times: number[]) => times.map((t) => pulse.value(t / 1e6))

describe('pulse shapes', () => {
  it('rectangle: after a jump the value after it', () => {
    const pulse = pulseOf({ shape: 'rectangle', peak: '2 kN', duration: '10 us', start: '5 us' })
    expect(at(pulse, [0, 4.9, 5, 14.9, 15.1])).toEqual([0, 0, 2000, 2000, 0])
    expect(pulse.rise).toBe(0)
    expect(pulse.breaks).toEqual([5e-6, 5e-6 + 1e-5])
    expect(pulse.value(pulse.breaks[1])).toBe(0)
  })

  it('half-sine', () => {
    const pulse = pulseOf({ shape: 'half-sine', peak: '-2 kN', duration: '12 us' })
    expect(at(pulse, [0, 12])).toEqual([0, 0])
    expect(pulse.value(6e-6)).toBeCloseTo(-2000, 9)
    expect(pulse.value(2e-6)).toBeCloseTo(-1000, 9)
    const upward = pulseOf({ shape: 'half-sine', peak: '2 kN', duration: '12 us' })
    // the trial steps are 12 us / 200000 wide, so two of them are left open
    expect(Math.abs((upward.rise ?? NaN) - measureRise(upward, 2000, 12e-6))).toBeLessThan(1.2e-10)
  })

  it('haversine', () => {
    const pulse = pulseOf({ shape: 'haversine', peak: '2 kN', duration: '12 us' })
    expect(pulse.value(6e-6)).toBeCloseTo(2000, 9)
    expect(pulse.value(3e-6)).toBeCloseTo(1000, 9)
    expect(Math.abs((pulse.rise ?? NaN) - measureRise(pulse, 2000, 12e-6))).toBeLessThan(1.2e-10)
    expect(pulse.breaks).toEqual([])
  })

  it('triangle, of equal sides where no rise is given', () => {
    const even = pulseOf({ shape: 'triangle', peak: '2 kN', duration: '10 us' })
    expect(at(even, [0, 10])).toEqual([0, 0])
    expect(even.value(2.5e-6)).toBeCloseTo(1000, 9)
    expect(even.value(7.5e-6)).toBeCloseTo(1000, 9)
    expect(even.rise).toBeCloseTo(4e-6, 18)
    const steep = pulseOf({ shape: 'triangle', peak: '2 kN', duration: '10 us', rise: '8 us' })
    expect(steep.value(4e-6)).toBeCloseTo(1000, 9)
    expect(steep.value(9e-6)).toBeCloseTo(1000, 9)
    // the fall of 2 us is the shorter flank
    expect(steep.rise).toBeCloseTo(1.6e-6, 18)
    expect(steep.breaks.length).toBe(3)
  })

  it('triangle without rise: a jump', () => {
    const pulse = pulseOf({ shape: 'triangle', peak: '2 kN', duration: '10 us', rise: '0 us' })
    expect(at(pulse, [0, 10])).toEqual([2000, 0])
    expect(pulse.value(5e-6)).toBeCloseTo(1000, 9)
    expect(pulse.rise).toBe(0)
  })

  it('trapezoid, falling as it rises where no fall is given', () => {
    const pulse = pulseOf({ shape: 'trapezoid', peak: '2 kN', duration: '10 us', rise: '2 us' })
    expect(pulse.value(1e-6)).toBeCloseTo(1000, 9)
    expect(at(pulse, [3, 5, 7])).toEqual([2000, 2000, 2000])
    expect(pulse.value(9e-6)).toBeCloseTo(1000, 9)
    const sharp = pulseOf({ shape: 'trapezoid', peak: '2 kN', duration: '10 us', rise: '2 us', fall: '0 us' })
    expect(at(sharp, [9.99, 10])).toEqual([2000, 0])
    expect(sharp.rise).toBe(0)
  })

  it('step and ramp stay for ever', () => {
    expect(at(pulseOf({ shape: 'step', peak: '2 kN', start: '3 us' }), [2.9, 3, 1e6])).toEqual([
      0, 2000, 2000,
    ])
    for (const key of ['rise', 'duration']) {
      const ramp = pulseOf({ shape: 'ramp', peak: '2 kN', [key]: '4 us' })
      expect(at(ramp, [0, 4, 1e6])).toEqual([0, 2000, 2000])
      expect(ramp.value(1e-6)).toBeCloseTo(500, 9)
      expect(ramp.rise).toBeCloseTo(3.2e-6, 18)
    }
  })

  it('formula in t', () => {
    const pulse = pulseOf({ shape: 'formula', formula: '2 kN * sin(pi * t / (10 us))' })
    expect(pulse.value(5e-6)).toBeCloseTo(2000, 9)
    expect([pulse.rise, pulse.breaks]).toEqual([null, []])
    const jump = pulseOf({ shape: 'formula', formula: '2 kN * exp(-t / (10 us))' })
    expect([jump.value(0), jump.rise, jump.breaks]).toEqual([2000, 0, [0]])
  })

  it('table: linear between its rows, zero outside', () => {
    const table = [
      ['2 us', '0 kN'],
      ['4 us', '2 kN'],
      ['8 us', '0 kN'],
    ]
    const pulse = pulseOf({ shape: 'table', table, start: '1 us' })
    expect(at(pulse, [0, 2.9, 9, 100])).toEqual([0, 0, 0, 0])
    expect(pulse.value(4e-6)).toBeCloseTo(1000, 9)
    expect(pulse.value(7e-6)).toBeCloseTo(1000, 9)
    // read backwards the values are the same
    expect(pulse.value(4e-6)).toBeCloseTo(1000, 9)
    expect(pulse.rise).toBeCloseTo(1.6e-6, 15)
  })

  it('table that begins or ends high: a jump', () => {
    expect(
      pulseOf({
        shape: 'table',
        table: [
          ['0 us', '2 kN'],
          ['4 us', '0 kN'],
        ],
      }).rise,
    ).toBe(0)
    const high = pulseOf({
      shape: 'table',
      table: [
        ['0 us', '0 kN'],
        ['4 us', '2 kN'],
      ],
    })
    expect([high.rise, high.value(4e-6)]).toEqual([0, 0])
  })

  it('displacement of a table stays at its last value', () => {
    const pulse = pulseOf(
      {
        shape: 'table',
        table: [
          ['0 us', '0 mm'],
          ['4 us', '2 mm'],
        ],
      },
      'displacement',
    )
    expect(pulse.value(1)).toBe(0.002)
    expect(pulse.rise).toBeCloseTo(3.2e-6, 15)
  })
})

describe('displacements', () => {
  const moved = (formula: string) =>
    readChanged({ leftEnd: { kind: 'displacement', pulse: { shape: 'formula', formula } } }).faults

  it('may be as steep as they like, but not jump', () => {
    expect(moved('1 mm * (1 + tanh((t - 600 us) / (1 ps))) / 2')).toEqual([])
    expect(moved('1 mm * t / (1 us)')).toEqual([])
    expect(moved('t < 700.1 us ? 0 mm : 1 um')[0].message).toContain('the formula does at t = 700.1 us')
    expect(moved('1 mm')[0].message).toContain('it starts at 1 mm and the end of the bar at 0 mm')
  })

  it('start where the bar starts', () => {
    const bars = [
      {
        name: 'rod',
        material: 'steel',
        displacement: '1 mm * (1 - s)',
        sections: [{ length: '1 m', diameter: '9 mm' }],
      },
    ]
    const leftEnd = { kind: 'displacement', pulse: { shape: 'formula', formula: '1 mm - 2 m/s * t' } }
    expect(readChanged({ bars, joints: [], gauges: [], leftEnd }).faults).toEqual([])
    const rightEnd = leftEnd
    expect(
      readChanged({ bars, joints: [], gauges: [], leftEnd: { kind: 'free' }, rightEnd }).faults.map(
        ({ path }) => path,
      ),
    ).toEqual(['rightEnd.pulse'])
  })
})
