import type { MathNode, OperatorNode, SymbolNode } from 'mathjs'
import { faultText } from '../faultText'
import type { Scope } from './formula'
import { CONSTANTS } from './formula'
import { FormulaRefusal } from './formulaRefusal'

/**
 * Refuses a division of which nobody can tell how far it reaches: behind `a / 2 b` some read
 * `a / (2 b)` and others `(a / 2) b`. Numbers and units side by side, as in `1/8 inch` or
 * `5 kN / 2 mm`, are clear and pass.
 * Throws a refusal with `formula-refused`.
 * @param node a multiplication or a division
 * @param scope names that have a value
 */
export function checkDivision(node: OperatorNode<never, never>, scope: Scope): void {
  const [left, right] = node.args as MathNode[]
  const behind =
    (node.fn as string) === 'divide' ? isSideBySide(right) : isSideBySide(node) && beginsWithDivision(left)
  if (!behind || isOfUnits(right, scope)) return
  const why =
    'a product without * behind a division sign can be read in two ways; write a / (2 * b) or a / 2 * b'
  throw new FormulaRefusal(faultText.formulaRefused(why))
}

function operatorOf(node: MathNode): OperatorNode<never, never> | null {
  return node.type === 'OperatorNode' ? (node as OperatorNode<never, never>) : null
}

/** A product whose factors stand side by side, without a sign. */
function isSideBySide(node: MathNode): boolean {
  const operator = operatorOf(node)
  return operator !== null && (operator.fn as string) === 'multiply' && operator.implicit
}

function beginsWithDivision(node: MathNode): boolean {
  const operator = operatorOf(node)
  if (operator === null) return false
  if ((operator.fn as string) === 'divide') return true
  return isSideBySide(node) && beginsWithDivision((operator.args as MathNode[])[0])
}

function isOfUnits(node: MathNode, scope: Scope): boolean {
  if (node.type === 'ConstantNode') return true
  if (node.type === 'SymbolNode') return !hasValue((node as SymbolNode).name, scope)
  const operator = operatorOf(node)
  if (operator === null) return false
  const args = operator.args as MathNode[]
  const isPower = ['pow', 'unaryMinus'].includes(operator.fn as string)
  return (isPower || isSideBySide(node)) && args.every((arg) => isOfUnits(arg, scope))
}

/** True for a name that stands for a value and not for a unit; `s` behind a division sign is the second. */
function hasValue(name: string, scope: Scope): boolean {
  if (scope.arguments === 't' && name === 't') return true
  if (scope.arguments === 'along' && name === 'x') return true
  return scope.variables.has(name) || CONSTANTS.has(name)
}
