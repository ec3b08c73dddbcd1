import { describe, expect, it } from 'vitest'
import type { Caution } from '../../../../src-main/contract/result'
import type { Pulse } from '../../../../src-main/contract/rig'
import { describeQuantity } from '../../../../src-main/engine/answers/cautions/describeQuantity'
import { joinPlaces } from '../../../../src-main/engine/answers/cautions/joinPlaces'
import { listCautions } from '../../../../src-main/engine/answers/listCautions'
import { listSectionPeaks } from '../../../../src-main/engine/answers/listSectionPeaks'
import type { Line } from '../../../../src-main/engine/line/line'
import type { RunRecord } from '../../../../src-main/engine/records/record'
import { STEEL, type PlainRig, type PlainSection } from './makePlainLine'
import { runPlain } from './runPlain'

const dt = 2e-6

function evaluateCautions({ line, record }: { line: Line; record: RunRecord }): Caution[] {
  return listCautions(line, record, listSectionPeaks(line, record))
}
const cautionsOf = (plain: PlainRig, gauges?: { bar: number; at: number }[]) =>
  evaluateCautions(runPlain({ dt, duration: 600e-6, ...plain }, gauges))
const codesOf = (plain: PlainRig) => cautionsOf(plain).map(({ code }) => code)
const find = (cautions: Caution[], code: Caution['code']) => cautions.find((caution) => caution.code === code)

const half = (peak: number, duration: number): Pulse => ({
  shape: 'half-sine',
  value: (t) => (t > 0 && t < duration ? peak * Math.sin((Math.PI * t) / duration) : 0),
  rise: 0.325 * duration,
  breaks: [0, duration],
})
const bar = (...sections: PlainSection[]) => [{ name: 'shaft', sections }]
const straight: PlainSection = { length: 0.4, diameter: 0.02 }
const CUSHION = {
  kind: 'cushion',
  stiffness: null,
  curve: null,
  unloading: null,
  damping: 0,
  mass: 0,
  gap: 0,
  tension: false,
} as const
/** A slow pulse that a 20 mm bar can carry: 4 d/c = 16 us. */
const slow = { kind: 'force', pulse: half(10e3, 100e-6) } as const

describe('a plain rig', () => {
  it('with a slow pulse carries only the caution on its own values', () => {
    const cautions = cautionsOf({ leftEnd: slow, bars: bar(straight) })
    expect(cautions.map(({ code }) => code)).toEqual(['user-values'])
    expect(cautions[0].where).toBe('')
  })

  it('of two bars that meet carries three', () => {
    expect(
      codesOf({ bars: [{ velocity: 5, sections: [straight] }, { sections: [straight] }], duration: 1e-3 }),
    ).toEqual(['short-rise', 'flat-faces', 'user-values'])
  })
})

