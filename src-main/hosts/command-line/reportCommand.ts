import { realpathSync, statSync } from 'node:fs'
import { writeReport } from '../../documents/report/writeReport'
import { saveFile } from '../../documents/save/saveFile'
import { EXIT } from './exitCodes'
import { openRig } from './openRig'
import { printBroken } from './printBroken'
import { printRefusals } from './printRefusals'
import { runSolve } from './runSolve'
import { saveOutput } from './saveOutput'
import type { Terminal } from './terminal'
import { writeReportSummary } from './writeSolveTables'

/**
 * `report`: computes a rig and writes its report as one page.
 *
 * @param rigPath - the rig file
 * @param options - where the report goes
 * @param terminal - where it prints
 * @returns the exit status
 */
export async function reportCommand(
  rigPath: string,
  { out }: { out: string },
  terminal: Terminal,
): Promise<number> {
  const opened = openRig(rigPath)
  if ('faults' in opened) return printRefusals(terminal, rigPath, opened.faults)
  const reason = checkReportPath(out)
  if (reason !== null) return printRefusals(terminal, rigPath, [{ path: out, message: reason }])
  const run = await runSolve(opened, { full: false, quiet: false }, terminal)
  if (!('result' in run)) return printBroken(terminal, rigPath, run)
  const text = writeReport(run.result, opened.file.text)
  const status = await saveOutput(terminal, out, () => saveFile(out, text))
  if (status === EXIT.done) terminal.out(writeReportSummary(run.result, out))
  return status
}

/** A report replaces a page at most: never a rig, a device or a folder. */
function checkReportPath(out: string): string | null {
  const path = resolveLinks(out)
  if (!/\.html?$/i.test(path)) return 'a report is a page; give it a name that ends in .html'
  const status = statSync(path, { throwIfNoEntry: false })
  return status && !status.isFile() ? 'there is something by this name that is not a file' : null
}

function resolveLinks(path: string): string {
  try {
    return realpathSync(path)
  } catch {
    return path
  }
}
