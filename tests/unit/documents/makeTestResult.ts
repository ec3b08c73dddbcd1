import { NOTICE } from '../../../src-main/contract/notice'
import type { Result, SensePeak, StepRatios } from '../../../src-main/contract/result'

const DT = 1e-6
const STEPS = 400

/**
 * Makes a whole result with a value under every key. The numbers are invented to be told apart, not
 * computed: these tests look at how a result is written, never at what it says.
 */
export function makeTestResult(): Result {
  const t = Array.from({ length: STEPS + 1 }, (_none, n) => n * DT)
  const rightgoing = t.map((time) => (time > 100e-6 && time < 220e-6 ? -40e3 : 0))
  const leftgoing = t.map((time) => (time > 200e-6 && time < 320e-6 ? 16e3 : 0))
  const force = t.map((_time, n) => rightgoing[n] + leftgoing[n])
  const x = [0, 0.3, 0.3, 0.8, 0.8, 1.2]
  return {
    format: 'barwright-result/1',
    rig: { title: 'Hammer on a stepped shaft', sha256: 'ab'.repeat(32) },
    software: { name: 'Barwright', version: '0.0.0' },
    method: 'characteristics',
    run: {
      timeStep: DT,
      steps: STEPS,
      cells: 240,
      duration: STEPS * DT,
      solveTime: 0.0125,
      travelTimeRounding: [
        { bar: 'striker', section: 0, error: 0 },
        { bar: 'shaft', section: 0, error: 0.00125 },
        { bar: 'shaft', section: 1, error: -0.0021 },
      ],
    },
    line: {
      length: 1.2,
      bars: [
        { name: 'striker', from: 0, to: 0.3, mass: 0.74, travelTime: 58.4e-6 },
        { name: 'shaft', from: 0.3, to: 1.2, mass: 3.1, travelTime: 175.2e-6 },
      ],
    },
    interfaces: [
      {
        name: 'shaft 1 | shaft 2',
        x: 0.8,
        leftImpedance: 12660,
        rightImpedance: 28485,
        fromLeft: makeRatios(0.3846),
        fromRight: makeRatios(-0.3846),
      },
    ],
    tapers: [
      {
        name: 'shaft, section 2',
        from: 0.8,
        to: 1.2,
        travelTime: 77.9e-6,
        shortPulse: { reflectedForce: 0, transmittedForce: 1.5 },
        longPulse: { reflectedForce: 0.3846, transmittedForce: 1.3846 },
        frequency: [0, 5e3, 10e3],
        reflectedForce: [0.3846, 0.2, 0.05],
        transmittedForce: [1.3846, 1.45, 1.5],
        transmittedEnergy: [0.852, 0.96, 0.9975],
      },
    ],
    envelope: {
      x,
      tension: [0, 1e6, 2e6, 90e6, 40e6, 30e6],
      tensionTime: [0, 3e-4, 3e-4, 2.5e-4, 2.5e-4, 2.6e-4],
      compression: [-240e6, -240e6, -240e6, -250.5e6, -111e6, -222e6],
      compressionTime: [0, 0, 1e-6, 9.6e-5, 9.6e-5, 1.7e-4],
    },
    sections: [
      {
        bar: 'striker',
        section: 0,
        from: 0,
        to: 0.3,
        tension: makePeak(1e6, null),
        compression: makePeak(-240e6, null),
      },
      {
        bar: 'shaft',
        section: 0,
        from: 0.3,
        to: 0.8,
        tension: makePeak(90e6, 700e6),
        compression: makePeak(-250.5e6, 900e6),
      },
      {
        bar: 'shaft',
        section: 1,
        from: 0.8,
        to: 1.2,
        tension: makePeak(40e6, 700e6),
        compression: makePeak(-222e6, 900e6),
      },
    ],
    governing: { bar: 'shaft', section: 0, sense: 'compression', margin: makePeak(-250.5e6, 900e6).margin! },
    factorOfSafety: 1.5,
    fatigue: [
      {
        bar: 'shaft',
        section: 0,
        at: 0.8,
        kt: null,
        strength: 1.2e9,
        exponent: -0.09,
        amplitude: 170.25e6,
        cycles: 3,
        largest: [
          { range: 340.5e6, mean: -80.25e6, count: 1, damage: 7.6e-10 },
          { range: 90e6, mean: 0, count: 2, damage: 2e-15 },
        ],
        damage: 7.6e-10,
        damageFirstHalf: 7.6e-10,
        impacts: 1.3e9,
      },
    ],
    striker: { name: 'striker', speed: 12, pulseLength: 0.6, pulseDuration: 116.8e-6, safeSpeed: 25.4 },
    gauges: [
      {
        name: 'G1',
        x: 0.7,
        t,
        stress: force.map((value) => value / 314e-6),
        trueStress: [],
        strain: force.map((value) => value / 314e-6 / 207e9),
        force,
        velocity: force.map((value) => (0 - value) / 12660),
        rightgoingForce: rightgoing,
        leftgoingForce: leftgoing,
        bridge: [],
        pulses: [
          { direction: 'right', from: 101e-6, to: 220e-6, peakForce: -40e3, clear: false },
          { direction: 'left', from: 201e-6, to: 320e-6, peakForce: 16e3, clear: false },
        ],
      },
    ],
    joints: [
      {
        name: 'striker | shaft',
        kind: 'contact',
        peakForce: -40e3,
        impulse: -4.67,
        closedFrom: 0,
        contactTime: 116e-6,
        energyLost: 0.012,
      },
    ],
    ends: {
      left: { peakForce: 0, impulse: 0, work: 0, contactTime: 0, bodyVelocity: null },
      right: { peakForce: -70e3, impulse: -8.1, work: 0, contactTime: 1.2e-4, bodyVelocity: 0.75 },
    },
    bars: [
      { name: 'striker', momentum: 0.5, velocity: 0.67, kinetic: 0.17, strain: 0.01 },
      { name: 'shaft', momentum: 3.2, velocity: 1.03, kinetic: 20.5, strain: 31 },
    ],
    energy: {
      t: [0, 2e-4, 4e-4],
      kinetic: [53.3, 30, 20.67],
      strain: [0, 23.29, 32.61],
      dissipated: [0, 0.01, 0.02],
      work: [0, 0, 0],
      closure: 3.1e-16,
    },
    momentum: { closure: 2.2e-16 },
    wavefronts: [
      { fromX: 0.3, fromT: 0, toX: 0.8, toT: 97e-6, direction: 'right', force: 1, spread: false },
      { fromX: 0.8, fromT: 97e-6, toX: 1.2, toT: 175e-6, direction: 'right', force: 1.38, spread: true },
    ],
    field: makeField(),
    comparison: {
      envelope: 0.0123,
      envelopeAt: 0.8,
      envelopeSense: 'compression',
      gauges: [{ name: 'G1', largest: 0.034, rootMeanSquare: 0.0056 }],
      verdict: 'The envelopes differ by up to 1.2 % of the largest stress.',
    },
    spalls: [{ bar: 'shaft', x: 1.1, time: 3.1e-4, stress: 1.5e9 }],
    fragments: [{ bar: 'shaft', from: 1.1, to: 1.2, mass: 0.55, velocity: 7.4 }],
    cautions: [
      { code: 'flat-faces', message: 'Contacts are taken as flat faces.', where: 'striker | shaft' },
      { code: 'user-values', message: "Allowables are the user's own.", where: '' },
    ],
    notice: NOTICE,
  }
}

function makeRatios(reflected: number): StepRatios {
  return {
    reflectedForce: reflected,
    transmittedForce: 1 + reflected,
    reflectedStress: reflected,
    transmittedStress: (1 + reflected) / 2,
    reflectedEnergy: reflected ** 2,
    transmittedEnergy: 1 - reflected ** 2,
  }
}

function makePeak(peak: number, allowable: number | null): SensePeak {
  const margin = allowable === null ? null : allowable / (1.5 * Math.abs(peak)) - 1
  return {
    peak,
    at: 0.4,
    time: 96e-6,
    kt: null,
    local: peak,
    localAt: 0.45,
    localTime: 99e-6,
    allowable,
    margin,
  }
}

function makeField(): Result['field'] {
  const x = Array.from({ length: 61 }, (_none, i) => i * 0.02)
  const t = Array.from({ length: 41 }, (_none, j) => j * 10 * DT)
  const speed = 5135
  return {
    x,
    t,
    stress: t.map((time) => x.map((place) => (Math.abs(place - 0.3 - speed * time) < 0.3 ? -240e6 : 0))),
  }
}