describe('fronts', () => {
  it('warns of a rise under 4 d/c, with both times and the thickest place', () => {
    const quick = { kind: 'force', pulse: half(10e3, 40e-6) } as const
    const sections = [straight, { length: 0.3, diameter: 0.04, fillet: 0 }]
    const caution = find(cautionsOf({ leftEnd: quick, bars: bar(...sections) }), 'short-rise')!
    expect(caution.message).toContain('The pulse at the left end takes 13 µs')
    expect(caution.message).toContain('4 d/c = 32 µs')
    expect(caution.where).toBe('shaft, section 2')
    expect(
      find(
        cautionsOf({ leftEnd: { kind: 'force', pulse: half(10e3, 110e-6) }, bars: bar(...sections) }),
        'short-rise',
      ),
    ).toBeUndefined()
  })

  it('says of what jumps that it rises at once: a load, a gap that closes, a displacement with a kink', () => {
    const step: Pulse = { shape: 'step', value: () => 1e3, rise: 0, breaks: [0] }
    const load = { bar: 0, at: 0.2, pulse: step }
    expect(find(cautionsOf({ bars: bar(straight), loads: [load] }), 'short-rise')!.message).toContain(
      'A load on shaft rises at once',
    )
    const gap = { kind: 'wall', gap: 1e-5 } as const
    expect(
      find(cautionsOf({ leftEnd: slow, rightEnd: gap, bars: bar(straight) }), 'short-rise')!.message,
    ).toContain('a gap that closes')
    const ramp: Pulse = { shape: 'ramp', value: (t) => Math.min(t, 1e-4), rise: 80e-6, breaks: [0, 1e-4] }
    expect(
      find(cautionsOf({ leftEnd: { kind: 'displacement', pulse: ramp }, bars: bar(straight) }), 'short-rise')!
        .message,
    ).toContain('at once')
    expect(
      find(cautionsOf({ leftEnd: { kind: 'velocity', pulse: ramp }, bars: bar(straight) }), 'short-rise'),
    ).toBeUndefined()
  })

  it('sees that a cushion or a soft end spreads the wave of an impact', () => {
    const Z = 8000 * 5000 * (Math.PI / 4) * 0.02 ** 2
    const ram = (joint: object) =>
      cautionsOf({
        bars: [{ velocity: 5, sections: [straight] }, { sections: [straight] }],
        joints: [{ ...CUSHION, ...joint }],
        duration: 1e-3,
      })
    // Two equal bars: Z/2 between them, so the rise from 10 % to 90 % is ln 9 (Z/2)/K; 4 d/c = 16 µs.
    const limit = (Math.log(9) * (Z / 2)) / 16e-6
    expect(find(ram({ stiffness: 0.95 * limit }), 'short-rise')).toBeUndefined()
    expect(find(ram({ stiffness: 1.3 * limit }), 'short-rise')!.message).toContain('takes 12.3 µs')
    // A dashpot lets a share D/(D + Z/2) through at once: over 9/10 leaves no rise at all.
    expect(find(ram({ stiffness: 0.1 * limit, damping: 5 * Z }), 'short-rise')!.message).toContain('at once')
    const curve = { closing: [0, 1e-3, 2e-3], force: [0, 1e-3 * 0.1 * limit, 1.4e-3 * limit] }
    expect(find(ram({ stiffness: null, curve }), 'short-rise')!.message).toContain('takes 12.3 µs')
    const onto = (rightEnd: PlainRig['rightEnd']) =>
      find(
        cautionsOf({ bars: [{ velocity: 5, sections: [straight] }], rightEnd, duration: 1e-3 }),
        'short-rise',
      )
    expect(onto({ kind: 'penetration', loading: 1.9 * limit, unloading: 9 * limit })).toBeUndefined()
    expect(onto({ kind: 'wall', gap: 0 })!.message).toContain('at once')
  })

  it('warns of flat faces only where a contact has pressed', () => {
    const wall = { kind: 'wall', gap: 1 } as const
    expect(codesOf({ leftEnd: slow, rightEnd: wall, bars: bar(straight) })).not.toContain('flat-faces')
    const caution = find(
      cautionsOf({ leftEnd: slow, rightEnd: { kind: 'wall', gap: 0 }, bars: bar(straight) }),
      'flat-faces',
    )!
    expect(caution.where).toBe('right end')
  })
})

