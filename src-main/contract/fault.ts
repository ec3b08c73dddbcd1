/** Every way in which an input can be refused. The words for each stand in one table, `engine/rig/faultText`. */
export type FaultCode =
  | 'not-readable'
  | 'too-large'
  | 'not-json'
  | 'duplicate-key'
  | 'too-deep'
  | 'forbidden-key'
  | 'unknown-key'
  | 'missing'
  | 'wrong-type'
  | 'wrong-choice'
  | 'wrong-format'
  | 'out-of-range'
  | 'needs-unit'
  | 'wrong-dimension'
  | 'formula-refused'
  | 'formula-syntax'
  | 'formula-unknown-name'
  | 'formula-not-finite'
  | 'variable-cycle'
  | 'both-motion-and-force'
  | 'unknown-material'
  | 'unknown-bar'
  | 'duplicate-name'
  | 'wrong-count'
  | 'bore-too-wide'
  | 'record-path'
  | 'record-refused'
  | 'too-many-cells'
  | 'too-many-steps'
  | 'too-much-memory'
  | 'conflict'

/** One reason why an input is refused, as plain data that crosses processes. */
export interface Fault {
  code: FaultCode
  /** Where in the rig file, such as `bars[0].sections[1].length`; empty for the whole file. */
  path: string
  /** What is wrong, the value, what would be right: one sentence for a person. */
  message: string
}
