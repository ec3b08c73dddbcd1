import { effectScope, nextTick, type EffectScope } from 'vue'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { SolveAnswer, SolveRequest } from '../../../../src-main/contract/bridge'
import { makeRig } from '../../../../src-renderer/stores/makeRig'
import { makeRun } from '../../../../src-renderer/stores/makeRun'

const solved = (title: string): SolveAnswer =>
  ({
    status: 'solved',
    result: { rig: { title }, run: { solveTime: 0.2, duration: 1e-3 } },
    line: { bars: [] },
    inspection: { values: [], pulses: [] },
  }) as unknown as SolveAnswer
const refused: SolveAnswer = {
  status: 'refused',
  faults: [{ code: 'out-of-range', path: 'run.duration', message: 'too short' }],
  inspection: { values: [], pulses: [] },
}

describe('the run of the rig that is open', () => {
  let scope: EffectScope
  beforeEach(() => {
    vi.useFakeTimers()
    scope = effectScope()
  })
  afterEach(() => {
    scope.stop()
    vi.useRealTimers()
  })

  function start() {
    const asked: { request: SolveRequest; give: (answer: SolveAnswer) => void }[] = []
    const bridge = {
      readSample: async () => ({ name: '', text: '{}', place: '' }),
      solve: (request: SolveRequest) =>
        new Promise<SolveAnswer>((give) => {
          asked.push({ request, give })
        }),
      progress: vi.fn(async () => ({ done: 1, of: 4, left: 3 })),
      stop: vi.fn(async () => undefined),
    }
    const rig = makeRig(bridge)
    const run = scope.run(() => makeRun(bridge, rig))!
    const settle = async (time = 0): Promise<void> => {
      await nextTick()
      await vi.advanceTimersByTimeAsync(time)
      await nextTick()
    }
    return { asked, bridge, rig, run, settle }
  }

  it('solves what is opened at once, and an edit after a pause of typing', async () => {
    const { asked, rig, run, settle } = start()
    rig.open('{"title":"A"}', 'a.rig.json', 'there')
    await settle(1)
    expect(asked[0].request).toMatchObject({
      text: '{"title":"A"}',
      name: 'a.rig.json',
      place: 'there',
      coarse: false,
    })
    asked[0].give(solved('A'))
    await settle()
    expect([run.result.value?.rig.title, run.stale.value, run.running.value]).toEqual(['A', false, false])
    for (const title of ['B', 'BC']) {
      rig.edit('title', title, 'Title')
      await settle(50)
    }
    expect(asked).toHaveLength(1)
    await settle(100)
    expect(JSON.parse(asked[1].request.text)).toEqual({ title: 'BC' })
  })

  it('keeps the last good result where the rig is refused, and says what it is from before', async () => {
    const { asked, rig, run, settle } = start()
    rig.open('{}', 'a')
    await settle(1)
    asked[0].give(solved('A'))
    await settle()
    rig.edit('run.duration', '0 s', 'Duration')
    await settle(200)
    asked[1].give(refused)
    await settle()
    expect(run.result.value?.rig.title).toBe('A')
    expect([run.stale.value, run.staleReason.value]).toEqual([true, 'from before: Duration'])
    expect(rig.faults.value).toEqual([refused.status === 'refused' && refused.faults[0]])
    rig.undo()
    await settle(200)
    asked[2].give(solved('A'))
    await settle()
    expect([run.stale.value, rig.faults.value]).toEqual([false, []])
  })

  it('follows the hand with one coarse run after another, the newest document next, and ends with a full one', async () => {
    const { asked, rig, run, settle } = start()
    rig.open('{}', 'a')
    await settle(1)
    asked[0].give(solved('A'))
    await settle()
    rig.dragging.value = true
    for (const title of ['1', '2', '3']) {
      rig.edit('title', title, 'Drag')
      await settle(10)
    }
    expect(asked).toHaveLength(2)
    expect(asked[1].request.coarse).toBe(true)
    asked[1].give(solved('1'))
    await settle()
    expect([run.result.value?.rig.title, run.coarse.value]).toEqual(['1', true])
    expect(JSON.parse(asked[2].request.text)).toEqual({ title: '3' })
    asked[2].give(solved('3'))
    await settle()
    rig.dragging.value = false
    await settle(200)
    expect(asked).toHaveLength(4)
    expect(asked[3].request.coarse).toBe(false)
  })

  it('drops an answer that a later run has overtaken', async () => {
    const { asked, rig, run, settle } = start()
    rig.open('{"title":"A"}', 'a')
    await settle(1)
    rig.open('{"title":"B"}', 'b')
    await settle(1)
    asked[1].give(solved('B'))
    await settle()
    asked[0].give(solved('A'))
    await settle()
    expect(run.result.value?.rig.title).toBe('B')
  })

  it('greys a result that is slow to be renewed, tells progress after a second, and can be stopped', async () => {
    const { asked, bridge, rig, run, settle } = start()
    rig.open('{}', 'a')
    await settle(1)
    asked[0].give(solved('A'))
    await settle()
    rig.edit('title', 'B', 'Title')
    await settle(200)
    expect(run.stale.value).toBe(false)
    await settle(300)
    expect([run.stale.value, run.progress.value]).toEqual([true, null])
    await settle(1000)
    expect(run.progress.value).toEqual({ done: 1, of: 4, left: 3 })
    run.stop()
    expect(bridge.stop).toHaveBeenCalledWith(run.slot)
    asked[1].give({ status: 'stopped' })
    await settle()
    expect([run.trouble.value, run.progress.value, run.running.value]).toEqual([
      'The run was stopped.',
      null,
      false,
    ])
  })

  it('says why there is no answer', async () => {
    const { asked, rig, run, settle } = start()
    rig.open('{}', 'a')
    await settle(1)
    asked[0].give({ status: 'broken', message: 'numbers ran away' })
    await settle()
    expect([run.trouble.value, run.result.value]).toEqual(['numbers ran away', null])
  })
})
