import type { Material } from '../../contract/rig'

/** How one element answers its strain; null where a part does not apply. */
export interface ElementMaterial {
  /** E [Pa] */
  modulus: number
  /** Yield stress [Pa], Infinity where it stays elastic. */
  yield: number
  /** Plastic modulus E Et / (E - Et) [Pa] */
  plasticModulus: number
  kinematic: boolean
  /** Kelvin-Voigt viscosity [Pa s] */
  viscosity: number
}

/**
 * Reads an element's law off a material: bilinear where both `yield` and `hardening` are given,
 * elastic otherwise; the plastic modulus is `E Et / (E - Et)`, Et being the tangent modulus.
 */
export function makeElementMaterial(material: Material): ElementMaterial {
  const { modulus, hardening } = material
  const plastic = material.yield !== null && hardening !== null
  return {
    modulus,
    yield: plastic ? material.yield! : Infinity,
    plasticModulus: plastic ? (modulus * hardening) / (modulus - hardening) : 0,
    kinematic: material.hardeningRule === 'kinematic',
    viscosity: material.viscosity ?? 0,
  }
}
