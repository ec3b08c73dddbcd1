import type { MathNode, UnitCtor } from 'mathjs'
import { create, parseDependencies, UnitDependencies } from 'mathjs'

/** The two parts of mathjs that are used: text to tree, and the table of units. Nothing evaluates. */
export interface Parser {
  parse(text: string): MathNode
  Unit: UnitCtor
}

/** [m] and [N], exact by definition (international yard and pound of 1959, standard gravity). */
const INCH = 0.0254
const POUND_FORCE = 0.45359237 * 9.80665

/** Units that trades write and mathjs lacks, or holds with fewer digits than their definition. */
const MORE_UNITS = {
  psi: `${POUND_FORCE / INCH ** 2} Pa`,
  ksi: `${(1000 * POUND_FORCE) / INCH ** 2} Pa`,
  Msi: `${(1e6 * POUND_FORCE) / INCH ** 2} Pa`,
  kip: `${1000 * POUND_FORCE} N`,
  slug: `${POUND_FORCE / (12 * INCH)} kg`,
  thou: `${INCH / 1000} m`,
  mph: `${1609.344 / 3600} m/s`,
} as const

let parser: Parser | null = null

/**
 * Gives the one parser, an instance of our own that no formula can configure; made at first use.
 */
export function getParser(): Parser {
  if (parser) return parser
  const math = create({ parseDependencies, UnitDependencies }, { number: 'number' }) as unknown as Parser
  for (const [name, definition] of Object.entries(MORE_UNITS)) {
    math.Unit.createUnit({ [name]: definition }, { override: true })
  }
  parser = math
  return math
}
