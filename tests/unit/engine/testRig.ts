import type { Bar, End, Joint, Material, Pulse, Rig, Section } from '../../../src-main/contract/rig'

/** rho c = 4e7 and c = 5000 m/s exactly. */
export const ROUND_STEEL: Material = {
  name: 'round steel',
  density: 8000,
  modulus: 200e9,
  poisson: 0.3,
  allowable: { tension: null, compression: null },
  yield: null,
  hardening: null,
  hardeningRule: 'isotropic',
  viscosity: null,
  spall: null,
  fatigue: null,
  source: '',
}

/** A solid or plain section of given areas, with the area linear, exponential or conical in between. */
export function makeSection(
  length: number,
  area: number | ((s: number) => number),
  options: Partial<Section> = {},
): Section {
  const at = typeof area === 'number' ? () => area : area
  return {
    name: '',
    length,
    material: ROUND_STEEL,
    fillet: null,
    allowable: { tension: null, compression: null },
    shape: {
      kind: 'area',
      uniform: typeof area === 'number',
      round: false,
      area: at,
      diameter: (s) => Math.sqrt((4 * at(s)) / Math.PI),
      bore: () => 0,
    },
    ...options,
  }
}

export function makeBar(name: string, sections: Section[], options: Partial<Bar> = {}): Bar {
  const velocity = options.uniformVelocity ?? 0
  return {
    name,
    sections,
    velocity: () => velocity,
    uniformVelocity: velocity,
    displacement: null,
    preload: 0,
    ...options,
  }
}

export function makePulse(value: (t: number) => number): Pulse {
  return { shape: 'formula', value, rise: null, breaks: [] }
}

export function makeRig(
  bars: Bar[],
  run: { duration: number; timeStep?: number; cell?: number },
  options: Partial<Rig> & { leftEnd?: End; rightEnd?: End; joints?: Joint[] } = {},
): Rig {
  return {
    title: 'test',
    notes: '',
    bars,
    joints: bars.slice(1).map(() => ({ kind: 'contact', gap: 0 })),
    leftEnd: { kind: 'free' },
    rightEnd: { kind: 'free' },
    loads: [],
    gravity: 0,
    gauges: [],
    factorOfSafety: 1,
    ...options,
    run: {
      duration: run.duration,
      timeStep: run.timeStep ?? null,
      cell: run.cell ?? null,
      method: 'characteristics',
      finiteStrain: false,
      lateralInertia: false,
      bulkViscosity: false,
      spall: false,
    },
  }
}
