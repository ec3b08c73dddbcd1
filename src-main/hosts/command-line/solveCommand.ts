import type { RunSettings } from '../../contract/rig'
import { checkResultFolder } from '../../documents/save/checkResultFolder'
import { makeResultFiles } from '../../documents/makeResultFiles'
import { saveResultFolder } from '../../documents/save/saveResultFolder'
import { checkFullField } from './checkFullField'
import { EXIT } from './exitCodes'
import { openRig } from './openRig'
import { printBroken } from './printBroken'
import { printRefusals } from './printRefusals'
import { runSolve } from './runSolve'
import { saveOutput } from './saveOutput'
import type { Terminal } from './terminal'
import { writeSolveSummary, writeSolveTables } from './writeSolveTables'

export interface SolveOptions {
  out?: string
  /** Goes before the one in the file. */
  method?: RunSettings['method']
  full?: boolean
  quiet?: boolean
}

/**
 * `solve`: computes a rig, and writes a result folder or prints a short table.
 *
 * @param rigPath - the rig file
 * @param options - of the command line
 * @param terminal - where it prints
 * @returns the exit status
 */
export async function solveCommand(
  rigPath: string,
  options: SolveOptions,
  terminal: Terminal,
): Promise<number> {
  const { out, method, full = false, quiet = false } = options
  const refuse = (path: string, message: string): number =>
    printRefusals(terminal, rigPath, [{ path, message }])
  const opened = openRig(rigPath, method)
  if ('faults' in opened) return printRefusals(terminal, rigPath, opened.faults)
  const tooLarge = full ? checkFullField(opened.rig) : null
  if (tooLarge !== null) return refuse('--full', tooLarge)
  const noFolder = out === undefined ? null : checkResultFolder(out)
  if (noFolder !== null) return refuse(out!, noFolder)

  const run = await runSolve(opened, { full, quiet }, terminal)
  if (!('result' in run)) return printBroken(terminal, rigPath, run)
  const { result } = run
  if (out === undefined) {
    if (!quiet) terminal.out(writeSolveTables(result))
    return EXIT.done
  }
  const files = makeResultFiles(result, opened.file.text)
  const status = await saveOutput(terminal, out, () => saveResultFolder(out, files, terminal.signal))
  if (status === EXIT.done && !quiet) terminal.out(writeSolveSummary(result, out))
  return status
}
