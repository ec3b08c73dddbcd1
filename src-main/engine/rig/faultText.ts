import { barFaults } from './texts/barFaults'
import { fileFaults } from './texts/fileFaults'
import { methodFaults } from './texts/methodFaults'
import { quantityFaults } from './texts/quantityFaults'
import { runFaults } from './texts/runFaults'

export type { FaultText, Range } from './texts/faultShape'

/**
 * Every reason why a rig is refused, in words: what is wrong, the value, and what would be right.
 * The place stands apart in the fault, so no text repeats it.
 */
export const faultText = { ...fileFaults, ...quantityFaults, ...barFaults, ...runFaults, ...methodFaults }
