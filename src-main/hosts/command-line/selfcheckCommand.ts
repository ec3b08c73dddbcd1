import { setImmediate as turn } from 'node:timers/promises'
import { NOTICE } from '../../contract/notice'
import { SOFTWARE } from '../../contract/software'
import { makeBench } from '../../selfcheck/bench'
import type { Check } from '../../selfcheck/check'
import { CHECKS } from '../../selfcheck/checks'
import { type CheckOutcome, runSelfcheck } from '../../selfcheck/runSelfcheck'
import { EXIT } from './exitCodes'
import { makeProgress } from './makeProgress'
import type { Terminal } from './terminal'
import { writeSelfcheckTables } from './writeSelfcheckTables'

/**
 * `selfcheck`: computes published results again and prints how far each is off.
 *
 * @param options - of the command line; json: every value of every check, in place of the table
 * @param terminal - where it prints
 * @param checks - the published checks
 * @param bench - what runs their rigs: the engine of this program
 * @returns the exit status: done, or that a check fails. Rejects with the signal's reason when it is stopped.
 */
export async function selfcheckCommand(
  options: { json?: boolean },
  terminal: Terminal,
  checks: readonly Check[] = CHECKS,
  bench = makeBench(),
): Promise<number> {
  const outcomes: CheckOutcome[] = []
  const progress = makeProgress(terminal, false)
  try {
    for (const outcome of runSelfcheck(checks, bench)) {
      outcomes.push(outcome)
      progress.show(outcomes.length / checks.length)
      await turn()
      terminal.signal.throwIfAborted()
    }
  } finally {
    progress.erase()
  }
  const passed = outcomes.filter((outcome) => outcome.passed).length
  const report = { software: SOFTWARE, passed, count: outcomes.length, checks: outcomes, notice: NOTICE }
  terminal.out(options.json ? `${JSON.stringify(report, null, 2)}\n` : writeSelfcheckTables(outcomes))
  return passed === outcomes.length ? EXIT.done : EXIT.failedCheck
}
