import type { FaultList } from './faultList'
import { faultText } from './faultText'
import { LIMITS } from './limits'
import type { Place } from './place'
import { quote } from './showValue'

/** Keys that reach into every object of the language. */
const FORBIDDEN = new Set(['__proto__', 'constructor', 'prototype'])

/** Ends the reading at the first place that is no JSON; never leaves this file. */
class Unreadable extends Error {}

/**
 * Reads JSON text strictly: keys may stand once, depth and numbers are limited, and no key reaches
 * into the language.
 * @param text the whole file, a byte-order mark at its start is skipped
 * @param faults gets `not-readable`, `too-large`, `not-json`, `duplicate-key`, `too-deep`,
 *   `forbidden-key`, `out-of-range`
 * @returns plain objects, lists, texts, numbers (NaN for one that is too large), booleans and nulls;
 *   undefined where it is no JSON
 */
export function readJson(text: string, faults: FaultList): unknown {
  if (text.length > LIMITS.textBytes) {
    faults.add([], faultText.textTooLarge(text.length))
    return undefined
  }
  if (text.includes('\u0000') || text.startsWith('\uFFFD')) {
    faults.add([], faultText.notText())
    return undefined
  }
  try {
    return makeReader(text, faults).whole()
  } catch (error) {
    if (error instanceof Unreadable) return undefined
    throw error
  }
}

function makeReader(text: string, faults: FaultList) {
  let at = text.startsWith('\uFEFF') ? 1 : 0
  let count = 0
  const place: (string | number)[] = []

  let countedTo = 0
  let linesBefore = 0
  let lineStart = 0

  /** Counts on from the last place asked for, so that many faults cost no more than one pass. */
  function lineAt(offset: number): { line: number; column: number } {
    for (; countedTo < offset; countedTo++) {
      if (text[countedTo] !== '\n') continue
      linesBefore++
      lineStart = countedTo + 1
    }
    return { line: linesBefore + 1, column: Math.max(1, offset - lineStart + 1) }
  }

  function stop(what: string, offset = at): never {
    const { line, column } = lineAt(offset)
    faults.add([], faultText.notJson(what, line, column))
    throw new Unreadable(what)
  }

  function skipSpace(): void {
    while (at < text.length && ' \t\r\n'.includes(text[at])) at++
  }

  function found(): string {
    return at < text.length ? `found ${quote(text[at])}` : 'the file ends here'
  }

  function readString(): string {
    const start = at
    at++
    while (text[at] !== '"') {
      if (at >= text.length) stop('this text is never closed by a "', start)
      if (text[at] < ' ') stop('a text must not run over the end of its line; write \\n for a new line')
      at += text[at] === '\\' ? 2 : 1
    }
    at++
    try {
      return JSON.parse(text.slice(start, at)) as string
    } catch {
      return stop('this text has a \\ that stands for nothing', start)
    }
  }

  function readNumber(): number {
    const match = /-?(0|[1-9][0-9]*)(\.[0-9]+)?([eE][-+]?[0-9]+)?/y
    match.lastIndex = at
    const digits = match.exec(text)
    if (!digits) return stop(`expected a value, ${found()}`)
    at += digits[0].length
    if (/[0-9A-Za-z_.+]/.test(text[at] ?? '')) stop(`a number is not written like this; ${found()} in it`)
    const value = Number(digits[0])
    if (Number.isFinite(value)) return value
    faults.add([...place], faultText.numberTooLarge(digits[0].slice(0, 30)))
    return NaN
  }

  function readWord(): boolean | null {
    for (const [word, value] of [
      ['true', true],
      ['false', false],
      ['null', null],
    ] as const) {
      if (text.startsWith(word, at)) {
        at += word.length
        return value
      }
    }
    return stop(`expected a value, ${found()}; texts stand between "`)
  }

  function readList(): unknown[] {
    const list: unknown[] = []
    at++
    skipSpace()
    if (text[at] === ']') {
      at++
      return list
    }
    for (;;) {
      place.push(list.length)
      list.push(readValue())
      place.pop()
      skipSpace()
      const mark = text[at]
      if (mark !== ',' && mark !== ']') stop(`expected , or ] after a value of a list, ${found()}`)
      at++
      if (mark === ']') return list
    }
  }

  function readKey(object: Record<string, unknown>): { key: string; keep: boolean } {
    skipSpace()
    const start = at
    if (text[at] !== '"') stop(`expected a key between ", ${found()}`)
    const key = readString()
    const own: Place = [...place, key]
    const twice = Object.hasOwn(object, key)
    if (FORBIDDEN.has(key)) faults.add(own, faultText.forbiddenKey(key))
    else if (twice) faults.add(own, faultText.duplicateKey(key, lineAt(start).line))
    skipSpace()
    if (text[at] !== ':') stop(`expected : after the key ${quote(key)}, ${found()}`)
    at++
    return { key, keep: !twice && !FORBIDDEN.has(key) }
  }

  function readObject(): Record<string, unknown> {
    const object: Record<string, unknown> = {}
    at++
    skipSpace()
    if (text[at] === '}') {
      at++
      return object
    }
    for (;;) {
      const { key, keep } = readKey(object)
      place.push(key)
      const value = readValue()
      place.pop()
      if (keep) object[key] = value
      skipSpace()
      const mark = text[at]
      if (mark !== ',' && mark !== '}') stop(`expected , or } after the value of ${quote(key)}, ${found()}`)
      at++
      if (mark === '}') return object
    }
  }

  function readValue(): unknown {
    skipSpace()
    if (place.length > LIMITS.jsonDepth) {
      faults.add(place.slice(0, 6), faultText.tooDeep(lineAt(at).line))
      throw new Unreadable('too deep')
    }
    count++
    if (count > LIMITS.jsonValues) {
      faults.add([], faultText.tooManyValues())
      throw new Unreadable('too many values')
    }
    const mark = text[at]
    if (mark === '{') return readObject()
    if (mark === '[') return readList()
    if (mark === '"') return readString()
    if (mark === '-' || (mark >= '0' && mark <= '9')) return readNumber()
    return readWord()
  }

  function whole(): unknown {
    const value = readValue()
    skipSpace()
    if (at < text.length) stop(`expected the end of the file, ${found()}`)
    return value
  }

  return { whole }
}
