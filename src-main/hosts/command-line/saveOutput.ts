import { describeFileError } from '../../documents/describeFileError'
import { cleanLine } from '../../documents/format/cleanLine'
import { EXIT } from './exitCodes'
import type { Terminal } from './terminal'

/**
 * Writes what a command has made, and reports a disk that does not take it.
 *
 * @param terminal - gets the reason on standard error
 * @param path - where the user wants it
 * @param save - writes it whole or not at all
 * @returns the exit status; rejects with anything but an error of the system
 */
export async function saveOutput(
  terminal: Terminal,
  path: string,
  save: () => Promise<void>,
): Promise<number> {
  try {
    await save()
    return EXIT.done
  } catch (error) {
    if ((error as NodeJS.ErrnoException).syscall === undefined) throw error
    terminal.err(
      `${cleanLine(path)}: cannot be written: ${describeFileError(error)}; what was there before is unchanged\n`,
    )
    return EXIT.fault
  }
}
