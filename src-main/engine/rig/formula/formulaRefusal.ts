import type { FaultText } from '../faultText'

/** Carries a fault out of the depth of a formula; `readFormula` catches every one. */
export class FormulaRefusal extends Error {
  constructor(readonly text: FaultText | null) {
    super('formula refused')
  }
}
