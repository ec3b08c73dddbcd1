import type { BridgeCall, BridgeMethod } from '../contract/bridgeCall'
import { CALL_CHECKS } from './callChecks'

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
  const checks = CALL_CHECKS[method]
  if (!Array.isArray(args) || args.length !== checks.length) {
    return { refused: `"${method}" takes ${checks.length} argument(s) in a list.` }
  }
  const kept: unknown[] = []
  for (const [i, check] of checks.entries()) {
    const checked = check(args[i], `Argument ${i + 1} of "${method}"`)
    if ('refused' in checked) return checked
    kept.push(checked.value)
  }
  return { call: { method, args: kept } }
}

function isMethod(method: unknown): method is BridgeMethod {
  return typeof method === 'string' && Object.hasOwn(CALL_CHECKS, method)
}
