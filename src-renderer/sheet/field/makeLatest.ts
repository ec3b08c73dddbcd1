/** Asks for one thing at a time, and always for the newest. */
export interface Latest<Request> {
  /** Asks once the frame is over and the answer before has come; a later call takes the place of this one. */
  ask(request: Request): void
  /** Forgets what waits and drops the answer that is on its way. */
  drop(): void
}

/**
 * Makes a way to ask that never floods the host: requests of one frame become one, and while an answer is
 * on its way only the newest request waits.
 *
 * @param fetch - asks the host
 * @param take - is given each answer with its request
 * @param fail - is given why there is none
 * @param nextFrame - calls back when the frame is over
 */
export function makeLatest<Request, Answer>(
  fetch: (request: Request) => Promise<Answer>,
  take: (answer: Answer, request: Request) => void,
  fail: (reason: unknown, request: Request) => void,
  nextFrame: (callback: () => void) => unknown = requestAnimationFrame,
): Latest<Request> {
  let waiting: { request: Request } | null = null
  let scheduled = false
  let busy = false
  let round = 0

  function schedule(): void {
    if (scheduled || busy || !waiting) return
    scheduled = true
    nextFrame(() => {
      scheduled = false
      void send()
    })
  }

  async function send(): Promise<void> {
    if (!waiting) return
    const { request } = waiting
    waiting = null
    busy = true
    const mine = round
    try {
      const answer = await fetch(request)
      if (mine === round) take(answer, request)
    } catch (reason) {
      if (mine === round) fail(reason, request)
    } finally {
      busy = false
      schedule()
    }
  }

  return {
    ask(request) {
      waiting = { request }
      schedule()
    },
    drop() {
      waiting = null
      round++
    },
  }
}
