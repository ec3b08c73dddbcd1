import { describe, expect, it } from 'vitest'
import type { Bridge } from '../../../src-main/contract/bridge'
import { answerCall } from '../../../src-main/service/answerCall'

const about = { name: 'Barwright', version: '1', notice: 'careful' }
const service: Bridge = {
  about: async () => about,
  solve: async (text) => {
    if (text === 'broken') throw new Error('the step is not finite')
    return { status: 'refused', faults: [{ code: 'not-json', path: '', message: text }] }
  },
}

describe('answerCall', () => {
  it('hands the arguments to the method and its value back', async () => {
    expect(await answerCall(service, { method: 'about', args: [] })).toEqual({
      reply: { value: about },
      status: 'done',
    })
    const { reply } = await answerCall(service, { method: 'solve', args: ['given text'] })
    expect(reply).toMatchObject({ value: { faults: [{ message: 'given text' }] } })
  })

  it('says why a message is refused', async () => {
    const { reply, status } = await answerCall(service, { method: 'erase', args: [] })
    expect(status).toBe('refused')
    expect(reply).toEqual({ error: expect.stringContaining('no method') as string })
  })

  it('never rejects: a fault of the program is told as one', async () => {
    expect(await answerCall(service, { method: 'solve', args: ['broken'] })).toEqual({
      reply: { error: 'A fault of the program: the step is not finite' },
      status: 'fault',
    })
  })
})
