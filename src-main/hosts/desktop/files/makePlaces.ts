import { randomUUID } from 'node:crypto'

/** The files that the user has chosen, each under a word that says nothing of where it lies. */
export interface Places {
  /** The word for a file; always the same one for the same path. */
  give(path: string): string
  /** The path of a word; null where it was not given out. */
  find(place: string): string | null
}

/** Makes the words for files: the page can name no file that the user has not chosen. */
export function makePlaces(): Places {
  const byPlace = new Map<string, string>()
  const byPath = new Map<string, string>()
  return {
    give(path) {
      const known = byPath.get(path)
      if (known !== undefined) return known
      const place = `file:${randomUUID()}`
      byPath.set(path, place)
      byPlace.set(place, path)
      return place
    },
    find: (place) => byPlace.get(place) ?? null,
  }
}
