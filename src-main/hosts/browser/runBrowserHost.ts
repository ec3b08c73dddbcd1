import { startBrowserHost, type BrowserHostOptions } from './startBrowserHost'
import { watchParent } from './watchParent'

/**
 * Runs the browser host until its parent is gone or it is told to end (SIGINT, SIGTERM).
 *
 * @param options - port and place of the built page
 * @param print - takes the one line to be printed, the address with its token, once it answers
 * @returns when the host has ended; rejects where the port is taken
 */
export async function runBrowserHost(
  options: BrowserHostOptions,
  print: (line: string) => void,
): Promise<void> {
  const host = await startBrowserHost(options)
  await new Promise<void>((resolve) => {
    const stopWatching = watchParent(end)
    process.once('SIGINT', end)
    process.once('SIGTERM', end)
    print(host.address)
    function end(): void {
      stopWatching()
      process.off('SIGINT', end)
      process.off('SIGTERM', end)
      resolve()
    }
  })
  await host.close()
}
