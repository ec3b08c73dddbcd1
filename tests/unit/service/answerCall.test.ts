import { describe, expect, it, vi } from 'vitest'
import type { DocumentFiles } from '../../../src-main/contract/bridge'
import { answerCall, type CallOwners } from '../../../src-main/service/answerCall'
import { Refusal } from '../../../src-main/service/refusal'

const about = { name: 'Barwright', version: '1', notice: 'careful' }
const service = {
  about: async () => about,
  stop: vi.fn(async () => {}),
  report: async (slot: string) => {
    throw slot === 'none' ? new Refusal('no run is kept') : new Error('the step is not finite')
  },
} as unknown as CallOwners['service']
const files = { save: vi.fn(async () => {}) } as unknown as DocumentFiles

describe('answerCall', () => {
  it('hands the arguments to the method and its value back', async () => {
    expect(await answerCall({ service, files: null }, { method: 'about', args: [] })).toEqual({
      reply: { value: about },
      status: 'done',
    })
    await answerCall({ service, files: null }, { method: 'stop', args: ['sheet'] })
    expect(service.stop).toHaveBeenCalledExactlyOnceWith('sheet')
  })

  it('says why a message is refused', async () => {
    const { reply, status } = await answerCall({ service, files: null }, { method: 'erase', args: [] })
    expect(status).toBe('refused')
    expect(reply).toEqual({ error: expect.stringContaining('no method') as string })
  })

  it("hands what is about files to the host's own, where it has any", async () => {
    const message = { method: 'files.save', args: ['file:1', '{}'] }
    expect((await answerCall({ service, files }, message)).status).toBe('done')
    expect(files.save).toHaveBeenCalledExactlyOnceWith('file:1', '{}')
    expect(await answerCall({ service, files: null }, message)).toMatchObject({ status: 'refused' })
  })

  it('never rejects: a reason that the user can mend is told as it is, a fault of the program as one', async () => {
    const report = (slot: string) => answerCall({ service, files }, { method: 'report', args: [slot] })
    expect(await report('none')).toEqual({ reply: { error: 'no run is kept' }, status: 'refused' })
    expect(await report('one')).toEqual({
      reply: { error: 'A fault of the program: the step is not finite' },
      status: 'fault',
    })
  })
})
