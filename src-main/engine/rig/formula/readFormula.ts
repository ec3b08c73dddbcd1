import type { FaultText } from '../faultText'
import { faultText } from '../faultText'
import { checkFormulaText } from './checkFormulaText'
import { checkFormulaTree } from './checkFormulaTree'
import { compileFormula } from './compileFormula'
import { DIMENSIONS, PLAIN } from './dimension'
import { findUnit } from './findUnit'
import type { Formula, Scope } from './formula'
import { makeFixedFormula } from './formula'
import { FormulaRefusal } from './formulaRefusal'
import { getParser } from './parser'
import { scaleByUnit } from './scaleByUnit'

/** A formula, or why there is none; no reason where a variable in it has its own fault. */
export type FormulaReading = { formula: Formula } | { formula: null; text: FaultText | null }

/** A number and one unit, by far the most frequent text of a rig. */
const SIMPLE = /^\s*([-+]?(?:[0-9]+\.?[0-9]*|\.[0-9]+)(?:[eE][-+]?[0-9]+)?)\s*([A-Za-z\u00B5\u03BC]*)\s*$/

/**
 * Tells whether a text is a number with at most one unit.
 */
export function isSimpleFormula(text: string): boolean {
  return SIMPLE.test(text)
}

/**
 * Reads one formula: text, tree, then numbers in SI. Nothing in it is ever executed.
 * @param text as it stands in the file
 * @param scope names that it may use
 * @returns the formula, or the fault: `formula-refused`, `formula-syntax`, `formula-unknown-name`,
 *   `formula-not-finite`, `wrong-dimension`
 */
export function readFormula(text: string, scope: Scope): FormulaReading {
  try {
    const formula = readSimple(text, scope) ?? readAny(text, scope)
    if (formula.fixed !== null && !Number.isFinite(formula.fixed)) {
      return { formula: null, text: faultText.formulaNotFinite(text, '') }
    }
    return { formula }
  } catch (error) {
    if (error instanceof FormulaRefusal) return { formula: null, text: error.text }
    throw error
  }
}

function readSimple(text: string, scope: Scope): Formula | null {
  if (text.length > 60) return null
  const match = SIMPLE.exec(text)
  if (!match) return null
  const number = Number(match[1])
  const name = match[2].replace(/[\u00B5\u03BC]/g, 'u').replace(/^in$/, 'inch')
  if (name === '') return makeFixedFormula(number, PLAIN)
  if (scope.variables.has(name) || (scope.arguments !== 'none' && 'txs'.includes(name)) || name === 't')
    return null
  const unit = findUnit(name)
  if (unit === null || typeof unit === 'string') return null
  return makeFixedFormula(scaleByUnit(number, unit.factor), unit.dimension)
}

function readAny(text: string, scope: Scope): Formula {
  const plain = checkFormulaText(text)
  const root = parse(plain, text)
  checkFormulaTree(root)
  return compileFormula(root, scope)
}

function parse(plain: string, text: string) {
  try {
    return getParser().parse(plain)
  } catch (error) {
    const decimalComma = /[0-9],[0-9]/.test(text) ? '; a decimal is written with a point, such as 1.5' : ''
    const said = error instanceof Error ? error.message : String(error)
    const what = said.replace(/\s*\(char \d+\)/, '').slice(0, 120)
    throw new FormulaRefusal(
      faultText.formulaSyntax(`${what}${decimalComma}; write for instance "${DIMENSIONS.length.example}"`),
    )
  }
}