describe('shapes', () => {
  it('warns of tapers over 15 degrees half angle, by outline or by bore', () => {
    const cone = (length: number): PlainSection => ({ length, diameter: [0.02, 0.04] })
    // atan(10 mm/36 mm) = 15.5 degrees, atan(10 mm/40 mm) = 14.0 degrees.
    const caution = find(
      cautionsOf({ leftEnd: slow, bars: bar(straight, cone(0.036), { length: 0.3, diameter: 0.04 }) }),
      'steep-taper',
    )!
    expect(caution).toMatchObject({ where: 'shaft, section 2' })
    expect(caution.message).toContain('15.5 degrees')
    expect(
      codesOf({ leftEnd: slow, bars: bar(straight, cone(0.04), { length: 0.3, diameter: 0.04 }) }),
    ).not.toContain('steep-taper')
  })

  it('joins the steps without a fillet factor, with their reasons, and names those with one apart', () => {
    const cautions = cautionsOf({
      leftEnd: slow,
      bars: bar(
        { ...straight, fillet: 0.002 },
        { length: 0.2, diameter: 0.03, fillet: 0 },
        { length: 0.2, diameter: 0.04 },
        { length: 0.2, diameter: 0.03, fillet: 0.1 },
        { length: 0.2, diameter: 0.032, name: 'collar' },
      ),
    })
    const none = find(cautions, 'no-fillet-factor')!
    expect(none.message).toContain(
      'the corner is sharp (radius 0); no fillet radius was given; the radius is large for the step: h/r = 0.0100',
    )
    expect(none.where).toBe('shaft, section 2; shaft, section 4')
    const some = find(cautions, 'static-fillet-factor')!
    expect(some.where).toBe('shaft, section 1')
    // D/d = 1.5, r/d = 0.1: 1.860345 (Pilkey, round, recomputed from the coefficients).
    expect(some.message).toContain('1.86')
    expect(cautions.filter(({ code }) => code === 'no-fillet-factor')).toHaveLength(1)
    const brass = { ...STEEL, modulus: 100e9 }
    const mixed = bar(straight, { length: 0.2, diameter: 0.03, material: brass })
    expect(find(cautionsOf({ leftEnd: slow, bars: mixed }), 'no-fillet-factor')!.message).toContain(
      'No fillet factor (the material changes at the step)',
    )
  })

  it('names the gauges within one diameter of a step', () => {
    const plain = {
      leftEnd: slow,
      bars: bar({ ...straight, fillet: 0.002 }, { length: 0.3, diameter: 0.03 }),
    }
    const near = find(
      cautionsOf(plain, [
        { bar: 0, at: 0.2 },
        { bar: 0, at: 0.38 },
      ]),
      'near-step',
    )!
    expect(near.message).toContain('Move G2 further away')
    expect(near.message).not.toContain('G1')
    expect(near.where).toBe('shaft 1 | 2')
    expect(find(cautionsOf(plain, [{ bar: 0, at: 0.2 }]), 'near-step')!.message).not.toContain('Move')
  })
})

