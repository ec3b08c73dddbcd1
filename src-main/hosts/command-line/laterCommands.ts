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

/**
 * `selfcheck`: says that the published checks are not run by the program itself yet.
 *
 * @param terminal - where it prints
 * @returns the exit status of a refusal
 */
export function selfcheckCommand(terminal: Terminal): number {
  return printRefusals(terminal, 'selfcheck', [
    { path: '', message: 'the published checks are not run from the command line yet' },
  ])
}
