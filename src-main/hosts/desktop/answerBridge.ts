import type { IpcMainInvokeEvent } from 'electron'
import type { Bridge, BridgeReply } from '../../contract/bridge'
import { answerCall } from '../../service/answerCall'
import { isPageAddress } from './pageAddress'

/**
 * Answers one message that came in on the bridge's channel, if the page itself sent it.
 *
 * @param service - what carries the methods out
 * @param event - who sent it: only the top frame of a window that shows the page is answered
 * @param message - whatever arrived, of any type
 * @returns the reply as plain data
 */
export async function answerBridge(
  service: Bridge,
  event: Pick<IpcMainInvokeEvent, 'senderFrame'>,
  message: unknown,
): Promise<BridgeReply> {
  const frame = event.senderFrame
  if (!frame || frame.parent !== null || !isPageAddress(frame.url)) {
    return { error: 'Only the page itself is answered.' }
  }
  return (await answerCall(service, message)).reply
}
