import { cleanLine } from '../../documents/format/cleanLine'
import { EXIT } from './exitCodes'
import type { Terminal } from './terminal'

/**
 * Prints that a run has lost its numbers on the way.
 *
 * @param terminal - gets the line on standard error
 * @param rigPath - the rig's file
 * @param run - the step after which the numbers were no longer finite, and all steps
 * @returns the exit status of a fault of the program
 */
export function printBroken(
  terminal: Terminal,
  rigPath: string,
  run: { brokenAfter: number; steps: number },
): number {
  terminal.err(
    `${cleanLine(rigPath)}: the run was stopped after step ${run.brokenAfter} of ${run.steps}, where its numbers ` +
      'were no longer finite; nothing was written\n',
  )
  return EXIT.fault
}
