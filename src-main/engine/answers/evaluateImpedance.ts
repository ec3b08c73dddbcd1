import type { Section } from '../../contract/rig'

/**
 * Mechanical impedance of a section at one place, Z = rho c A = A sqrt(E rho).
 *
 * @param section the section
 * @param s place along it, 0..1
 * @returns [kg/s]
 */
export function evaluateImpedance({ shape, material }: Section, s: number): number {
  return shape.area(s) * Math.sqrt(material.density * material.modulus)
}
