import type { MathNode } from 'mathjs'
import { faultText } from '../faultText'
import { LIMITS } from '../limits'
import { FormulaRefusal } from './formulaRefusal'

const ALLOWED = new Set([
  'ConstantNode',
  'SymbolNode',
  'OperatorNode',
  'ParenthesisNode',
  'FunctionNode',
  'ConditionalNode',
  'RelationalNode',
])

/** What the refused parts of a tree are called in messages. */
const REFUSED: Record<string, string> = {
  RangeNode: 'ranges (a:b) have no place in it',
  AssignmentNode: 'nothing can be assigned in it; to compare, write ==',
  FunctionAssignmentNode: 'no function can be defined in it',
  AccessorNode: 'a dot behind a name has no place in it',
  IndexNode: 'a dot behind a name has no place in it',
  BlockNode: 'it must be one formula',
  ArrayNode: 'lists have no place in it',
  ObjectNode: 'objects have no place in it',
}

/**
 * Checks the tree of a formula against the kinds of parts that may stand in it, and their count and
 * depth. Throws a refusal with `formula-refused`.
 * @param root as parsed
 */
export function checkFormulaTree(root: MathNode): void {
  const waiting: { node: MathNode; depth: number }[] = [{ node: root, depth: 1 }]
  let count = 0
  for (let next = waiting.pop(); next; next = waiting.pop()) {
    const { node, depth } = next
    count++
    if (count > LIMITS.formulaNodes) refuse(`it has more than ${LIMITS.formulaNodes} parts; use variables`)
    if (depth > LIMITS.formulaDepth) {
      refuse(`its parts stand more than ${LIMITS.formulaDepth} deep; use variables`)
    }
    if (!ALLOWED.has(node.type)) refuse(REFUSED[node.type] ?? 'only plain arithmetic has a place in it')
    node.forEach((child) => waiting.push({ node: child, depth: depth + 1 }))
  }
}

function refuse(why: string): never {
  throw new FormulaRefusal(faultText.formulaRefused(why))
}
