import { describe, expect, it } from 'vitest'
import type { Bridge, SolveAnswer } from '../../../src-main/contract/bridge'
import { useSolve } from '../../../src-renderer/app/useSolve'

const refused = (message: string): SolveAnswer => ({
  status: 'refused',
  faults: [{ code: 'not-json', path: '', message }],
})

function makeHeldBridge() {
  const held: { text: string; give: (answer: SolveAnswer) => void; fail: (error: Error) => void }[] = []
  const bridge: Bridge = {
    about: () => Promise.reject(new Error('not asked here')),
    solve: (text) => new Promise((give, fail) => held.push({ text, give, fail })),
  }
  return { bridge, held }
}

const fileOf = (name: string, text: string): File => new File([text], name)

describe('useSolve', () => {
  it('hands the text of the file to the host and keeps the answer', async () => {
    const { bridge, held } = makeHeldBridge()
    const { open, answer, fileName, busy } = useSolve(bridge)
    const opening = open(fileOf('one.rig.json', '{"a":1}'))
    await expect.poll(() => held.length).toBe(1)
    expect(held[0].text).toBe('{"a":1}')
    expect([fileName.value, busy.value, answer.value]).toEqual(['one.rig.json', true, null])
    held[0].give(refused('one'))
    await opening
    expect([busy.value, answer.value]).toEqual([false, refused('one')])
  })

  it('drops an answer that a later file has overtaken', async () => {
    const { bridge, held } = makeHeldBridge()
    const { open, answer, busy } = useSolve(bridge)
    const first = open(fileOf('one', '1'))
    await expect.poll(() => held.length).toBe(1)
    const second = open(fileOf('two', '2'))
    await expect.poll(() => held.length).toBe(2)
    held[1].give(refused('two'))
    await second
    held[0].give(refused('one'))
    await first
    expect([answer.value, busy.value]).toEqual([refused('two'), false])
  })

  it('says in words why there is no answer, and shows no old one', async () => {
    const { bridge, held } = makeHeldBridge()
    const { open, answer, trouble } = useSolve(bridge)
    const first = open(fileOf('one', '1'))
    await expect.poll(() => held.length).toBe(1)
    held[0].give(refused('one'))
    await first
    const second = open(fileOf('two', '2'))
    await expect.poll(() => held.length).toBe(2)
    held[1].fail(new Error('the host is gone'))
    await second
    expect([answer.value, trouble.value]).toEqual([null, 'the host is gone'])
  })
})