describe('strength', () => {
  const area = (Math.PI / 4) * 0.02 ** 2
  const press = (stress: number) => ({ kind: 'force', pulse: half(stress * area, 100e-6) }) as const

  it('warns of negative margins with the worst one in numbers', () => {
    const cautions = cautionsOf({ leftEnd: press(1000e6), factorOfSafety: 2, bars: bar(straight) })
    const caution = find(cautions, 'negative-margin')!
    // 500 MPa allowed in compression, 400 MPa in tension, about 1000 MPa there: 400/(2 x 1000) - 1 = -0.8.
    expect(caution.message).toContain('at worst -0.8 in shaft, section 1 (tension)')
    expect(caution.message).toContain('against 400 MPa allowed, with a factor of safety of 2')
    expect(codesOf({ leftEnd: press(100e6), bars: bar(straight) })).not.toContain('negative-margin')
  })

  it('warns of stress over yield, nominal or only local', () => {
    const soft = { ...STEEL, yield: 150e6 }
    const whole = find(
      cautionsOf({ leftEnd: press(200e6), bars: bar({ ...straight, material: soft }) }),
      'over-yield',
    )!
    expect(whole.message).toMatch(/^Stress over yield: up to 200 MPa in shaft, section 1, yield 150 MPa/)
    expect(whole.message).toContain('The run is linear')
    expect(whole.message).toMatch(
      /Give the material its hardening, "0 Pa" for none\. A run by elements follows it\.$/,
    )
    const corner = { ...straight, material: soft, fillet: 0.002 }
    const only = find(
      cautionsOf({
        leftEnd: press(60e6),
        bars: bar(corner, { length: 0.3, diameter: 0.03, material: soft }),
      }),
      'over-yield',
    )!
    expect(only.message).toMatch(/^Local stress at a fillet over yield/)
    expect(only.where).toBe('shaft, section 1')
  })

  it('says of stress over yield in a run by elements whether it is followed', () => {
    const yielding = (material: typeof STEEL) => {
      const { line, record } = runPlain({
        dt,
        duration: 600e-6,
        leftEnd: press(200e6),
        bars: bar({ ...straight, material }),
      })
      const rig = { ...line.rig, run: { ...line.rig.run, method: 'elements' as const } }
      return find(evaluateCautions({ line: { ...line, rig }, record }), 'over-yield')!.message
    }
    expect(yielding({ ...STEEL, yield: 150e6, hardening: 0 })).toContain('The run follows yielding')
    const elastic = yielding({ ...STEEL, yield: 150e6 })
    expect(elastic).toContain('The run is linear')
    expect(elastic).toContain('Give the material its hardening')
  })

  it('warns of strain over 2 %', () => {
    const rubber = { ...STEEL, modulus: 8e9, density: 320 }
    const section = { ...straight, material: rubber }
    expect(
      find(cautionsOf({ leftEnd: press(200e6), bars: bar(section) }), 'large-strain')!.message,
    ).toContain('up to 2.5 %')
    expect(codesOf({ leftEnd: press(150e6), bars: bar(section) })).not.toContain('large-strain')
  })

  it('counts the plastic strain where the run follows it', () => {
    const soft = { ...STEEL, yield: 150e6, hardening: 2e9 }
    const { line, record } = runPlain({
      dt,
      duration: 600e-6,
      leftEnd: press(200e6),
      bars: bar({ ...straight, material: soft }),
    })
    const by = (method: 'characteristics' | 'elements') => {
      const rig = { ...line.rig, run: { ...line.rig.run, method } }
      return find(evaluateCautions({ line: { ...line, rig }, record }), 'large-strain')
    }
    // 200 MPa/200 GPa + 50 MPa (1/2 GPa - 1/200 GPa) = 2.575 %.
    expect(by('elements')!.message).toMatch(/up to 2\.5[78] %/)
    expect(by('characteristics')).toBeUndefined()
  })

  it('asks for allowables where stress has none', () => {
    const bare = { ...straight, allowable: { tension: null, compression: 300e6 } }
    const caution = find(cautionsOf({ leftEnd: slow, bars: bar(straight, bare) }), 'no-allowable')!
    expect(caution.where).toBe('shaft, section 2')
  })

  it('warns of buckling where a thin bar is pressed for long, not by a short pulse of the same force', () => {
    const thin: PlainSection = { length: 1, diameter: 0.004 }
    const small = (Math.PI / 4) * 0.004 ** 2
    // 500 MPa: growth time 2 r/(c strain) = 2 x 1 mm/(5000 x 0.0025) = 160 us; Euler load 24.8 N.
    const push = (duration: number) =>
      ({
        kind: 'force',
        pulse: { ...half(0, 1), value: (t: number) => (t >= 0 && t < duration ? 500e6 * small : 0) },
      }) as const
    const caution = find(
      cautionsOf({ leftEnd: push(300e-6), rightEnd: { kind: 'matched' }, bars: bar(thin) }),
      'buckling',
    )!
    expect(caution.message).toContain('6.28 kN of compression')
    expect(caution.message).toContain('Euler load of 0.0248 kN')
    expect(caution.message).toContain('160 µs')
    expect(caution.where).toBe('shaft')
    expect(codesOf({ leftEnd: push(100e-6), rightEnd: { kind: 'matched' }, bars: bar(thin) })).not.toContain(
      'buckling',
    )
  })
})

