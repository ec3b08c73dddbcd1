import type { Bench } from './bench'

/** One published number. */
export interface PublishedValue {
  /** What it is, such as `F_R/F_I at Z2/Z1 = 4`. */
  what: string
  published: number
  /** What its error is measured against, its own size where left out; needed where it is zero. */
  scale?: number
}

/** A published result that the engine has to compute again. */
export interface Check {
  /** Its lasting name, such as `step-forces`. */
  id: string
  title: string
  /** The topic of published results it belongs to, 1..14. */
  section: number
  /** Where the numbers come from; says "from memory" where the text was not at hand. */
  source: string
  /** At least one. */
  values: PublishedValue[]
  /** Largest relative error of a value, at most 1 %. */
  tolerance: number
  /** Why the tolerance is what it is. */
  reason: string
  /**
   * Computes all values through the engine.
   *
   * @param bench runs the rigs
   * @returns a number for each value, in their order and unit
   */
  compute(bench: Bench): number[]
}
