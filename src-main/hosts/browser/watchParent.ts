import { fstatSync } from 'node:fs'

const LOOK_EVERY = 1000

/**
 * Calls back once when the process that started this one is gone: its pipe to standard input closes,
 * or its id no longer answers. A terminal or a null device as standard input says nothing of it.
 *
 * @param onGone - called at most once
 * @returns a function that stops watching
 */
export function watchParent(onGone: () => void): () => void {
  const parent = process.ppid
  const timer = setInterval(() => {
    if (process.ppid !== parent || !isAlive(parent)) finish()
  }, LOOK_EVERY)
  const pipe = isPipe(0)
  const stop = (): void => {
    clearInterval(timer)
    if (pipe) process.stdin.off('end', finish).off('close', finish).pause()
  }
  const finish = (): void => {
    stop()
    onGone()
  }
  if (pipe) process.stdin.once('end', finish).once('close', finish).resume()
  return stop
}

function isPipe(descriptor: number): boolean {
  try {
    const status = fstatSync(descriptor)
    return status.isFIFO() || status.isSocket()
  } catch {
    return false
  }
}

function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    return (error as NodeJS.ErrnoException).code === 'EPERM'
  }
}
