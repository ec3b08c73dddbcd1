import { createHash } from 'node:crypto'
import type { Bridge, SolveAnswer } from '../contract/bridge'
import { NOTICE } from '../contract/notice'
import { SOFTWARE } from '../contract/software'
import { readRig } from '../engine/rig/readRig'
import { solveInSlices } from './solveInSlices'

/**
 * Makes what stands behind the bridge of every host.
 *
 * @returns the bridge's methods, carried out in this process
 */
export function makeService(): Bridge {
  return {
    about: async () => ({ ...SOFTWARE, notice: NOTICE }),
    solve: solveText,
  }
}

/** Records beside the rig are refused: a page hands over a text and no folder. */
async function solveText(text: string): Promise<SolveAnswer> {
  const { rig, faults } = readRig(text)
  if (rig === null) return { status: 'refused', faults }
  const outcome = await solveInSlices(rig, createHash('sha256').update(text).digest('hex'))
  if ('result' in outcome) return { status: 'solved', result: outcome.result }
  throw new Error(`the numbers stopped being finite after step ${outcome.brokenAfter} of ${outcome.steps}`)
}
