import type { Bridge, BridgeReply } from '../contract/bridge'
import { checkCall } from './checkCall'

/**
 * Answers one message from the page; never rejects, so that every host hands on plain data.
 *
 * @param service - what carries the methods out
 * @param message - whatever arrived, of any type
 * @returns the method's value, or in words why there is none; and whose doing that is
 */
export async function answerCall(
  service: Bridge,
  message: unknown,
): Promise<{ reply: BridgeReply; status: 'done' | 'refused' | 'fault' }> {
  const checked = checkCall(message)
  if ('refused' in checked) return { reply: { error: checked.refused }, status: 'refused' }
  const { method, args } = checked.call
  try {
    const value = method === 'about' ? await service.about() : await service.solve(args[0])
    return { reply: { value }, status: 'done' }
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    return { reply: { error: `A fault of the program: ${reason}` }, status: 'fault' }
  }
}
