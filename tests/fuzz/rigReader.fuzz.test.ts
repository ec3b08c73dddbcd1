import fc from 'fast-check'
import { afterAll, describe, expect, it } from 'vitest'
import type { RigReading } from '../../src-main/engine/rig/readRig'
import { readRig } from '../../src-main/engine/rig/readRig'
import { BROKEN_RIGS, HOSTILE_FORMULAS } from '../unit/engine/rig/brokenRigs'
import { EXAMPLE_RIG } from '../unit/engine/rig/exampleRig'

/** The same seed on every run; `npx vitest run tests/fuzz` with FUZZ_RUNS=100000 looks further. */
const RUNS = { numRuns: Number(process.env.FUZZ_RUNS ?? 300), seed: 20240607 }

/** A rig without faults, or faults without a rig, each with words that a terminal shows as they are. */
function expectSound(reading: RigReading): void {
  expect(reading.rig === null).toBe(reading.faults.length > 0)
  for (const { code, path, message } of reading.faults) {
    expect(code).toMatch(/^[a-z-]+$/)
    expect(message.length).toBeGreaterThan(5)
    expect(`${path}${message}`).not.toMatch(/[\u0000-\u001F\u007F-\u009F\u200B-\u200F\u2028-\u202E]/)
  }
}

type Json = Record<string | number, unknown>

/** Every place of a value, as keys from the top. */
function placesOf(value: unknown, place: (string | number)[] = []): (string | number)[][] {
  if (typeof value !== 'object' || value === null) return [place]
  const inner = Object.entries(value).flatMap(([key, it]: [string, unknown]) =>
    placesOf(it, [...place, Array.isArray(value) ? Number(key) : key]),
  )
  return [place, ...inner]
}

/** Rigs that use every kind of part, to be broken at one place. */
const RICH = {
  ...EXAMPLE_RIG,
  leftEnd: {
    kind: 'force',
    pulse: {
      shape: 'table',
      table: [
        ['0 us', '0 kN'],
        ['5 us', '2 kN'],
      ],
      start: '1 us',
    },
  },
  bars: [
    { ...EXAMPLE_RIG.bars[0], velocity: '3 m/s * (1 - s)', allowable: { tension: '300 MPa' } },
    {
      ...EXAMPLE_RIG.bars[1],
      preload: '2 kN',
      sections: [
        ...EXAMPLE_RIG.bars[1].sections,
        {
          stations: [
            ['0 mm', '20 mm'],
            ['40 mm', '24 mm'],
          ],
          bore: { from: '1 mm', to: '2 mm', profile: 'area-linear' },
        },
        { length: '10 mm', area: '400 mm^2 * (1 + s)', material: 'steel' },
      ],
    },
  ],
  joints: [{ kind: 'cushion', stiffness: '5 kN/mm', damping: '3 N s/m', tension: true }],
  rightEnd: { kind: 'support', stiffness: '5 kN/mm', mass: '1 kg', joint: 'contact', gap: '1 mm' },
  loads: [
    { bar: 'shaft', at: '1 mm', pulse: { shape: 'trapezoid', peak: '1 kN', duration: '9 us', rise: '2 us' } },
  ],
  gravity: 'gravity',
  gauges: [{ name: 'G1', bar: 'shaft', at: '400 mm', bridge: { factor: 2, arms: 2, excitation: '5 V' } }],
  studies: [{ kind: 'sweep', variable: 'drop', from: '1 m', to: '2 m', count: 3 }],
}
const PLACES = placesOf(RICH).filter((place) => place.length > 0)

function withValue(place: (string | number)[], value: unknown): string {
  const rig = structuredClone(RICH) as unknown as Json
  const owner = place.slice(0, -1).reduce((inner, key) => inner[key] as Json, rig)
  owner[place[place.length - 1]] = value
  return JSON.stringify(rig)
}

const word = fc.constantFrom(
  ...'25 1e3 0 .5 1e999 mm us kN MPa m s kg t x drop pi gravity sqrt( exp( min( ( ) + - * / ^ , < > == ? : ! % . .. ; # [ ] { } " zeros( config( e i in to mod'.split(
    ' ',
  ),
)
const formula = fc.oneof(
  fc.array(word, { maxLength: 30 }).map((words) => words.join(' ')),
  fc.array(word, { maxLength: 30 }).map((words) => words.join('')),
  fc.string({ maxLength: 60 }),
  fc.string({ unit: 'binary', maxLength: 60 }),
  fc.constantFrom(...HOSTILE_FORMULAS.map(([text]) => text)),
)

describe('the rig reader', () => {
  const before = Object.getOwnPropertyNames(Object.prototype).sort()
  afterAll(() => {
    expect(Object.getOwnPropertyNames(Object.prototype).sort()).toEqual(before)
    expect(readRig(JSON.stringify(EXAMPLE_RIG)).faults).toEqual([])
  })

  it('has no fault in the rig that the others are made from', () => {
    expect(readRig(JSON.stringify(RICH)).faults).toEqual([])
  })

  it('never throws at any text', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.string({ unit: 'binary' }), fc.json()), (text) =>
        expectSound(readRig(text)),
      ),
      RUNS,
    )
  })

  it('never throws at a rig cut short or with a letter changed', () => {
    const text = JSON.stringify(RICH)
    fc.assert(
      fc.property(fc.nat(text.length), fc.string({ maxLength: 3 }), fc.nat(3), (at, put, drop) =>
        expectSound(readRig(text.slice(0, at) + put + text.slice(at + drop))),
      ),
      RUNS,
    )
  })

  it('never throws at any value at any place', () => {
    const value = fc.oneof(
      fc.jsonValue(),
      fc.anything({ maxDepth: 2 }).map((it) => it ?? null),
      formula,
    )
    fc.assert(
      fc.property(fc.constantFrom(...PLACES), value, (place, it) => {
        let text: string
        try {
          text = withValue(place, it)
        } catch {
          // values that are no JSON, such as big integers
          return
        }
        expectSound(readRig(text))
      }),
      RUNS,
    )
  })

  it('never throws at any formula at any place', () => {
    fc.assert(
      fc.property(fc.constantFrom(...PLACES), formula, (place, it) =>
        expectSound(readRig(withValue(place, it))),
      ),
      RUNS,
    )
  })

  it('never throws at any record', () => {
    const leftEnd = { kind: 'force', pulse: { shape: 'file', file: 'a.csv' } }
    const text = JSON.stringify({ ...RICH, leftEnd })
    const cell = fc.oneof(
      fc.double().map(String),
      fc.constantFrom('t [us]', 'F [kN]', '"', '""', '', ',', ';', '\t', '\r'),
      fc.string({ maxLength: 5 }),
    )
    const record = fc
      .array(
        fc.array(cell, { maxLength: 4 }).map((cells) => cells.join(',')),
        { maxLength: 8 },
      )
      .map((rows) => rows.join('\n'))
    fc.assert(
      fc.property(fc.oneof(record, fc.string({ unit: 'binary' })), (csv) =>
        expectSound(readRig(text, { readRecord: () => csv })),
      ),
      RUNS,
    )
  })

  it('gives the words of every broken rig without a sign that a terminal would obey', () => {
    for (const { text } of BROKEN_RIGS) expectSound(readRig(text))
  })
})
