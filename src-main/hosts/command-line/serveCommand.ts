import { runBrowserHost } from '../browser/runBrowserHost'
import { EXIT } from './exitCodes'
import { printRefusals } from './printRefusals'
import type { Terminal } from './terminal'

/**
 * `serve`: serves the window's page to this machine's browser until it is told to end.
 *
 * @param port - on the loopback address; 0 takes a free one
 * @param terminal - gets one line, the address with its token
 * @returns the exit status, once the host has ended
 */
export async function serveCommand(port: number, terminal: Terminal): Promise<number> {
  try {
    await runBrowserHost({ port, bundleFolder: terminal.pageFolder }, (line) => terminal.out(`${line}\n`))
    return EXIT.done
  } catch (error) {
    const reason = PORT_REASONS[(error as NodeJS.ErrnoException).code ?? '']
    if (reason === undefined) throw error
    return printRefusals(terminal, '--port', [{ path: '', message: `port ${port} ${reason}` }])
  }
}

const PORT_REASONS: Readonly<Record<string, string>> = {
  EADDRINUSE: 'is taken by another program; give another one, or 0 for a free one',
  EACCES: 'may not be opened by you; give one above 1023, or 0 for a free one',
}
