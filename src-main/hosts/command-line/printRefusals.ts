import type { Fault } from '../../contract/fault'
import { cleanLine } from '../../documents/format/cleanLine'
import { EXIT } from './exitCodes'
import type { Terminal } from './terminal'

/**
 * Prints why an input is refused, one reason a line, as `path: reason`.
 *
 * @param terminal - gets the lines on standard error
 * @param whole - stands for the path of a fault of the whole file: the name of what is refused
 * @param faults - every reason
 * @returns the exit status of a refusal
 */
export function printRefusals(
  terminal: Terminal,
  whole: string,
  faults: readonly Pick<Fault, 'path' | 'message'>[],
): number {
  for (const { path, message } of faults) {
    terminal.err(`${cleanLine(path === '' ? whole : path)}: ${cleanLine(message)}\n`)
  }
  return EXIT.refused
}
