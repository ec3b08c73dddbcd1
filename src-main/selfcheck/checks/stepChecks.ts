import { STEEL_INTO, STEP_RATIOS } from '../../engine/exact/published/stepRatios'
import { MATCHING_AREA, SILVER_TO_GOLD } from '../../engine/exact/published/workedExamples'
import type { Bench, RigSetup } from '../bench'
import type { Check } from '../check'

/** One half of the line: a bar of 40 cells. */
interface Half {
  density: number
  modulus: number
  /** Share of 10 cm^2. */
  area: number
}

/** Waves that leave a step, as shares of those that arrived. */
interface Ratios {
  forceReflected: number
  forceTransmitted: number
  velocityReflected: number
  velocityTransmitted: number
  stressTransmitted: number
  energyReflected: number
  energyTransmitted: number
}

const CELLS = 40
const EXACT = 'characteristics are exact at a step; ten digits are published'
const ROUND: Half = { density: 8000, modulus: 200e9, area: 1 }
const STEEL: Half = { density: 7850, modulus: 207e9, area: 1 }

/** Sends a rectangle of ten steps from the left end over the step in the middle and reads the waves that leave it. */
function marchStep(bench: Bench, first: Half, second: Half | 'free' | 'fixed'): Ratios {
  const halves = typeof second === 'string' ? [first] : [first, second]
  const lengths = halves.map(({ density, modulus }) => CELLS * Math.sqrt(modulus / density) * 1e-6)
  const setup: RigSetup = {
    materials: Object.fromEntries(
      halves.map(({ density, modulus }, i) => [
        `m${i}`,
        { density: `${density} kg/m^3`, modulus: `${modulus} Pa` },
      ]),
    ),
    leftEnd: { kind: 'force', pulse: { shape: 'rectangle', peak: '1 kN', duration: '9.5 us' } },
    rightEnd: { kind: second === 'fixed' ? 'fixed' : 'free' },
    bars: [
      {
        name: 'bar',
        sections: halves.map(({ area }, i) => ({
          length: `${lengths[i]} m`,
          area: `${area * 10} cm^2`,
          material: `m${i}`,
        })),
      },
    ],
    gauges: lengths.map((length, i) => ({
      name: `G${i}`,
      bar: 'bar',
      at: `${lengths.slice(0, i).reduce((sum, each) => sum + each, 0) + length / 2} m`,
    })),
    run: { duration: `${(halves.length === 1 ? 2.4 : 1.9) * CELLS} us`, timeStep: '1 us' },
  }
  const { line, record } = bench.march(setup)
  const [before, behind] = record.gauges
  const end = record.node(line.spans.length)!
  // What a free or fixed end sees where there is no second bar.
  const passed = behind ?? { force: end.forceLeft, velocity: end.velocityLeft, area: 1, impedance: Infinity }
  const largest = (values: Float64Array) =>
    values.reduce((best, value) => (Math.abs(value) > Math.abs(best) ? value : best), 0)
  const energy = (F: Float64Array, Z: number) => F.reduce((sum, each) => sum + (each * each) / Z, 0)
  const incident = { force: largest(before.rightgoing), velocity: largest(before.velocity.slice(0, 45)) }
  const arrived = energy(before.rightgoing, before.impedance)
  return {
    forceReflected: largest(before.force.slice(45)) / incident.force,
    forceTransmitted: largest(passed.force) / incident.force,
    velocityReflected: largest(before.velocity.slice(45)) / incident.velocity,
    velocityTransmitted: largest(passed.velocity) / incident.velocity,
    stressTransmitted: largest(passed.force) / passed.area / (incident.force / before.area),
    energyReflected: energy(before.leftgoing, before.impedance) / arrived,
    energyTransmitted: energy(passed.force, passed.impedance) / arrived,
  }
}

const marchRatio = (bench: Bench, ratio: number): Ratios =>
  marchStep(bench, ROUND, ratio === 0 ? 'free' : ratio === Infinity ? 'fixed' : { ...ROUND, area: ratio })

const bonded = STEP_RATIOS.rows.filter(([ratio]) => ratio > 0 && ratio < Infinity)
const [silver, gold]: Half[] = [
  { density: 10500, modulus: 83e9, area: 1 },
  { density: 19300, modulus: 78e9, area: 1 },
]

