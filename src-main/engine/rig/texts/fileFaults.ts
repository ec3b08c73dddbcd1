import { LIMITS } from '../limits'
import { quote, showNumber, showValue } from '../showValue'
import type { FaultText } from './faultShape'
import { didYouMean } from './nameHint'

/** Why a file is no rig file: its text, its keys, the kinds of its values. */
export const fileFaults = {
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

  unknownKey: (key: string, nearest: string | null, known: readonly string[]): FaultText => ({
    code: 'unknown-key',
    message: `unknown key ${quote(key)}${nearest === null ? `; known here: ${known.join(', ')}` : didYouMean(nearest)}`,
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
    message: `got ${showValue(value)}; choose one of ${choices.join(', ')}${didYouMean(nearest)}`,
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
}
