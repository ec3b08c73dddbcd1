import { startThread, type Thread } from './startThread'

/** Threads kept ready for the next solve. */
const SPARE = 1

/** Threads that are lent out and taken back. */
export interface ThreadPool {
  /** A thread without a run, a waiting one or a new one. */
  take(): Thread
  /** Takes a thread back, with its run let go. */
  give(thread: Thread): void
  /** Ends all threads, those lent out too. */
  close(): Promise<void>
}

/**
 * Makes a pool with a thread ready in it.
 */
export function makeThreadPool(): ThreadPool {
  const all = new Set<Thread>()
  const spare: Thread[] = []
  const start = (): Thread => {
    const thread = startThread((gone) => {
      all.delete(gone)
      const index = spare.indexOf(gone)
      if (index >= 0) spare.splice(index, 1)
    })
    all.add(thread)
    return thread
  }
  spare.push(start())
  return {
    take: () => spare.pop() ?? start(),
    give(thread) {
      if (!all.has(thread)) return
      if (spare.length >= SPARE) return void thread.end()
      thread.drop()
      spare.push(thread)
    },
    async close() {
      await Promise.all([...all].map((thread) => thread.end()))
    },
  }
}
