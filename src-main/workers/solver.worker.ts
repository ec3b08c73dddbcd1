import { parentPort } from 'node:worker_threads'
import { answerFromRun, type KeptRun, solveJob } from './answerQuestion'
import type { Question, WorkerMessage, WorkerReply } from './solveJob'

const port = parentPort!
const reply = (message: WorkerReply, buffers: ArrayBuffer[] = []) => port.postMessage(message, buffers)

let kept: KeptRun | null = null
let stopper = new AbortController()

port.on('message', (message: WorkerMessage) => {
  if ('question' in message) void answer(message.id, message.question)
  else if (message.wish === 'stop') stopper.abort()
  else kept = null
})

async function answer(id: number, question: Question): Promise<void> {
  try {
    if (question.kind === 'solve') {
      stopper = new AbortController()
      kept = null
      const onProgress = (done: number, of: number) => reply({ id, done, of })
      const answered = await solveJob(question.job, { signal: stopper.signal, onProgress })
      kept = answered.kept
      reply({ id, value: answered.value }, answered.buffers)
    } else {
      if (kept === null) throw new Error('no run is kept')
      const { value, buffers } = answerFromRun(kept, question)
      reply({ id, value }, buffers)
    }
  } catch (error) {
    reply({ id, error: error instanceof Error ? error.message : String(error) })
  }
}
