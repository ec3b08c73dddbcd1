/**
 * A rig that has been read and checked: SI throughout, every reference resolved, every formula
 * compiled. Only `engine/rig` makes one. Forces and stresses are positive in tension, motions
 * positive to the right.
 */

/** Stresses that may not be passed [Pa], both positive; null where none was given. */
export interface Allowable {
  tension: number | null
  compression: number | null
}

export interface Material {
  name: string
  /** [kg/m^3] */
  density: number
  /** Young's modulus [Pa] */
  modulus: number
  poisson: number | null
  allowable: Allowable
  /** [Pa] */
  yield: number | null
  /** Tangent modulus after yield [Pa] */
  hardening: number | null
  hardeningRule: 'isotropic' | 'kinematic'
  /** Kelvin-Voigt viscosity [Pa s] */
  viscosity: number | null
  /** Stress at which it comes apart [Pa] */
  spall: number | null
  fatigue: { strength: number; exponent: number } | null
  source: string
}

export type ShapeKind =
  | 'cylinder'
  | 'tube'
  | 'cone'
  | 'exponential'
  | 'area-linear'
  | 'formula'
  | 'stations'
  | 'area'

/** The form of one section along `s`, 0 at its left face and 1 at its right face. */
export interface SectionShape {
  kind: ShapeKind
  /** True where the area does not change along the section. */
  uniform: boolean
  /** False for sections given by plain `area`. */
  round: boolean
  /** Undeformed area [m^2] at s in 0..1. */
  area(s: number): number
  /** Outer diameter [m] at s; for a plain area, that of the circle of equal area. */
  diameter(s: number): number
  /** Bore [m] at s; 0 for a solid section. */
  bore(s: number): number
}

export interface Section {
  name: string
  /** [m] */
  length: number
  material: Material
  shape: SectionShape
  /** Radius where this section meets the next, in the corner of the smaller one [m]. */
  fillet: number | null
  allowable: Allowable
}

/** A quantity along a bar: `x` from its left face [m], `s` in 0..1 along it. */
export type Along = (x: number, s: number) => number

export interface Bar {
  name: string
  sections: Section[]
  /** Initial velocity [m/s]. */
  velocity: Along
  /** The velocity where it is one value for the whole bar, 0 at rest; null for a formula in x or s. */
  uniformVelocity: number | null
  /** Initial displacement [m], giving an initial strain; null for none. */
  displacement: Along | null
  /** Initial axial force, tension positive [N]. */
  preload: number
}

export type PulseShape =
  | 'rectangle'
  | 'half-sine'
  | 'haversine'
  | 'triangle'
  | 'trapezoid'
  | 'step'
  | 'ramp'
  | 'formula'
  | 'table'
  | 'file'

/** A prescribed history of a force [N], velocity [m/s] or displacement [m]. */
export interface Pulse {
  shape: PulseShape
  /** Value at time t [s]; at a jump the value after it. */
  value(t: number): number
  /** Time from 10 % to 90 % or the shortest rise known [s]; 0 for a jump, null when not known. */
  rise: number | null
  /** Times [s] at which the value or its slope jumps, where known; in ascending order. */
  breaks: number[]
}

export type End =
  | { kind: 'free' }
  | { kind: 'fixed' }
  | { kind: 'matched' }
  | { kind: 'force'; pulse: Pulse }
  | { kind: 'velocity'; pulse: Pulse }
  | { kind: 'displacement'; pulse: Pulse }
  | { kind: 'mass'; mass: number; velocity: number; joint: 'bonded' | 'contact'; gap: number }
  | {
      kind: 'support'
      stiffness: number
      damping: number
      mass: number
      joint: 'bonded' | 'contact'
      gap: number
    }
  | { kind: 'wall'; gap: number }
  | { kind: 'penetration'; loading: number; unloading: number }

export type SpecimenLaw =
  | { kind: 'elastic'; modulus: number; rateSensitivity: number; referenceRate: number }
  | { kind: 'bilinear'; modulus: number; yield: number; hardening: number; rateSensitivity: number; referenceRate: number }
  | { kind: 'power'; strength: number; exponent: number; rateSensitivity: number; referenceRate: number }
  | { kind: 'curve'; strain: number[]; stress: number[]; rateSensitivity: number; referenceRate: number }

export type Joint =
  | { kind: 'bonded' }
  | { kind: 'contact'; gap: number }
  | {
      kind: 'cushion'
      /** [N/m]; null where a curve is given */
      stiffness: number | null
      /** Loading curve: closing [m] and force, compression positive [N]. */
      curve: { closing: number[]; force: number[] } | null
      /** [N/m]; null where it unloads as it loads */
      unloading: number | null
      damping: number
      mass: number
      gap: number
      /** True where it also pulls. */
      tension: boolean
    }
  | { kind: 'specimen'; length: number; area: number; law: SpecimenLaw }

/** An axial force at a point of a bar, positive to the right. */
export interface PointLoad {
  /** Index of the bar. */
  bar: number
  /** Distance from the bar's left face [m]. */
  at: number
  pulse: Pulse
}

export interface Bridge {
  /** Gauge factor, 1. */
  factor: number
  /** Arms that carry a gauge: 1, 2 or 4. */
  arms: number
  /** [V] */
  excitation: number
  gain: number
  /** Ratio read by the arms mounted across the bar; null where all arms lie along it. */
  poisson: number | null
}

export interface Gauge {
  name: string
  /** Index of the bar. */
  bar: number
  /** Distance from the bar's left face [m]. */
  at: number
  bridge: Bridge | null
}

export interface RunSettings {
  /** [s] */
  duration: number
  /** Wanted cell length [m]; null where a time step was given. */
  cell: number | null
  /** Time step [s]; null where a cell was given. */
  timeStep: number | null
  method: 'characteristics' | 'elements' | 'both'
  finiteStrain: boolean
  lateralInertia: boolean
  bulkViscosity: boolean
  spall: boolean
}

export interface Rig {
  title: string
  notes: string
  bars: Bar[]
  /** One fewer than bars, in order. */
  joints: Joint[]
  leftEnd: End
  rightEnd: End
  loads: PointLoad[]
  /** Acceleration along x [m/s^2]; 0 for a level rig. */
  gravity: number
  gauges: Gauge[]
  factorOfSafety: number
  run: RunSettings
}
