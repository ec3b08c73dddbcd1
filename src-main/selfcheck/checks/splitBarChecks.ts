import { INCIDENT_WAVE } from '../../engine/exact/published/examples'
import {
  RING_UP,
  SPLIT_BAR_ENERGIES,
  SPLIT_BAR_LIMIT,
  SPLIT_BAR_REDUCED,
  SPLIT_BAR_WAVES,
} from '../../engine/exact/published/splitBar'
import type { Bench, RigSetup } from '../bench'
import type { Check } from '../check'
import { lengthOf, ROUND_STEEL, SPEED, stepsOf } from '../setups'

const MODULUS = 200e9
const AREA = Math.PI * 0.01 ** 2
const SPECIMEN = { length: 5e-3, area: Math.PI * 0.005 ** 2 }
/** Steps of 1 us: the pulse is whole at the first gauge, its echo there and what passed at the second one. */
const INCIDENT = [150, 270]
const LATER = [450, 570]
const EXACT =
  'exact: travel times are whole numbers of steps, the specimen yields at one stress; nine digits are published'

const bar = (name: string, length: string, velocity?: string): RigSetup['bars'][number] => ({
  name,
  material: 'steel',
  velocity,
  sections: [{ length, diameter: '20 mm' }],
})

/** Fires the striker at the bars with the specimen between them; strains are compression positive. */
function fire(bench: Bench) {
  const { line, record } = bench.march({
    materials: { steel: ROUND_STEEL },
    bars: [bar('striker', '0.3 m', '20 m/s'), bar('input', '1.5 m'), bar('output', '1.5 m')],
    joints: [
      { kind: 'contact' },
      {
        kind: 'specimen',
        length: '5 mm',
        diameter: '10 mm',
        law: {
          kind: 'curve',
          curve: [
            [0, '400 MPa'],
            [1, '400 MPa'],
          ],
        },
      },
    ],
    rightEnd: { kind: 'matched' },
    gauges: [
      { name: 'input', bar: 'input', at: '0.75 m' },
      { name: 'output', bar: 'output', at: '0.75 m' },
      { name: 'face 1', bar: 'input', at: '1.5 m' },
      { name: 'face 2', bar: 'output', at: '0 m' },
    ],
    run: stepsOf(600),
  })
  const [input, output, face1, face2] = record.gauges
  const mean = (values: Float64Array, [from, to]: number[]) =>
    values.slice(from, to).reduce((sum, value) => sum + value, 0) / (to - from)
  const strain = (wave: Float64Array, steps: number[]) => -mean(wave, steps) / (MODULUS * AREA)
  const energy = (wave: Float64Array, [from, to]: number[]) =>
    wave.slice(from, to).reduce((sum, f) => sum + (f * f * line.dt) / input.impedance, 0)
  const pressed = [300, 420]
  const closing = face1.velocity.map((v, k) => v - face2.velocity[k])
  return {
    incident: strain(input.rightgoing, INCIDENT),
    reflected: strain(input.leftgoing, LATER),
    transmitted: strain(output.rightgoing, LATER),
    duration: input.rightgoing.slice(0, 300).filter((f) => f < -1).length * line.dt,
    force: -mean(face1.force, pressed),
    v1: mean(face1.velocity, pressed),
    v2: mean(face2.velocity, pressed),
    closing: (closing.slice(0, pressed[1]).reduce((sum, v) => sum + v, 0) * line.dt) / SPECIMEN.length,
    energies: [
      energy(input.rightgoing, INCIDENT),
      energy(input.leftgoing, LATER),
      energy(output.rightgoing, LATER),
      record.jointLoss[1],
    ],
  }
}

/** Forces of both faces of an elastic specimen of four cells, by its transits, over the incident step. */
function ringUp(bench: Bench, beta: number, transits: number): number[] {
  const before = 70
  const { record } = bench.march({
    materials: { steel: ROUND_STEEL },
    leftEnd: { kind: 'force', pulse: { shape: 'step', peak: '1 kN' } },
    bars: [
      {
        name: 'bar',
        material: 'steel',
        sections: [
          { length: lengthOf(before), area: '10 cm^2' },
          { length: lengthOf(4), area: `${10 * beta} cm^2` },
          { length: lengthOf(4), area: '10 cm^2' },
        ],
      },
    ],
    rightEnd: { kind: 'matched' },
    gauges: [before, before + 4].map((cells, i) => ({ name: `face ${i}`, bar: 'bar', at: lengthOf(cells) })),
    run: stepsOf(before + 4 * transits + 4),
  })
  return Array.from({ length: transits + 1 }, (_, k) => record.gauges[k % 2].force[before + 4 * k] / -1000)
}

