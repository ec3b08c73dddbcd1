/**
 * Checks one value of a message. What it returns holds nothing but what was checked.
 *
 * @param what - its name in the words of a refusal
 */
export type Check = (value: unknown, what: string) => { value: unknown } | { refused: string }

/** Text of a length. */
export function checkText(most: number, least = 0): Check {
  return (value, what) => {
    if (typeof value !== 'string') return { refused: `${what} must be text.` }
    if (value.length >= least && value.length <= most) return { value }
    return { refused: `${what} has ${value.length} characters; ${least} to ${most} are taken.` }
  }
}

/** A finite number in a range, both ends included. */
export function checkNumber(least: number, most: number): Check {
  return (value, what) => {
    if (typeof value !== 'number') return { refused: `${what} must be a number.` }
    return value >= least && value <= most
      ? { value }
      : { refused: `${what} is ${value}; ${least} to ${most} is taken.` }
  }
}

/** A whole number in a range, both ends included. */
export function checkWhole(least: number, most: number): Check {
  const checkRange = checkNumber(least, most)
  return (value, what) =>
    typeof value === 'number' && !Number.isInteger(value)
      ? { refused: `${what} must be a whole number.` }
      : checkRange(value, what)
}

/** True or false. */
export const checkFlag: Check = (value, what) =>
  typeof value === 'boolean' ? { value } : { refused: `${what} must be true or false.` }

/** One of a few words. */
export function checkOneOf(...words: string[]): Check {
  return (value, what) =>
    words.includes(value as string) ? { value } : { refused: `${what} must be one of ${words.join(', ')}.` }
}

/** A value that may be missing. */
export function optional(check: Check): Check {
  return (value, what) => (value === undefined ? { value } : check(value, what))
}

/** A value that may be null. */
export function orNull(check: Check): Check {
  return (value, what) => (value === null ? { value } : check(value, what))
}

/** An object with these entries and no others. */
export function checkObject(entries: Readonly<Record<string, Check>>): Check {
  return (value, what) => {
    if (typeof value !== 'object' || value === null || Array.isArray(value)) {
      return { refused: `${what} must be an object.` }
    }
    const stranger = Object.keys(value).find((key) => !Object.hasOwn(entries, key))
    if (stranger !== undefined) {
      return {
        refused: `${what} has an entry that it does not take; it takes ${Object.keys(entries).join(', ')}.`,
      }
    }
    const kept: Record<string, unknown> = {}
    for (const [key, check] of Object.entries(entries)) {
      const given = Object.hasOwn(value, key) ? (value as Record<string, unknown>)[key] : undefined
      const checked = check(given, `${what}.${key}`)
      if ('refused' in checked) return checked
      if (checked.value !== undefined) kept[key] = checked.value
    }
    return { value: kept }
  }
}
