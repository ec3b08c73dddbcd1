import type { SolveAnswer } from '../contract/bridge'
import type { Question, SolveJob, WorkerReply } from './solveJob'
import startWorker from './solver.worker?nodeWorker'

/** A worker thread that solves rigs one at a time and keeps the last run to be looked into. */
export interface Thread {
  /** Solves; `stopped` where it was stopped or ended meanwhile, `broken` where the thread failed. */
  solve(job: SolveJob, onProgress: (done: number, of: number) => void): Promise<SolveAnswer>
  /** Asks the solve to stop at its next pause. */
  stop(): void
  /** Looks into the run; rejects where there is none. */
  ask(question: Exclude<Question, { kind: 'solve' }>): Promise<unknown>
  /** Lets the run go. */
  drop(): void
  /** Ends the thread, whatever it is at. */
  end(): Promise<void>
}

interface Waiting {
  onProgress: (done: number, of: number) => void
  resolve(value: unknown): void
  reject(error: Error): void
}

/**
 * Starts a thread. It does not keep the process alive.
 *
 * @param onGone - told once when the thread has ended, by itself or not
 */
export function startThread(onGone: (thread: Thread) => void): Thread {
  const worker = startWorker({ stdin: false })
  worker.unref()
  const waiting = new Map<number, Waiting>()
  let lastId = 0
  let ending = false
  let failure: Error | null = null

  worker.on('message', (reply: WorkerReply) => {
    const one = waiting.get(reply.id)
    if (one === undefined) return
    if ('done' in reply) return one.onProgress(reply.done, reply.of)
    waiting.delete(reply.id)
    if ('error' in reply) one.reject(new Error(reply.error))
    else one.resolve(reply.value)
  })
  worker.on('error', (error: Error) => (failure = error))
  worker.on('exit', () => {
    failure ??= new Error(ending ? 'the thread was ended' : 'the thread ended by itself')
    for (const one of waiting.values()) one.reject(failure)
    waiting.clear()
    onGone(thread)
  })

  function send(question: Question, onProgress: Waiting['onProgress']): Promise<unknown> {
    if (failure !== null) return Promise.reject(failure)
    const id = ++lastId
    return new Promise((resolve, reject) => {
      waiting.set(id, { onProgress, resolve, reject })
      worker.postMessage({ id, question })
    })
  }

  const thread: Thread = {
    async solve(job, onProgress) {
      try {
        return (await send({ kind: 'solve', job }, onProgress)) as SolveAnswer
      } catch (error) {
        if (ending) return { status: 'stopped' }
        return { status: 'broken', message: `A fault of the program: ${(error as Error).message}.` }
      }
    },
    stop: () => worker.postMessage({ wish: 'stop' }),
    ask: (question) => send(question, () => {}),
    drop: () => worker.postMessage({ wish: 'drop' }),
    async end() {
      ending = true
      await worker.terminate()
    },
  }
  return thread
}
