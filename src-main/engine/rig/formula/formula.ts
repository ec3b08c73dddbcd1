import type { Dimension } from './dimension'

/** What a formula may depend on: the time in pulses, `x` and `s` along a bar or section, or nothing. */
export type FormulaArguments = 'none' | 't' | 'along'

/** The value of a variable or of a formula that depends on nothing. */
export interface FixedValue {
  /** SI */
  value: number
  dimension: Dimension
}

/** The names that a formula may use besides units, functions and constants; null for a faulty variable. */
export interface Scope {
  variables: ReadonlyMap<string, FixedValue | null>
  arguments: FormulaArguments
}

/** A formula ready to be evaluated in SI. */
export interface Formula {
  dimension: Dimension
  /** The value where the formula depends on nothing, else null. */
  fixed: number | null
  /**
   * Evaluates it.
   * @param a the time [s] in pulses, the distance from the bar's left face [m] along a bar
   * @param b the place 0..1 along the section or bar
   * @returns SI
   */
  at(a: number, b: number): number
}

/** Constants of every formula. */
export const CONSTANTS: ReadonlyMap<string, FixedValue> = new Map<string, FixedValue>([
  ['pi', { value: Math.PI, dimension: [0, 0, 0, 0, 0, 0, 0, 0, 0] }],
  ['gravity', { value: 9.80665, dimension: [0, 1, -2, 0, 0, 0, 0, 0, 0] }],
])

/** Makes the formula of one value. */
export function makeFixedFormula(value: number, dimension: Dimension): Formula {
  return { dimension, fixed: value, at: () => value }
}
