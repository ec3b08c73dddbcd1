import type { Section } from '../../contract/rig'

/**
 * Time a wave takes along a section, length / c with c = sqrt(E/rho).
 *
 * @param section the section
 * @returns [s]
 */
export function evaluateTravelTime({ length, material }: Section): number {
  return length / Math.sqrt(material.modulus / material.density)
}