describe('the run', () => {
  it('is too short where a wave has not come back, or the decisive stress comes last', () => {
    const short = find(cautionsOf({ leftEnd: slow, bars: bar(straight), duration: 100e-6 }), 'short-run')!
    expect(short.message).toContain(
      'it lasts 100 µs, while a wave needs 160 µs to cross the line and come back',
    )
    expect(
      find(
        cautionsOf({ leftEnd: slow, rightEnd: { kind: 'matched' }, bars: bar(straight), duration: 100e-6 }),
        'short-run',
      ),
    ).toBeUndefined()
    const growing: Pulse = { shape: 'formula', value: (t) => 1e7 * t, rise: null, breaks: [] }
    const late = find(
      cautionsOf({
        leftEnd: { kind: 'force', pulse: growing },
        rightEnd: { kind: 'matched' },
        bars: bar(straight),
      }),
      'short-run',
    )!
    expect(late.message).toContain(
      'peaks that come in its last 2 % may still grow (shaft, section 1, compression, which governs)',
    )
  })

  it('is short as well where a peak that does not govern comes last', () => {
    const late: Pulse = {
      shape: 'formula',
      value: (t) => (t < 50e-6 ? 10e3 : t > 501e-6 ? -3e3 : 0),
      rise: null,
      breaks: [],
    }
    const plain = { rightEnd: { kind: 'matched' }, bars: bar(straight), duration: 500e-6 } as const
    const caution = find(cautionsOf({ leftEnd: { kind: 'force', pulse: late }, ...plain }), 'short-run')
    expect(caution).toBeUndefined()
    const longer = cautionsOf({ leftEnd: { kind: 'force', pulse: late }, ...plain, duration: 506e-6 })
    expect(find(longer, 'short-run')!.message).toContain('(shaft, section 1, tension)')
  })

  it('leaves laws out with both methods, and says which', () => {
    const { line, record } = runPlain({ dt, leftEnd: slow, bars: bar(straight) })
    const both = (run: object) =>
      find(
        evaluateCautions({
          line: { ...line, rig: { ...line.rig, run: { ...line.rig.run, method: 'both', ...run } } },
          record,
        }),
        'laws-left-out',
      )
    expect(both({})).toBeUndefined()
    expect(both({ finiteStrain: true, lateralInertia: true })!.message).toContain(
      'leave out finite strain, lateral inertia;',
    )
  })

  it('rounds travel times', () => {
    const caution = find(
      cautionsOf({ leftEnd: slow, bars: bar({ length: 0.404, diameter: 0.02 }, straight), dt: 4e-6 }),
      'travel-time-rounding',
    )!
    // 0.404 m is 80.8 us or 20.2 cells of 4 us.
    expect(caution.message).toContain('up to 0.99 % (shaft, section 1)')
    expect(caution.where).toBe('shaft, section 1')
  })

  it('does not close: says by how much and not to rely on it', () => {
    const { line, record } = runPlain({ dt, leftEnd: slow, bars: bar(straight) })
    const broken = { ...record, energy: { ...record.energy, closure: 3e-7 } }
    expect(find(evaluateCautions({ line, record: broken }), 'energy-closure')!.message).toContain('3.0e-7')
  })
})

describe('words', () => {
  it('are to three figures in the unit of the bench', () => {
    expect(describeQuantity(16.04e-6, 'time')).toBe('16 µs')
    expect(describeQuantity(0.01234, 'length')).toBe('12.3 mm')
    expect(describeQuantity(-412.4e6, 'stress')).toBe('-412 MPa')
  })

  it('name four places and count the rest', () => {
    expect(joinPlaces(['a', 'b', 'a'])).toBe('a; b')
    expect(joinPlaces(['a', 'b', 'c', 'd', 'e', 'f'])).toBe('a; b; c; d; and 2 more')
  })
})
