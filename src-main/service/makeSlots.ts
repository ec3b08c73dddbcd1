import { setTimeout as wait } from 'node:timers/promises'
import type { Progress, SolveAnswer } from '../contract/bridge'
import { makeThreadPool } from '../workers/makeThreadPool'
import type { SolveJob } from '../workers/solveJob'
import type { Thread } from '../workers/startThread'
import { Refusal } from './refusal'

/** Runs kept at most; of more the one asked for longest ago is let go. */
const MOST_SLOTS = 6
/** Time that a solve is given to stop by itself before its thread is ended [ms]. */
const STOP_TIME = 60
/** Time of a solve before which its end is not guessed [s]. */
const FIRST_GUESS = 0.2

/** One solve under way. */
interface Running {
  thread: Thread
  /** [ms] */
  startedAt: number
  done: number
  of: number
  ended: Promise<unknown>
}

interface Slot {
  /** Counts the solves and stops, so that one that waits knows it has been overtaken. */
  latest: number
  running: Running | null
  /** The thread that holds the run last solved. */
  kept: Thread | null
}

/** What is solved and kept for each sheet. */
export interface Slots {
  solve(name: string, job: SolveJob): Promise<SolveAnswer>
  progress(name: string): Progress | null
  stop(name: string): Promise<void>
  /** Looks into the run last solved; rejects where there is none. */
  ask(name: string, question: Parameters<Thread['ask']>[0]): Promise<unknown>
  close(): Promise<void>
}

/**
 * Makes the slots. Each solve has a thread of its own beside the one that holds the run before it, so
 * that this one can be looked into until the next is there.
 */
export function makeSlots(): Slots {
  const pool = makeThreadPool()
  const slots = new Map<string, Slot>()

  /** The slot of a name, made the one asked for last. */
  function find(name: string): Slot {
    const slot = slots.get(name) ?? { latest: 0, running: null, kept: null }
    slots.delete(name)
    slots.set(name, slot)
    if (slots.size > MOST_SLOTS) letGo([...slots].find(([, one]) => one.running === null))
    return slot
  }

  function letGo(entry: [string, Slot] | undefined): void {
    if (entry === undefined) return
    slots.delete(entry[0])
    if (entry[1].kept) pool.give(entry[1].kept)
  }

  async function stopRunning(slot: Slot): Promise<void> {
    const { running } = slot
    if (running === null) return
    running.thread.stop()
    const late = Symbol()
    const patience = new AbortController()
    const ended = await Promise.race([
      running.ended,
      wait(STOP_TIME, late, { signal: patience.signal }).catch(() => {}),
    ])
    patience.abort()
    if (ended === late) await running.thread.end()
  }

  return {
    async solve(name, job) {
      const slot = find(name)
      const mine = ++slot.latest
      await stopRunning(slot)
      if (mine !== slot.latest) return { status: 'stopped' }
      const thread = pool.take()
      const running = { thread, startedAt: performance.now(), done: 0, of: 0, ended: Promise.resolve() }
      slot.running = running
      const answered = thread.solve(job, (done, of) => Object.assign(running, { done, of }))
      running.ended = answered.then(() => {})
      const answer = await answered
      if (slot.running === running) slot.running = null
      if (answer.status !== 'solved' || slots.get(name) !== slot) pool.give(thread)
      else {
        if (slot.kept) pool.give(slot.kept)
        slot.kept = thread
      }
      return answer
    },
    progress(name) {
      const running = slots.get(name)?.running
      if (!running || running.of === 0) return null
      const { done, of } = running
      const spent = (performance.now() - running.startedAt) / 1000
      const left = spent < FIRST_GUESS || done === 0 ? null : (spent * (of - done)) / done
      return { done, of, left }
    },
    async stop(name) {
      const slot = slots.get(name)
      if (slot === undefined) return
      slot.latest++
      await stopRunning(slot)
    },
    async ask(name, question) {
      const kept = slots.has(name) ? find(name).kept : null
      if (kept === null) throw new Refusal('No run is kept for this sheet any more: solve it again.')
      return kept.ask(question)
    },
    close: () => pool.close(),
  }
}
