import { openRig } from './openRig'
import { printRefusals } from './printRefusals'
import type { Terminal } from './terminal'

/**
 * `study`: reads the rig and says that its studies are not computed yet.
 *
 * @param rigPath - the rig file
 * @param terminal - where it prints
 * @returns the exit status of a refusal
 */
export function studyCommand(rigPath: string, terminal: Terminal): number {
  const opened = openRig(rigPath)
  const faults =
    'faults' in opened ? opened.faults : [{ path: 'studies', message: 'studies are not computed yet' }]
  return printRefusals(terminal, rigPath, faults)
}
