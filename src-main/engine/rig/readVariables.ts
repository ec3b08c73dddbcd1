import { faultText } from './faultText'
import { DIMENSIONS, PLAIN } from './formula/dimension'
import { findUnit } from './formula/findUnit'
import { CONSTANTS } from './formula/formula'
import { FORMULA_FUNCTIONS } from './formula/formulaFunctions'
import type { Place } from './place'
import type { Reading } from './reading'

/**
 * Reads the variables of a rig, which may refer to one another in any order.
 * @param reading gets their values, and the faults `variable-cycle`, `wrong-format`, `conflict` and
 *   those of formulas
 * @param raw texts or plain numbers by name
 */
export function readVariables(reading: Reading, raw: Record<string, string | number | undefined>): void {
  const place = (name: string): Place => ['variables', name]
  const names = Object.keys(raw).filter((name) => checkName(reading, place(name), name))
  const open: string[] = []
  const broken = new Set<string>()

  function settle(name: string): void {
    if (reading.variables.has(name)) return
    const circle = open.indexOf(name)
    if (circle !== -1) {
      const chain = open.slice(circle)
      if (!chain.some((it) => broken.has(it))) {
        const first = names.find((it) => chain.includes(it)) ?? name
        reading.faults.add(place(first), faultText.variableCycle([...chain, name]))
      }
      chain.forEach((it) => broken.add(it))
      return
    }
    open.push(name)
    const text = raw[name]
    if (typeof text === 'string')
      for (const other of mentioned(text)) if (names.includes(other)) settle(other)
    open.pop()
    reading.variables.set(name, broken.has(name) ? null : evaluate(name, text))
  }

  function evaluate(name: string, text: string | number | undefined) {
    if (text === undefined) return null
    if (typeof text === 'number') return { value: text, dimension: PLAIN }
    const { formula, ...rest } = reading.formula(text, 'none')
    if (formula && formula.fixed !== null) return { value: formula.fixed, dimension: formula.dimension }
    if ('text' in rest && rest.text) reading.faults.add(place(name), rest.text)
    return null
  }

  for (const name of names) {
    settle(name)
    const known = reading.variables.get(name)
    if (known) reading.notes?.value(place(name), known.value, known.dimension)
  }
}

/** Names in a formula, units and functions among them. */
function mentioned(text: string): string[] {
  return text.slice(0, 2000).match(/[A-Za-z_][A-Za-z0-9_]*/g) ?? []
}

function checkName(reading: Reading, place: Place, name: string): boolean {
  if (!/^[A-Za-z][A-Za-z0-9_]*$/.test(name) || name.length > 60) {
    reading.faults.add(place, faultText.variableName(name))
    return false
  }
  const meaning = meaningOf(name)
  if (meaning === null) return true
  reading.faults.add(place, faultText.variableTaken(name, meaning))
  return false
}

const WORDS: Record<string, string> = {
  t: 'the time',
  x: 'the place along a bar',
  s: 'the place along a section, and the second',
  in: 'the inch',
}

/** Words of the formula language that are no names. */
const RESERVED = new Set('mod to and or xor not true false null undefined NaN Infinity end'.split(' '))

function meaningOf(name: string): string | null {
  if (Object.hasOwn(WORDS, name)) return WORDS[name]
  if (CONSTANTS.has(name)) return 'a constant'
  if (FORMULA_FUNCTIONS.has(name)) return 'a function'
  if (RESERVED.has(name)) return 'a word of the formula language'
  const unit = findUnit(name)
  if (unit === null) return null
  if (typeof unit === 'string') return 'a unit'
  const known = Object.values(DIMENSIONS).find(({ dimension }) =>
    dimension.every((it, i) => it === unit.dimension[i]),
  )
  return `the unit ${name}${known ? ` (${known.label})` : ''}`
}
