import type { EndTable, Result, SensePeak, StepRatios } from '../contract/result'

/** A level of the format: null for a plain value or a list of plain values, else its keys in order. */
export type ShapeNode = null | readonly [ShapeNode] | { readonly [key: string]: ShapeNode }

/** The shape that a type must have: a key that is missing here does not compile. */
type ShapeOf<T> = T extends readonly (infer Item)[]
  ? Item extends object
    ? Item extends readonly unknown[]
      ? null
      : readonly [ShapeOf<Item>]
    : null
  : T extends object
    ? { readonly [Key in keyof T]-?: [T[Key]] extends [null] ? null : ShapeOf<NonNullable<T[Key]>> }
    : null

const STEP_RATIOS: ShapeOf<StepRatios> = {
  reflectedForce: null,
  transmittedForce: null,
  reflectedStress: null,
  transmittedStress: null,
  reflectedEnergy: null,
  transmittedEnergy: null,
}

const SENSE_PEAK: ShapeOf<SensePeak> = {
  peak: null,
  at: null,
  time: null,
  kt: null,
  local: null,
  localAt: null,
  localTime: null,
  allowable: null,
  margin: null,
}

const END: ShapeOf<EndTable> = {
  peakForce: null,
  impulse: null,
  work: null,
  contactTime: null,
  bodyVelocity: null,
}

/** The keys of `result.json` in the order in which they are written. */
export const RESULT_SHAPE: ShapeOf<Result> = {
  format: null,
  rig: { title: null, sha256: null },
  software: { name: null, version: null },
  method: null,
  run: {
    timeStep: null,
    steps: null,
    cells: null,
    duration: null,
    solveTime: null,
    travelTimeRounding: [{ bar: null, section: null, error: null }],
  },
  line: { length: null, bars: [{ name: null, from: null, to: null, mass: null, travelTime: null }] },
  interfaces: [
    {
      name: null,
      x: null,
      leftImpedance: null,
      rightImpedance: null,
      fromLeft: STEP_RATIOS,
      fromRight: STEP_RATIOS,
    },
  ],
  tapers: [
    {
      name: null,
      from: null,
      to: null,
      travelTime: null,
      shortPulse: { reflectedForce: null, transmittedForce: null },
      longPulse: { reflectedForce: null, transmittedForce: null },
      frequency: null,
      reflectedForce: null,
      transmittedForce: null,
      transmittedEnergy: null,
    },
  ],
  envelope: { x: null, tension: null, tensionTime: null, compression: null, compressionTime: null },
  sections: [
    { bar: null, section: null, from: null, to: null, tension: SENSE_PEAK, compression: SENSE_PEAK },
  ],
  governing: { bar: null, section: null, sense: null, margin: null },
  factorOfSafety: null,
  fatigue: [
    {
      bar: null,
      section: null,
      at: null,
      kt: null,
      strength: null,
      exponent: null,
      amplitude: null,
      cycles: null,
      largest: [{ range: null, mean: null, count: null, damage: null }],
      damage: null,
      damageFirstHalf: null,
      impacts: null,
    },
  ],
  striker: { name: null, speed: null, pulseLength: null, pulseDuration: null, safeSpeed: null },
  gauges: [
    {
      name: null,
      x: null,
      t: null,
      stress: null,
      trueStress: null,
      strain: null,
      force: null,
      velocity: null,
      rightgoingForce: null,
      leftgoingForce: null,
      bridge: null,
      pulses: [{ direction: null, from: null, to: null, peakForce: null, clear: null }],
    },
  ],
  joints: [
    {
      name: null,
      kind: null,
      peakForce: null,
      impulse: null,
      closedFrom: null,
      contactTime: null,
      energyLost: null,
    },
  ],
  ends: {
    left: END,
    right: END,
  },
  bars: [{ name: null, momentum: null, velocity: null, kinetic: null, strain: null }],
  energy: { t: null, kinetic: null, strain: null, dissipated: null, work: null, closure: null },
  momentum: { closure: null },
  wavefronts: [
    { fromX: null, fromT: null, toX: null, toT: null, direction: null, force: null, spread: null },
  ],
  field: { x: null, t: null, stress: null },
  comparison: {
    envelope: null,
    envelopeAt: null,
    envelopeSense: null,
    gauges: [{ name: null, largest: null, rootMeanSquare: null }],
    verdict: null,
  },
  spalls: [{ bar: null, x: null, time: null, stress: null }],
  fragments: [{ bar: null, from: null, to: null, mass: null, velocity: null }],
  cautions: [{ code: null, message: null, where: null }],
  notice: null,
}
