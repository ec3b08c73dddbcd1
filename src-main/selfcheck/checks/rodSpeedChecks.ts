import { ROD_SPEEDS } from '../../engine/exact/published/rodSpeeds'
import type { RigSetup } from '../bench'
import type { Check } from '../check'

const material = ([density, modulus, strength]: number[]): RigSetup['materials'] => ({
  rod: {
    density: `${density} kg/m^3`,
    modulus: `${modulus} Pa`,
    allowable: { tension: `${strength} Pa`, compression: `${strength} Pa` },
  },
})

export const ROD_SPEED_CHECKS: Check[] = [
  {
    id: 'rod-speeds',
    title: 'Handbook materials: speed of a front',
    section: 12,
    source: ROD_SPEEDS.source,
    values: ROD_SPEEDS.rows.map(([density, , , published]) => ({
      what: `c of ${density} kg/m^3 [m/s]`,
      published,
    })),
    tolerance: 2e-5,
    reason: 'five digits are published',
    compute: (bench) =>
      ROD_SPEEDS.rows.map((row) => {
        const { line, record } = bench.march({
          materials: material(row),
          leftEnd: { kind: 'force', pulse: { shape: 'step', peak: '1 kN' } },
          bars: [{ name: 'rod', material: 'rod', sections: [{ length: '1 m', area: '1 cm^2' }] }],
          gauges: [
            { name: 'near', bar: 'rod', at: '0.2 m' },
            { name: 'far', bar: 'rod', at: '0.8 m' },
          ],
          run: { duration: '260 us', cell: '10 mm' },
        })
        const [near, far] = record.gauges.map(({ force }) => force.findIndex((F) => F !== 0))
        return 0.6 / ((far - near) * line.dt)
      }),
  },
  {
    id: 'rod-strikes',
    title: 'Handbook materials: impact speed at yield',
    section: 12,
    source: ROD_SPEEDS.source,
    values: ROD_SPEEDS.rows.map(([density, , , , published]) => ({
      what: `2 yield/(rho c) of ${density} kg/m^3 [m/s]`,
      published,
    })),
    tolerance: 3e-4,
    reason: 'four digits are published',
    compute: (bench) =>
      ROD_SPEEDS.rows.map((row) => {
        const sections = [{ length: '0.2 m', area: '1 cm^2' }]
        const { striker } = bench.solve({
          materials: material(row),
          bars: [
            { name: 'striker', material: 'rod', velocity: '1 m/s', sections },
            { name: 'rod', material: 'rod', sections },
          ],
          rightEnd: { kind: 'matched' },
          run: { duration: '70 us', cell: '10 mm' },
        })
        return striker?.safeSpeed ?? NaN
      }),
  },
]
