import type { StepRatios } from '../../contract/result'

/**
 * What a wave from side 1 becomes at a bonded plane where the impedance goes from Z1 to Z2.
 *
 *     F_R/F_I = (Z2 - Z1)/(Z2 + Z1)      F_T/F_I = 2 Z2/(Z1 + Z2)
 *     stress: the same R, and T A1/A2    energy: R^2 and 4 Z1 Z2/(Z1 + Z2)^2
 *
 * Holds for plane waves in linear bars (one dimension). Source: W. Johnson, Impact Strength of
 * Materials (1972) ch. 1; Kolsky, Stress Waves in Solids (1953) ch. II-III (from memory for the chapter).
 *
 * @param z1 impedance on the side the wave comes from, positive and finite [kg/s]
 * @param z2 impedance on the far side, 0 for a free end and Infinity for a fixed one [kg/s]
 * @param a1 area on the near side [m^2]
 * @param a2 area on the far side; 0 where there is no bar, and then no stress passes [m^2]
 * @returns each wave as a share of the one that arrived [1]
 */
export function evaluateStepRatios(z1: number, z2: number, a1: number, a2: number): StepRatios {
  const R = z2 === Infinity ? 1 : (z2 - z1) / (z2 + z1)
  const T = z2 === Infinity ? 2 : (2 * z2) / (z1 + z2)
  return {
    reflectedForce: R,
    transmittedForce: T,
    reflectedStress: R,
    transmittedStress: a2 === 0 ? 0 : (T * a1) / a2,
    reflectedEnergy: R * R,
    transmittedEnergy: z2 === Infinity ? 0 : T * ((2 * z1) / (z1 + z2)),
  }
}
