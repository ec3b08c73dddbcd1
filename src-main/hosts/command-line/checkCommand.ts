import { makeSolve } from '../../engine/solveRig'
import { EXIT } from './exitCodes'
import { openRig } from './openRig'
import { printRefusals } from './printRefusals'
import type { Terminal } from './terminal'
import { writeLineTables } from './writeLineTables'

/**
 * `check`: reads a rig and prints all its faults, or a summary of its line.
 *
 * @param rigPath - the rig file
 * @param terminal - where it prints
 * @returns the exit status
 */
export function checkCommand(rigPath: string, terminal: Terminal): number {
  const opened = openRig(rigPath)
  if ('faults' in opened) return printRefusals(terminal, rigPath, opened.faults)
  terminal.out(writeLineTables(makeSolve(opened.rig).line))
  return EXIT.done
}
