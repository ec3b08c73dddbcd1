import { quote } from '../showValue'

/** Puts the name that may have been meant behind a message; nothing where there is none. */
export function didYouMean(nearest: string | null): string {
  return nearest === null ? '' : `; did you mean ${quote(nearest)}?`
}

/** Puts the names that would have been right behind a message, the first 20 of them. */
export function listKnown(known: readonly string[]): string {
  if (known.length === 0) return '; none is defined'
  return `; known: ${known.slice(0, 20).map(quote).join(', ')}`
}
