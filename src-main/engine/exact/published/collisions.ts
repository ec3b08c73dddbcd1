/** A collision of two bars: force steps come as shares of Z1 v, in rows of their own length. */
export interface CollisionRow {
  impedanceRatio: number
  /** Transit times in whole units of `unit`: T1 = cells1 x unit. */
  cells1: number
  cells2: number
  unit: number
  forceSteps: number[]
  forceEnds: number
  part: number
  V1: number
  V2: number
  restitution: number
}

export const COLLISION_SOURCE =
  'de Saint-Venant 1867; Love, Treatise, 4th ed., arts. 281-284; Timoshenko and Goodier, Theory of ' +
  'Elasticity, 3rd ed., ch. 14; Goldsmith, Impact (1960) ch. III (from memory); values recomputed as exact fractions'

const row = (
  impedanceRatio: number,
  [cells1, cells2, unit]: [number, number, number],
  forceSteps: number[],
  [forceEnds, part, V1, V2, restitution]: [number, number, number, number, number],
): CollisionRow => ({
  impedanceRatio,
  cells1,
  cells2,
  unit,
  forceSteps,
  forceEnds,
  part,
  V1,
  V2,
  restitution,
})

/** The collisions of two coaxial bars, striker 1 at v and target 2 at rest: times in units of L/c, speeds over v. */
export const COLLISIONS: CollisionRow[] = [
  row(1, [1, 1, 1], [1 / 2], [2, 2, 0, 1, 1]),
  row(1, [2, 3, 0.5], [1 / 2], [2, 3, 0, 2 / 3, 2 / 3]),
  row(1, [1, 2, 1], [1 / 2], [2, 4, 0, 1 / 2, 1 / 2]),
  row(1, [1, 3, 1], [1 / 2], [2, 6, 0, 1 / 3, 1 / 3]),
  row(1, [1, 4, 1], [1 / 2], [2, 8, 0, 1 / 4, 1 / 4]),
  row(1, [2, 1, 1], [1 / 2], [2, 4, 1 / 2, 1, 1 / 2]),
  row(1 / 4, [1, 1, 1], [4 / 5], [2, 2, -3 / 5, 2 / 5, 1]),
  row(1 / 4, [1, 2, 1], [4 / 5], [2, 2, -3 / 5, 1 / 5, 4 / 5]),
  row(1 / 4, [2, 1, 1], [4 / 5, 12 / 25], [4, 4, -7 / 25, 16 / 25, 23 / 25]),
  row(1 / 2, [1, 2, 1], [2 / 3], [2, 2, -1 / 3, 1 / 3, 2 / 3]),
  row(1 / 2, [2, 1, 1], [2 / 3, 2 / 9], [4, 4, 1 / 9, 8 / 9, 7 / 9]),
  row(2, [1, 1, 1], [1 / 3], [2, 2, 1 / 3, 4 / 3, 1]),
  row(2, [1, 2, 1], [1 / 3, 1 / 9], [4, 4, 1 / 9, 8 / 9, 7 / 9]),
  row(2, [2, 1, 1], [1 / 3], [2, 2, 2 / 3, 4 / 3, 2 / 3]),
  row(2, [1, 3, 1], [1 / 3, 1 / 9, 1 / 27], [6, 6, 1 / 27, 52 / 81, 49 / 81]),
  row(4, [1, 2, 1], [1 / 5, 3 / 25], [4, 4, 9 / 25, 32 / 25, 23 / 25]),
  row(4, [2, 1, 1], [1 / 5], [2, 2, 4 / 5, 8 / 5, 4 / 5]),
  row(4, [1, 3, 1], [1 / 5, 3 / 25, 9 / 125], [6, 6, 27 / 125, 392 / 375, 311 / 375]),
]
