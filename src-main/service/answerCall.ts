import type { Bridge, DocumentFiles } from '../contract/bridge'
import type { BridgeReply } from '../contract/bridgeCall'
import { checkCall } from './checkCall'
import { Refusal } from './refusal'

/** What carries the methods out: the service, and the host's rig files where it has any. */
export interface CallOwners {
  service: Omit<Bridge, 'files'>
  files: DocumentFiles | null
}

/**
 * Answers one message from the page; never rejects, so that every host hands on plain data.
 *
 * @param owners - what carries the methods out
 * @param message - whatever arrived, of any type
 * @returns the method's value, or in words why there is none; and whose doing that is
 */
export async function answerCall(
  { service, files }: CallOwners,
  message: unknown,
): Promise<{ reply: BridgeReply; status: 'done' | 'refused' | 'fault' }> {
  const refuse = (error: string) => ({ reply: { error }, status: 'refused' as const })
  const checked = checkCall(message)
  if ('refused' in checked) return refuse(checked.refused)
  const { method, args } = checked.call
  const ofFiles = method.startsWith('files.')
  if (ofFiles && files === null) return refuse('This host opens and saves no files itself.')
  const owner = (ofFiles ? files : service) as unknown as Record<string, (...args: unknown[]) => unknown>
  try {
    return { reply: { value: await owner[method.replace('files.', '')](...args) }, status: 'done' }
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    if (error instanceof Refusal) return refuse(reason)
    return { reply: { error: `A fault of the program: ${reason}` }, status: 'fault' }
  }
}
