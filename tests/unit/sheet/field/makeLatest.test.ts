import { describe, expect, it } from 'vitest'
import { makeLatest } from '../../../../src-renderer/sheet/field/makeLatest'

/** A host that answers when told, and frames that end when told. */
function makeBench() {
  const frames: (() => void)[] = []
  const asked: { request: string; answer: (value: string) => void; refuse: (reason: Error) => void }[] = []
  const taken: string[] = []
  const latest = makeLatest<string, string>(
    (request) =>
      new Promise((answer, refuse) => {
        asked.push({ request, answer, refuse })
      }),
    (answer, request) => taken.push(`${request}: ${answer}`),
    (reason, request) => taken.push(`${request} failed: ${(reason as Error).message}`),
    (callback) => frames.push(callback),
  )
  const endFrame = (): void => frames.splice(0).forEach((callback) => callback())
  const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0))
  return { latest, asked, taken, endFrame, settle }
}

describe('makeLatest', () => {
  it('asks once a frame, for the newest', () => {
    const { latest, asked, endFrame } = makeBench()
    latest.ask('a')
    latest.ask('b')
    expect(asked).toHaveLength(0)
    endFrame()
    expect(asked.map(({ request }) => request)).toEqual(['b'])
  })

  it('keeps one request on its way and one waiting', async () => {
    const { latest, asked, taken, endFrame, settle } = makeBench()
    latest.ask('a')
    endFrame()
    for (const request of ['b', 'c', 'd']) {
      latest.ask(request)
      endFrame()
    }
    expect(asked).toHaveLength(1)
    asked[0].answer('1')
    await settle()
    endFrame()
    expect(asked.map(({ request }) => request)).toEqual(['a', 'd'])
    asked[1].answer('2')
    await settle()
    expect(taken).toEqual(['a: 1', 'd: 2'])
  })

  it('tells of a failure and goes on', async () => {
    const { latest, asked, taken, endFrame, settle } = makeBench()
    latest.ask('a')
    endFrame()
    latest.ask('b')
    asked[0].refuse(new Error('away'))
    await settle()
    endFrame()
    asked[1].answer('2')
    await settle()
    expect(taken).toEqual(['a failed: away', 'b: 2'])
  })

  it('drops what is on its way and what waits', async () => {
    const { latest, asked, taken, endFrame, settle } = makeBench()
    latest.ask('a')
    endFrame()
    latest.ask('b')
    latest.drop()
    asked[0].answer('1')
    await settle()
    endFrame()
    expect(asked).toHaveLength(1)
    expect(taken).toEqual([])
  })
})
