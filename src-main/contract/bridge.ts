import type { Fault } from './fault'
import type { Result } from './result'

/** What the window says of itself. */
export interface About {
  name: string
  version: string
  notice: string
}

/** A rig is either solved or refused with every reason; a fault of the program is an error instead. */
export type SolveAnswer = { status: 'solved'; result: Result } | { status: 'refused'; faults: Fault[] }

/** Everything that the page may ask of its host; the page knows nothing else of it. */
export interface Bridge {
  about(): Promise<About>
  /** Reads and solves the text of a rig file; records beside the file are out of reach here. */
  solve(text: string): Promise<SolveAnswer>
}

export type BridgeMethod = keyof Bridge

/** The arguments that each method takes, by name: every host checks a message against this table. */
export const BRIDGE_METHODS: Record<BridgeMethod, readonly 'text'[]> = { about: [], solve: ['text'] }

/** Length of text that an argument may have [UTF-16 units]; the rig reader's own limit is in bytes and no larger. */
export const BRIDGE_TEXT_LIMIT = 20 * 1024 * 1024

/** One message from the page, as plain data. */
export interface BridgeCall {
  method: BridgeMethod
  args: string[]
}

/** The host's answer to one message: the method's value, or why there is none. */
export type BridgeReply = { value: unknown } | { error: string }
