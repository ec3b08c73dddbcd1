import type {
  ConditionalNode,
  ConstantNode,
  FunctionNode,
  MathNode,
  OperatorNode,
  ParenthesisNode,
  RelationalNode,
  SymbolNode,
} from 'mathjs'
import { faultText } from '../faultText'
import { nearestName } from '../nearestName'
import { quote } from '../showValue'
import { didYouMean } from '../texts/nameHint'
import type { Dimension } from './dimension'
import { describeDimension, DIMENSIONS, isSameDimension, PLAIN } from './dimension'
import { checkDivision } from './checkDivision'
import { compileName } from './compileName'
import type { Formula, Scope } from './formula'
import { findUnit } from './findUnit'
import { CONSTANTS, makeFixedFormula } from './formula'
import type { FormulaFunction } from './formulaFunctions'
import { FORMULA_FUNCTIONS } from './formulaFunctions'
import { FormulaRefusal } from './formulaRefusal'

type Evaluate = (...values: number[]) => number

/** A comparison is 1 or 0, and not a number where one of its sides is none. */
const COMPARISONS: Record<string, (a: number, b: number) => boolean> = {
  smaller: (a, b) => a < b,
  larger: (a, b) => a > b,
  smallerEq: (a, b) => a <= b,
  largerEq: (a, b) => a >= b,
  equal: (a, b) => a === b,
  unequal: (a, b) => a !== b,
}

/**
 * Turns the checked tree of a formula into a function of numbers in SI. Dimensions are worked out
 * from the tree itself, in every branch, so that no trial value is needed.
 * Throws a refusal with `wrong-dimension`, `formula-refused`, `formula-unknown-name`.
 * @param node a tree that `checkFormulaTree` has let pass
 * @param scope names that the formula may use
 * @param divides true where the node is a factor of a divisor
 */
export function compileFormula(node: MathNode, scope: Scope, divides = false): Formula {
  switch (node.type) {
    case 'ConstantNode':
      return compileConstant(node as ConstantNode)
    case 'SymbolNode':
      return compileName((node as SymbolNode).name, scope, divides)
    case 'ParenthesisNode':
      return compileFormula((node as ParenthesisNode).content, scope, divides)
    case 'OperatorNode':
      return compileOperator(node as OperatorNode<never, never>, scope, divides)
    case 'FunctionNode':
      return compileCall(node as FunctionNode, scope)
    case 'ConditionalNode':
      return compileChoice(node as ConditionalNode, scope)
    default:
      return refuse('a comparison stands only before ? in a choice such as "t < 5 us ? 2 kN : 0 kN"')
  }
}

function refuse(why: string): never {
  throw new FormulaRefusal(faultText.formulaRefused(why))
}

function mixed(what: string): never {
  throw new FormulaRefusal(faultText.mixedDimensions(what))
}

function compileConstant(node: ConstantNode): Formula {
  const value: unknown = node.value
  if (typeof value !== 'number') return refuse(`${String(value)} has no place in it`)
  if (!Number.isFinite(value)) return refuse('it holds a number too large for any computer number')
  return makeFixedFormula(value, PLAIN)
}

/** Makes the function of functions, or its one value where they are all fixed. */
function combine(dimension: Dimension, evaluate: Evaluate, ...parts: Formula[]): Formula {
  if (parts.every((part) => part.fixed !== null)) {
    return makeFixedFormula(evaluate(...parts.map((part) => part.fixed as number)), dimension)
  }
  const [p, q] = parts
  if (parts.length === 1) return { dimension, fixed: null, at: (a, b) => evaluate(p.at(a, b)) }
  if (parts.length === 2) return { dimension, fixed: null, at: (a, b) => evaluate(p.at(a, b), q.at(a, b)) }
  return { dimension, fixed: null, at: (a, b) => evaluate(...parts.map((part) => part.at(a, b))) }
}

function checkSame(left: Formula, right: Formula, what: string): void {
  if (isSameDimension(left.dimension, right.dimension)) return
  mixed(
    `cannot ${what} ${describeDimension(left.dimension)} and ${describeDimension(right.dimension)}${zeroHint(left, right)}`,
  )
}

function zeroHint(left: Formula, right: Formula): string {
  const bareZero = [left, right].some((it) => it.fixed === 0 && isSameDimension(it.dimension, PLAIN))
  return bareZero ? '; zero needs a unit too' : ''
}

function compileOperator(node: OperatorNode<never, never>, scope: Scope, divides: boolean): Formula {
  const fn = node.fn as string
  const args = node.args as MathNode[]
  if (fn === 'pow') return compilePower(args, scope, divides)
  if (fn === 'multiply' || fn === 'divide') {
    checkDivision(node, scope)
    const left = compileFormula(args[0], scope, divides)
    const right = compileFormula(args[1], scope, fn === 'divide' ? !divides : divides)
    const sign = fn === 'divide' ? -1 : 1
    const dimension = left.dimension.map((exponent, i) => exponent + sign * right.dimension[i])
    return combine(dimension, fn === 'divide' ? (a, b) => a / b : (a, b) => a * b, left, right)
  }
  const parts = () => args.map((arg) => compileFormula(arg, scope))
  if (fn === 'unaryMinus' || fn === 'unaryPlus') {
    const part = compileFormula(args[0], scope, divides)
    return fn === 'unaryPlus' ? part : combine(part.dimension, (a) => -a, part)
  }
  if (fn === 'add' || fn === 'subtract') {
    const [left, right] = parts()
    checkSame(left, right, fn === 'add' ? 'add' : 'subtract')
    return combine(left.dimension, fn === 'add' ? (a, b) => a + b : (a, b) => a - b, left, right)
  }
  if (Object.hasOwn(COMPARISONS, fn)) {
    return refuse('a comparison stands only before ? in a choice such as "t < 5 us ? 2 kN : 0 kN"')
  }
  const sign = (node.op as string) === '!' ? 'factorials (!) have' : `${quote(node.op as string)} has`
  return refuse(`${sign} no place in it`)
}

