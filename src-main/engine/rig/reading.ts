import type { FaultList } from './faultList'
import { faultText } from './faultText'
import type { FixedValue, FormulaArguments } from './formula/formula'
import type { FormulaReading } from './formula/readFormula'
import { isSimpleFormula, readFormula } from './formula/readFormula'
import { LIMITS } from './limits'
import type { RigNotes } from './makeInspection'

/** Gives the text of a record beside the rig, or why it cannot be had. */
export type ReadRecord = (relativePath: string) => string | { refused: string }

/** What all readers of the parts of one file share. */
export interface Reading {
  faults: FaultList
  /** Values of the rig's variables; null for one that has a fault of its own. */
  variables: Map<string, FixedValue | null>
  /** Reads a formula within the budget of the file. */
  formula(text: string, args: FormulaArguments): FormulaReading
  readRecord: ReadRecord | null
  /** What was read is noted here; null where nobody asks. */
  notes: RigNotes | null
}

/**
 * Makes what the readers of one file share.
 * @param faults list that they report to
 * @param readRecord access to the records beside the rig; null where there is none
 * @param notes of what was read; null where nobody asks
 */
export function makeReading(
  faults: FaultList,
  readRecord: ReadRecord | null,
  notes: RigNotes | null = null,
): Reading {
  const variables = new Map<string, FixedValue | null>()
  const known = new Map<string, FormulaReading>()
  let budget: number = LIMITS.formulaTotal
  return {
    faults,
    variables,
    readRecord,
    notes,
    formula(text, args) {
      if (isSimpleFormula(text)) return readFormula(text, { variables, arguments: args })
      const key = `${args} ${text}`
      const before = known.get(key)
      if (before) return before
      if (budget < 0) return { formula: null, text: null }
      budget -= text.length
      if (budget < 0) {
        faults.add([], faultText.formulasTooLong())
        return { formula: null, text: null }
      }
      const reading = readFormula(text, { variables, arguments: args })
      known.set(key, reading)
      return reading
    },
  }
}
