import type { Bench, RigSetup } from './bench'
import { ROUND_STEEL } from './setups'

/** What a rod of round steel is made to do by its left end. */
export interface Drive {
  /** Velocity of the end [m/s]. */
  velocity: number
  /** Time in which it comes to that velocity [s]; at once for zero. */
  rise: number
  material?: Partial<RigSetup['materials'][string]>
  run?: Partial<RigSetup['run']>
}

/**
 * Moves the left end of a rod of half a metre and reads the even state behind the wave, on 200 elements.
 *
 * @returns nominal stress, the mean over the last tenth of the run [Pa], and nominal strain of the stretch from
 *   20 to 50 mm, from the velocities of its ends; tension positive
 */
export function driveRod(
  bench: Bench,
  { velocity, rise, material, run }: Drive,
): { stress: number; strain: number } {
  const peak = `${velocity} m/s`
  const { line, record } = bench.march({
    materials: { steel: { ...ROUND_STEEL, ...material } },
    leftEnd: {
      kind: 'velocity',
      pulse: rise === 0 ? { shape: 'step', peak } : { shape: 'ramp', peak, rise: `${rise} s` },
    },
    bars: [{ name: 'rod', material: 'steel', sections: [{ length: '0.5 m', area: '1 cm^2' }] }],
    gauges: [
      { name: 'near', bar: 'rod', at: '20 mm' },
      { name: 'far', bar: 'rod', at: '50 mm' },
    ],
    run: { duration: '130 us', cell: '2.5 mm', method: 'elements', ...run },
  })
  const [near, far] = record.gauges
  const from = Math.round(0.9 * near.force.length)
  const last = far.force.slice(from)
  return {
    stress: last.reduce((sum, F) => sum + F, 0) / last.length / near.area,
    strain: (line.dt * near.velocity.reduce((sum, v, k) => sum + far.velocity[k] - v, 0)) / (far.x - near.x),
  }
}