export const SPLIT_BAR_CHECKS: Check[] = [
  {
    id: 'split-bar-incident',
    title: 'Split bar: incident wave',
    section: 7,
    source: INCIDENT_WAVE.source,
    values: INCIDENT_WAVE.columns
      .slice(0, 4)
      .map((what, i) => ({ what, published: INCIDENT_WAVE.rows[0][i] })),
    tolerance: 5e-9,
    reason: EXACT,
    compute: (bench) => {
      const { incident, duration } = fire(bench)
      return [incident, incident * MODULUS, incident * MODULUS * AREA, duration]
    },
  },
  {
    id: 'split-bar-waves',
    title: 'Split bar: strains, force, speeds of the faces',
    section: 7,
    source: SPLIT_BAR_WAVES.source,
    values: SPLIT_BAR_WAVES.columns.map((what, i) => ({ what, published: SPLIT_BAR_WAVES.rows[0][i] })),
    tolerance: 5e-9,
    reason: EXACT,
    compute: (bench) => {
      const { force, incident, reflected, transmitted, v1, v2 } = fire(bench)
      return [force, incident, reflected, transmitted, v1, v2]
    },
  },
  {
    id: 'split-bar-reductions',
    title: 'Split bar: rate, stress, strain by 3, 2, 1 waves',
    section: 7,
    source: SPLIT_BAR_REDUCED.source,
    values: [
      ...['three', 'two', 'one'].map((waves) => ({
        what: `rate by ${waves} waves [1/s]`,
        published: SPLIT_BAR_REDUCED.rows[0][0],
      })),
      ...['three', 'two', 'one'].map((waves) => ({
        what: `stress by ${waves} waves [Pa]`,
        published: SPLIT_BAR_REDUCED.rows[0][1],
      })),
      { what: 'strain of the specimen', published: SPLIT_BAR_REDUCED.rows[0][2] },
    ],
    tolerance: 5e-9,
    reason: EXACT,
    compute: (bench) => {
      const { incident, reflected, transmitted, closing } = fire(bench)
      const rate = SPEED / SPECIMEN.length
      const stress = (MODULUS * AREA) / SPECIMEN.area
      return [
        rate * (incident - reflected - transmitted),
        2 * rate * (incident - transmitted),
        -2 * rate * reflected,
        (stress * (incident + reflected + transmitted)) / 2,
        stress * (incident + reflected),
        stress * transmitted,
        closing,
      ]
    },
  },
  {
    id: 'split-bar-energies',
    title: 'Split bar: energies, plastic work',
    section: 7,
    source: SPLIT_BAR_ENERGIES.source,
    values: SPLIT_BAR_ENERGIES.columns.map((column, i) => ({
      what: `${column} [J]`,
      published: SPLIT_BAR_ENERGIES.rows[0][i],
    })),
    tolerance: 5e-9,
    reason: EXACT,
    compute: (bench) => fire(bench).energies,
  },
  {
    id: 'split-bar-limit',
    title: 'Split bar: largest striker speed',
    section: 7,
    source: SPLIT_BAR_LIMIT.source,
    values: [{ what: 'striker speed [m/s]', published: SPLIT_BAR_LIMIT.rows[0][1] }],
    tolerance: 1e-9,
    reason: 'exact',
    compute: (bench) => {
      const { striker } = bench.solve({
        materials: { steel: { ...ROUND_STEEL, allowable: { tension: '1000 MPa', compression: '1000 MPa' } } },
        bars: [bar('striker', '0.3 m', '20 m/s'), bar('input', '1.5 m')],
        rightEnd: { kind: 'matched' },
        run: stepsOf(500),
      })
      return [striker?.safeSpeed ?? NaN]
    },
  },
  {
    id: 'split-bar-ring-up',
    title: 'Elastic specimen: transits until even within 5 %',
    section: 7,
    source: RING_UP.source,
    values: RING_UP.rows.flatMap(([beta, first]) => [
      { what: `first transit at beta = ${beta}`, published: first },
      {
        what: `face force over F_I after it at beta = ${beta}`,
        published: 1 - ((1 - beta) / (1 + beta)) ** (first + 1),
      },
    ]),
    tolerance: 1e-9,
    reason: 'exact: every transit is a whole number of steps',
    compute: (bench) =>
      RING_UP.rows.flatMap(([beta, first]) => {
        const face = ringUp(bench, beta, 16)
        const agrees = face.findIndex(
          (F, k) => k > 0 && 2 * Math.abs(F - face[k - 1]) < 0.05 * (F + face[k - 1]),
        )
        return [agrees, face[first]]
      }),
  },
]
