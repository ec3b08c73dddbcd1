/** What a function asks of its arguments and gives back. */
export type FunctionRule =
  /** plain numbers in, a plain number out */
  | 'plain'
  /** an angle or a plain number in, a plain number out */
  | 'angle'
  /** any dimension in, the same out; several arguments must agree */
  | 'same'
  /** any dimension in, a plain number out */
  | 'sign'
  /** any dimension in, its root out */
  | { root: number }
  /** two arguments of one dimension in, a plain number out */
  | 'ratio'
  /** the same as the operator ^ */
  | 'power'

export interface FormulaFunction {
  rule: FunctionRule
  /** Smallest and largest count of arguments. */
  count: readonly [number, number]
  evaluate: (...values: number[]) => number
}

function entry(
  rule: FunctionRule,
  evaluate: (...values: number[]) => number,
  least = 1,
  most = least,
): FormulaFunction {
  return { rule, count: [least, most], evaluate }
}

/** The functions that a formula may call; no other name can be called. */
export const FORMULA_FUNCTIONS: ReadonlyMap<string, FormulaFunction> = new Map<string, FormulaFunction>([
  ['abs', entry('same', Math.abs)],
  ['min', entry('same', Math.min, 1, 20)],
  ['max', entry('same', Math.max, 1, 20)],
  ['hypot', entry('same', Math.hypot, 1, 20)],
  ['sign', entry('sign', Math.sign)],
  ['sqrt', entry({ root: 2 }, Math.sqrt)],
  ['cbrt', entry({ root: 3 }, Math.cbrt)],
  ['pow', entry('power', Math.pow, 2)],
  ['exp', entry('plain', Math.exp)],
  ['log', entry('plain', Math.log)],
  ['log10', entry('plain', Math.log10)],
  ['log2', entry('plain', Math.log2)],
  ['sin', entry('angle', Math.sin)],
  ['cos', entry('angle', Math.cos)],
  ['tan', entry('angle', Math.tan)],
  ['asin', entry('plain', Math.asin)],
  ['acos', entry('plain', Math.acos)],
  ['atan', entry('plain', Math.atan)],
  ['atan2', entry('ratio', Math.atan2, 2)],
  ['sinh', entry('plain', Math.sinh)],
  ['cosh', entry('plain', Math.cosh)],
  ['tanh', entry('plain', Math.tanh)],
  ['floor', entry('plain', Math.floor)],
  ['ceil', entry('plain', Math.ceil)],
  ['round', entry('plain', Math.round)],
])
