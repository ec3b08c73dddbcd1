import { setTimeout as wait } from 'node:timers/promises'

const BUSY = new Set(['EPERM', 'EBUSY', 'EACCES'])
const WAITS = [20, 50, 100, 200, 400]

/**
 * Tries a change of the disk again while another program, such as a virus scanner, holds the file.
 *
 * @param change - what to do; must be safe to repeat
 * @returns what it returned; rejects with its last error after about a second
 */
export async function retryBusy<T>(change: () => T | Promise<T>): Promise<T> {
  for (const pause of process.platform === 'win32' ? WAITS : []) {
    try {
      return await change()
    } catch (error) {
      if (!BUSY.has((error as NodeJS.ErrnoException).code ?? '')) throw error
      await wait(pause)
    }
  }
  return await change()
}
