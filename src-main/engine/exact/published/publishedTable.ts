/** One table of published or recomputed numbers, as it stands in its source. */
export interface PublishedTable {
  /** Where the formula and the numbers come from; says "from memory" where the text was not at hand. */
  source: string
  /** What the numbers are. */
  label: string
  columns: string[]
  rows: number[][]
}
