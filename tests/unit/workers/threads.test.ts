import { afterEach, describe, expect, it, vi } from 'vitest'
import { makeThreadPool, type ThreadPool } from '../../../src-main/workers/makeThreadPool'
import type { SolveJob } from '../../../src-main/workers/solveJob'
import { PIN_RIG } from './pinRig'

const job = (changes: object = {}): SolveJob => ({
  text: JSON.stringify({ ...PIN_RIG, ...changes }),
  coarse: false,
  rigPath: null,
})
const LONG = { run: { duration: '1 s', cell: '2 mm' } }
const unheard = () => {}

let pool: ThreadPool
afterEach(() => pool.close())

describe('the threads of a pool', () => {
  it('keep the run of the last solve, until it is let go', async () => {
    pool = makeThreadPool()
    const thread = pool.take()
    await expect(thread.ask({ kind: 'report' })).rejects.toThrow('no run is kept')
    expect((await thread.solve(job(), unheard)).status).toBe('solved')
    expect(await thread.ask({ kind: 'report' })).toContain(PIN_RIG.title)
    pool.give(thread)
    await expect(thread.ask({ kind: 'report' })).rejects.toThrow('no run is kept')
  })

  it('are lent out again, one of them kept ready', async () => {
    pool = makeThreadPool()
    const [first, second] = [pool.take(), pool.take()]
    expect(second).not.toBe(first)
    pool.give(first)
    pool.give(second)
    expect(pool.take()).toBe(first)
    expect((await second.solve(job(), unheard)).status).toBe('stopped')
  })

  it('stop at their next pause, and can be used again', async () => {
    pool = makeThreadPool()
    const thread = pool.take()
    const told = vi.fn()
    const answer = thread.solve(job(LONG), told)
    await expect.poll(() => told.mock.calls.length, { timeout: 10_000 }).toBeGreaterThan(1)
    const [done, of] = told.mock.lastCall as [number, number]
    expect(done).toBeGreaterThan(0)
    expect(of).toBeGreaterThan(done)
    thread.stop()
    expect(await answer).toEqual({ status: 'stopped' })
    expect((await thread.solve(job(), unheard)).status).toBe('solved')
  })

  it('are ended whatever they are at, and not lent out after that', async () => {
    pool = makeThreadPool()
    const thread = pool.take()
    const answer = thread.solve(job(LONG), unheard)
    await thread.end()
    expect(await answer).toEqual({ status: 'stopped' })
    await expect(thread.ask({ kind: 'report' })).rejects.toThrow('ended')
    pool.give(thread)
    expect(pool.take()).not.toBe(thread)
  })
})
