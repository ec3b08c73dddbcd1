import { CommanderError } from 'commander'
import { cleanLine } from '../../documents/format/cleanLine'
import { EXIT } from './exitCodes'
import { makeCommands } from './makeCommands'
import type { Terminal } from './terminal'

/**
 * Runs one command of the command line.
 *
 * @param argv - the arguments after the program's own name
 * @param terminal - where it prints, and what tells it to stop
 * @returns the exit status; never rejects
 */
export async function runCommandLine(argv: string[], terminal: Terminal): Promise<number> {
  let status: number = EXIT.done
  try {
    const program = makeCommands(terminal, (finished) => {
      status = finished
    })
    await program.parseAsync(argv, { from: 'user' })
    return status
  } catch (error) {
    if (error instanceof CommanderError) return error.exitCode === 0 ? EXIT.done : EXIT.refused
    if (terminal.signal.aborted && error === terminal.signal.reason) {
      terminal.err('Stopped; nothing was written.\n')
      return EXIT.stopped
    }
    return printFault(error, terminal)
  }
}

function printFault(error: unknown, terminal: Terminal): number {
  const { message, stack } = error instanceof Error ? error : new Error(String(error))
  terminal.err(`A fault of the program, not of the rig: ${cleanLine(message)}\n`)
  if (terminal.debug) terminal.err(`${stack}\n`)
  return EXIT.fault
}
