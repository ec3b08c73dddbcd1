import type { FieldTable } from '../../contract/result'

/** A field on a coarse grid, each cell holding the stress of largest magnitude within it. */
export interface CoarseField {
  /** Edges of the columns [m], shape (columns + 1). */
  x: number[]
  /** Edges of the rows [s], shape (rows + 1). */
  t: number[]
  /** A row per time [Pa], shape (rows)(columns). */
  stress: number[][]
  /** Largest magnitude [Pa]. */
  largest: number
}

/**
 * Coarsens a field for a picture: a narrow peak stays, with its sign, since extremes are taken and not means.
 *
 * @param field - stress over place and time
 * @param columns - most columns of the coarse grid
 * @param rows - most rows of the coarse grid
 * @returns the coarse field; null where the field has less than two places or times
 */
export function coarsenField(field: FieldTable, columns: number, rows: number): CoarseField | null {
  if (field.x.length < 2 || field.t.length < 2) return null
  const x = splitAxis(field.x, columns)
  const t = splitAxis(field.t, rows)
  const stress = t.edges.slice(1).map(() => x.edges.slice(1).map(() => 0))
  let largest = 0
  field.stress.forEach((row, j) => {
    const into = stress[t.bin[j]]
    for (let i = 0; i < row.length; i++) {
      const size = Math.abs(row[i])
      if (size > Math.abs(into[x.bin[i]])) into[x.bin[i]] = row[i]
      if (size > largest) largest = size
    }
  })
  return { x: x.edges, t: t.edges, stress, largest }
}

/** Equal bins over an axis, no more of them than samples, and the bin of each sample. */
function splitAxis(axis: ArrayLike<number>, most: number): { edges: number[]; bin: number[] } {
  const from = axis[0]
  const length = axis[axis.length - 1] - from
  const count = Math.min(most, axis.length - 1)
  return {
    edges: Array.from({ length: count + 1 }, (_none, i) => from + (length * i) / count),
    bin: Array.from(axis, (value) => Math.min(count - 1, Math.floor(((value - from) / length) * count))),
  }
}
