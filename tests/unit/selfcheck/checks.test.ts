import { describe, expect, it } from 'vitest'
import { type Bench, makeBench, type RigSetup } from '../../../src-main/selfcheck/bench'
import { CHECKS } from '../../../src-main/selfcheck/checks'
import { runSelfcheck } from '../../../src-main/selfcheck/runSelfcheck'

/** A fault put into every rig on its way to the engine: 2 % on one of its numbers. */
type Sabotage = (setup: RigSetup) => void

const more = (text: string): string => `1.02 * (${text})`

/** Calls for every object in a tree. */
function visit(node: unknown, act: (object: Record<string, unknown>) => void): void {
  if (typeof node !== 'object' || node === null) return
  if (!Array.isArray(node)) act(node as Record<string, unknown>)
  for (const child of Object.values(node)) visit(child, act)
}

const raise =
  (key: string): Sabotage =>
  (setup) =>
    visit(setup, (object) => {
      if (typeof object[key] === 'string') object[key] = more(object[key])
    })

const SABOTAGES: Record<string, Sabotage> = {
  'a stiffer first material': (setup) => {
    const [first] = Object.values(setup.materials)
    first.modulus = more(first.modulus)
  },
  'a heavier first material': (setup) => {
    const [first] = Object.values(setup.materials)
    first.density = more(first.density)
  },
  'a larger last section': (setup) => {
    const section = setup.bars.at(-1)!.sections.at(-1)!
    if (section.area !== undefined) section.area = more(section.area)
    else if (typeof section.diameter === 'string') section.diameter = more(section.diameter)
    else section.diameter = { ...section.diameter!, to: more(section.diameter!.to) }
  },
  'larger loads': raise('peak'),
  'larger preloads': raise('preload'),
  'larger fillets': raise('fillet'),
}

function makeSabotagedBench(sabotage: Sabotage): Bench {
  const bench = makeBench()
  const spoil = (setup: RigSetup): RigSetup => {
    const copy = structuredClone(setup)
    sabotage(copy)
    return copy
  }
  return { march: (setup) => bench.march(spoil(setup)), solve: (setup) => bench.solve(spoil(setup)) }
}

describe('every published check', () => {
  it('has a name of its own', () => {
    expect(new Set(CHECKS.map(({ id }) => id)).size).toBe(CHECKS.length)
    for (const { id } of CHECKS) expect(id).toMatch(/^[a-z]+(-[a-z]+)*$/)
  })

  it('stands in the order of the topics, and every topic from 1 to 14 has one', () => {
    expect(CHECKS.length).toBeGreaterThanOrEqual(40)
    expect([...new Set(CHECKS.map(({ section }) => section))]).toEqual(
      Array.from({ length: 14 }, (_, i) => i + 1),
    )
  })

  it('names its source and why its tolerance, never over 1 %, is what it is', () => {
    for (const { source, reason, tolerance } of CHECKS) {
      expect(source.length).toBeGreaterThan(10)
      expect(reason.length).toBeGreaterThan(4)
      expect(tolerance).toBeGreaterThan(0)
      expect(tolerance).toBeLessThanOrEqual(1e-2)
    }
  })

  it('has finite values with a scale to measure them by', () => {
    for (const { values } of CHECKS) {
      expect(values.length).toBeGreaterThan(0)
      for (const { what, published, scale } of values) {
        expect(what).not.toBe('')
        expect(Number.isFinite(published)).toBe(true)
        expect(scale ?? Math.abs(published)).toBeGreaterThan(0)
      }
    }
  })

  it.each(CHECKS.map((check) => [check.id, check] as const))('fails on a spoilt rig: %s', (_id, check) => {
    const caught = Object.values(SABOTAGES).some((sabotage) => {
      const [{ passed }] = runSelfcheck([check], makeSabotagedBench(sabotage))
      return !passed
    })
    expect(caught).toBe(true)
  })

  it.each(CHECKS.map((check) => [check.id, check] as const))(
    'fails where any one published value is off by twice what it allows: %s',
    (_id, check) => {
      const found = check.compute(makeBench())
      check.values.forEach((value, i) => {
        const scale = value.scale ?? Math.abs(value.published)
        const away = Math.sign(value.published - found[i]) || 1
        const published = value.published + 2 * away * check.tolerance * scale
        const values = check.values.map((other, j) => (i === j ? { ...value, published, scale } : other))
        const [outcome] = runSelfcheck([{ ...check, values, compute: () => found }])
        expect(outcome).toMatchObject({ passed: false, what: value.what })
      })
    },
  )
})