function compilePower(args: MathNode[], scope: Scope, divides: boolean): Formula {
  const power = compileFormula(args[1], scope)
  if (!isSameDimension(power.dimension, PLAIN)) {
    mixed(`an exponent must be a plain number, got ${describeDimension(power.dimension)}`)
  }
  const base = compileFormula(args[0], scope, power.fixed !== null && power.fixed < 0 ? !divides : divides)
  if (isSameDimension(base.dimension, PLAIN)) return combine(PLAIN, Math.pow, base, power)
  if (power.fixed === null) {
    return mixed(`${describeDimension(base.dimension)} can only be raised to a fixed power`)
  }
  const exponent = power.fixed
  return combine(
    base.dimension.map((it) => it * exponent),
    Math.pow,
    base,
    power,
  )
}

function compileCall(node: FunctionNode, scope: Scope): Formula {
  const name = (node.fn as { name?: unknown }).name
  const known = typeof name === 'string' ? FORMULA_FUNCTIONS.get(name) : undefined
  if (typeof name !== 'string' || !known) {
    const shown = String(name)
    if (scope.variables.has(shown) || CONSTANTS.has(shown) || findUnit(shown) !== null) {
      return refuse(`${quote(shown)} is no function; to multiply, write ${shown} * (...)`)
    }
    const nearest = nearestName(shown, FORMULA_FUNCTIONS.keys())
    return refuse(`the function ${quote(shown)} has no place in it${didYouMean(nearest)}`)
  }
  const [least, most] = known.count
  if (node.args.length < least || node.args.length > most) {
    const count = least === most ? String(least) : `${least} to ${most}`
    return refuse(`${name}(...) takes ${count} value${most === 1 ? '' : 's'}, got ${node.args.length}`)
  }
  if (known.rule === 'power') return compilePower(node.args, scope, false)
  const parts = node.args.map((arg) => compileFormula(arg, scope))
  return combine(resultOf(name, known, parts), known.evaluate, ...parts)
}

/** Checks the dimensions that go into a function and gives the one that comes out. */
function resultOf(name: string, { rule }: FormulaFunction, parts: Formula[]): Dimension {
  const first = parts[0].dimension
  if (typeof rule === 'object') return first.map((exponent) => exponent / rule.root)
  if (rule === 'same' || rule === 'ratio') {
    for (const part of parts) checkSame(parts[0], part, `take ${name}(...) of`)
    return rule === 'same' ? first : PLAIN
  }
  const angle = rule === 'angle' && isSameDimension(first, DIMENSIONS.angle.dimension)
  if (rule !== 'sign' && !angle && !isSameDimension(first, PLAIN)) {
    mixed(
      `${name}(...) takes a plain number${rule === 'angle' ? ' or an angle' : ''}, got ${describeDimension(first)}`,
    )
  }
  return PLAIN
}

function compileChoice(node: ConditionalNode, scope: Scope): Formula {
  const condition = compileCondition(node.condition, scope)
  const yes = compileFormula(node.trueExpr, scope)
  const no = compileFormula(node.falseExpr, scope)
  checkSame(yes, no, 'choose between')
  if (condition.fixed === 1) return yes
  if (condition.fixed === 0) return no
  const at: Formula['at'] = (a, b) => {
    const holds = condition.at(a, b)
    return holds === 1 ? yes.at(a, b) : holds === 0 ? no.at(a, b) : NaN
  }
  return { dimension: yes.dimension, fixed: condition.fixed === null ? null : NaN, at }
}

function compileCondition(node: MathNode, scope: Scope): Formula {
  if (node.type === 'ParenthesisNode') return compileCondition((node as ParenthesisNode).content, scope)
  const relation = node as RelationalNode & { conditionals: string[]; params: MathNode[] }
  const operator = node as OperatorNode<never, never>
  const [names, args]: [string[], MathNode[]] =
    node.type === 'RelationalNode'
      ? [relation.conditionals, relation.params]
      : [[String(operator.fn)], (operator.args as MathNode[] | undefined) ?? []]
  if (!names.every((name) => Object.hasOwn(COMPARISONS, name)) || args.length !== names.length + 1) {
    return refuse('before ? there must be a comparison such as "t < 5 us"')
  }
  const parts = args.map((arg) => compileFormula(arg, scope))
  for (let i = 1; i < parts.length; i++) checkSame(parts[i - 1], parts[i], 'compare')
  const holds: Evaluate = (...values) => {
    if (values.some(Number.isNaN)) return NaN
    return names.every((name, i) => COMPARISONS[name](values[i], values[i + 1])) ? 1 : 0
  }
  return combine(PLAIN, holds, ...parts)
}
