import type { Bridge, DocumentFiles } from './bridge'

/** The bridge's methods as messages name them, those of its documents among them. */
export type BridgeMethod = Exclude<keyof Bridge, 'files'> | `files.${keyof DocumentFiles}`

/** One message from the page, as plain data. */
export interface BridgeCall {
  method: BridgeMethod
  args: unknown[]
}

/** The host's answer to one message: the method's value, or why there is none. */
export type BridgeReply = { value: unknown } | { error: string }

/** Length of text that an argument may have [UTF-16 units]; the rig reader's own limit is in bytes and no larger. */
export const BRIDGE_TEXT_LIMIT = 20 * 1024 * 1024
