import type { Fault } from '../../contract/fault'
import type { Dimension, DimensionName } from './formula/dimension'
import { describeDimension, DIMENSIONS } from './formula/dimension'
import { LIMITS } from './limits'
import { quote, showLength, showNumber, showValue } from './showValue'

/** A fault without its place. */
export type FaultText = Pick<Fault, 'code' | 'message'>

/** Values that a quantity may take. */
export type Range = 'any' | 'positive' | 'not-negative'

const RANGES: Record<Range, string> = {
  any: 'any value',
  positive: 'more than zero',
  'not-negative': 'zero or more',
}

function did(nearest: string | null): string {
  return nearest === null ? '' : `; did you mean ${quote(nearest)}?`
}

/**
 * Every reason why a rig is refused, in words: what is wrong, the value, and what would be right.
 * The place stands apart in the fault, so no text repeats it.
 */
export const faultText = {
  // the file
  notText: (): FaultText => ({
    code: 'not-readable',
    message: 'the file is not UTF-8 text; save it as UTF-8',
  }),
  textTooLarge: (size: number): FaultText => ({
    code: 'too-large',
    message: `the file has ${showNumber(size / 1024 / 1024)} MB; at most ${LIMITS.textBytes / 1024 / 1024} MB are read`,
  }),
  notJson: (what: string, line: number, column: number): FaultText => ({
    code: 'not-json',
    message: `line ${line}, column ${column}: ${what}`,
  }),
  duplicateKey: (key: string, line: number): FaultText => ({
    code: 'duplicate-key',
    message: `the key ${quote(key)} stands here a second time, in line ${line}; keep one of them`,
  }),
  tooDeep: (line: number): FaultText => ({
    code: 'too-deep',
    message: `line ${line} holds more than ${LIMITS.jsonDepth} lists and objects inside one another; no rig needs that many`,
  }),
  tooManyValues: (): FaultText => ({
    code: 'too-large',
    message: `the file holds more than ${LIMITS.jsonValues} values; put long tables into a record beside the rig`,
  }),
  forbiddenKey: (key: string): FaultText => ({
    code: 'forbidden-key',
    message: `the key ${quote(key)} is never allowed; take another name`,
  }),
  numberTooLarge: (text: string): FaultText => ({
    code: 'out-of-range',
    message: `the number ${text} is too large for any computer number; write one below 1e308`,
  }),
  moreFaults: (count: number): FaultText => ({
    code: 'too-large',
    message: `there are ${count} more faults like these; correct the ones above first`,
  }),

  // the form
  unknownKey: (key: string, nearest: string | null, known: readonly string[]): FaultText => ({
    code: 'unknown-key',
    message: `unknown key ${quote(key)}${nearest === null ? `; known here: ${known.join(', ')}` : did(nearest)}`,
  }),
  missing: (expected: string): FaultText => ({
    code: 'missing',
    message: `is missing; expected ${expected}`,
  }),
  wrongType: (expected: string, value: unknown): FaultText => ({
    code: 'wrong-type',
    message: `expected ${expected}, got ${showValue(value)}`,
  }),
  wrongChoice: (value: unknown, choices: readonly string[], nearest: string | null): FaultText => ({
    code: 'wrong-choice',
    message: `got ${showValue(value)}; choose one of ${choices.join(', ')}${did(nearest)}`,
  }),
  wrongFormat: (value: unknown, format: string): FaultText => ({
    code: 'wrong-format',
    message: `got ${showValue(value)}; this program reads "${format}"`,
  }),
  wrongCount: (expected: string, got: number): FaultText => ({
    code: 'wrong-count',
    message: `expected ${expected}, got ${got}`,
  }),
  tooMany: (what: string, most: number, got: number): FaultText => ({
    code: 'too-large',
    message: `there are ${got} ${what}; at most ${most} are read`,
  }),
  nameTooLong: (length: number, most: number): FaultText => ({
    code: 'too-large',
    message: `the text has ${length} characters; at most ${most} are allowed`,
  }),
  nameEmpty: (): FaultText => ({ code: 'missing', message: 'is empty; give it a name' }),
  duplicateName: (name: string, first: string): FaultText => ({
    code: 'duplicate-name',
    message: `the name ${quote(name)} is already taken by ${first}; give each its own`,
  }),

  // quantities and formulas
  needsUnit: (value: unknown, dimension: DimensionName): FaultText => {
    const { label, example } = DIMENSIONS[dimension]
    const unit = example.slice(example.indexOf(' ') + 1)
    const bare = String(value).trim()
    const like = /^[-+]?[0-9.]+(e[-+]?[0-9]+)?$/i.test(bare) ? `${bare} ${unit}` : example
    const why =
      Number(bare) === 0 ? 'zero needs a unit too' : `the bare number ${showValue(value)} has no unit`
    return { code: 'needs-unit', message: `expected ${label}; ${why}: write for instance "${like}"` }
  },
  wrongDimension: (dimension: DimensionName, got: Dimension, text: unknown): FaultText => ({
    code: 'wrong-dimension',
    message: `expected ${DIMENSIONS[dimension].label}, got ${describeDimension(got)} (${showValue(text)})`,
  }),
  mixedDimensions: (what: string): FaultText => ({ code: 'wrong-dimension', message: what }),
  formulaRefused: (what: string): FaultText => ({
    code: 'formula-refused',
    message: `the formula is refused: ${what}`,
  }),
  formulaSyntax: (what: string): FaultText => ({
    code: 'formula-syntax',
    message: `cannot be read as a formula: ${what}`,
  }),
  formulaUnknownName: (name: string, hint: string): FaultText => ({
    code: 'formula-unknown-name',
    message: `the name ${quote(name)} is not known${hint}`,
  }),
  formulaNotFinite: (text: unknown, where: string): FaultText => ({
    code: 'formula-not-finite',
    message: `the formula ${showValue(text)} has no finite real value${where}; look for a division by zero or the root of a negative number`,
  }),
  formulasTooLong: (): FaultText => ({
    code: 'too-large',
    message: `the formulas of this file have more than ${LIMITS.formulaTotal} characters together; write long tables as plain values such as "25 mm", or as a record beside the rig`,
  }),
  variableCycle: (chain: readonly string[]): FaultText => ({
    code: 'variable-cycle',
    message: `the variables refer to one another in a circle: ${chain.slice(0, 10).join(' -> ')}; give one of them a value of its own`,
  }),
  variableName: (name: string): FaultText => ({
    code: 'wrong-format',
    message: `${quote(name)} cannot be the name of a variable; use letters, digits and _, starting with a letter`,
  }),
  variableTaken: (name: string, meaning: string): FaultText => ({
    code: 'conflict',
    message: `the name ${quote(name)} already means ${meaning} in formulas; take another, such as ${quote(`${name}1`)}`,
  }),
  outOfRange: (value: unknown, range: Range): FaultText => ({
    code: 'out-of-range',
    message: `got ${showValue(value)}; it must be ${RANGES[range]}`,
  }),
  outside: (value: string, allowed: string): FaultText => ({
    code: 'out-of-range',
    message: `got ${value}; it must be ${allowed}`,
  }),
  beyondMagnitude: (value: unknown): FaultText => ({
    code: 'out-of-range',
    message: `${showValue(value)} is beyond any bar: in SI units it must lie between ${1 / LIMITS.magnitude} and ${LIMITS.magnitude}; check the units`,
  }),

  // materials
  unknownMaterial: (name: string, nearest: string | null, known: readonly string[]): FaultText => ({
    code: 'unknown-material',
    message: `there is no material ${quote(name)}${nearest === null ? listOf(known) : did(nearest)}`,
  }),
  noMaterial: (): FaultText => ({
    code: 'missing',
    message: 'is missing; name a material for the bar, or one for each of its sections',
  }),
  waveSpeed: (speed: number): FaultText => ({
    code: 'out-of-range',
    message: `modulus and density give a wave speed of ${showNumber(speed)} m/s; it must lie between 1 m/s and 100000 m/s: check their units`,
  }),
  hardeningOverModulus: (): FaultText => ({
    code: 'out-of-range',
    message: 'the tangent modulus after yield must be less than the modulus',
  }),

  // geometry
  severalForms: (given: readonly string[]): FaultText => ({
    code: 'conflict',
    message: `the section is given by ${given.join(' and ')} at once; keep exactly one of diameter, area, stations`,
  }),
  noForm: (): FaultText => ({
    code: 'missing',
    message: 'the form is missing; give exactly one of diameter, area, stations',
  }),
  boreWithArea: (): FaultText => ({
    code: 'conflict',
    message: 'a bore belongs to a diameter; an area is already what is left of the section',
  }),
  boreTooWide: (bore: number, diameter: number, where: string): FaultText => ({
    code: 'bore-too-wide',
    message: `Bore ${showLength(bore)} is ${bore === diameter ? 'as wide as' : 'wider than'} the bar, ${showLength(diameter)}${where}. Give less than ${showLength(diameter)}.`,
  }),
  notPositiveAlong: (what: string, value: string, where: string): FaultText => ({
    code: 'out-of-range',
    message: `the ${what} is ${value} ${where}; it must be more than zero over the whole section`,
  }),
  negativeAlong: (what: string, value: string, where: string): FaultText => ({
    code: 'out-of-range',
    message: `the ${what} is ${value} ${where}; it must be zero or more over the whole section`,
  }),
  stationsOrder: (place: number, before: number): FaultText => ({
    code: 'out-of-range',
    message: `the station at ${showLength(place)} does not come after the one at ${showLength(before)}; stations go from left to right, and a step is made by starting a new section`,
  }),
  stationsStart: (place: number): FaultText => ({
    code: 'out-of-range',
    message: `the first station stands at ${showLength(place)}; it must stand at 0 mm, the left face of the section`,
  }),
  stationsEnd: (place: number, length: number): FaultText => ({
    code: 'conflict',
    message: `the last station stands at ${showLength(place)} but the section is ${showLength(length)} long; make both the same, or leave the length out`,
  }),
  displacementAndPreload: (): FaultText => ({
    code: 'conflict',
    message: 'displacement and preload both give the initial strain; keep one of them',
  }),

  // references and places
  unknownBar: (name: string, nearest: string | null, known: readonly string[]): FaultText => ({
    code: 'unknown-bar',
    message: `there is no bar ${quote(name)}${nearest === null ? listOf(known) : did(nearest)}`,
  }),
  notOnBar: (at: number, length: number): FaultText => ({
    code: 'out-of-range',
    message: `${showLength(at)} is not on the bar; it must lie between 0 mm and ${showLength(length)}, measured from the bar's left face`,
  }),

  // ends, joints and pulses
  bothMotionAndForce: (given: readonly string[]): FaultText => ({
    code: 'both-motion-and-force',
    message: `this asks for ${given.join(' and ')}; at one point either a motion or a force may be prescribed, never both`,
  }),
  bondedGap: (): FaultText => ({
    code: 'conflict',
    message: 'a bonded joint has no gap; leave the gap out, or make the joint "contact"',
  }),
  oneOf: (names: readonly string[], given: number): FaultText =>
    given === 0
      ? { code: 'missing', message: `is missing; give one of ${names.join(', ')}` }
      : { code: 'conflict', message: `${names.join(' and ')} are given at once; keep one of them` },
  emptySupport: (): FaultText => ({
    code: 'missing',
    message:
      'a support needs a stiffness, a damping or a mass that is more than zero; for none of them write "free"',
  }),
  displacementJump: (how: string): FaultText => ({
    code: 'conflict',
    message: `a displacement cannot jump: ${how}; give it a finite rise`,
  }),
  notAscending: (what: string, row: number): FaultText => ({
    code: 'out-of-range',
    message: `${what} must rise from row to row; row ${row} does not come after the one before it`,
  }),
  riseOverDuration: (): FaultText => ({
    code: 'conflict',
    message: 'rise and fall together are longer than the duration',
  }),

  // records
  recordPath: (path: string, why: string): FaultText => ({
    code: 'record-path',
    message: `the record ${showValue(path)} is refused: ${why}; a record is named by a path inside the rig's folder, such as "records/hit.csv"`,
  }),
  recordRefused: (why: string): FaultText => ({ code: 'record-refused', message: why }),

  // the run
  notComputedYet: (what: string): FaultText => ({
    code: 'not-computed-yet',
    message: `${what} is read and checked but not computed yet`,
  }),
  tooManyCells: (cells: number, advice: string): FaultText => ({
    code: 'too-many-cells',
    message: `the line would need about ${Math.round(cells)} cells; at most ${LIMITS.cells} are computed: ${advice}`,
  }),
  tooManySteps: (steps: number, advice: string): FaultText => ({
    code: 'too-many-steps',
    message: `the run would need about ${Math.round(steps)} steps; at most ${LIMITS.steps} are computed: ${advice}`,
  }),
  tooMuchMemory: (bytes: number, advice: string): FaultText => ({
    code: 'too-much-memory',
    message: `the run would hold about ${showNumber(bytes / 1024 ** 3)} GB; at most ${LIMITS.memory / 1024 ** 3} GB are taken: ${advice}`,
  }),
}

function listOf(known: readonly string[]): string {
  if (known.length === 0) return '; none is defined'
  return `; known: ${known.slice(0, 20).map(quote).join(', ')}`
}
