import { faultText } from '../faultText'
import { LIMITS } from '../limits'
import { quote } from '../showValue'
import { FormulaRefusal } from './formulaRefusal'

/** Why a character can stand in no formula. */
const REASONS: [RegExp, string][] = [
  [/["'`]/, 'texts in quotes have no place in it'],
  [/[[\]]/, 'lists in [ ] have no place in it'],
  [/[{}]/, 'objects in { } have no place in it'],
  [/%/, '% has no place in it; write 5 % as 0.05'],
  [/[;\n\r]/, 'it must be one formula, without ; and line ends'],
  [/#/, 'remarks after # have no place in it; use the notes'],
  [/°/, 'the sign ° has no place in it; write deg'],
]

/** Signs that drawings and data sheets use for what a formula spells in plain letters. */
const SPELLINGS: [RegExp, string][] = [
  [/[\u00B5\u03BC]/g, 'u'],
  [/\u00B2/g, '^2'],
  [/\u00B3/g, '^3'],
  [/[\u00B7\u00D7\u22C5]/g, '*'],
  [/\u2212/g, '-'],
  [/[\u00A0\u202F\t]/g, ' '],
]

/**
 * Checks the text of a formula before anything parses it: length, characters, depth and count.
 * Throws a refusal with `formula-refused` or `formula-syntax`.
 * @param text as it stands in the file
 * @returns the same formula in plain letters, with `inch` for `in`
 */
export function checkFormulaText(text: string): string {
  if (text.length > LIMITS.formulaLength) {
    refuse(`it has ${text.length} characters; at most ${LIMITS.formulaLength} are read`)
  }
  const plain = SPELLINGS.reduce((spelled, [sign, letters]) => spelled.replace(sign, letters), text)
  if (plain.trim() === '') throw new FormulaRefusal(faultText.formulaSyntax('it is empty'))
  for (const [pattern, why] of REASONS) if (pattern.test(plain)) refuse(why)
  const strange = /[^A-Za-z0-9_ +\-*/^().,<>=!?:]/.exec(plain)
  if (strange) refuse(`the sign ${quote(strange[0])} has no place in it`)
  checkDepth(plain)
  const tokens = plain.match(/[A-Za-z_][A-Za-z0-9_]*|[0-9.]+|[+\-*/^<>=!?]+/g) ?? []
  const signs = plain.match(/[-+]/g) ?? []
  if (Math.max(tokens.length, signs.length) > LIMITS.formulaNodes) {
    refuse(`it has more than ${LIMITS.formulaNodes} parts; use variables`)
  }
  return plain.replace(/(?<![A-Za-z_])in(?![A-Za-z0-9_])/g, 'inch')
}

function checkDepth(text: string): void {
  let depth = 0
  for (const character of text) {
    if (character === '(') depth++
    if (character === ')') depth--
    if (depth > LIMITS.formulaDepth) {
      refuse(`its parentheses stand more than ${LIMITS.formulaDepth} deep; use variables`)
    }
  }
}

function refuse(why: string): never {
  throw new FormulaRefusal(faultText.formulaRefused(why))
}
