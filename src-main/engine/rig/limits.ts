/** What a rig file may at most hold; each limit is checked before the work that it bounds. */
export const LIMITS = {
  /** Bytes of a rig file; a host checks them before it reads the file. */
  textBytes: 20 * 1024 * 1024,
  /** Lists and objects inside one another in a rig file. */
  jsonDepth: 50,
  /** Values of a rig file, lists and objects among them. */
  jsonValues: 300_000,
  materials: 1000,
  bars: 1000,
  /** Sections of all bars together. */
  sections: 5000,
  gauges: 1000,
  loads: 1000,
  studies: 100,
  /** Faults listed one by one; what is over is counted. */
  faults: 1000,
  /** Characters of one formula. */
  formulaLength: 2000,
  /** Parts of a formula inside one another. */
  formulaDepth: 40,
  /** Numbers, names, operators and calls in one formula. */
  formulaNodes: 400,
  /** Characters of all different formulas of a file together, single values such as `25 mm` apart. */
  formulaTotal: 200_000,
  variables: 1000,
  /** Characters of a name or a title. */
  nameLength: 200,
  titleLength: 1000,
  notesLength: 100_000,
  /** Bytes of a record; a host checks them before it reads the file. */
  recordBytes: 100 * 1024 * 1024,
  recordRows: 1_000_000,
  recordColumns: 100,
  /** Characters of one row of a record. */
  recordRowLength: 10_000,
  /** Intervals at which a formula along a section, a bar or the run is tried. */
  samples: 256,
  /** No SI value of a rig is larger, and no positive one smaller than its inverse. */
  magnitude: 1e18,
  /** [m]; what is longer is a slip of capitals, such as Mm for mm. */
  length: 1e6,
  cells: 200_000,
  steps: 5_000_000,
  /** Bytes that a run may hold. */
  memory: 2 * 1024 ** 3,
} as const