export const STEP_CHECKS: Check[] = [
  {
    id: 'step-forces',
    title: 'Area steps and ends: force sent back and passed',
    section: 1,
    source: STEP_RATIOS.source,
    values: STEP_RATIOS.rows.flatMap(([ratio, R, T]) => [
      { what: `F_R/F_I at Z2/Z1 = ${ratio}`, published: R, scale: 1 },
      { what: `F_T/F_I at Z2/Z1 = ${ratio}`, published: T, scale: 1 },
    ]),
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) =>
      STEP_RATIOS.rows.flatMap(([ratio]) => {
        const found = marchRatio(bench, ratio)
        return [found.forceReflected, found.forceTransmitted]
      }),
  },
  {
    id: 'step-velocity-stress',
    title: 'Area steps: velocity and stress passed',
    section: 1,
    source: STEP_RATIOS.source,
    values: bonded.flatMap(([ratio, , , velocity, , , stress]) => [
      { what: `v_T/v_I at Z2/Z1 = ${ratio}`, published: velocity },
      { what: `stress_T/stress_I at A2/A1 = ${ratio}`, published: stress },
    ]),
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) =>
      bonded.flatMap(([ratio]) => {
        const found = marchRatio(bench, ratio)
        return [found.velocityTransmitted, found.stressTransmitted]
      }),
  },
  {
    id: 'step-energies',
    title: 'Area steps: energy sent back and passed',
    section: 1,
    source: STEP_RATIOS.source,
    values: bonded.flatMap(([ratio, , , , reflected, transmitted]) => [
      { what: `E_R/E_I at Z2/Z1 = ${ratio}`, published: reflected, scale: 1 },
      { what: `E_T/E_I at Z2/Z1 = ${ratio}`, published: transmitted, scale: 1 },
    ]),
    tolerance: 1e-9,
    reason: EXACT,
    compute: (bench) =>
      bonded.flatMap(([ratio]) => {
        const found = marchRatio(bench, ratio)
        return [found.energyReflected, found.energyTransmitted]
      }),
  },
  {
    id: 'step-materials',
    title: 'Steel into aluminium, titanium, PMMA, tungsten',
    section: 1,
    source: STEEL_INTO.source,
    values: STEEL_INTO.rows.flatMap(([density, , , R, T, ET]) => [
      { what: `F_R/F_I into ${density} kg/m^3`, published: R },
      { what: `F_T/F_I into ${density} kg/m^3`, published: T },
      { what: `E_T/E_I into ${density} kg/m^3`, published: ET },
    ]),
    tolerance: 4e-9,
    reason: 'characteristics are exact at a step; nine digits are published',
    compute: (bench) =>
      STEEL_INTO.rows.flatMap(([density, modulus]) => {
        const found = marchStep(bench, STEEL, { density, modulus, area: 1 })
        return [found.forceReflected, found.forceTransmitted, found.energyTransmitted]
      }),
  },
  {
    id: 'step-matched-area',
    title: 'Steel into aluminium of matching area',
    section: 1,
    source: MATCHING_AREA.source,
    values: [
      { what: 'F_R/F_I', published: MATCHING_AREA.rows[0][1], scale: 1 },
      { what: 'E_T/E_I', published: MATCHING_AREA.rows[0][2] },
    ],
    tolerance: 1e-9,
    reason: 'the area is published to nine digits',
    compute: (bench) => {
      const aluminium = { density: 2700, modulus: 68.9e9, area: MATCHING_AREA.rows[0][0] }
      const found = marchStep(bench, STEEL, aluminium)
      return [found.forceReflected, found.energyTransmitted]
    },
  },
  {
    id: 'step-silver-gold',
    title: 'Silver into gold',
    section: 1,
    source: SILVER_TO_GOLD.source,
    values: ['v_T/v_I', 'v_R/v_I', 'stress_T/stress_I'].map((what, i) => ({
      what,
      published: SILVER_TO_GOLD.rows[0][i + 3],
    })),
    tolerance: 4e-9,
    reason: 'characteristics are exact at a step; nine digits are published',
    compute: (bench) => {
      const found = marchStep(bench, silver, gold)
      return [found.velocityTransmitted, found.velocityReflected, found.stressTransmitted]
    },
  },
]
