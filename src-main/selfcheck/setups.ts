import type { RigSetup } from './bench'

/** c = 5000 m/s and rho c = 4e7 kg/(m^2 s) exactly. */
export const ROUND_STEEL = { density: '8000 kg/m^3', modulus: '200 GPa', poisson: 0.3 }

/** Bar wave speed of round steel [m/s]. */
export const SPEED = 5000
/** rho c of round steel [kg/(m^2 s)]. */
export const RHO_C = 4e7

/** Length that a wave in round steel passes in a number of steps of 1 us, as a rig file says it. */
export function lengthOf(cells: number): string {
  return `${cells * 5} mm`
}

/** A run of a number of steps of 1 us. */
export function stepsOf(steps: number): RigSetup['run'] {
  return { duration: `${steps} us`, timeStep: '1 us' }
}
