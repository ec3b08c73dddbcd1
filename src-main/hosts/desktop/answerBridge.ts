import type { IpcMainInvokeEvent } from 'electron'
import type { BridgeReply } from '../../contract/bridgeCall'
import { answerCall, type CallOwners } from '../../service/answerCall'
import { isPageAddress } from './pageAddress'

/**
 * Answers one message that came in on the bridge's channel, if the page itself sent it.
 *
 * @param owners - what carries the methods out for the window that the message came from
 * @param event - who sent it: only the top frame of a window that shows the page is answered
 * @param message - whatever arrived, of any type
 * @returns the reply as plain data
 */
export async function answerBridge(
  owners: CallOwners,
  event: Pick<IpcMainInvokeEvent, 'senderFrame'>,
  message: unknown,
): Promise<BridgeReply> {
  const frame = event.senderFrame
  if (!frame || frame.parent !== null || !isPageAddress(frame.url)) {
    return { error: 'Only the page itself is answered.' }
  }
  return (await answerCall(owners, message)).reply
}
