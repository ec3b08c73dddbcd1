import type { RunSettings, Section } from '../../contract/rig'

/** c = sqrt(E/rho) of a section [m/s]. */
export function evaluateSectionSpeed({ material }: Section): number {
  return Math.sqrt(material.modulus / material.density)
}

/**
 * Estimates the time step of a run by characteristics: the given one, or the time in which the
 * fastest wave passes the wanted cell; what is chosen may be up to 30 % finer.
 *
 * @param run cell [m] or time step [s]
 * @param sections of all bars
 * @returns [s]
 */
export function estimateTimeStep(
  run: Pick<RunSettings, 'cell' | 'timeStep'>,
  sections: readonly Section[],
): number {
  const fastest = sections.map(evaluateSectionSpeed).reduce((a, b) => Math.max(a, b), 0)
  return run.timeStep ?? (run.cell ?? Infinity) / fastest
}
