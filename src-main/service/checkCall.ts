import { BRIDGE_METHODS, BRIDGE_TEXT_LIMIT, type BridgeCall, type BridgeMethod } from '../contract/bridge'

/**
 * Checks that a message from the page is one of the bridge's methods with the arguments it takes.
 *
 * @param message - whatever arrived, of any type
 * @returns the call, with nothing of the message kept but what was checked; or why it is refused
 */
export function checkCall(message: unknown): { call: BridgeCall } | { refused: string } {
  if (typeof message !== 'object' || message === null) return { refused: 'A message must be an object.' }
  const { method, args } = message as Record<string, unknown>
  if (!isMethod(method)) return { refused: 'The message names no method of the bridge.' }
  const wanted = BRIDGE_METHODS[method]
  if (!Array.isArray(args) || args.length !== wanted.length) {
    return { refused: `"${method}" takes ${wanted.length} argument(s) in a list.` }
  }
  const texts: string[] = []
  for (const value of args) {
    if (typeof value !== 'string') return { refused: `"${method}" takes text only.` }
    if (value.length > BRIDGE_TEXT_LIMIT) {
      return { refused: `"${method}" got ${value.length} characters; at most ${BRIDGE_TEXT_LIMIT} are read.` }
    }
    texts.push(value)
  }
  return { call: { method, args: texts } }
}

function isMethod(method: unknown): method is BridgeMethod {
  return typeof method === 'string' && Object.hasOwn(BRIDGE_METHODS, method)
}
