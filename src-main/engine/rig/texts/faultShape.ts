import type { Fault } from '../../../contract/fault'

/** A fault without its place. */
export type FaultText = Pick<Fault, 'code' | 'message'>

/** Values that a quantity may take. */
export type Range = 'any' | 'positive' | 'not-negative'
